package throwbench.app.gauge;

import java.util.ArrayList;
import java.util.List;
import throwbench.app.drawing.Signal;
import throwbench.solver.machine.Throw;
import throwbench.solver.revolution.Column;

/** Which quantities have a gauge. */
final class Gauges {

    private Gauges() {}

    /** Rod load, guide force, torque, the pressure of every chamber and piston speed. */
    static List<Signal> usual(Throw shown) {
        List<Signal> signals = new ArrayList<>();
        signals.add(new Signal.OfColumn(Column.ROD_LOAD));
        signals.add(new Signal.OfColumn(Column.GUIDE_FORCE));
        signals.add(new Signal.OfColumn(Column.THROW_TORQUE));
        for (int c = 0; c < shown.chambers().size(); c++) {
            signals.add(new Signal.OfPressure(c));
        }
        signals.add(new Signal.OfColumn(Column.VELOCITY));
        return signals;
    }
}
