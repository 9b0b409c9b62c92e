package throwbench.solver.chamber;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Strokes;

/**
 * A liquid chamber over the revolution: a run of spans, each shut in on a leg or on the pressure of an open valve. The
 * pressure has no steps but where a suction valve that is held open turns the flow round.
 */
final class LiquidCycle implements PressureCurve {

    /** What holds the pressure over a span. */
    enum Hold {
        LEG,
        SUCTION_OPEN,
        DISCHARGE_OPEN,
        /** By the stroke: drawn in or pushed back. */
        SUCTION_HELD_OPEN
    }

    /**
     * A stretch of the revolution.
     *
     * @param end crank angle counted from the start of the first span, rad
     * @param leg of a leg; without meaning else
     */
    record Span(Hold hold, double end, LiquidLeg leg) {}

    /**
     * What a turn passes.
     *
     * @param volume drawn in less what flows back, flow allowance taken off, m³
     * @param mass kg
     */
    record Passed(double volume, double mass) {
        static final Passed NOTHING = new Passed(0, 0);
    }

    private final OpenPressures open;
    private final double start;
    private final List<Span> spans;
    private final List<ValveEvent> events;
    private final Passed passed;
    private final List<String> notes;

    /**
     * @param start crank angle at which the first span begins, rad
     * @param spans of which the last ends a turn later
     */
    LiquidCycle(
            OpenPressures open,
            double start,
            List<Span> spans,
            List<ValveEvent> events,
            Passed passed,
            List<String> notes) {
        this.open = open;
        this.start = start;
        this.spans = List.copyOf(spans);
        this.events = events.stream()
                .sorted(Comparator.comparingDouble(ValveEvent::crankAngle))
                .toList();
        this.passed = passed;
        this.notes = List.copyOf(notes);
    }

    /** The same cycle with one more thing to tell. */
    LiquidCycle noting(String note) {
        List<String> all = new ArrayList<>(notes);
        all.add(note);
        return new LiquidCycle(open, start, spans, events, passed, all);
    }

    @Override
    public void fill(ChamberSweep sweep, double[] pressure) {
        Strokes strokes = sweep.sweep().strokes();
        for (int k = 0; k < strokes.count(); k++) {
            fill(sweep, strokes.from(k), strokes.to(k), sweep.chamber().growsOn(strokes.inward(k)), pressure);
        }
    }

    private void fill(ChamberSweep sweep, int from, int to, boolean grows, double[] pressure) {
        double[] volume = sweep.volume();
        double[] reach1 = sweep.sweep().reach1();
        double[] crankAngle = sweep.sweep().crankAngle();
        for (int i = from; i < to; i++) {
            double factor = open.lossFactor(reach1[i]);
            Span span = spanAt(Angles.wrap(crankAngle[i] - start));
            pressure[i] = switch (span.hold()) {
                case SUCTION_OPEN -> open.suction(factor);
                case DISCHARGE_OPEN -> open.discharge(factor);
                case SUCTION_HELD_OPEN -> grows ? open.suction(factor) : open.pushedBack(factor);
                case LEG -> onLeg(span.leg().pressureAt(volume[i]), factor);
            };
        }
    }

    /** A stiff liquid makes much of a volume's last digit; shut in, its pressure lies between those of the open valves. */
    private double onLeg(double pressure, double factor) {
        return Math.max(open.suction(factor), Math.min(open.discharge(factor), pressure));
    }

    private Span spanAt(double turned) {
        for (Span span : spans) {
            if (turned < span.end()) {
                return span;
            }
        }
        return spans.get(spans.size() - 1);
    }

    @Override
    public List<ValveEvent> events() {
        return events;
    }

    @Override
    public OptionalDouble massPerTurn() {
        return OptionalDouble.of(passed.mass());
    }

    @Override
    public double inletVolumePerTurn() {
        return passed.volume();
    }

    /** A liquid's temperature is not followed. */
    @Override
    public OptionalDouble dischargeTemperature() {
        return OptionalDouble.empty();
    }

    @Override
    public List<String> notes() {
        return notes;
    }
}
