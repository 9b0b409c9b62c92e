package throwbench.app.gauge;

import java.util.OptionalDouble;
import throwbench.app.drawing.Readout;
import throwbench.solver.revolution.Extremes;

/**
 * The scale of a gauge, in the unit shown: round ends that hold zero, the extremes of the revolution and the limits. It is the
 * same for a whole revolution, and small changes of the machine seldom move it.
 *
 * @param from left end
 * @param to right end, above from
 */
public record GaugeScale(double from, double to) {

    private static final double[] ROUND = {1, 1.25, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10};

    /** Free share beyond a limit, so that its band can be seen. */
    private static final double BEYOND = 1.12;

    static GaugeScale of(Extremes extremes, OptionalDouble low, OptionalDouble high, Readout readout) {
        double least = Math.min(0, readout.inUnit(extremes.least().value()));
        double greatest = Math.max(0, readout.inUnit(extremes.greatest().value()));
        if (low.isPresent()) {
            least = Math.min(least, readout.inUnit(low.getAsDouble()) * BEYOND);
        }
        if (high.isPresent()) {
            greatest = Math.max(greatest, readout.inUnit(high.getAsDouble()) * BEYOND);
        }
        double from = 0 - round(-least);
        double to = round(greatest);
        return to > from ? new GaugeScale(from, to) : new GaugeScale(0, 1);
    }

    /** The next round number that is not below a value ≥ 0. */
    private static double round(double value) {
        if (!(value > 0)) {
            return 0;
        }
        double power = Math.pow(10, Math.floor(Math.log10(value)));
        for (double step : ROUND) {
            if (value <= step * power * (1 + 1e-9)) {
                return step * power;
            }
        }
        return 10 * power;
    }

    /** Share of the way from the left end to the right one, in [0, 1], of a value in the unit shown. */
    public double share(double value) {
        return Math.max(0, Math.min(1, (value - from) / (to - from)));
    }
}
