package throwbench.solver.fluid;

/**
 * What an equation of state with three parameters knows of a fluid.
 *
 * @param temperature T_c, K, above 0
 * @param pressure p_c, Pa, above 0
 * @param acentricFactor ω, dimensionless, of either sign
 */
public record CriticalPoint(double temperature, double pressure, double acentricFactor) {

    public CriticalPoint {
        if (!(temperature > 0 && pressure > 0 && Double.isFinite(acentricFactor))) {
            throw new IllegalArgumentException(
                    "no critical point: " + temperature + " K, " + pressure + " Pa, acentric factor " + acentricFactor);
        }
    }
}
