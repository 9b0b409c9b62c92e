package throwbench.app.gauge;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import throwbench.app.bench.Shown;
import throwbench.app.bench.ShownMachines;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.RecordingPen;
import throwbench.app.drawing.Signal;
import throwbench.solver.document.quantity.UnitSystem;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Machine;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extreme;
import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.Instant;

/** Bars, ticks, limits and numbers of the gauges against the solver. */
class GaugePaintingTest {

    private static List<Gauge> gauges(Shown shown) {
        return Gauges.of(shown.shownThrow(), Set.copyOf(Gauges.USUAL)).stream()
                .map(s -> Gauge.of(s, shown))
                .toList();
    }

    private static RecordingPen moving(Shown shown, GaugeLayout layout, double degrees) {
        RecordingPen pen = new RecordingPen();
        GaugePainter painter = new GaugePainter();
        painter.still(new RecordingPen(), gauges(shown), layout, Palette.LIGHT);
        Instant instant = new Instant(shown.running(), 0).turnTo(Math.toRadians(degrees));
        painter.moving(pen, gauges(shown), layout, Palette.LIGHT, instant);
        return pen;
    }

    @Test
    void usualGaugesAreRodLoadGuideTorqueEveryChamberAndSpeed() {
        List<String> titles = gauges(ShownMachines.shown(ShownMachines.booster(), 0)).stream()
                .map(Gauge::title)
                .toList();
        assertEquals(
                List.of(
                        "rod load",
                        "guide force",
                        "throw torque",
                        "pressure, A head",
                        "pressure, A crank",
                        "piston speed"),
                titles);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 37.5, 97, 200, 286.7, 359})
    void barsReachFromZeroToThePresentValue(double degrees) {
        Shown shown = ShownMachines.shown(ShownMachines.booster(), 0);
        GaugeLayout layout = GaugeLayout.of(320, 400, 6);
        RecordingPen pen = moving(shown, layout, degrees);
        Instant instant = new Instant(shown.running(), 0).turnTo(Math.toRadians(degrees));
        List<Gauge> gauges = gauges(shown);
        for (int i = 0; i < gauges.size(); i++) {
            Gauge gauge = gauges.get(i);
            // identity: the scale is linear between its ends
            double perUnit = (layout.right() - layout.left())
                    / (gauge.scale().to() - gauge.scale().from());
            double zero = layout.left() - gauge.scale().from() * perUnit;
            double value = zero + gauge.readout().inUnit(gauge.signal().at(instant)) * perUnit;
            RecordingPen.Rectangle bar = pen.rectangles.get(i);
            assertEquals(Math.min(zero, value), bar.x(), 1e-9, gauge.title());
            assertEquals(Math.abs(value - zero), bar.width(), 1e-9, gauge.title());
            assertEquals(value, pen.lines.get(i).x1(), 1e-9, gauge.title());
        }
    }

    @Test
    void numbersAreTheSolversInTheirPlace() {
        Shown shown = ShownMachines.shown(ShownMachines.booster(), 0);
        GaugeLayout layout = GaugeLayout.of(320, 400, 6);
        List<Double> places = new ArrayList<>();
        for (int degrees = 0; degrees < 360; degrees += 11) {
            RecordingPen pen = moving(shown, layout, degrees);
            Instant instant = new Instant(shown.running(), 0).turnTo(Math.toRadians(degrees));
            assertEquals(
                    instant.at(Column.ROD_LOAD) / 1000,
                    Double.parseDouble(pen.texts.get(0).text().replace('–', '-')),
                    0.05);
            assertEquals(
                    instant.pressure(0, 1) / 1e5,
                    Double.parseDouble(pen.texts.get(4).text()),
                    0.05);
            pen.texts.forEach(t -> places.add(t.x()));
        }
        assertEquals(1, places.stream().distinct().count(), "every number ends at the same place");
    }

    @Test
    void limitsOfRodLoadStandAtTheirRatings() {
        Shown shown = ShownMachines.shown(ShownMachines.booster(), 0);
        GaugeLayout layout = GaugeLayout.of(320, 400, 6);
        RecordingPen pen = new RecordingPen();
        new GaugePainter().still(pen, gauges(shown), layout, Palette.LIGHT);
        Gauge rod = gauges(shown).get(0);
        List<Double> limits = pen.lines.stream()
                .filter(l -> l.rgb() == Palette.LIGHT.verdicts().limit())
                .map(RecordingPen.Segment::x1)
                .toList();
        double perKilonewton = (layout.right() - layout.left())
                / (rod.scale().to() - rod.scale().from());
        assertEquals(2, limits.size(), "only the rod load has ratings");
        assertEquals(layout.left() + (-90 - rod.scale().from()) * perKilonewton, limits.get(0), 1e-9);
        assertEquals(layout.left() + (120 - rod.scale().from()) * perKilonewton, limits.get(1), 1e-9);
    }

    @Test
    void ratingsOfTheThrowGoBeforeThoseOfTheMachine() {
        Machine machine =
                ShownMachines.withThrowLimits(ShownMachines.booster(), new Limits(Map.of(LimitKey.ROD_TENSION, 70e3)));
        Gauge rod = gauges(ShownMachines.shown(machine, 0)).get(0);
        assertEquals(OptionalDouble.of(70e3), rod.highLimit());
        assertEquals(OptionalDouble.of(-90e3), rod.lowLimit());
    }

    @Test
    void nothingIsWrittenOverItsNeighbour() {
        for (UnitSystem units : UnitSystem.values()) {
            for (double width = 210; width <= 460; width += 50) {
                for (double height = 150; height <= 600; height += 50) {
                    Shown shown = ShownMachines.shown(ShownMachines.longNames(), 0, units);
                    GaugeLayout layout = GaugeLayout.of(width, height, 6);
                    RecordingPen pen = moving(shown, layout, 286.7);
                    new GaugePainter().still(pen, gauges(shown), layout, Palette.LIGHT);
                    assertEquals(List.of(), pen.touching(), width + " x " + height);
                    for (RecordingPen.Written text : pen.texts) {
                        assertTrue(text.left() >= 0 && text.right() <= width, text::toString);
                    }
                }
            }
        }
    }

    @Test
    void scalesHaveRoundEndsThatHoldZeroExtremesAndLimits() {
        Extremes extremes = new Extremes(new Extreme(-71_600, 1), new Extreme(47_400, 2));
        Gauge like = gauges(ShownMachines.shown(ShownMachines.booster(), 0)).get(0);
        assertEquals(
                new GaugeScale(-80, 50),
                GaugeScale.of(extremes, OptionalDouble.empty(), OptionalDouble.empty(), like.readout()));
        assertEquals(
                new GaugeScale(-80, 150),
                GaugeScale.of(extremes, OptionalDouble.empty(), OptionalDouble.of(120e3), like.readout()));
        Extremes pushing = new Extremes(new Extreme(-9_600, 1), new Extreme(-2_000, 2));
        assertEquals(
                new GaugeScale(-10, 0),
                GaugeScale.of(pushing, OptionalDouble.empty(), OptionalDouble.empty(), like.readout()));
    }

    @Test
    void columnScrollsOnlyWhenRowsCannotShrinkFurther() {
        assertTrue(GaugeLayout.of(320, 300, 6).height() <= 300);
        assertTrue(GaugeLayout.of(320, 900, 6).height() <= 900);
        assertTrue(GaugeLayout.of(320, 300, 9).height() > 300);
        assertEquals(
                GaugeLayout.of(320, 300, 9).row(), GaugeLayout.of(320, 100, 9).row());
    }

    @Test
    void pressuresCountFromVacuum() {
        Gauge pressure = gauges(ShownMachines.shown(ShownMachines.booster(), 0)).get(3);
        assertEquals(new Signal.OfPressure(0), pressure.signal());
        assertEquals(0, pressure.scale().from());
        assertEquals("bar a", pressure.readout().unit());
    }
}
