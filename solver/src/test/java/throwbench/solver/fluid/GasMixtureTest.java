package throwbench.solver.fluid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.LinkedHashMap;
import java.util.Map;
import org.junit.jupiter.api.Test;

class GasMixtureTest {

    /** Dry air of its parts, table 6.2 of the check values: its heat capacity agrees with that of air within 0.09 %. */
    @Test
    void airOfItsPartsIsAir() {
        GasMixture parts = new GasMixture(
                Map.of("nitrogen", 0.780848, "oxygen", 0.209390, "argon", 0.009332, "carbon dioxide", 0.000430), false);
        PerfectGas ofParts = parts.perfectAt(350).value().orElseThrow();
        PerfectGas air =
                new GasMixture(Map.of("air", 1.0), false).perfectAt(350).value().orElseThrow();
        assertEquals(air.molarMass(), ofParts.molarMass(), 1e-4 * air.molarMass());
        double heatCapacity = air.isentropicExponent() / (air.isentropicExponent() - 1);
        double ofPartsHeatCapacity = ofParts.isentropicExponent() / (ofParts.isentropicExponent() - 1);
        assertEquals(heatCapacity, ofPartsHeatCapacity, 9e-4 * heatCapacity);
    }

    /** M = Σ x M, k = c_p/(c_p − R), c_p = Σ x c_p; heat capacities at 350 K from the reference equations of 6.1. */
    @Test
    void biogasHasMeanMassAndMeanHeatCapacity() {
        PerfectGas gas = new GasMixture(Map.of("methane", 0.62, "carbon dioxide", 0.38), false)
                .perfectAt(350)
                .value()
                .orElseThrow();
        double heatCapacity = 0.62 * 37.96282926482764 + 0.38 * 39.39408323603501;
        assertEquals(0.62 * 16.04246e-3 + 0.38 * 44.0095e-3, gas.molarMass(), 1e-12);
        assertEquals(heatCapacity / (heatCapacity - 8.314462618), gas.isentropicExponent(), 5e-4);
    }

    @Test
    void gasWithTheFractionZeroNeitherCountsNorLimits() {
        Map<String, Double> fractions = new LinkedHashMap<>();
        fractions.put("nitrogen", 1.0);
        fractions.put("R134a", 0.0);
        assertEquals(
                new GasMixture(Map.of("nitrogen", 1.0), false).perfectAt(700),
                new GasMixture(fractions, false).perfectAt(700));
    }

    @Test
    void temperatureOutsideAPolynomialIsSaid() {
        Answer<PerfectGas> answer = new GasMixture(Map.of("methane", 1.0), false).perfectAt(150);
        assertEquals("the heat capacity of methane is known from 200 K to 1000 K, not at 150.0 K", answer.reason());
        assertEquals(
                "the heat capacity of methane is known from 200 K to 1000 K, not at NaN K",
                new GasMixture(Map.of("methane", 1.0), false)
                        .perfectAt(Double.NaN)
                        .reason());
    }

    @Test
    void fractionsThatMissOneAreRefused() {
        assertEquals("the fractions sum to 0.99", message(Map.of("methane", 0.99)));
        assertEquals("the fractions sum to 0.0", message(Map.of()));
        assertEquals(
                1.000001,
                new GasMixture(Map.of("methane", 1.000001), false)
                        .moleFractions()
                        .get("methane"));
    }

    @Test
    void unknownGasesAndNegativeFractionsAreRefused() {
        assertEquals("no gas of the table: phlogiston", message(Map.of("phlogiston", 1.0)));
        assertEquals("methane has the fraction -1.0", message(Map.of("methane", -1.0)));
        assertEquals("methane has the fraction NaN", message(Map.of("methane", Double.NaN)));
    }

    private static String message(Map<String, Double> fractions) {
        return String.valueOf(assertThrows(IllegalArgumentException.class, () -> new GasMixture(fractions, true))
                .getMessage());
    }
}
