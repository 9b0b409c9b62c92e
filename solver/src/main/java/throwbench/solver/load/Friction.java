package throwbench.solver.load;

/**
 * Friction of one throw.
 *
 * @param packing force of packing and rings on piston and rod, N, ≥ 0
 * @param guideCoefficient μ at the guide, ≥ 0
 */
public record Friction(double packing, double guideCoefficient) {

    public static final Friction NONE = new Friction(0, 0);
}
