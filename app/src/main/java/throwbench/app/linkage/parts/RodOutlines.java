package throwbench.app.linkage.parts;

/** Outlines of crank web and connecting rod. */
final class RodOutlines {

    /** Half the angle of the counterweight's sector. */
    private static final double SECTOR = Math.toRadians(50);

    private RodOutlines() {}

    /** Crank web about the crank centre, its pin at (r, 0), its counterweight on the other side. */
    static Outline web(GearShape.Crank crank, double r) {
        Outline.Builder upper = new Outline.Builder();
        // the straight flanks touch both circles
        double tangent = Math.acos(Math.max(-1, Math.min(1, (crank.hub() - crank.pinEnd()) / r)));
        upper.arc(r, 0, crank.pinEnd(), 0, tangent);
        double flank = Math.PI - SECTOR;
        double leave = Math.max(tangent, flank - 0.30);
        upper.arc(0, 0, crank.hub(), tangent, leave);
        double out = crank.counterweight();
        double round = Math.min(0.12 * out, 0.4 * Math.max(0, out - crank.hub()));
        if (round > 0) {
            // a rounded corner where the flank meets the rim
            upper.to((out - round) * Math.cos(flank), (out - round) * Math.sin(flank));
            double rim = flank + round / out;
            upper.to(
                    (out - 0.3 * round) * Math.cos(flank + 0.3 * round / out),
                    (out - 0.3 * round) * Math.sin(flank + 0.3 * round / out));
            upper.arc(0, 0, out, rim, Math.PI);
        } else {
            upper.arc(0, 0, out, leave, Math.PI);
        }
        return upper.mirrored();
    }

    /** Connecting rod from the crank pin at (0, 0) to the crosshead pin at (l, 0): two eyes, a filleted tapered shank. */
    static Outline rod(GearShape.Rod rod, double l) {
        Outline.Builder upper = new Outline.Builder();
        double bigFillet = 0.75 * rod.bigEye();
        double bigX = filletCentre(rod.bigEye(), rod.shankBig(), bigFillet);
        double bigAngle = Math.atan2(rod.shankBig() + bigFillet, bigX);
        upper.arc(0, 0, rod.bigEye(), Math.PI, bigAngle);
        upper.arc(bigX, rod.shankBig() + bigFillet, bigFillet, Math.PI + bigAngle, 1.5 * Math.PI);
        double smallFillet = 0.75 * rod.smallEye();
        double smallX = filletCentre(rod.smallEye(), rod.shankSmall(), smallFillet);
        double smallAngle = Math.atan2(rod.shankSmall() + smallFillet, smallX);
        upper.arc(l - smallX, rod.shankSmall() + smallFillet, smallFillet, 1.5 * Math.PI, 2 * Math.PI - smallAngle);
        upper.arc(l, 0, rod.smallEye(), Math.PI - smallAngle, 0);
        return upper.mirrored();
    }

    /** The recess along the shank, in the same axes. */
    static Outline groove(GearShape.Rod rod, double l) {
        double from = filletCentre(rod.bigEye(), rod.shankBig(), 0.75 * rod.bigEye());
        double to = l - filletCentre(rod.smallEye(), rod.shankSmall(), 0.75 * rod.smallEye());
        double half = Math.max(0, to - from) / 2;
        double big = Math.min(0.5 * rod.shankBig(), half);
        double small = Math.min(0.5 * rod.shankSmall(), half);
        Outline.Builder upper = new Outline.Builder();
        upper.arc(from + big, 0, big, Math.PI, Math.PI / 2);
        upper.arc(to - small, 0, small, Math.PI / 2, 0);
        return upper.mirrored();
    }

    /** x of the centre of a fillet that touches an eye and the line at the shank's height. */
    static double filletCentre(double eye, double shank, double fillet) {
        double reach = eye + fillet;
        double up = shank + fillet;
        return Math.sqrt(Math.max(0, (reach - up) * (reach + up)));
    }
}
