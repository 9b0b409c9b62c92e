package throwbench.solver.load;

/**
 * Masses that move along the line of stroke, kg, each ≥ 0.
 *
 * @param piston piston, or plunger
 * @param pistonRod piston rod with its nuts; 0 for a trunk piston or plunger
 * @param crosshead crosshead with pin and shoes; 0 for a trunk piston
 */
public record ReciprocatingMasses(double piston, double pistonRod, double crosshead) {

    public ReciprocatingMasses {
        if (!(piston >= 0 && pistonRod >= 0 && crosshead >= 0)) {
            throw new IllegalArgumentException("masses " + piston + ", " + pistonRod + ", " + crosshead + " kg");
        }
    }

    /** m_p: what the piston rod must accelerate at its crosshead end. */
    public double pistonAndRod() {
        return piston + pistonRod;
    }

    /** m_rec: all that reciprocates. */
    public double total() {
        return piston + pistonRod + crosshead;
    }
}
