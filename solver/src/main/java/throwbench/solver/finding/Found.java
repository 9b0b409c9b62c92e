package throwbench.solver.finding;

import java.util.OptionalDouble;
import throwbench.solver.revolution.Extreme;

/**
 * What a criterion found at one place, before it is held against a limit.
 *
 * @param value in the criterion's unit; empty where it cannot be had, which the note then explains
 * @param angle crank angle at which it happens, rad
 * @param usual the limit that holds here where none is set; empty: the criterion's default
 * @param note may be empty where there is a value
 */
record Found(OptionalDouble value, OptionalDouble angle, OptionalDouble usual, String note) {

    static Found of(double value) {
        return new Found(OptionalDouble.of(value), OptionalDouble.empty(), OptionalDouble.empty(), "");
    }

    /** A value that stands where an extreme stands. */
    static Found at(Extreme where, double value) {
        OptionalDouble angle = OptionalDouble.of(where.crankAngle());
        return new Found(OptionalDouble.of(value), angle, OptionalDouble.empty(), "");
    }

    /** No value. */
    static Found none(String reason) {
        return new Found(OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty(), reason);
    }

    Found noting(String more) {
        return new Found(value, angle, usual, more);
    }

    Found usually(OptionalDouble limit) {
        return new Found(value, angle, limit, note);
    }
}
