package throwbench.solver.chamber.flow;

import java.util.function.DoubleUnaryOperator;

/** Finds how long a step must be to end just where something changes sign. */
final class Landing {

    /** Angle to which the place is found, rad: far below what moves a periodic state by 1e-8. */
    private static final double EXACT = 1e-13;

    private static final int MOST = 60;

    private Landing() {}

    /**
     * By regula falsi (Illinois) with a bisection now and then.
     *
     * @param longest a step that is too long, rad
     * @param atStart what it is before the step; not 0
     * @param trial what it is at the end of a step of a length; of the other sign, or 0, for the longest
     * @return the length of the shortest step tried that reaches the change
     */
    static double length(double longest, double atStart, DoubleUnaryOperator trial) {
        double before = 0;
        double beforeBy = atStart;
        double after = longest;
        double afterBy = trial.applyAsDouble(longest);
        for (int i = 0; i < MOST && after - before > EXACT; i++) {
            double at =
                    i % 4 == 3 ? (before + after) / 2 : (before * afterBy - after * beforeBy) / (afterBy - beforeBy);
            double by = trial.applyAsDouble(at);
            if (by * atStart > 0) {
                before = at;
                beforeBy = by;
                afterBy /= 2;
            } else {
                after = at;
                afterBy = by;
                beforeBy /= 2;
            }
        }
        return after;
    }
}
