package throwbench.solver.fluid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class GasTableTest {

    @Test
    void everyNameAndOtherNameFindsItsGas() {
        assertEquals(29, GasTable.names().size());
        for (String name : GasTable.names()) {
            Gas gas = GasTable.find(name).orElseThrow();
            assertEquals(name, gas.name());
            for (String other : gas.otherNames()) {
                assertEquals(Optional.of(gas), GasTable.find(other), other);
            }
        }
    }

    @Test
    void namesAreFoundInAnyCaseAndSpelling() {
        List<String> spellings = List.of("hydrogen sulfide", "Hydrogen Sulphide", " h2s ", "H2S");
        assertEquals(
                List.of("hydrogen sulfide"),
                spellings.stream()
                        .map(name -> GasTable.find(name).orElseThrow().name())
                        .distinct()
                        .toList());
        assertEquals(Optional.empty(), GasTable.find("phlogiston"));
    }

    @Test
    void everyRowNamesItsSources() {
        for (Gas gas : GasTable.gases()) {
            assertTrue(gas.source().startsWith("chemicals 1.5.2, after "), gas.name());
            assertTrue(gas.heatCapacity().source().matches("NASA TM-4513 \\(1993\\), .+|own fit to .+ %"), gas.name());
        }
    }

    /** The integral over T of the polynomial's own integral: c_p/R = T ds/dT. */
    @Test
    void entropyRiseIsTheIntegralOfTheHeatCapacity() {
        for (Gas gas : GasTable.gases()) {
            IdealHeatCapacity cp = gas.heatCapacity();
            double slope = 300 * (cp.entropyRise(300, 300.01) - cp.entropyRise(300, 299.99)) / 0.02;
            assertEquals(cp.at(300), slope, 1e-7 * cp.at(300), gas.name());
        }
    }
}
