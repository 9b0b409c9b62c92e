package throwbench.solver.fluid;

/**
 * A liquid of constant bulk modulus.
 *
 * @param density ρ, kg/m³, above 0
 * @param bulkModulus K, Pa, above 0
 * @param vapourPressure Pa absolute, above 0
 */
public record Liquid(double density, double bulkModulus, double vapourPressure) implements Fluid {

    public Liquid {
        if (!(density > 0 && bulkModulus > 0 && vapourPressure > 0)) {
            throw new IllegalArgumentException("not a liquid: density " + density + " kg/m3, bulk modulus "
                    + bulkModulus + " Pa, vapour pressure " + vapourPressure + " Pa");
        }
    }

    @Override
    public boolean isGas() {
        return false;
    }
}
