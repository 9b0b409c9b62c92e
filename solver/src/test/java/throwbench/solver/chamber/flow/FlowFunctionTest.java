package throwbench.solver.chamber.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class FlowFunctionTest {

    static List<FlowCheckRow> rows() throws IOException {
        return FlowCheckRow.all();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void theValuesOfTheBooksAreMet(FlowCheckRow row) {
        double value = value(row);
        assertEquals(row.exact(), value, 1e-9 * row.exact(), row.told());
        if (!row.published().isEmpty()) {
            double published = Double.parseDouble(row.published());
            assertEquals(published, value, Double.parseDouble(row.tolerance()) * published, row.told());
        }
    }

    @Test
    void everyRowTellsItsSource() throws IOException {
        assertEquals(29, rows().size());
        for (FlowCheckRow row : rows()) {
            assertFalse(row.source().isEmpty() || row.status().isEmpty(), row.id());
        }
    }

    private static double value(FlowCheckRow row) {
        FlowFunction law = new FlowFunction(row.k());
        return switch (row.id().substring(0, 2)) {
            case "V1" -> law.criticalRatio();
            case "V2" -> law.greatest();
            case "V3" -> law.at(Double.parseDouble(row.pressureRatio()));
            case "V4" -> pounds(law, row.id().equals("V4a") ? 0 : 94.7 / 114.7);
            // 500 mm2, 1 MPa a, 360 K, R = 287 J/(kg K)
            case "V5" -> 500e-6 * 1e6 / Math.sqrt(287 * 360.0) * law.at(0);
            default -> throw new IllegalStateException("no formula for " + row.id());
        };
    }

    /** Air from 114.7 psi a, 560 °R, R = 53.3 ft lbf/(lb °R) through 0.005454 ft², with the book's g = 32.2 ft/s²; lb/s. */
    private static double pounds(FlowFunction law, double ratio) {
        return 0.005454 * 114.7 * 144 * Math.sqrt(32.2 / (53.3 * 560)) * law.at(ratio);
    }

    @Test
    void nothingFlowsAgainstAHigherPressure() {
        FlowFunction law = new FlowFunction(1.3);
        assertEquals(0, law.at(1));
        assertEquals(0, law.at(1.7));
    }

    @Test
    void aSmallDifferenceFlowsLikeALiquid() {
        // Bernoulli with the density upstream: √(2 (1 − Π)); the first correction is −3/(4k) (1 − Π)
        double drop = 1e-6;
        double liquid = Math.sqrt(2 * drop);
        assertEquals(1, new FlowFunction(1.001).at(1 - drop) / liquid, drop);
        assertEquals(1, new FlowFunction(1.4).at(1 - drop) / liquid, drop);
    }

    @Test
    void anExponentOfOneOrLessIsNoGas() {
        assertThrows(IllegalArgumentException.class, () -> new FlowFunction(1));
        assertThrows(IllegalArgumentException.class, () -> new FlowFunction(Double.NaN));
    }
}
