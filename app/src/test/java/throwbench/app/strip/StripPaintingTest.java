package throwbench.app.strip;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import throwbench.app.bench.Shown;
import throwbench.app.bench.ShownMachines;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.RecordingPen;
import throwbench.app.drawing.Signal;
import throwbench.solver.machine.Machine;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;
import throwbench.solver.revolution.Reversal;

/** What is drawn against the solver: every station of every trace, the spans, the cursor's dots. */
class StripPaintingTest {

    /** Free points between a lane's edge and its extreme value; part of the drawing's look, not of its truth. */
    private static final double INSET = 4;

    private static final double TOLERANCE = 0.02;

    private static final List<Machine> MACHINES = List.of(
            ShownMachines.booster(), ShownMachines.offset(), ShownMachines.longNames(), ShownMachines.neverReversing());

    private static StripPlot plot(Shown shown, double width, double height) {
        return new StripPlot(
                shown,
                Lanes.of(shown.shownThrow(), List.of(Column.GUIDE_FORCE, Column.TRAVEL, Column.SHAFT_TORQUE)),
                width,
                height);
    }

    private static RecordingPen paint(StripPlot plot) {
        RecordingPen pen = new RecordingPen();
        new StripPainter().paint(pen, plot, Palette.LIGHT);
        return pen;
    }

    @ParameterizedTest
    @ValueSource(doubles = {500, 900, 1400})
    void everyStationStandsWhereItsValueSays(double width) {
        for (Machine machine : MACHINES) {
            StripPlot plot = plot(ShownMachines.shown(machine, 0), width, 400);
            assertTracesTrue(plot, paint(plot).polylines);
        }
    }

    @Test
    void aTraceMovedByThreePointsIsFound() {
        StripPlot plot = plot(ShownMachines.shown(ShownMachines.booster(), 0), 900, 400);
        List<RecordingPen.Polyline> moved = new ArrayList<>(paint(plot).polylines);
        RecordingPen.Polyline drawn = moved.get(4);
        List<Double> y = drawn.y().stream().map(v -> v + 3).toList();
        moved.set(4, new RecordingPen.Polyline(drawn.rgb(), drawn.width(), drawn.dashes(), drawn.x(), y));
        assertThrows(AssertionError.class, () -> assertTracesTrue(plot, moved));
    }

    @Test
    void aKeptPlotDrawsTheNextStateNotTheLast() {
        StripPlot plot = plot(ShownMachines.shown(ShownMachines.booster(), 0), 900, 400);
        Shown next = ShownMachines.shown(ShownMachines.neverReversing(), 0);
        plot.update(next, Lanes.of(next.shownThrow(), List.of()), 640, 300);
        assertTracesTrue(plot, paint(plot).polylines);
    }

    /** Identity: a lane's scale is linear, its extremes (and zero, where the lane holds it) stand at its edges. */
    private static void assertTracesTrue(StripPlot plot, List<RecordingPen.Polyline> drawn) {
        int at = 0;
        for (int l = 0; l < plot.lanes().size(); l++) {
            Lane lane = plot.lanes().get(l);
            StripLayout.Row row = plot.layout().lanes().get(l);
            double low = lane.kind() == Lane.Kind.PRESSURE ? Double.POSITIVE_INFINITY : 0;
            double high = lane.kind() == Lane.Kind.PRESSURE ? Double.NEGATIVE_INFINITY : 0;
            List<double[]> values = new ArrayList<>();
            for (StripTrace trace : lane.traces()) {
                double[] read = trace.signal().read(plot.shown().revolution(), new double[plot.points()]);
                read[plot.points() - 1] = read[0];
                values.add(read);
                low = Math.min(
                        low,
                        trace.signal().extremes(plot.shown().summary()).least().value());
                high = Math.max(
                        high,
                        trace.signal()
                                .extremes(plot.shown().summary())
                                .greatest()
                                .value());
            }
            for (double[] read : values) {
                RecordingPen.Polyline line = drawn.get(at++);
                assertEquals(721, line.x().size());
                for (int i = 0; i < read.length; i++) {
                    double x = plot.layout().left()
                            + (plot.layout().right() - plot.layout().left()) * i / 720;
                    double room = row.bottom() - row.top() - 2 * INSET;
                    double y = row.bottom() - INSET - (read[i] - low) / (high - low) * room;
                    assertEquals(x, line.x().get(i), TOLERANCE, () -> lane.kind() + " x");
                    assertEquals(y, line.y().get(i), TOLERANCE, () -> lane.kind() + " y");
                }
            }
        }
        assertEquals(at, drawn.size(), "every trace is drawn once");
    }

    @Test
    void tracesOfALaneDifferInDashOrColour() {
        Shown shown = ShownMachines.shown(ShownMachines.booster(), 0);
        List<Column> dozen = List.of(
                Column.GUIDE_FORCE,
                Column.CROSSHEAD_PIN_X,
                Column.CROSSHEAD_PIN_Y,
                Column.CRANK_PIN_X,
                Column.CRANK_PIN_Y);
        StripPlot plot = new StripPlot(shown, Lanes.of(shown.shownThrow(), dozen), 900, 400);
        List<RecordingPen.Polyline> drawn = paint(plot).polylines;
        assertEquals(12, drawn.size(), "the usual seven and five more");
        int at = 0;
        for (Lane lane : plot.lanes()) {
            List<RecordingPen.Polyline> ofLane =
                    drawn.subList(at, at + lane.traces().size());
            at += lane.traces().size();
            assertEquals(
                    ofLane.size(),
                    ofLane.stream().map(p -> p.dashes()).distinct().count(),
                    () -> "dashes of the lane " + lane.kind());
        }
    }

    @Test
    void theBandIsFilledFromSignChangeToSignChange() {
        Shown shown = ShownMachines.shown(ShownMachines.offset(), 0);
        StripPlot plot = plot(shown, 1000, 400);
        Reversal reversal = shown.summary().reversal();
        List<RecordingPen.Rectangle> band = paint(plot).rectangles.stream()
                .filter(r -> r.opacity() == 1 && r.y() == plot.layout().band().top() && r.height() > 20)
                .toList();
        double[] filled = new double[2];
        for (RecordingPen.Rectangle piece : band) {
            filled[piece.rgb() == Palette.LIGHT.loads().tension() ? 0 : 1] += piece.width();
        }
        double perRadian = (plot.layout().right() - plot.layout().left()) / (2 * Math.PI);
        assertEquals(total(reversal, true) * perRadian, filled[0], TOLERANCE);
        assertEquals(total(reversal, false) * perRadian, filled[1], TOLERANCE);
        double firstEdge =
                plot.layout().left() + perRadian * reversal.signChanges().get(0).crankAngle();
        assertEquals(firstEdge, band.get(0).x() + band.get(0).width(), TOLERANCE);
    }

    private static double total(Reversal reversal, boolean tension) {
        return reversal.spans().stream()
                .filter(s -> s.inTension() == tension)
                .mapToDouble(Reversal.Span::length)
                .sum();
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 3.2, 37.5, 181, 286.7, 359.9})
    void dotsOfTheCursorLieOnTheirTraces(double degrees) {
        Shown shown = ShownMachines.shown(ShownMachines.booster(), 0);
        StripPlot plot = plot(shown, 900, 400);
        RecordingPen pen = new RecordingPen();
        Instant instant = new Instant(shown.running(), 0).turnTo(Math.toRadians(degrees));
        new CursorPainter().paint(pen, plot, Palette.LIGHT, instant);
        List<RecordingPen.Polyline> traces = paint(plot).polylines;
        assertEquals(traces.size(), pen.circles.size());
        double station = degrees * 2;
        int before = (int) Math.floor(station);
        for (int t = 0; t < traces.size(); t++) {
            List<Double> y = traces.get(t).y();
            double between = y.get(before) + (station - before) * (y.get(before + 1) - y.get(before));
            // over half a degree a chord leaves a curve of this size, or the corner where a valve opens, by this at
            // most
            assertEquals(between, pen.circles.get(t).y(), 0.2, "trace " + t);
            assertEquals(
                    plot.layout().x(Math.toRadians(degrees)), pen.circles.get(t).x(), TOLERANCE);
        }
    }

    @Test
    void valuesKeepTheirPlaceAndDecimalsWhileTheCrankTurns() {
        Shown shown = ShownMachines.shown(ShownMachines.booster(), 0);
        StripPlot plot = plot(shown, 900, 400);
        Instant instant = new Instant(shown.running(), 0);
        List<String> places = new ArrayList<>();
        for (int degrees = 0; degrees < 360; degrees += 7) {
            RecordingPen pen = new RecordingPen();
            new CursorPainter().values(pen, plot, Palette.LIGHT, instant.turnTo(Math.toRadians(degrees)));
            StringBuilder place = new StringBuilder();
            for (RecordingPen.Written text : pen.texts) {
                int point = text.text().indexOf('.');
                place.append(text.x()).append(' ').append(text.y()).append(' ');
                place.append(point < 0 ? 0 : text.text().length() - point).append(';');
            }
            places.add(place.toString());
        }
        assertEquals(1, places.stream().distinct().count());
    }

    @Test
    void theValueBesideRodLoadIsTheSolversValue() {
        Shown shown = ShownMachines.shown(ShownMachines.booster(), 0);
        StripPlot plot = plot(shown, 900, 400);
        RecordingPen pen = new RecordingPen();
        Instant instant = new Instant(shown.running(), 0).turnTo(Math.toRadians(286.5));
        new CursorPainter().values(pen, plot, Palette.LIGHT, instant);
        double kilonewtons = instant.at(Column.ROD_LOAD) / 1000;
        String written = pen.texts.get(2).text().replace('–', '-');
        assertEquals(kilonewtons, Double.parseDouble(written), 0.05);
        assertTrue(kilonewtons < -50, "the example stands deep in compression");
        assertEquals(Palette.LIGHT.loads().compression(), pen.texts.get(2).rgb());
        assertEquals(
                new Signal.OfColumn(Column.ROD_LOAD),
                plot.lanes().get(0).traces().get(2).signal());
    }
}
