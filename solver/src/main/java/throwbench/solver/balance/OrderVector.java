package throwbench.solver.balance;

import java.util.OptionalDouble;
import throwbench.solver.mechanism.Rotation;

/**
 * One order of a force or a couple with its components along X and Y: a vector whose tip draws an ellipse. As the sum of a
 * vector that turns counter-clockwise and one that turns clockwise, both n times a turn, its half-axes are the sum and the
 * difference of their lengths.
 *
 * @param x along machine X
 * @param y along machine Y, of the same order
 */
public record OrderVector(Harmonic x, Harmonic y) {

    /** Shares of the longer turning vector below which the shorter one is rounding, and the ellipse a circle. */
    private static final double CIRCLE = 1e-9;

    public OrderVector {
        if (x.order() != y.order()) {
            throw new IllegalArgumentException("orders " + x.order() + " and " + y.order());
        }
    }

    public int order() {
        return x.order();
    }

    /** The greatest length: the larger singular value of [[a_X, b_X], [a_Y, b_Y]]. */
    public double size() {
        return length(Rotation.COUNTER_CLOCKWISE) + length(Rotation.CLOCKWISE);
    }

    /** The least length: the smaller singular value. */
    public double leastSize() {
        return Math.abs(length(Rotation.COUNTER_CLOCKWISE) - length(Rotation.CLOCKWISE));
    }

    /** Where it is longest: angle of that axis from X, rad, in [0, π); empty where it is equally long all round. */
    public OptionalDouble direction() {
        double forth = length(Rotation.COUNTER_CLOCKWISE);
        double back = length(Rotation.CLOCKWISE);
        if (Math.min(forth, back) <= CIRCLE * Math.max(forth, back)) {
            return OptionalDouble.empty();
        }
        double mean = (angle(Rotation.COUNTER_CLOCKWISE) + angle(Rotation.CLOCKWISE)) / 2;
        double folded = mean - Math.PI * Math.floor(mean / Math.PI);
        return OptionalDouble.of(folded >= Math.PI ? 0 : folded);
    }

    /** Length of the part that turns in a sense. */
    public double length(Rotation sense) {
        return Math.hypot(alongX(sense), alongY(sense));
    }

    /** Angle from X, at φ₁ = 0, of the part that turns in a sense, rad. */
    public double angle(Rotation sense) {
        return Math.atan2(alongY(sense), alongX(sense));
    }

    private double alongX(Rotation sense) {
        return (x.cos() + sense.sign() * y.sin()) / 2;
    }

    private double alongY(Rotation sense) {
        return (y.cos() - sense.sign() * x.sin()) / 2;
    }
}
