package throwbench.app.linkage;

import java.util.List;
import throwbench.app.drawing.Palette;
import throwbench.app.linkage.parts.CrossheadPainter;
import throwbench.app.linkage.parts.GearShape;
import throwbench.app.linkage.parts.Look;
import throwbench.app.linkage.parts.Pose;
import throwbench.app.linkage.parts.RodLine;
import throwbench.app.linkage.parts.RodLoadPainter;
import throwbench.app.linkage.parts.ThrowLayout;
import throwbench.app.linkage.parts.ThrowPen;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;
import throwbench.solver.revolution.SignChange;

/**
 * Shows on the shown throw's piston rod what it carries; a plunger shows it along its axis, a trunk piston's throw on the
 * connecting rod. For some degrees after the load has changed its sign a ring opens about the crosshead pin.
 */
final class RodLoad {

    /** How long after a sign change its ring is seen, rad of crank angle. */
    static final double EVENT = Math.toRadians(26);

    /** Least thickness of the band, points at weight 1. */
    private static final double LEAST = 9;

    private final Scene scene;
    private final double peak;
    private final List<SignChange> changes;
    private final RodLoadPainter.Band band = new RodLoadPainter.Band();

    RodLoad(Scene scene) {
        this.scene = scene;
        this.peak = Headline.greatest(scene.shown().summary().reversal());
        this.changes = scene.shown().summary().reversal().signChanges();
    }

    void paint(ThrowPen p, Pose pose, Instant instant, Look look) {
        ThrowLayout layout = scene.own();
        double load = instant.at(Column.ROD_LOAD);
        double share = peak > 0 ? load / peak : 0;
        double half = lay(p, layout, pose);
        if (half > 0) {
            RodLoadPainter.paint(p, band, share, look, half);
        }
        if (!layout.gear().slider().trunk() && !layout.line().bars().isEmpty()) {
            RodLine.Bar bar = layout.line().bars().get(0);
            CrossheadPainter.paintNut(p, layout, pose, look, Math.max(bar.radius(), half));
        }
        ring(p, layout, pose, instant);
    }

    /** Lays the band where this kind of throw carries its load; half its thickness, m. */
    private double lay(ThrowPen p, ThrowLayout layout, Pose pose) {
        double least = p.metres(LEAST * scene.weight()) / 2;
        GearShape gear = layout.gear();
        RodLine.Piston first = layout.line().pistons().get(0);
        if (gear.slider().trunk()) {
            double from = 1.5 * gear.rod().bigEye();
            double to = layout.linkage().rodLength() - 1.6 * gear.rod().smallEye();
            double half = Math.max(least, 0.55 * gear.rod().shankSmall());
            band.set(
                    pose.pinX() + from * pose.cosRod(),
                    pose.pinY() + from * pose.sinRod(),
                    pose.cosRod(),
                    pose.sinRod(),
                    Math.max(0, to - from));
            return to > from ? half : 0;
        }
        if (first.plunger()) {
            double from = gear.slider().front();
            double half = Math.max(
                    least,
                    Math.min(0.5 * first.radius(), 0.16 * layout.linkage().stroke()));
            band.set(pose.wristX() + from, pose.wristY(), 1, 0, first.headFace() - from - 0.4 * first.radius());
            return half;
        }
        for (RodLine.Bar bar : layout.line().bars()) {
            if (bar.rod()) {
                band.set(pose.wristX() + bar.from(), pose.wristY(), 1, 0, bar.to() - bar.from());
                return Math.max(least, bar.radius());
            }
        }
        return 0;
    }

    /** Share of the event left since the last sign change, 0 where it is over. */
    double eventLeft(double crankAngle) {
        double since = Double.POSITIVE_INFINITY;
        for (int i = 0; i < changes.size(); i++) {
            since = Math.min(since, Angles.wrap(crankAngle - changes.get(i).crankAngle()));
        }
        return Math.max(0, 1 - since / EVENT);
    }

    private void ring(ThrowPen p, ThrowLayout layout, Pose pose, Instant instant) {
        double left = eventLeft(instant.crankAngle());
        if (left == 0) {
            return;
        }
        double w = scene.weight();
        double small = layout.gear().rod().smallEye();
        double radius = (1.15 + 1.7 * (1 - left)) * Math.max(small, p.metres(9 * w));
        int hue = scene.palette().rodLoad(instant.at(Column.ROD_LOAD));
        p.pen().stroke(Palette.mix(scene.palette().ground().surface(), hue, 0.25 + 0.75 * left), (1 + 4 * left) * w);
        p.circle(pose.wristX(), pose.wristY(), radius, false, true);
    }
}
