package throwbench.app.linkage.parts;

import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;
import throwbench.app.linkage.parts.RodLine.Bar;
import throwbench.app.linkage.parts.RodLine.Piston;

/** Draws what moves in the cylinders: pistons with their rings, plungers, trunk pistons cut open, necks and tail rods. */
public final class PistonPainter {

    private PistonPainter() {}

    /** Everything of a throw that moves beyond the crosshead, the piston rod as bare steel. */
    public static void paint(ThrowPen p, ThrowLayout layout, Pose pose, Look look) {
        double x = pose.wristX();
        double e = pose.wristY();
        for (Bar bar : layout.line().bars()) {
            p.pen().stroke(look.edge(), bar.rod() ? look.strong() : look.thin());
            p.pen().fill(look.palette().parts().face());
            p.box(x + bar.from(), e - bar.radius(), x + bar.to(), e + bar.radius(), look.solid(), true);
        }
        boolean first = true;
        for (Piston piston : layout.line().pistons()) {
            if (first && layout.gear().slider().trunk()) {
                trunk(p, layout, pose, look, piston);
            } else {
                body(p, pose, look, piston);
            }
            first = false;
        }
    }

    private static void body(ThrowPen p, Pose pose, Look look, Piston piston) {
        double from = pose.wristX() + piston.crankFace();
        double to = pose.wristX() + piston.headFace();
        double e = pose.wristY();
        Pen pen = p.pen();
        pen.stroke(look.edge(), look.strong());
        pen.fill(look.palette().parts().face());
        double length = to - from;
        double cut = Math.min(0.06 * length, 0.06 * piston.radius());
        p.chamfered(from, e - piston.radius(), to, e + piston.radius(), cut, look.solid(), true);
        if (look.solid() && !piston.plunger()) {
            double ringed = Math.min(length, 1.1 * piston.radius());
            rings(p, look, to - ringed, to, e, piston.radius(), 3);
            sheen(p, look, from, to, e, piston.radius());
        }
    }

    /** Two faint lines along a turned body. */
    private static void sheen(ThrowPen p, Look look, double from, double to, double e, double radius) {
        p.pen().stroke(Palette.mix(look.palette().parts().face(), look.edge(), 0.22), look.thin());
        p.line(from, e + 0.62 * radius, to, e + 0.62 * radius);
        p.line(from, e - 0.62 * radius, to, e - 0.62 * radius);
    }

    /** Piston rings at the rim, the middle of a stretch. */
    private static void rings(ThrowPen p, Look look, double from, double to, double e, double radius, int count) {
        double pitch = (to - from) / (count + 3);
        double depth = Math.min(0.09 * radius, 0.9 * pitch);
        p.pen().fill(look.palette().parts().steel());
        for (int i = 0; i < count; i++) {
            double at = from + pitch * (i + 1.75);
            p.box(at, e + radius - depth, at + 0.5 * pitch, e + radius, true, false);
            p.box(at, e - radius, at + 0.5 * pitch, e - radius + depth, true, false);
        }
    }

    /** A trunk piston cut open: skirt walls, crown, and the pin's bosses behind the connecting rod. */
    private static void trunk(ThrowPen p, ThrowLayout layout, Pose pose, Look look, Piston piston) {
        double x = pose.wristX();
        double e = pose.wristY();
        GearShape.Slider slider = layout.gear().slider();
        double back = x - slider.back();
        double crown = x + piston.headFace();
        double shell = slider.shoe();
        double inside = Math.max(x + 1.15 * layout.gear().rod().smallEye(), x + slider.front() - 1.6 * shell);
        double skirt = slider.halfHeight();
        Pen pen = p.pen();
        if (look.solid()) {
            pen.fill(Palette.mix(
                    look.palette().parts().shade(), look.palette().parts().edge(), 0.18));
            p.box(back, e - skirt, inside, e + skirt, true, false);
            pen.stroke(look.edge(), look.thin());
            pen.fill(look.palette().parts().shade());
            p.circle(x, e, 1.35 * layout.gear().rod().smallEye(), true, true);
        }
        CylinderPainter.wall(p, look, back, e + skirt - shell, inside, e + skirt);
        CylinderPainter.wall(p, look, back, e - skirt, inside, e - skirt + shell);
        CylinderPainter.wall(p, look, inside, e - skirt, Math.max(crown, x + slider.front()), e + skirt);
        boolean wider = piston.radius() > 1.01 * skirt;
        if (wider) {
            CylinderPainter.wall(p, look, x + piston.crankFace(), e - piston.radius(), crown, e + piston.radius());
        }
        pen.stroke(look.edge(), look.strong());
        double from = wider ? x + piston.crankFace() : back;
        if (wider) {
            p.box(back, e - skirt, from, e + skirt, false, true);
        }
        p.box(from, e - piston.radius(), crown, e + piston.radius(), false, true);
        if (look.solid()) {
            rings(p, look, crown - Math.min(crown - from, 0.75 * piston.radius()), crown, e, piston.radius(), 3);
        }
    }
}
