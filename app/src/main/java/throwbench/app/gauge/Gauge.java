package throwbench.app.gauge;

import java.util.List;
import java.util.OptionalDouble;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.Readout;
import throwbench.app.drawing.ShortNames;
import throwbench.app.drawing.Signal;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extremes;

/**
 * One gauge: a quantity, its extremes over the revolution and what limits it. Values in SI.
 *
 * @param shortTitle where the title finds no room
 * @param lowLimit least value allowed (a rating in compression, negative)
 * @param highLimit greatest value allowed
 * @param bySign whether its value is coloured by tension and compression
 */
public record Gauge(
        Signal signal,
        String title,
        String shortTitle,
        Extremes extremes,
        OptionalDouble lowLimit,
        OptionalDouble highLimit,
        GaugeScale scale,
        Readout readout,
        boolean bySign) {

    /** The gauge of a quantity in a state. */
    static Gauge of(Signal signal, Shown shown) {
        boolean rod = signal.equals(new Signal.OfColumn(Column.ROD_LOAD));
        boolean gas = signal.equals(new Signal.OfColumn(Column.GAS_LOAD));
        OptionalDouble high = rod
                ? limit(shown, LimitKey.ROD_TENSION)
                : gas ? limit(shown, LimitKey.GAS_TENSION) : OptionalDouble.empty();
        OptionalDouble push = rod
                ? limit(shown, LimitKey.ROD_COMPRESSION)
                : gas ? limit(shown, LimitKey.GAS_COMPRESSION) : OptionalDouble.empty();
        OptionalDouble low = push.isPresent() ? OptionalDouble.of(-push.getAsDouble()) : push;
        Extremes extremes = signal.extremes(shown.summary());
        Readout readout = signal.readout(shown.units(), shown.summary());
        String title = signal.title(shown.shownThrow());
        String shortTitle = title;
        if (signal instanceof Signal.OfPressure pressure) {
            List<String> names =
                    shown.shownThrow().chambers().stream().map(Chamber::name).toList();
            shortTitle = "pressure, " + ShortNames.of(names).get(pressure.chamber());
            title = "pressure, " + title;
        }
        return new Gauge(
                signal,
                title,
                shortTitle,
                extremes,
                low,
                high,
                GaugeScale.of(extremes, low, high, readout),
                readout,
                rod || gas);
    }

    /** A limit of the throw before that of the machine, SI. */
    private static OptionalDouble limit(Shown shown, LimitKey key) {
        OptionalDouble own = shown.shownThrow().limits().get(key);
        return own.isPresent() ? own : shown.machine().limits().get(key);
    }
}
