package throwbench.app.strip;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import throwbench.app.bench.Shown;
import throwbench.app.bench.ShownMachines;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.RecordingPen;
import throwbench.solver.chamber.PressureCurve;
import throwbench.solver.chamber.ValveEvent;
import throwbench.solver.machine.Bookmark;
import throwbench.solver.machine.Machine;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.revolution.RunningThrow;

/** Marks and names: complete, in their place, never over one another. */
class MarkPlacesTest {

    private static final List<Machine> MACHINES = List.of(
            ShownMachines.booster(), ShownMachines.offset(), ShownMachines.longNames(), ShownMachines.neverReversing());

    private static RecordingPen paint(StripPlot plot) {
        RecordingPen pen = new RecordingPen();
        new StripPainter().paint(pen, plot, Palette.LIGHT);
        return pen;
    }

    private static StripPlot plot(Machine machine, int duty, double width, double height) {
        Shown shown = ShownMachines.shown(machine, duty);
        return new StripPlot(shown, Lanes.of(shown.shownThrow(), List.of()), width, height);
    }

    @Test
    void namesOfMarksNeverTouchAtAnySize() {
        for (Machine machine : MACHINES) {
            for (int duty = 0; duty < machine.dutyPoints().size(); duty++) {
                for (double width = 500; width <= 1400; width += 60) {
                    for (double height = 200; height <= 500; height += 100) {
                        StripPlot plot = plot(machine, duty, width, height);
                        assertNamesApart(
                                plot,
                                MarkRows.place(
                                        new RecordingPen(),
                                        plot.layout(),
                                        plot.events().all()));
                    }
                }
            }
        }
    }

    private static void assertNamesApart(StripPlot plot, List<MarkRows.Placed> placed) {
        for (int i = 0; i < placed.size(); i++) {
            MarkRows.Placed a = placed.get(i);
            assertTrue(
                    a.from() >= plot.layout().left() - 4
                            && a.to() <= plot.layout().width(),
                    a::toString);
            for (MarkRows.Placed b : placed.subList(0, i)) {
                boolean apart = a.row() != b.row() || a.to() < b.from() || b.to() < a.from();
                assertTrue(apart, () -> a + " touches " + b);
            }
        }
    }

    @Test
    void textsOfTheStripNeverTouchAtAnySize() {
        for (Machine machine : MACHINES) {
            for (double width = 500; width <= 1400; width += 100) {
                for (double height = 200; height <= 500; height += 60) {
                    String where = machine.name() + " " + width + " x " + height;
                    RecordingPen pen = paint(plot(machine, 0, width, height));
                    assertEquals(List.of(), pen.touching(), where);
                }
            }
        }
    }

    @Test
    void everyValveEventOfTheCurvesHasItsMark() {
        for (Machine machine : MACHINES) {
            StripPlot plot = plot(machine, 0, 1000, 400);
            RunningThrow running = plot.shown().running().throwsInOrder().get(0);
            int events = 0;
            for (int c = 0; c < running.curves().size(); c++) {
                PressureCurve curve = running.curves().get(c);
                for (ValveEvent event : curve.events()) {
                    int chamber = c;
                    events++;
                    long marks = plot.events().all().stream()
                            .filter(e -> e.chamber() == chamber
                                    && e.angle() == event.crankAngle()
                                    && e.kind()
                                            == (event.opens()
                                                    ? StripEvent.Kind.VALVE_OPENS
                                                    : StripEvent.Kind.VALVE_SHUTS)
                                    && e.name().contains(event.valve().text()))
                            .count();
                    assertEquals(1, marks, () -> event + " of chamber " + chamber);
                }
            }
            double perRadian = (plot.layout().right() - plot.layout().left()) / Angles.TURN;
            List<Double> triangles = paint(plot).polygons.stream()
                    .filter(p -> p.rgb() == Palette.LIGHT.ground().surface() && p.x().size() == 3)
                    .map(p -> (p.x().get(0) - plot.layout().left()) / perRadian)
                    .toList();
            assertEquals(events, triangles.size(), machine.name());
            for (StripEvent event : plot.events().all()) {
                if (event.kind().ofValve()) {
                    assertTrue(
                            triangles.stream().anyMatch(t -> Math.abs(t - event.angle()) < 1e-9),
                            () -> event + " has no triangle on its trace");
                }
            }
        }
    }

    @Test
    void everySignChangeAndPeakIsNamedWhereThereIsRoom() {
        StripPlot plot = plot(ShownMachines.booster(), 0, 1300, 460);
        List<String> names = MarkRows.place(
                        new RecordingPen(), plot.layout(), plot.events().all())
                .stream()
                .map(MarkRows.Placed::text)
                .toList();
        assertEquals(plot.shown().summary().reversal().signChanges().size() + 2, names.size());
        assertEquals(
                List.of(),
                plot.events().all().stream()
                        .filter(e -> e.kind() == StripEvent.Kind.SIGN_CHANGE || e.kind() == StripEvent.Kind.PEAK)
                        .map(StripEvent::name)
                        .filter(n -> !names.contains(n))
                        .toList());
    }

    @Test
    void deadCentresOfAnOffsetThrowStandAtTheirOwnAngles() {
        StripPlot plot = plot(ShownMachines.offset(), 0, 1000, 400);
        // second method: asin e/(l + r) and asin e/(l − r) from the definition, r = 75 mm, l = 400 mm, e = 60 mm
        double crankEnd = Math.PI + Math.asin(0.06 / 0.325) - Math.asin(0.06 / 0.475);
        double x = plot.layout().left() + (plot.layout().right() - plot.layout().left()) * crankEnd / Angles.TURN;
        List<RecordingPen.Written> marks =
                paint(plot).texts.stream().filter(t -> t.text().equals("CDC")).toList();
        assertEquals(1, marks.size());
        assertEquals(x, marks.get(0).x(), 1e-6);
        assertEquals(183.4, Math.toDegrees(crankEnd), 0.05, "the example is not at 180°");
        assertEquals(
                List.of(plot.layout().left(), plot.layout().right()),
                paint(plot).texts.stream()
                        .filter(t -> t.text().equals("HDC"))
                        .map(RecordingPen.Written::x)
                        .toList());
    }

    @Test
    void bookmarksOfTheShownThrowAreMarkedAndThoseOfOthersAreNot() {
        Machine machine = ShownMachines.withBookmarks(
                ShownMachines.booster(),
                List.of(new Bookmark("A", 2, "peak guide force"), new Bookmark("B", 3, "not of this throw")));
        StripPlot plot = plot(machine, 0, 1200, 460);
        List<StripEvent> marks = plot.events().all().stream()
                .filter(e -> e.kind() == StripEvent.Kind.BOOKMARK)
                .toList();
        assertEquals(
                List.of("peak guide force"),
                marks.stream().map(StripEvent::name).toList());
        assertEquals(2, marks.get(0).angle());
        assertTrue(paint(plot).texts.stream().anyMatch(t -> t.text().equals("peak guide force")));
    }

    @Test
    void theMouseIsToldWhatHappensAtItsAngle() {
        StripPlot plot = plot(ShownMachines.booster(), 0, 1200, 460);
        StripEvent opening = plot.events().all().stream()
                .filter(e -> e.kind() == StripEvent.Kind.VALVE_OPENS)
                .findFirst()
                .orElseThrow();
        double x = plot.layout().x(opening.angle());
        assertTrue(plot.eventsAt(x + 3, 4).contains(opening.name()));
        assertEquals("", plot.eventsAt(plot.layout().x(Math.toRadians(330)), 4));
        assertTrue(plot.eventsAt(plot.layout().right(), 4).contains("HDC"), "360° is 0°");
    }

    @Test
    void openStretchesOfValvesEndWhereTheirValveShuts() {
        RunningThrow running = ShownMachines.shown(ShownMachines.booster(), 0)
                .running()
                .throwsInOrder()
                .get(0);
        for (PressureCurve curve : running.curves()) {
            List<ValvePainter.Open> stretches = ValvePainter.open(curve.events());
            assertEquals(2, stretches.size());
            for (ValvePainter.Open open : stretches) {
                assertTrue(
                        curve.events().stream()
                                .anyMatch(e -> !e.opens()
                                        && e.valve() == open.valve()
                                        && Math.abs(Angles.wrap(open.to() - e.crankAngle() + 1e-9)) < 2e-9),
                        open::toString);
            }
        }
    }

    @Test
    void nextAndPreviousEventWalkThroughAllOfThem() {
        StripEvents events = StripEvents.of(ShownMachines.shown(ShownMachines.offset(), 0));
        List<Double> angles = events.all().stream()
                .map(e -> Math.rint(e.angle() * 1e6))
                .distinct()
                .sorted()
                .collect(Collectors.toList());
        double at = 0;
        for (int i = 1; i <= angles.size(); i++) {
            at = events.next(at).orElseThrow();
            assertEquals(angles.get(i % angles.size()), Math.rint(at * 1e6));
        }
        for (int i = angles.size() - 1; i >= 0; i--) {
            at = events.previous(at).orElseThrow();
            assertEquals(angles.get(i), Math.rint(at * 1e6));
        }
    }
}
