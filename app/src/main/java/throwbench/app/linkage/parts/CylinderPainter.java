package throwbench.app.linkage.parts;

import java.util.Optional;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;
import throwbench.app.linkage.parts.RodLine.Barrel;
import throwbench.app.linkage.parts.RodLine.Cover;

/** Draws cylinders cut along the line of stroke: liners, covers, packings. */
public final class CylinderPainter {

    /** Distance of hatching lines, points at weight 1. */
    private static final double HATCH = 5.5;

    private CylinderPainter() {}

    /** Every fixed wall of a throw's cylinders. */
    public static void paint(ThrowPen p, ThrowLayout layout, Look look) {
        double e = layout.linkage().guideOffset();
        for (Barrel b : layout.line().barrels()) {
            double from = b.from();
            double to = b.to();
            for (int side = -1; side <= 1; side += 2) {
                double inner = e + side * b.radius();
                double outer = inner + side * b.wall();
                wall(p, look, from, Math.min(inner, outer), to, Math.max(inner, outer));
            }
            cover(p, look, b, b.crankCover(), -1, e);
            cover(p, look, b, b.headCover(), 1, e);
        }
    }

    private static void cover(ThrowPen p, Look look, Barrel b, Optional<Cover> at, int outwards, double e) {
        if (at.isEmpty()) {
            return;
        }
        Cover c = at.get();
        double out = c.face() + outwards * c.thickness();
        double least = Math.min(c.face(), out);
        double most = Math.max(c.face(), out);
        double rim = b.radius() + b.wall();
        if (c.opening() == 0) {
            wall(p, look, least, e - rim, most, e + rim);
            return;
        }
        double box = Math.min(rim, packingRadius(c));
        for (int side = -1; side <= 1; side += 2) {
            double inner = e + side * box;
            double outer = e + side * rim;
            if (rim > box) {
                wall(p, look, least, Math.min(inner, outer), most, Math.max(inner, outer));
            }
            packing(p, look, c, outwards, e, side);
        }
    }

    /** Outer radius of the packing case. */
    static double packingRadius(Cover c) {
        return c.opening() + Math.max(0.35 * c.opening(), 0.4 * c.thickness()) + 0.3 * c.thickness();
    }

    /** Packing case with its rings, above or below the rod. */
    private static void packing(ThrowPen p, Look look, Cover c, int outwards, double e, int side) {
        double out = c.face() + outwards * c.packing();
        double from = Math.min(c.face(), out);
        double to = Math.max(c.face(), out);
        double inner = e + side * c.opening();
        double outer = e + side * packingRadius(c);
        Pen pen = p.pen();
        pen.stroke(look.edge(), look.thin());
        pen.fill(look.palette().parts().face());
        p.box(from, inner, to, outer, look.solid(), true);
        if (!look.solid()) {
            return;
        }
        double ring = e + side * (c.opening() + 0.55 * (packingRadius(c) - c.opening()));
        int rings = (int) Math.max(2, Math.min(5, Math.round(p.points(to - from) / 7)));
        double pitch = (to - from) / (rings + 0.4);
        pen.fill(look.palette().parts().steel());
        for (int i = 0; i < rings; i++) {
            double at = from + pitch * (i + 0.35);
            p.box(at, inner, at + 0.7 * pitch, ring, true, false);
        }
    }

    /** A cut wall between two corners, the lesser ones first. */
    static void wall(ThrowPen p, Look look, double x1, double y1, double x2, double y2) {
        Pen pen = p.pen();
        pen.stroke(look.edge(), look.thin());
        if (!look.solid()) {
            p.box(x1, y1, x2, y2, false, true);
            return;
        }
        pen.fill(look.palette().parts().face());
        p.box(x1, y1, x2, y2, true, false);
        double spacing = p.metres(HATCH * Math.max(1, look.thin()));
        if (p.points(Math.min(x2 - x1, y2 - y1)) > 3.5) {
            pen.stroke(Palette.mix(look.palette().parts().face(), look.edge(), 0.32), 0.7 * look.thin());
            p.hatch(x1, y1, x2, y2, spacing);
        }
        pen.stroke(look.edge(), look.thin());
        p.box(x1, y1, x2, y2, false, true);
    }
}
