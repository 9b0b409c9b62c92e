package throwbench.app.strip;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import throwbench.app.drawing.ColumnWords;
import throwbench.app.drawing.ShortNames;
import throwbench.app.drawing.Signal;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.Throw;
import throwbench.solver.revolution.Column;

/** Which lanes the strip has, and which traces stand in them. */
public final class Lanes {

    /** Columns that are always shown. */
    static final List<Column> USUAL =
            List.of(Column.GAS_LOAD, Column.INERTIA_LOAD, Column.ROD_LOAD, Column.THROW_TORQUE, Column.VELOCITY);

    /** Columns that may be added: the others, without the axis itself. */
    static final List<Column> ADDABLE = Arrays.stream(Column.values())
            .filter(c -> c != Column.CRANK_ANGLE && !USUAL.contains(c))
            .toList();

    private Lanes() {}

    /**
     * The lanes of a throw: loads, pressures, torque and piston speed, and what the user added.
     *
     * @param added columns besides the usual ones, in the order in which they were added
     */
    public static List<Lane> of(Throw shown, List<Column> added) {
        List<Lane> lanes = new ArrayList<>();
        lanes.add(new Lane(
                Lane.Kind.LOADS,
                List.of(
                        trace(Column.GAS_LOAD, "gas", Dash.DASHED, false),
                        trace(Column.INERTIA_LOAD, "inertia", Dash.DOTTED, false),
                        trace(Column.ROD_LOAD, "rod load", Dash.SOLID, true))));
        lanes.add(pressures(shown));
        lanes.add(new Lane(Lane.Kind.TORQUE, List.of(trace(Column.THROW_TORQUE, "throw", Dash.SOLID, false))));
        lanes.add(new Lane(Lane.Kind.SPEED, List.of(trace(Column.VELOCITY, "piston", Dash.SOLID, false))));
        for (Column column : added) {
            if (!USUAL.contains(column)) {
                add(lanes, column);
            }
        }
        lanes.sort(Comparator.comparing(Lane::kind));
        return List.copyOf(lanes);
    }

    private static StripTrace trace(Column column, String name, Dash dash, boolean strong) {
        return new StripTrace(new Signal.OfColumn(column), name, name, dash, strong, false);
    }

    private static Lane pressures(Throw shown) {
        List<StripTrace> traces = new ArrayList<>();
        List<String> names = shown.chambers().stream().map(Chamber::name).toList();
        List<String> shortNames = ShortNames.of(names);
        for (int c = 0; c < names.size(); c++) {
            traces.add(
                    new StripTrace(new Signal.OfPressure(c), names.get(c), shortNames.get(c), dash(c), false, false));
        }
        return new Lane(Lane.Kind.PRESSURE, traces);
    }

    private static void add(List<Lane> lanes, Column column) {
        Lane.Kind kind = Lane.Kind.of(column);
        for (int i = 0; i < lanes.size(); i++) {
            Lane lane = lanes.get(i);
            if (lane.kind() == kind) {
                lanes.set(i, lane.with(added(column, lane.traces().size())));
                return;
            }
        }
        lanes.add(new Lane(kind, List.of(added(column, 0))));
    }

    private static StripTrace added(Column column, int place) {
        String name = ColumnWords.title(column);
        return new StripTrace(new Signal.OfColumn(column), name, name, dash(place), false, true);
    }

    private static Dash dash(int place) {
        Dash[] all = Dash.values();
        return all[place % all.length];
    }
}
