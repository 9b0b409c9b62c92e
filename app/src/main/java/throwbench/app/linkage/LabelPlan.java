package throwbench.app.linkage;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import throwbench.app.drawing.Pen;
import throwbench.app.drawing.Readout;
import throwbench.app.linkage.force.ArrowSet;
import throwbench.app.linkage.force.ForceKind;
import throwbench.app.linkage.force.ForcePeaks;
import throwbench.app.linkage.force.ForceScale;
import throwbench.app.linkage.force.LabelPlacer;
import throwbench.app.linkage.force.LabelPlacer.Box;
import throwbench.app.linkage.force.Occupancy;
import throwbench.app.linkage.parts.ThrowAxes;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.revolution.Column;

/**
 * Where every label of the machine stands for the whole revolution. A label that finds no room free of others is left out.
 *
 * @param arrows one an arrow
 * @param chambers one a chamber space
 * @param movingBox all that moves, labels included, within the view
 */
record LabelPlan(List<Optional<Label>> arrows, List<ChamberLabel> chambers, Box movingBox) {

    /** Size of type beside arrows, points at weight 1. */
    static final double TYPE = 12.5;

    /** Side of a cell of the occupancy, points at weight 1. */
    private static final double CELL = 5;

    /**
     * A chamber's pressure: written inside while the chamber is long enough, else beside the cylinder.
     *
     * @param needed free length at which it is written inside, m
     * @param rootX where the line from the label beside ends in the chamber, points
     */
    record ChamberLabel(
            ChamberSpace space,
            Optional<Label> inside,
            double needed,
            Optional<Label> beside,
            double rootX,
            double rootY) {}

    /** @param before the plan that held until now: labels stay where they can */
    static LabelPlan of(
            Scene scene, ForcePeaks peaks, ForceScale scale, Pen pen, List<Box> taken, Optional<LabelPlan> before) {
        return new Maker(scene, peaks, scale, pen, taken, before).make();
    }

    private static final class Maker {

        private final Scene scene;
        private final ForcePeaks peaks;
        private final Pen pen;
        private final ThrowAxes axes;
        private final double w;
        private final Survey survey;
        private final LabelPlacer placer;
        private final ArrowSet arrows;
        private final Optional<LabelPlan> before;

        Maker(Scene scene, ForcePeaks peaks, ForceScale scale, Pen pen, List<Box> taken, Optional<LabelPlan> before) {
            this.before = before;
            this.scene = scene;
            this.peaks = peaks;
            this.pen = pen;
            this.axes = scene.axes();
            this.w = scene.weight();
            this.arrows = peaks.arrows();
            Occupancy occupancy =
                    new Occupancy(scene.size().width(), scene.size().height(), CELL * Math.max(1, scene.weight()));
            this.survey = new Survey(scene, peaks, scale, occupancy);
            survey.mark();
            this.placer = new LabelPlacer(occupancy, scene.size().inside(), 5 * w, w);
            taken.forEach(placer::keepFree);
            survey.deadCentreBoxes().forEach(placer::keepFree);
        }

        LabelPlan make() {
            List<ChamberLabel> inside = new ArrayList<>();
            Readout pressure = Readout.of(
                    scene.shown().units(),
                    Dimension.GAS_PRESSURE,
                    StillPainter.PressureRange.of(scene.shown().summary()).greatest());
            for (ChamberSpace space : ChamberSpace.of(scene.own())) {
                inside.add(inside(space, pressure));
            }
            List<Optional<Label>> labels = new ArrayList<>();
            for (int i = 0; i < arrows.size(); i++) {
                labels.add(arrow(i));
            }
            List<ChamberLabel> chambers =
                    inside.stream().map(c -> beside(c, pressure)).toList();
            labels.forEach(l -> l.ifPresent(x -> survey.reach(x.box())));
            chambers.forEach(c -> c.beside().ifPresent(x -> survey.reach(x.box())));
            return new LabelPlan(labels, chambers, survey.movingBox());
        }

        private Optional<Label> arrow(int i) {
            ArrowSet.Arrow a = arrows.arrows().get(i);
            Column.Kind kind = a.kind() == ForceKind.TORQUE ? Column.Kind.TORQUE : Column.Kind.FORCE;
            Readout readout = Readout.of(scene.shown().units(), kind, peaks.of(i));
            Label label = Label.measured(pen, a.name(), readout, peaks.of(i), TYPE * w);
            return placer.place(
                            survey.nearX(i),
                            survey.nearY(i),
                            label.box().width(),
                            label.box().height(),
                            stoodAt(a.name()))
                    .map(label::at);
        }

        private Optional<Box> stoodAt(String name) {
            return before.flatMap(plan -> plan.arrows().stream()
                    .flatMap(Optional::stream)
                    .filter(l -> l.name().equals(name))
                    .map(Label::box)
                    .findFirst());
        }

        private Optional<Box> stoodAt(ChamberSpace space) {
            return before.flatMap(plan -> plan.chambers().stream()
                    .filter(c -> c.space().chamber() == space.chamber())
                    .flatMap(c -> c.beside().stream())
                    .map(Label::box)
                    .findFirst());
        }

        /** The place inside, beside the cover, in the half of the cylinder that the gas arrows leave free. */
        private ChamberLabel inside(ChamberSpace space, Readout pressure) {
            Label label = Label.measured(pen, "", pressure, pressure(), 11.5 * w);
            double along = Math.abs(axes.cos()) * label.box().width()
                    + Math.abs(axes.sin()) * label.box().height();
            double across = Math.abs(axes.sin()) * label.box().width()
                    + Math.abs(axes.cos()) * label.box().height();
            double needed = (along + 14 * w) / axes.scale();
            double reach = space.head()
                    ? scene.own().linkage().leastReach()
                    : scene.own().linkage().greatestReach();
            double height = (space.radius() - (space.plunger() ? space.radius() : space.inner())) * axes.scale();
            int outwards = space.head() ? -1 : 1;
            double x = space.cover() + outwards * needed / 2;
            double y = scene.own().linkage().guideOffset() + axes.upper() * space.upper();
            double rootX = axes.px(
                    space.cover()
                            + outwards
                                    * 0.3
                                    * space.free(
                                            space.head()
                                                    ? scene.own().linkage().greatestReach()
                                                    : scene.own().linkage().leastReach()),
                    scene.own().linkage().guideOffset() + axes.upper() * 0.86 * space.radius());
            double rootY =
                    axes.py(space.cover(), scene.own().linkage().guideOffset() + axes.upper() * 0.86 * space.radius());
            boolean fits = 0.75 * space.free(reach) > needed && height > across + 6 * w;
            if (!fits) {
                return new ChamberLabel(space, Optional.empty(), needed, Optional.empty(), rootX, rootY);
            }
            Box box = new Box(
                    axes.px(x, y) - label.box().width() / 2,
                    axes.py(x, y) - label.box().height() / 2,
                    label.box().width(),
                    label.box().height());
            if (!box.within(scene.size().inside())) {
                return new ChamberLabel(space, Optional.empty(), needed, Optional.empty(), rootX, rootY);
            }
            placer.keepFree(box);
            return new ChamberLabel(space, Optional.of(label.at(box)), needed, Optional.empty(), rootX, rootY);
        }

        private double pressure() {
            return StillPainter.PressureRange.of(scene.shown().summary()).greatest();
        }

        private ChamberLabel beside(ChamberLabel c, Readout pressure) {
            Label label = Label.measured(pen, "", pressure, pressure(), 11.5 * w);
            double out = scene.own().linkage().guideOffset()
                    + axes.upper() * (c.space().radius() + (22 * w) / axes.scale());
            Optional<Label> placed = placer.place(
                            axes.px(c.space().cover(), out),
                            axes.py(c.space().cover(), out),
                            label.box().width(),
                            label.box().height(),
                            stoodAt(c.space()))
                    .map(label::at);
            return new ChamberLabel(c.space(), c.inside(), c.needed(), placed, c.rootX(), c.rootY());
        }
    }
}
