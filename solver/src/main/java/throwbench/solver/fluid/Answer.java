package throwbench.solver.fluid;

import java.util.Optional;
import java.util.function.Function;

/**
 * A property that is known, or the sentence that says why it is not: a state outside a polynomial's range, a gas that
 * condenses.
 *
 * @param value empty when it cannot be had
 * @param reason one sentence for the user, without a full stop; empty when there is a value
 */
public record Answer<T>(Optional<T> value, String reason) {

    public Answer {
        if (value.isPresent() != reason.isEmpty()) {
            throw new IllegalArgumentException("either a value or a reason: " + value + ", '" + reason + "'");
        }
    }

    public static <T> Answer<T> of(T value) {
        return new Answer<>(Optional.of(value), "");
    }

    public static <T> Answer<T> none(String reason) {
        return new Answer<>(Optional.empty(), reason);
    }

    /** The same reason, or what the function makes of the value. */
    public <U> Answer<U> map(Function<T, U> function) {
        return new Answer<>(value.map(function), reason);
    }
}
