package throwbench.solver.fluid;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * A gas named by the mole fractions of gases of the built-in table.
 *
 * @param moleFractions name of a gas of the table → fraction, each ≥ 0, summing to 1 within 1e-6; in file order
 * @param real whether capacity, density and exponents follow the real gas instead of the perfect one
 */
public record GasMixture(Map<String, Double> moleFractions, boolean real) implements Fluid {

    public GasMixture {
        moleFractions = Collections.unmodifiableMap(new LinkedHashMap<>(moleFractions));
    }

    @Override
    public boolean isGas() {
        return true;
    }
}
