package throwbench.solver.revolution;

import java.util.function.DoubleUnaryOperator;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;

/** Traces of curves that no machine has, with known sign changes and extremes. */
public final class Sampled {

    private Sampled() {}

    /** A curve without steps. */
    public static Trace smooth(DoubleUnaryOperator curve) {
        return of((angle, side) -> curve.applyAsDouble(angle), 0);
    }

    /**
     * Any curve.
     *
     * @param breaks rad, rising, the first 0
     */
    static Trace of(Curve curve, double... breaks) {
        double[] grid = new double[Trace.STATIONS];
        for (int i = 0; i < grid.length; i++) {
            grid[i] = curve.at(Angles.TURN / grid.length * i, Approach.JUST_AFTER);
        }
        return new Trace(curve, grid, breaks);
    }
}
