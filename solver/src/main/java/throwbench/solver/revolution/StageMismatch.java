package throwbench.solver.revolution;

import java.util.List;
import java.util.OptionalDouble;

/**
 * A stage and those that follow it.
 *
 * @param followers at least one
 * @param passed by the stage, kg/s; empty where it is not known
 * @param taken in by all its followers, kg/s; empty where it is not known
 */
public record StageMismatch(String stage, List<String> followers, OptionalDouble passed, OptionalDouble taken) {

    public StageMismatch {
        followers = List.copyOf(followers);
    }

    /**
     * The relative difference: what the followers take in more or less than the stage passes, as a share of what it passes,
     * ≥ 0; empty where a mass is not known or the stage passes nothing.
     */
    public OptionalDouble relative() {
        if (passed.isEmpty() || taken.isEmpty() || passed.getAsDouble() == 0) {
            return OptionalDouble.empty();
        }
        return OptionalDouble.of(Math.abs(taken.getAsDouble() - passed.getAsDouble()) / passed.getAsDouble());
    }

    static OptionalDouble sum(OptionalDouble a, OptionalDouble b) {
        return a.isPresent() && b.isPresent()
                ? OptionalDouble.of(a.getAsDouble() + b.getAsDouble())
                : OptionalDouble.empty();
    }
}
