package throwbench.solver.map;

/**
 * Where a margin changes its sign, or ends.
 *
 * @param at SI value of the variable
 * @param below the margin just below it
 * @param above the margin just above it
 */
public record Crossing(Kind kind, double at, Outcome below, Outcome above) {

    /** How the margin passes. */
    public enum Kind {
        /** It is zero there. */
        ZERO,
        /** It jumps over zero. */
        STEP,
        /** On one side it cannot be had. */
        EDGE
    }
}
