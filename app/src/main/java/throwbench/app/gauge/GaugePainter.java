package throwbench.app.gauge;

import java.util.List;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;
import throwbench.app.drawing.TextFit;
import throwbench.solver.revolution.Instant;

/** Paints gauges: names, scales, limits and extremes stand still; bars, pointers and values move. */
final class GaugePainter {

    private static final double UNIT = 12.5;
    private static final double UNIT_GAP = 6;
    private static final double EXTREME = 10.5;

    private double unitWidth;

    void still(Pen pen, List<Gauge> gauges, GaugeLayout layout, Palette palette) {
        pen.font(14.5, true);
        pen.fill(palette.ground().ink());
        pen.text("At this angle", layout.left(), 22, Pen.Align.LEFT);
        pen.font(UNIT, true);
        unitWidth = 0;
        for (Gauge gauge : gauges) {
            unitWidth = Math.max(unitWidth, pen.width(gauge.readout().unit()));
        }
        for (int i = 0; i < gauges.size(); i++) {
            still(pen, gauges.get(i), layout, i, palette);
        }
    }

    private void still(Pen pen, Gauge gauge, GaugeLayout layout, int i, Palette palette) {
        double base = layout.baseline(i);
        pen.font(UNIT, true);
        pen.fill(palette.ground().soft());
        pen.text(gauge.readout().unit(), layout.right() - unitWidth, base, Pen.Align.LEFT);
        double value = Math.max(width(pen, gauge, layout, true), width(pen, gauge, layout, false));
        pen.font(layout.nameSize(), false);
        double room = layout.right() - unitWidth - UNIT_GAP - value - 10 - layout.left();
        pen.text(TextFit.name(pen, gauge.title(), gauge.shortTitle(), room), layout.left(), base, Pen.Align.LEFT);
        track(pen, gauge, layout, i, palette);
        double top = layout.barTop(i);
        double bottom = top + layout.barHeight();
        extreme(pen, gauge, layout, gauge.extremes().least().value(), top, bottom, palette);
        extreme(pen, gauge, layout, gauge.extremes().greatest().value(), top, bottom, palette);
        if (layout.saysExtremes()) {
            sayExtremes(pen, gauge, layout, bottom + 13, palette);
        }
    }

    /** Width of the present value at one of its extremes. */
    private static double width(Pen pen, Gauge gauge, GaugeLayout layout, boolean greatest) {
        pen.font(layout.valueSize(), true);
        double value = greatest
                ? gauge.extremes().greatest().value()
                : gauge.extremes().least().value();
        return pen.width(gauge.readout().number(value));
    }

    private static void track(Pen pen, Gauge gauge, GaugeLayout layout, int i, Palette palette) {
        double top = layout.barTop(i);
        double height = layout.barHeight();
        pen.fill(palette.ground().window());
        pen.stroke(palette.ground().edge(), 1);
        pen.rect(layout.left(), top, layout.right() - layout.left(), height, 2, true, true);
        gauge.lowLimit().ifPresent(limit -> {
            double x = x(gauge, layout, limit);
            limitBand(pen, layout.left(), x, x, top, height, palette);
        });
        gauge.highLimit().ifPresent(limit -> {
            double x = x(gauge, layout, limit);
            limitBand(pen, x, layout.right(), x, top, height, palette);
        });
        double zero = x(gauge, layout, 0);
        pen.stroke(palette.ground().soft(), 1);
        pen.line(zero, top - 2, zero, top + height + 2);
    }

    private static void limitBand(
            Pen pen, double from, double to, double limit, double top, double height, Palette palette) {
        pen.fill(palette.verdicts().limit(), 0.2);
        pen.rect(from, top, to - from, height, 0, true, false);
        pen.stroke(palette.verdicts().limit(), 2.4);
        pen.line(limit, top - 4, limit, top + height + 4);
    }

    private static void extreme(
            Pen pen, Gauge gauge, GaugeLayout layout, double value, double top, double bottom, Palette palette) {
        double x = x(gauge, layout, value);
        pen.stroke(palette.ground().soft(), 1.8);
        pen.line(x, top - 3, x, bottom + 3);
    }

    private static void sayExtremes(Pen pen, Gauge gauge, GaugeLayout layout, double base, Palette palette) {
        pen.font(EXTREME, false);
        pen.fill(palette.ground().soft());
        String least = gauge.readout().number(gauge.extremes().least().value());
        String greatest = gauge.readout().number(gauge.extremes().greatest().value());
        double leastWidth = pen.width(least);
        double greatestWidth = pen.width(greatest);
        double leastX = x(gauge, layout, gauge.extremes().least().value()) - leastWidth / 2;
        double greatestX = x(gauge, layout, gauge.extremes().greatest().value()) - greatestWidth / 2;
        double lowest = Math.max(layout.left(), Math.min(leastX, layout.right() - leastWidth - greatestWidth - 8));
        double highest = Math.min(layout.right() - greatestWidth, Math.max(greatestX, lowest + leastWidth + 8));
        pen.text(least, lowest, base, Pen.Align.LEFT);
        if (!least.equals(greatest)) {
            pen.text(greatest, highest, base, Pen.Align.LEFT);
        }
    }

    void moving(Pen pen, List<Gauge> gauges, GaugeLayout layout, Palette palette, Instant instant) {
        for (int i = 0; i < gauges.size(); i++) {
            Gauge gauge = gauges.get(i);
            double value = gauge.signal().at(instant);
            int colour =
                    gauge.bySign() ? palette.rodLoad(value) : gauge.signal().colour(palette);
            double x = x(gauge, layout, value);
            double zero = x(gauge, layout, 0);
            double top = layout.barTop(i);
            double height = layout.barHeight();
            pen.fill(colour);
            pen.rect(Math.min(x, zero), top + 2, Math.abs(x - zero), height - 4, 0, true, false);
            pen.stroke(colour, 3);
            pen.line(x, top - 2, x, top + height + 2);
            pen.font(layout.valueSize(), true);
            pen.text(
                    gauge.readout().number(value),
                    layout.right() - unitWidth - UNIT_GAP,
                    layout.baseline(i),
                    Pen.Align.RIGHT);
        }
    }

    /** Where a value (SI) stands. */
    static double x(Gauge gauge, GaugeLayout layout, double value) {
        return layout.x(gauge.scale().share(gauge.readout().inUnit(value)));
    }
}
