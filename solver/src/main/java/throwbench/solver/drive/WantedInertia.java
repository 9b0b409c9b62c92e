package throwbench.solver.drive;

import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * The rotating inertia with which the coefficient of fluctuation of the speed is a wanted one.
 *
 * @param inertia J, kg m²; empty where there is none
 * @param reason why there is none, a sentence; else empty
 */
public record WantedInertia(OptionalDouble inertia, String reason) {

    private static final double STEP = 4;

    /** Inertias are looked for up to this many times above and below the first guess. */
    private static final double REACH = 1e9;

    /** What a speed that is not found counts for: more fluctuation than any. */
    private static final double STALLED = 1e3;

    /**
     * Finds it, by bracketing and root finding.
     *
     * @param fluctuation the wanted (ω_max − ω_min)/ω_mean, above 0
     * @param guess kg m², above 0
     * @param turn solves the turn with a rotating inertia
     */
    public static WantedInertia find(double fluctuation, double guess, DoubleFunction<SpeedOutcome> turn) {
        if (!(fluctuation > 0 && guess > 0)) {
            throw new IllegalArgumentException("fluctuation " + fluctuation + ", first guess " + guess + " kg m2");
        }
        UnivariateFunction excess = logInertia -> Math.log(turn.apply(Math.exp(logInertia))
                        .curve()
                        .map(SpeedCurve::fluctuation)
                        .orElse(STALLED)
                / fluctuation);
        double low = Math.log(guess);
        double high = low;
        while (excess.value(high) > 0 && high < Math.log(guess * REACH)) {
            high += Math.log(STEP);
        }
        while (excess.value(low) <= 0 && low > Math.log(guess / REACH)) {
            low -= Math.log(STEP);
        }
        if (excess.value(low) <= 0) {
            return new WantedInertia(
                    OptionalDouble.empty(), "the speed fluctuates less than that with no rotating inertia at all");
        }
        if (excess.value(high) > 0) {
            return new WantedInertia(OptionalDouble.empty(), "no rotating inertia holds the speed so even");
        }
        double root = new BrentSolver(1e-12, 1e-11).solve(200, excess, low, high);
        return new WantedInertia(OptionalDouble.of(Math.exp(root)), "");
    }
}
