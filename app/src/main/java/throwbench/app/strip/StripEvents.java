package throwbench.app.strip;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.Readout;
import throwbench.app.drawing.Signal;
import throwbench.solver.chamber.PressureCurve;
import throwbench.solver.chamber.ValveEvent;
import throwbench.solver.machine.Bookmark;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extreme;
import throwbench.solver.revolution.Reversal;
import throwbench.solver.revolution.RunningThrow;
import throwbench.solver.revolution.SignChange;

/** Everything that happens to the shown throw in a revolution, by crank angle. */
public final class StripEvents {

    /** Two events nearer than this are stepped over together, rad. */
    private static final double SAME = 1e-6;

    private final List<StripEvent> events;

    private StripEvents(List<StripEvent> events) {
        this.events = List.copyOf(events);
    }

    /** The events of a state: dead centres, valves, sign changes and peaks of the rod load, bookmarks. */
    public static StripEvents of(Shown shown) {
        List<StripEvent> events = new ArrayList<>();
        RunningThrow running = shown.running().throwsInOrder().get(shown.throwIndex());
        double crankEnd =
                running.body().linkage().crankEndDeadCentre(shown.running().rotation());
        events.add(plain(0, StripEvent.Kind.DEAD_CENTRE, "HDC"));
        events.add(plain(crankEnd, StripEvent.Kind.DEAD_CENTRE, "CDC"));
        addReversal(shown, events);
        for (int c = 0; c < running.curves().size(); c++) {
            addValves(running.chambers().get(c).name(), c, running.curves().get(c), events);
        }
        for (Bookmark mark : shown.machine().bookmarks()) {
            if (mark.throwName().equals(shown.shownThrow().name())) {
                events.add(plain(Angles.wrap(mark.angle()), StripEvent.Kind.BOOKMARK, mark.note()));
            }
        }
        events.sort(Comparator.comparingDouble(StripEvent::angle).thenComparing(StripEvent::kind));
        return new StripEvents(events);
    }

    private static StripEvent plain(double angle, StripEvent.Kind kind, String name) {
        return new StripEvent(angle, kind, name, name, -1);
    }

    private static void addReversal(Shown shown, List<StripEvent> events) {
        Reversal reversal = shown.summary().reversal();
        for (SignChange change : reversal.signChanges()) {
            String at = Readout.angle().text(change.crankAngle());
            String name = (change.toTension() ? "into tension " : "into compression ") + at;
            events.add(new StripEvent(change.crankAngle(), StripEvent.Kind.SIGN_CHANGE, name, at, -1));
        }
        Readout load = new Signal.OfColumn(Column.ROD_LOAD).readout(shown.units(), shown.summary());
        reversal.tension().ifPresent(peak -> events.add(peak(peak, "most tension ", load)));
        reversal.compression().ifPresent(peak -> events.add(peak(peak, "most compression ", load)));
    }

    private static StripEvent peak(Extreme peak, String words, Readout load) {
        String value = load.text(peak.value());
        return new StripEvent(peak.crankAngle(), StripEvent.Kind.PEAK, words + value, value, -1);
    }

    private static void addValves(String chamber, int index, PressureCurve curve, List<StripEvent> events) {
        for (ValveEvent event : curve.events()) {
            StripEvent.Kind kind = event.opens() ? StripEvent.Kind.VALVE_OPENS : StripEvent.Kind.VALVE_SHUTS;
            String name = chamber + ": " + event.valve().text() + (event.opens() ? " opens " : " shuts ")
                    + Readout.angle().text(event.crankAngle());
            events.add(
                    new StripEvent(event.crankAngle(), kind, name, event.valve().text(), index));
        }
    }

    /** All of them, by crank angle. */
    public List<StripEvent> all() {
        return events;
    }

    /** Crank angle of the next event after an angle (rad), through 360° if need be; empty where there is none. */
    public OptionalDouble next(double angle) {
        return nearest(angle, 1);
    }

    /** Crank angle of the last event before an angle (rad), through 0° if need be. */
    public OptionalDouble previous(double angle) {
        return nearest(angle, -1);
    }

    private OptionalDouble nearest(double angle, int sense) {
        double least = Angles.TURN - SAME;
        OptionalDouble found = OptionalDouble.empty();
        for (StripEvent event : events) {
            double way = Angles.wrap(sense * (event.angle() - angle));
            if (way > SAME && way < least) {
                least = way;
                found = OptionalDouble.of(event.angle());
            }
        }
        return found;
    }
}
