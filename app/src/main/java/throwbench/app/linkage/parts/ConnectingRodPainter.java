package throwbench.app.linkage.parts;

import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;

/** Draws the connecting rod: shank with its recess, split big end with its bolts, bearings and pins in both eyes. */
public final class ConnectingRodPainter {

    private ConnectingRodPainter() {}

    public static void paint(ThrowPen p, ThrowLayout layout, Pose pose, Look look) {
        Pen pen = p.pen();
        double x = pose.pinX();
        double y = pose.pinY();
        double c = pose.cosRod();
        double s = pose.sinRod();
        GearShape.Rod rod = layout.gear().rod();
        pen.stroke(look.edge(), look.strong());
        pen.fill(look.palette().parts().face());
        if (look.solid()) {
            bolts(p, rod, pose);
        }
        p.outline(layout.shank(), x, y, c, s, look.solid(), true);
        if (!look.solid()) {
            p.circle(x, y, layout.gear().crank().pin(), false, true);
            p.circle(pose.wristX(), pose.wristY(), rod.wristPin(), false, true);
            return;
        }
        int recess = Palette.mix(
                look.palette().parts().face(), look.palette().parts().shade(), 0.8);
        pen.stroke(Palette.mix(recess, look.edge(), 0.35), look.thin());
        pen.fill(recess);
        p.outline(layout.groove(), x, y, c, s, true, true);
        split(p, layout, pose, look);
        eye(p, x, y, layout.gear().crank().pin(), look);
        eye(p, pose.wristX(), pose.wristY(), rod.wristPin(), look);
    }

    /** Bearing shell and pin. */
    private static void eye(ThrowPen p, double x, double y, double pin, Look look) {
        Pen pen = p.pen();
        pen.stroke(look.edge(), look.thin());
        pen.fill(Palette.mix(
                look.palette().parts().face(), look.palette().parts().steel(), 0.45));
        p.circle(x, y, 1.14 * pin, true, true);
        pen.fill(Palette.mix(
                look.palette().parts().face(), look.palette().ground().surface(), 0.6));
        p.circle(x, y, pin, true, true);
        pen.fill(look.edge());
        p.circle(x, y, 0.13 * pin, true, false);
    }

    /** The joint of the big end's cap. */
    private static void split(ThrowPen p, ThrowLayout layout, Pose pose, Look look) {
        double from = 1.14 * layout.gear().crank().pin();
        double to = 1.12 * layout.gear().rod().bigEye();
        double nx = -pose.sinRod();
        double ny = pose.cosRod();
        p.pen().stroke(look.edge(), look.thin());
        for (int side = -1; side <= 1; side += 2) {
            p.line(
                    pose.pinX() + side * from * nx,
                    pose.pinY() + side * from * ny,
                    pose.pinX() + side * to * nx,
                    pose.pinY() + side * to * ny);
        }
    }

    /** Bosses for the cap bolts, half hidden by the eye. */
    private static void bolts(ThrowPen p, GearShape.Rod rod, Pose pose) {
        double half = 0.36 * rod.bigEye();
        for (int side = -1; side <= 1; side += 2) {
            p.turnedBox(
                    pose.pinX(),
                    pose.pinY(),
                    pose.cosRod(),
                    pose.sinRod(),
                    -half,
                    side * 0.6 * rod.bigEye(),
                    half,
                    side * GearShape.CAP * rod.bigEye());
        }
    }
}
