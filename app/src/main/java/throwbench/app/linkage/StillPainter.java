package throwbench.app.linkage;

import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;
import throwbench.app.drawing.Pen.Align;
import throwbench.app.drawing.Readout;
import throwbench.app.linkage.force.ForceScale;
import throwbench.app.linkage.force.LabelPlacer.Box;
import throwbench.app.linkage.parts.CrossheadPainter;
import throwbench.app.linkage.parts.CylinderPainter;
import throwbench.app.linkage.parts.Look;
import throwbench.app.linkage.parts.RodLine;
import throwbench.app.linkage.parts.ThrowAxes;
import throwbench.app.linkage.parts.ThrowLayout;
import throwbench.app.linkage.parts.ThrowPen;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.revolution.Extremes;

/** Draws what stands still: lines of stroke, dead-centre marks, guides, cylinders, legend, scale bar. */
final class StillPainter {

    /** Length of a dead-centre mark with its letters, points at weight 1. */
    static final double MARK = 46;

    private static final String HINT = "drag the crank pin to turn · wheel zooms · click an arrow for its trace";

    /** Width left free for the menu beside the hint, points. */
    private static final double MENU = 110;

    private static final int SHADES = 28;

    private final Scene scene;
    private final ForceScale forceScale;
    private final Readout force;
    private final Readout pressure;
    private final PressureRange range;
    private final Box legendBox;
    private final Box footBox;
    private final boolean hintFits;
    private final ThrowPen drawn;

    StillPainter(Scene scene, ForceScale forceScale, Readout force, Pen pen) {
        this.scene = scene;
        this.forceScale = forceScale;
        this.force = force;
        this.drawn = new ThrowPen(pen, scene.axes());
        this.range = PressureRange.of(scene.shown().summary());
        this.pressure = Readout.of(scene.shown().units(), Dimension.GAS_PRESSURE, range.greatest());
        double w = scene.weight();
        double border = scene.size().border();
        pen.font(11 * w, false);
        double texts = pen.width(pressure.number(range.least())) + 14 * w + pen.width(pressure.text(range.greatest()));
        double narrow = Math.max(texts, Math.min(110 * w, 0.22 * scene.size().width()));
        legendBox = new Box(scene.size().width() - border - narrow, 14 * w, narrow, 28 * w);
        double foot = forceScale.barLength() + 10 * w + pen.width(force.text(forceScale.bar()));
        double hint = pen.width(HINT) + 28 * w;
        hintFits = scene.choice().hint() && foot + hint < scene.size().width() - 2 * border - MENU;
        footBox = new Box(border, scene.size().height() - 26 * w, hintFits ? foot + hint : foot, 20 * w);
    }

    Box legendBox() {
        return legendBox;
    }

    Box footBox() {
        return footBox;
    }

    void paint(Pen pen) {
        Look outline = scene.outline();
        for (int i = 0; i < scene.layout().size(); i++) {
            if (scene.draws(i) && isFirstOfItsLine(i)) {
                drawn.on(pen, scene.layout().axes(i, scene.framing()));
                strokeLine(scene.layout().of(i), true);
                CrossheadPainter.paintGuide(drawn, scene.layout().of(i), outline);
                CylinderPainter.paint(drawn, scene.layout().of(i), outline);
            }
        }
        scene.ghost().ifPresent(g -> g.paintStill(drawn.on(pen, g.axes(scene.framing())), scene.held()));
        drawn.on(pen, scene.axes());
        crankCircle();
        strokeLine(scene.own(), false);
        CrossheadPainter.paintGuide(drawn, scene.own(), scene.full());
        CylinderPainter.paint(drawn, scene.own(), scene.full());
        deadCentres(pen);
        legend(pen);
        foot(pen);
    }

    /** Throws one behind the other share one cylinder on the paper. */
    private boolean isFirstOfItsLine(int i) {
        if (scene.layout().coincide(i, scene.shown().throwIndex())) {
            return false;
        }
        for (int k = 0; k < i; k++) {
            if (scene.draws(k) && scene.layout().coincide(i, k)) {
                return false;
            }
        }
        return true;
    }

    private void strokeLine(ThrowLayout layout, boolean pale) {
        double w = scene.weight();
        Palette palette = scene.palette();
        int colour = pale
                ? palette.ground().grid()
                : Palette.mix(palette.ground().surface(), palette.ground().soft(), 0.55);
        ThrowLayout.Extent extent = layout.extent();
        double e = layout.linkage().guideOffset();
        double over = drawn.metres(6 * w);
        drawn.pen().stroke(colour, 0.9 * w);
        drawn.pen().dash(14 * w, 4 * w, 2 * w, 4 * w);
        drawn.line(extent.leastX() - over, e, extent.greatestX() + over, e);
        if (e != 0) {
            // the line through the crank centre, from which the offset counts
            drawn.pen().stroke(palette.ground().grid(), 0.9 * w);
            drawn.pen().dash(3 * w, 4 * w);
            drawn.line(extent.leastX() - over, 0, layout.linkage().leastReach(), 0);
        }
        drawn.pen().dash();
    }

    /** The crank pin's path with its dead centres. */
    private void crankCircle() {
        double w = scene.weight();
        Linkage linkage = scene.own().linkage();
        drawn.pen().stroke(scene.palette().ground().edge(), 0.9 * w);
        drawn.pen().dash(4 * w, 4 * w);
        drawn.circle(0, 0, linkage.crankRadius(), false, true);
        drawn.pen().dash();
        drawn.pen().stroke(scene.palette().ground().soft(), 1.1 * w);
        tick(linkage.crankRadius(), linkage.headEndAngle());
        tick(linkage.crankRadius(), linkage.crankEndAngle());
    }

    private void tick(double radius, double theta) {
        double half = drawn.metres(4 * scene.weight());
        double c = Math.cos(theta);
        double s = Math.sin(theta);
        drawn.line((radius - half) * c, (radius - half) * s, (radius + half) * c, (radius + half) * s);
    }

    private void deadCentres(Pen pen) {
        Linkage linkage = scene.own().linkage();
        RodLine.Piston first = scene.own().line().pistons().get(0);
        double at = first.plunger() ? first.headFace() : RodLine.middle(first);
        deadCentre(pen, "HDC", linkage.greatestReach() + at);
        deadCentre(pen, "CDC", linkage.leastReach() + at);
    }

    private void deadCentre(Pen pen, String name, double x) {
        double w = scene.weight();
        RodLine.Barrel barrel = scene.own().line().barrels().get(0);
        ThrowAxes axes = scene.axes();
        int up = axes.upper();
        double outside = scene.own().linkage().guideOffset() - up * (barrel.radius() + barrel.wall());
        double from = outside - up * drawn.metres(3 * w);
        double to = outside - up * drawn.metres((MARK - 20) * w);
        pen.stroke(scene.palette().ground().soft(), w);
        pen.dash(3 * w, 3 * w);
        drawn.line(x, from, x, to);
        pen.dash();
        pen.font(11 * w, false);
        pen.fill(scene.palette().ground().soft());
        // beyond the mark's end, away from the upper side
        double outX = up * axes.sin();
        double px = axes.px(x, to) + outX * 6 * w;
        double py = axes.py(x, to) + up * axes.cos() * 6 * w;
        Align align = outX > 0.5 ? Align.LEFT : outX < -0.5 ? Align.RIGHT : Align.CENTRE;
        double down = Math.abs(outX) > 0.5 ? 4 * w : 9 * w;
        pen.text(name, px, py + down, align);
    }

    private void legend(Pen pen) {
        double w = scene.weight();
        double height = 10 * w;
        double step = legendBox.width() / SHADES;
        for (int i = 0; i < SHADES; i++) {
            pen.fill(scene.palette().pressure((i + 0.5) / SHADES));
            // each shade runs under the next, or the ground shows between them
            double width = i + 1 < SHADES ? step + 1 : step;
            pen.rect(legendBox.x() + i * step, legendBox.y(), width, height, 0, true, false);
        }
        pen.stroke(scene.palette().ground().soft(), 0.8 * w);
        pen.rect(legendBox.x(), legendBox.y(), legendBox.width(), height, 0, false, true);
        pen.fill(scene.palette().ground().soft());
        pen.font(11 * w, false);
        double y = legendBox.y() + 23 * w;
        pen.text(pressure.number(range.least()), legendBox.x(), y, Align.LEFT);
        pen.text(pressure.text(range.greatest()), legendBox.x() + legendBox.width(), y, Align.RIGHT);
    }

    private void foot(Pen pen) {
        double w = scene.weight();
        double y = footBox.y() + 14 * w;
        double x = footBox.x();
        pen.font(11 * w, false);
        if (forceScale.bar() > 0) {
            double length = forceScale.barLength();
            pen.stroke(scene.palette().ground().ink(), 1.8 * w);
            pen.line(x, y - 4 * w, x + length, y - 4 * w);
            pen.line(x, y - 8 * w, x, y);
            pen.line(x + length, y - 8 * w, x + length, y);
            pen.fill(scene.palette().ground().ink());
            String text = barText();
            pen.text(text, x + length + 8 * w, y, Align.LEFT);
            x += length + 36 * w + pen.width(text);
        }
        if (hintFits) {
            pen.fill(scene.palette().ground().soft());
            pen.text(HINT, x, y, Align.LEFT);
        }
    }

    /** The bar's force is round: no decimals that say nothing. */
    private String barText() {
        double shownValue = force.inUnit(forceScale.bar());
        int decimals = (int) Math.max(0, Math.ceil(-Math.log10(shownValue) - 1e-9));
        return Readout.fixed(shownValue, decimals) + ' ' + force.unit();
    }

    /** Least and greatest pressure of the shown throw's chambers, Pa absolute. */
    record PressureRange(double least, double greatest) {

        static PressureRange of(throwbench.solver.revolution.Summary summary) {
            double least = Double.POSITIVE_INFINITY;
            double greatest = 0;
            for (Extremes e : summary.pressures()) {
                least = Math.min(least, e.least().value());
                greatest = Math.max(greatest, e.greatest().value());
            }
            return new PressureRange(least, greatest);
        }

        /** Where a pressure stands between them, 0 to 1. */
        double share(double pressure) {
            return greatest > least ? (pressure - least) / (greatest - least) : 0.5;
        }
    }
}
