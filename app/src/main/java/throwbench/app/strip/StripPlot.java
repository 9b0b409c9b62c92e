package throwbench.app.strip;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.Readout;
import throwbench.app.drawing.Signal;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.Revolution;

/** A state laid out for one size: places, scales and the pixels of every trace. Arrays are kept from state to state. */
final class StripPlot {

    private Shown shown;
    private List<Lane> lanes = List.of();
    private StripLayout layout;
    private StripEvents events;
    private List<BandSpan> band;
    private List<LaneScale> scales = List.of();
    private final List<List<Readout>> readouts = new ArrayList<>();
    private double[] x = {};
    private double[] values = {};
    private final List<double[]> pixels = new ArrayList<>();

    StripPlot(Shown shown, List<Lane> lanes, double width, double height) {
        this.shown = shown;
        this.events = StripEvents.of(shown);
        this.band = BandSpan.of(shown);
        this.layout = StripLayout.of(width, height, lanes, 0);
        update(shown, lanes, width, height);
    }

    /** Takes another state, other lanes or another size. */
    void update(Shown next, List<Lane> nextLanes, double width, double height) {
        shown = next;
        lanes = nextLanes;
        events = StripEvents.of(next);
        band = BandSpan.of(next);
        layout = StripLayout.of(
                width, height, nextLanes, next.shownThrow().chambers().size());
        List<LaneScale> made = new ArrayList<>();
        readouts.clear();
        for (int i = 0; i < lanes.size(); i++) {
            StripLayout.Row row = layout.lanes().get(i);
            LaneScale scale = LaneScale.of(lanes.get(i), next.summary(), row.top(), row.bottom());
            made.add(scale);
            readouts.add(readouts(lanes.get(i), scale));
        }
        scales = List.copyOf(made);
        trace();
    }

    /** One number of decimals a unit and lane, so that the numbers of a lane can be compared. */
    private List<Readout> readouts(Lane lane, LaneScale scale) {
        double peak = Math.max(Math.abs(scale.least()), Math.abs(scale.greatest()));
        return lane.traces().stream()
                .map(t -> t.signal().readout(shown.units(), peak))
                .toList();
    }

    private void trace() {
        Revolution revolution = shown.revolution();
        int count = revolution.count() + 1;
        if (x.length != count) {
            x = new double[count];
            values = new double[count];
            pixels.clear();
        }
        for (int i = 0; i < count; i++) {
            x[i] = layout.x(Angles.TURN * i / (count - 1));
        }
        int at = 0;
        for (int l = 0; l < lanes.size(); l++) {
            for (StripTrace trace : lanes.get(l).traces()) {
                if (at == pixels.size()) {
                    pixels.add(new double[count]);
                }
                fill(trace.signal(), scales.get(l), pixels.get(at++));
            }
        }
    }

    private void fill(Signal signal, LaneScale scale, double[] y) {
        signal.read(shown.revolution(), values);
        int last = y.length - 1;
        values[last] = values[0]; // 360° is 0°
        for (int i = 0; i <= last; i++) {
            y[i] = scale.y(values[i]);
        }
    }

    Shown shown() {
        return shown;
    }

    StripLayout layout() {
        return layout;
    }

    List<Lane> lanes() {
        return lanes;
    }

    LaneScale scale(int lane) {
        return scales.get(lane);
    }

    /** How the numbers of a trace are written. */
    Readout readout(int lane, int trace) {
        return readouts.get(lane).get(trace);
    }

    /** Names of the events whose marks stand within a distance (points) of an x, a line each; empty where none does. */
    String eventsAt(double at, double near) {
        return events.all().stream()
                .filter(e -> Math.abs(layout.x(e.angle()) - at) <= near
                        || (e.angle() == 0 && Math.abs(layout.right() - at) <= near))
                .map(StripEvent::name)
                .collect(Collectors.joining("\n"));
    }

    StripEvents events() {
        return events;
    }

    List<BandSpan> band() {
        return band;
    }

    /** Number of points of every trace: the stations, and 360°. */
    int points() {
        return x.length;
    }

    /** x of the points, the same for every trace; not to be changed. */
    double[] x() {
        return x;
    }

    /** y of the points of a trace; not to be changed. */
    double[] y(int lane, int trace) {
        int before = 0;
        for (int l = 0; l < lane; l++) {
            before += lanes.get(l).traces().size();
        }
        return pixels.get(before + trace);
    }

    /** Extremes of a trace. */
    Extremes extremes(int lane, int trace) {
        return lanes.get(lane).traces().get(trace).signal().extremes(shown.summary());
    }
}
