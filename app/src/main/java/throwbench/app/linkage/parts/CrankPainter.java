package throwbench.app.linkage.parts;

import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;

/** Draws the crank web with its counterweight, and the journal in its bearing. */
public final class CrankPainter {

    private CrankPainter() {}

    public static void paint(ThrowPen p, ThrowLayout layout, Pose pose, Look look) {
        Pen pen = p.pen();
        GearShape.Crank crank = layout.gear().crank();
        pen.stroke(look.edge(), look.strong());
        pen.fill(look.palette().parts().shade());
        p.outline(layout.web(), 0, 0, pose.cosPin(), pose.sinPin(), look.solid(), true);
        if (!look.solid()) {
            return;
        }
        rim(p, layout, pose, look);
        pen.stroke(look.edge(), look.thin());
        pen.fill(look.palette().parts().face());
        p.circle(0, 0, 1.16 * crank.journal(), true, true);
        pen.fill(Palette.mix(
                look.palette().parts().face(), look.palette().ground().surface(), 0.6));
        p.circle(0, 0, crank.journal(), true, true);
        // centre mark
        pen.fill(look.edge());
        p.circle(0, 0, 0.13 * crank.journal(), true, false);
    }

    /** A line inside the counterweight's rim, as a turned edge shows. */
    private static void rim(ThrowPen p, ThrowLayout layout, Pose pose, Look look) {
        GearShape.Crank crank = layout.gear().crank();
        double inside = 0.9 * crank.counterweight();
        if (inside < 1.1 * crank.hub()) {
            return;
        }
        ThrowAxes axes = p.axes();
        p.pen().stroke(Palette.mix(look.palette().parts().shade(), look.edge(), 0.45), look.thin());
        double pin = Math.toDegrees(Math.atan2(pose.sinPin(), pose.cosPin()) + Math.atan2(axes.sin(), axes.cos()));
        p.pen().arc(axes.px(0, 0), axes.py(0, 0), p.points(inside), pin + 180 - 43, 86);
    }
}
