package throwbench.app.gauge;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import throwbench.app.drawing.Signal;
import throwbench.solver.machine.Throw;
import throwbench.solver.revolution.Column;

/** Which quantities have a gauge. */
final class Gauges {

    /** Columns that have one until the user picks others. */
    static final List<Column> USUAL =
            List.of(Column.ROD_LOAD, Column.GUIDE_FORCE, Column.THROW_TORQUE, Column.VELOCITY);

    /** Columns that may have one: all but the crank angle itself. */
    static final List<Column> ALL =
            Arrays.stream(Column.values()).filter(c -> c != Column.CRANK_ANGLE).toList();

    private Gauges() {}

    /** The picked columns with a gauge each: loads and torques, the pressure of every chamber, motion. */
    static List<Signal> of(Throw shown, Set<Column> picked) {
        List<Signal> signals = new ArrayList<>();
        List<Signal> motion = new ArrayList<>();
        for (Column column : ALL) {
            if (picked.contains(column)) {
                (column.compareTo(Column.GAS_LOAD) < 0 ? motion : signals).add(new Signal.OfColumn(column));
            }
        }
        for (int c = 0; c < shown.chambers().size(); c++) {
            signals.add(new Signal.OfPressure(c));
        }
        signals.addAll(motion);
        return signals;
    }
}
