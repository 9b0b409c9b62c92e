package throwbench.solver.fluid;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * A gas named by the mole fractions of gases of the built-in table.
 *
 * @param moleFractions name of a gas of {@link GasTable} → fraction, each ≥ 0, summing to 1 within 1e-6; in file order
 * @param real whether capacity, density and exponents follow the real gas instead of the perfect one
 */
public record GasMixture(Map<String, Double> moleFractions, boolean real) implements Fluid {

    /** How far the fractions may miss 1: room for fractions written with six decimals. */
    public static final double SUM_TOLERANCE = 1e-6;

    /** @throws IllegalArgumentException for a name the table does not have, a negative fraction, or another sum */
    public GasMixture {
        moleFractions = Collections.unmodifiableMap(new LinkedHashMap<>(moleFractions));
        double sum = 0;
        for (Map.Entry<String, Double> part : moleFractions.entrySet()) {
            if (GasTable.find(part.getKey()).isEmpty()) {
                throw new IllegalArgumentException("no gas of the table: " + part.getKey());
            }
            if (!(part.getValue() >= 0)) {
                throw new IllegalArgumentException(part.getKey() + " has the fraction " + part.getValue());
            }
            sum += part.getValue();
        }
        if (!(Math.abs(sum - 1) <= SUM_TOLERANCE)) {
            throw new IllegalArgumentException("the fractions sum to " + sum);
        }
    }

    @Override
    public boolean isGas() {
        return true;
    }

    /** M = Σ x_i M_i, kg/mol. */
    public double molarMass() {
        return Composition.of(this).molarMass();
    }

    /**
     * The perfect gas with this mixture's molar mass and the isentropic exponent k = c_p/(c_p − R), c_p = Σ x_i c_p,i(T).
     *
     * @param suctionTemperature K
     * @return no gas, with a sentence, where the heat capacity of a part is not known at this temperature
     */
    public Answer<PerfectGas> perfectAt(double suctionTemperature) {
        Composition composition = Composition.of(this);
        if (!composition.isKnownAt(suctionTemperature)) {
            return Answer.none(composition.outOfRange(suctionTemperature));
        }
        double heatCapacity = composition.heatCapacity(suctionTemperature);
        return Answer.of(new PerfectGas(composition.molarMass(), heatCapacity / (heatCapacity - 1)));
    }
}
