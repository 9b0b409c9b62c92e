package throwbench.solver.balance;

/**
 * One order of a quantity over the turn: a cos nφ₁ + b sin nφ₁, φ₁ the crank angle of the first throw.
 *
 * @param order n, ≥ 1
 * @param cos a_n = (1/π) ∮ f cos nφ₁ dφ₁, in the quantity's unit
 * @param sin b_n likewise
 */
public record Harmonic(int order, double cos, double sin) {

    /** √(a² + b²). */
    public double amplitude() {
        return Math.hypot(cos, sin);
    }

    /** Its value at a crank angle of the first throw (rad). */
    public double at(double crankAngle) {
        return cos * Math.cos(order * crankAngle) + sin * Math.sin(order * crankAngle);
    }
}
