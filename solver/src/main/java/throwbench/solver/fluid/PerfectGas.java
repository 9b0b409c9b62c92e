package throwbench.solver.fluid;

/**
 * A gas of constant heat capacity.
 *
 * @param molarMass M, kg/mol, above 0
 * @param isentropicExponent k, above 1
 */
public record PerfectGas(double molarMass, double isentropicExponent) implements Fluid {

    /** R, J/(mol K): CODATA 2018, exact since the 2019 revision of the SI. */
    public static final double MOLAR_GAS_CONSTANT = 8.314462618;

    public PerfectGas {
        if (!(molarMass > 0 && isentropicExponent > 1)) {
            throw new IllegalArgumentException("not a gas: M = " + molarMass + " kg/mol, k = " + isentropicExponent);
        }
    }

    /** Specific gas constant, J/(kg K). */
    public double gasConstant() {
        return MOLAR_GAS_CONSTANT / molarMass;
    }

    @Override
    public boolean isGas() {
        return true;
    }
}
