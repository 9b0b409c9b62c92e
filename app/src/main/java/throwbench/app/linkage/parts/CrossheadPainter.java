package throwbench.app.linkage.parts;

import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;

/** Draws the crosshead with its shoes, the guide bars it slides between, and a trunk piston cut open. */
public final class CrossheadPainter {

    private CrossheadPainter() {}

    /** The fixed guide bars, cut. */
    public static void paintGuide(ThrowPen p, ThrowLayout layout, Look look) {
        GearShape.Slider slider = layout.gear().slider();
        if (slider.trunk()) {
            return;
        }
        double e = layout.linkage().guideOffset();
        GearShape.Guide guide = slider.guide();
        for (int side = -1; side <= 1; side += 2) {
            double inner = e + side * slider.halfHeight();
            double outer = inner + side * guide.bar();
            CylinderPainter.wall(p, look, guide.from(), Math.min(inner, outer), guide.to(), Math.max(inner, outer));
        }
    }

    /** The crosshead, without the connecting rod's eye in it. */
    public static void paint(ThrowPen p, ThrowLayout layout, Pose pose, Look look) {
        GearShape.Slider slider = layout.gear().slider();
        double x = pose.wristX();
        double e = pose.wristY();
        Pen pen = p.pen();
        if (slider.trunk()) {
            return;
        }
        double body = slider.halfHeight() - slider.shoe();
        pen.stroke(look.edge(), look.thin());
        pen.fill(look.palette().parts().steel());
        for (int side = -1; side <= 1; side += 2) {
            double inner = e + side * body;
            double outer = e + side * slider.halfHeight();
            p.box(x - slider.back(), inner, x + slider.front(), outer, look.solid(), true);
        }
        pen.stroke(look.edge(), look.strong());
        pen.fill(look.palette().parts().face());
        double cut = 0.16 * body;
        double back = 0.92 * slider.back();
        p.chamfered(x - back, e - body, x + slider.front(), e + body, cut, look.solid(), true);
        if (look.solid()) {
            pen.stroke(look.edge(), look.thin());
            pen.fill(Palette.mix(
                    look.palette().parts().face(), look.palette().parts().shade(), 0.7));
            p.circle(x, e, 1.12 * layout.gear().rod().smallEye(), true, true);
        }
    }

    /** The nut that holds the piston rod in the crosshead. */
    public static void paintNut(ThrowPen p, ThrowLayout layout, Pose pose, Look look, double rodRadius) {
        GearShape.Slider slider = layout.gear().slider();
        double from = pose.wristX() + slider.front();
        double half = Math.min(1.5 * rodRadius, slider.halfHeight() - slider.shoe());
        p.pen().stroke(look.edge(), look.thin());
        p.pen().fill(look.palette().parts().shade());
        p.box(
                from,
                pose.wristY() - half,
                from + 0.09 * layout.linkage().stroke(),
                pose.wristY() + half,
                look.solid(),
                true);
    }
}
