package throwbench.solver.chamber.flow;

import java.util.function.DoubleUnaryOperator;

/** Finds how long a step must be to end just where something changes sign. */
final class Landing {

    /** Angle to which the place is found, rad: far below what moves a periodic state by 1e-8. */
    private static final double EXACT = 1e-13;

    private static final int MOST = 60;

    /** Trials after which nothing but halving is worth trying. */
    private static final int HOPED = 20;

    /** One trial in so many halves the bracket, in case the others creep. */
    private static final int BISECTED = 6;

    private Landing() {}

    /**
     * By regula falsi (Illinois) with a bisection now and then.
     *
     * @param longest a step that is too long, rad
     * @param atStart what it is before the step; not 0
     * @param enough how near to the change, in the same measure, is near enough
     * @param trial what it is at the end of a step of a length; of the other sign, or 0, for the longest
     * @return the length of a step that ends there
     */
    static double length(double longest, double atStart, double enough, DoubleUnaryOperator trial) {
        double before = 0;
        double beforeBy = atStart;
        double after = longest;
        double afterBy = trial.applyAsDouble(longest);
        int side = 0;
        for (int i = 0; i < MOST && after - before > EXACT; i++) {
            double at = (before * afterBy - after * beforeBy) / (afterBy - beforeBy);
            if (i > HOPED || i % BISECTED == BISECTED - 1) {
                at = (before + after) / 2;
            }
            double by = trial.applyAsDouble(at);
            if (Math.abs(by) <= enough) {
                return at;
            }
            boolean tooShort = by * atStart > 0;
            if (tooShort) {
                before = at;
                beforeBy = by;
                afterBy = side > 0 ? afterBy / 2 : afterBy;
            } else {
                after = at;
                afterBy = by;
                beforeBy = side < 0 ? beforeBy / 2 : beforeBy;
            }
            side = tooShort ? 1 : -1;
        }
        return after;
    }
}
