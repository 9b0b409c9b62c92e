package throwbench.app.linkage;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;
import throwbench.app.linkage.force.ArrowPainter;
import throwbench.app.linkage.force.ArrowPlaces;
import throwbench.app.linkage.force.ArrowSet;
import throwbench.app.linkage.force.ForceKind;
import throwbench.app.linkage.force.ForcePeaks;
import throwbench.app.linkage.force.ForceScale;
import throwbench.app.linkage.parts.ConnectingRodPainter;
import throwbench.app.linkage.parts.CrankPainter;
import throwbench.app.linkage.parts.CrossheadPainter;
import throwbench.app.linkage.parts.Look;
import throwbench.app.linkage.parts.PistonPainter;
import throwbench.app.linkage.parts.Pose;
import throwbench.app.linkage.parts.ThrowAxes;
import throwbench.app.linkage.parts.ThrowLayout;
import throwbench.app.linkage.parts.ThrowPen;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;

/** Draws what moves, at one instant: other throws in outline, chambers, parts, the rod's load, arrows, labels. */
final class MovingPainter {

    /** The torque's arc stands so far outside crank and big end, points at weight 1. */
    static final double ARC_OUT = 13;

    private final Scene scene;
    private final int own;
    private final ArrowSet arrows;
    private final ForceScale forceScale;
    private final LabelPlan plan;
    private final StillPainter.PressureRange range;
    private final List<Pose> poses = new ArrayList<>();
    private final List<ThrowAxes> axes = new ArrayList<>();
    private final Look full;
    private final Look outline;
    private final Look held;
    private final ThrowAxes ghostAxes;
    private final ThrowPen drawn;
    private final ArrowPainter arrowPainter;
    private final ArrowPlaces places;
    private final RodLoad rodLoad;
    private final ForcePeaks peaks;
    private @Nullable Instant painted;
    private double torqueExtent;

    MovingPainter(Scene scene, ForcePeaks peaks, ForceScale forceScale, LabelPlan plan, Pen pen) {
        this.scene = scene;
        this.own = scene.shown().throwIndex();
        this.peaks = peaks;
        this.arrows = peaks.arrows();
        this.forceScale = forceScale;
        this.plan = plan;
        this.range = StillPainter.PressureRange.of(scene.shown().summary());
        for (int i = 0; i < scene.layout().size(); i++) {
            poses.add(new Pose(scene.layout().of(i).linkage()));
            axes.add(scene.layout().axes(i, scene.framing()));
        }
        this.full = scene.full();
        this.outline = scene.outline();
        this.held = scene.held();
        this.ghostAxes = scene.ghost().map(g -> g.axes(scene.framing())).orElseGet(scene::axes);
        this.drawn = new ThrowPen(pen, axes.get(own));
        this.arrowPainter = new ArrowPainter(pen, scene.weight());
        this.places = new ArrowPlaces(arrows.size());
        this.rodLoad = new RodLoad(scene);
    }

    void paint(Pen pen, Instant instant) {
        painted = instant;
        for (int i = 0; i < poses.size(); i++) {
            poses.get(i).take(instant, i);
        }
        for (int i = 0; i < poses.size(); i++) {
            if (scene.draws(i)) {
                drawn.on(pen, axes.get(i));
                gear(scene.layout().of(i), poses.get(i), outline);
            }
        }
        if (scene.ghost().isPresent()) {
            scene.ghost().get().paintMoving(drawn.on(pen, ghostAxes), instant.crankAngle(), held);
        }
        Pose pose = poses.get(own);
        drawn.on(pen, axes.get(own));
        chambers(pen, instant, pose);
        gear(scene.own(), pose, full);
        rodLoad.paint(drawn, pose, instant, full);
        arrows(pen, instant, pose);
        labels(pen);
    }

    private void gear(ThrowLayout layout, Pose pose, Look look) {
        CrankPainter.paint(drawn, layout, pose, look);
        CrossheadPainter.paint(drawn, layout, pose, look);
        PistonPainter.paint(drawn, layout, pose, look);
        ConnectingRodPainter.paint(drawn, layout, pose, look);
    }

    private void chambers(Pen pen, Instant instant, Pose pose) {
        // the fill keeps clear of the walls' edges, which stand on the layer below
        double clear = drawn.metres(0.6 * full.thin());
        double e = pose.wristY();
        for (int i = 0; i < plan.chambers().size(); i++) {
            LabelPlan.ChamberLabel c = plan.chambers().get(i);
            ChamberSpace space = c.space();
            double pressure = instant.pressure(own, space.chamber());
            double half = space.radius() - clear;
            double from = space.from(pose) + (space.head() ? 0 : clear);
            double to = space.to(pose) - (space.head() ? clear : 0);
            pen.fill(scene.palette().pressure(range.share(pressure)));
            drawn.box(from, e - half, to, e + half, true, false);
            boolean inside = c.inside().isPresent() && space.free(pose.wristX()) >= c.needed();
            if (inside) {
                c.inside().get().paint(pen, pressure, scene.palette().ground().ink(), false);
            } else {
                beside(pen, c, pressure);
            }
        }
    }

    private void beside(Pen pen, LabelPlan.ChamberLabel c, double pressure) {
        Optional<Label> label = c.beside();
        if (label.isEmpty()) {
            return;
        }
        Label l = label.get();
        double x = Math.max(l.box().x(), Math.min(l.box().x() + l.box().width(), c.rootX()));
        double y = c.rootY() < l.box().y() ? l.box().y() : l.box().y() + l.box().height();
        pen.stroke(scene.palette().loads().gas(), 0.9 * scene.weight());
        pen.line(x, y, c.rootX(), c.rootY());
        pen.fill(scene.palette().loads().gas());
        pen.circle(c.rootX(), c.rootY(), 1.8 * scene.weight(), true, false);
        l.paint(pen, pressure, scene.palette().loads().gas(), false);
    }

    private void arrows(Pen pen, Instant instant, Pose pose) {
        arrows.place(instant, pose);
        places.take(arrows, axes.get(own), forceScale);
        arrowPainter.on(pen);
        Palette palette = scene.palette();
        int ground = palette.ground().surface();
        for (int i = 0; i < arrows.size(); i++) {
            ForceKind kind = arrows.arrows().get(i).kind();
            int colour = kind.colour(palette);
            if (kind == ForceKind.TORQUE) {
                ThrowAxes at = axes.get(own);
                torqueExtent = torqueExtent(instant);
                arrowPainter.paintArc(
                        at.originX(), at.originY(), Survey.arcRadius(scene), arcStart(), torqueExtent, colour);
            } else {
                arrowPainter.paint(
                        kind, places.tailX(i), places.tailY(i), places.tipX(i), places.tipY(i), colour, ground);
            }
        }
    }

    /** The torque's arc, rad, counter-clockwise positive: with the rotation when the driver must deliver it. */
    private double torqueExtent(Instant instant) {
        Rotation rotation = scene.shown().machine().drive().rotation();
        return rotation.sign() * instant.at(own, Column.THROW_TORQUE) * forceScale.radPerNewtonMetre();
    }

    /** Where the torque's arc begins, rad counter-clockwise from the right. */
    double arcStart() {
        ThrowAxes at = axes.get(own);
        return Math.atan2(at.sin(), at.cos()) + arrows.arcStart();
    }

    /** Extent of the torque's arc as it was last drawn, rad. */
    double torqueExtent() {
        return torqueExtent;
    }

    private void labels(Pen pen) {
        for (int i = 0; i < arrows.size(); i++) {
            Optional<Label> label = plan.arrows().get(i);
            if (label.isPresent()) {
                int colour = arrows.arrows().get(i).kind().colour(scene.palette());
                label.get().paint(pen, Math.abs(arrows.value(i)), colour, true);
            }
        }
    }

    LabelPlan plan() {
        return plan;
    }

    Scene scene() {
        return scene;
    }

    /** The instant last drawn. */
    Optional<Instant> instant() {
        return Optional.ofNullable(painted);
    }

    ForcePeaks peaks() {
        return peaks;
    }

    /** Where the shown throw's links were last drawn. */
    Pose pose() {
        return poses.get(own);
    }

    /** The arrows as they were last drawn. */
    ArrowSet arrowSet() {
        return arrows;
    }

    /** Their places as they were last drawn. */
    ArrowPlaces places() {
        return places;
    }
}
