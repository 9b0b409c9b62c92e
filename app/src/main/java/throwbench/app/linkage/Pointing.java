package throwbench.app.linkage;

import java.util.List;
import java.util.Optional;
import throwbench.app.drawing.Readout;
import throwbench.app.linkage.Target.Part;
import throwbench.app.linkage.force.ArrowPlaces;
import throwbench.app.linkage.force.ArrowSet;
import throwbench.app.linkage.force.ForceKind;
import throwbench.app.linkage.parts.GearShape;
import throwbench.app.linkage.parts.Pose;
import throwbench.app.linkage.parts.RodLine;
import throwbench.app.linkage.parts.ThrowAxes;
import throwbench.app.linkage.parts.ThrowLayout;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;

/** Tells what of a picture stands under a point, and says it in words. */
final class Pointing {

    /** How near to an arrow a point must be, points. */
    private static final double NEAR = 6;

    private final MovingPainter painted;
    private final Scene scene;

    Pointing(MovingPainter painted) {
        this.painted = painted;
        this.scene = painted.scene();
    }

    /** What stands at a point as it was last drawn, the uppermost first. */
    Optional<Target> at(double px, double py) {
        Optional<Target> pin = pins(px, py);
        if (pin.isPresent()) {
            return pin;
        }
        Optional<Target> arrow = arrow(px, py);
        return arrow.isPresent() ? arrow : part(px, py);
    }

    private Optional<Target> pins(double px, double py) {
        ThrowAxes axes = scene.axes();
        Pose pose = painted.pose();
        GearShape gear = scene.own().gear();
        double x = axes.x(px, py);
        double y = axes.y(px, py);
        double least = NEAR * scene.weight() / axes.scale();
        if (Math.hypot(x - pose.pinX(), y - pose.pinY())
                < Math.max(least, 1.2 * gear.crank().pin())) {
            return target(Part.CRANK_PIN, Column.CRANK_PIN_X, Column.CRANK_PIN_Y);
        }
        if (Math.hypot(x - pose.wristX(), y - pose.wristY())
                < Math.max(least, 1.1 * gear.rod().wristPin())) {
            return target(Part.CROSSHEAD_PIN, Column.CROSSHEAD_PIN_X, Column.CROSSHEAD_PIN_Y);
        }
        return Optional.empty();
    }

    private static Optional<Target> target(Part part, Column... columns) {
        return Optional.of(new Target(part, -1, List.of(columns)));
    }

    private Optional<Target> arrow(double px, double py) {
        ArrowSet set = painted.arrowSet();
        ArrowPlaces places = painted.places();
        double nearest = NEAR * scene.weight();
        int best = -1;
        for (int i = 0; i < set.size(); i++) {
            boolean torque = set.arrows().get(i).kind() == ForceKind.TORQUE;
            double d = torque ? fromArc(px, py) : places.distance(i, px, py);
            if (d < nearest) {
                nearest = d;
                best = i;
            }
        }
        if (best < 0) {
            return label(px, py);
        }
        return Optional.of(
                new Target(Part.ARROW, best, set.arrows().get(best).kind().columns()));
    }

    /** A label stands for its arrow. */
    private Optional<Target> label(double px, double py) {
        List<Optional<Label>> labels = painted.plan().arrows();
        for (int i = 0; i < labels.size(); i++) {
            boolean on = labels.get(i)
                    .filter(l -> px >= l.box().x()
                            && px <= l.box().x() + l.box().width()
                            && py >= l.box().y()
                            && py <= l.box().y() + l.box().height())
                    .isPresent();
            if (on) {
                return Optional.of(new Target(
                        Part.ARROW, i, painted.arrowSet().arrows().get(i).kind().columns()));
            }
        }
        return Optional.empty();
    }

    private double fromArc(double px, double py) {
        double dx = px - scene.axes().originX();
        double dy = scene.axes().originY() - py;
        double extent = painted.torqueExtent();
        double turned = Math.IEEEremainder(Math.atan2(dy, dx) - painted.arcStart() - extent / 2, 2 * Math.PI);
        boolean beside = Math.abs(turned) > Math.abs(extent) / 2 + 0.05;
        return beside ? Double.POSITIVE_INFINITY : Math.abs(Math.hypot(dx, dy) - Survey.arcRadius(scene));
    }

    private Optional<Target> part(double px, double py) {
        ThrowAxes axes = scene.axes();
        Pose pose = painted.pose();
        ThrowLayout own = scene.own();
        double x = axes.x(px, py);
        double y = axes.y(px, py);
        double along = x - pose.wristX();
        double across = Math.abs(y - pose.wristY());
        GearShape gear = own.gear();
        GearShape.Slider slider = gear.slider();
        if (onConnectingRod(x, y, pose, own)) {
            return target(Part.CONNECTING_ROD, Column.ROD_ANGLE);
        }
        if (!slider.trunk() && along > -slider.back() && along < slider.front() && across < slider.halfHeight()) {
            return target(Part.CROSSHEAD, Column.VELOCITY);
        }
        for (int i = 0; i < own.line().pistons().size(); i++) {
            RodLine.Piston p = own.line().pistons().get(i);
            double back = slider.trunk() && i == 0 ? -slider.back() : p.crankFace();
            if (along > back && along < p.headFace() && across < p.radius()) {
                return target(
                        p.plunger() ? Part.PISTON_ROD : Part.PISTON, p.plunger() ? Column.ROD_LOAD : Column.TRAVEL);
            }
        }
        for (RodLine.Bar b : own.line().bars()) {
            if (along > b.from() && along < b.to() && across < b.radius()) {
                return target(Part.PISTON_ROD, Column.ROD_LOAD);
            }
        }
        return fixed(x, y, across, pose, own);
    }

    private Optional<Target> fixed(double x, double y, double across, Pose pose, ThrowLayout own) {
        List<LabelPlan.ChamberLabel> chambers = painted.plan().chambers();
        for (int i = 0; i < chambers.size(); i++) {
            ChamberSpace space = chambers.get(i).space();
            if (x > space.from(pose) && x < space.to(pose) && across < space.radius()) {
                return Optional.of(new Target(Part.CHAMBER, i, List.of()));
            }
        }
        GearShape.Crank crank = own.gear().crank();
        double alongPin = x * pose.cosPin() + y * pose.sinPin();
        double besidePin = Math.abs(y * pose.cosPin() - x * pose.sinPin());
        double r = own.linkage().crankRadius();
        boolean onWeb = alongPin > 0 && alongPin < r && besidePin < Math.min(crank.hub(), crank.pinEnd());
        if (onWeb || Math.hypot(x, y) < (alongPin < 0 ? crank.counterweight() : crank.hub())) {
            return target(Part.CRANK, Column.THROW_TORQUE);
        }
        GearShape.Slider slider = own.gear().slider();
        boolean onGuide = !slider.trunk()
                && x > slider.guide().from()
                && x < slider.guide().to()
                && across < slider.halfHeight() + slider.guide().bar();
        return onGuide ? target(Part.GUIDE, Column.GUIDE_FORCE) : Optional.empty();
    }

    private static boolean onConnectingRod(double x, double y, Pose pose, ThrowLayout own) {
        double dx = x - pose.pinX();
        double dy = y - pose.pinY();
        double along = dx * pose.cosRod() + dy * pose.sinRod();
        double across = Math.abs(dy * pose.cosRod() - dx * pose.sinRod());
        GearShape.Rod rod = own.gear().rod();
        boolean onShank = along > 0 && along < own.linkage().rodLength() && across < rod.shankBig();
        return onShank
                || Math.hypot(dx, dy) < rod.bigEye()
                || Math.hypot(x - pose.wristX(), y - pose.wristY()) < rod.smallEye();
    }

    /** Names a target and gives its value at an instant. */
    String say(Target target, Instant instant) {
        int own = scene.shown().throwIndex();
        return switch (target.part()) {
            case ARROW -> {
                ArrowSet.Arrow a = painted.arrowSet().arrows().get(target.index());
                boolean torque = a.kind() == ForceKind.TORQUE;
                yield a.name() + "  "
                        + value(
                                torque ? Column.Kind.TORQUE : Column.Kind.FORCE,
                                painted.arrowSet().value(target.index()),
                                painted.peaks().of(target.index()));
            }
            case CHAMBER -> {
                int chamber =
                        painted.plan().chambers().get(target.index()).space().chamber();
                String name = scene.shown().shownThrow().chambers().get(chamber).name();
                yield name + "  "
                        + Readout.of(
                                        scene.shown().units(),
                                        Dimension.GAS_PRESSURE,
                                        scene.shown()
                                                .summary()
                                                .pressures()
                                                .get(chamber)
                                                .greatest()
                                                .value())
                                .text(instant.pressure(own, chamber));
            }
            case CRANK_PIN, CROSSHEAD_PIN ->
                target.part().text() + "  "
                        + value(
                                Column.Kind.FORCE,
                                Math.hypot(
                                        instant.at(target.columns().get(0)),
                                        instant.at(target.columns().get(1))),
                                painted.peaks().greatestForce());
            default -> {
                Column column = target.columns().get(0);
                yield target.part().text() + "  " + words(column) + " "
                        + value(column.kind(), instant.at(column), peak(column));
            }
        };
    }

    private static String words(Column column) {
        return switch (column) {
            case ROD_ANGLE -> "angle";
            case VELOCITY -> "velocity";
            case TRAVEL -> "travel";
            case ROD_LOAD -> "rod load";
            case THROW_TORQUE -> "torque";
            default -> "force";
        };
    }

    private double peak(Column column) {
        var extremes = scene.shown().summary().extremes().get(column);
        return extremes == null
                ? 0
                : Math.max(
                        Math.abs(extremes.least().value()),
                        Math.abs(extremes.greatest().value()));
    }

    private String value(Column.Kind kind, double si, double peak) {
        return Readout.of(scene.shown().units(), kind, peak).text(si);
    }
}
