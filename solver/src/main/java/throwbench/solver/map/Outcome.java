package throwbench.solver.map;

import java.util.OptionalDouble;

/**
 * A result at one point: its value, or why there is none.
 *
 * @param reason a sentence; empty where there is a value
 */
public record Outcome(OptionalDouble value, String reason) {

    public Outcome {
        if (value.isPresent() != reason.isEmpty()) {
            throw new IllegalArgumentException("a value or a reason, not " + value + " with \"" + reason + "\"");
        }
    }

    /** A value; one that is no number is none. */
    public static Outcome of(double value) {
        // adding 0 turns negative zero into zero
        return Double.isFinite(value)
                ? new Outcome(OptionalDouble.of(value + 0.0), "")
                : impossible("comes out as " + value);
    }

    /** No value, for a reason. */
    public static Outcome impossible(String reason) {
        return new Outcome(OptionalDouble.empty(), reason);
    }

    /** Whether there is a value. */
    public boolean isPossible() {
        return value.isPresent();
    }
}
