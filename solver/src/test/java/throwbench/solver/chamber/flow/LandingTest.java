package throwbench.solver.chamber.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LandingTest {

    @ParameterizedTest
    @ValueSource(doubles = {1e-6, 0.003, 0.02, 0.0699})
    void theStepEndsWhereTheSignChanges(double place) {
        int[] trials = {0};
        double found = Landing.length(0.07, Math.expm1(place), 1e-15, at -> {
            trials[0]++;
            return Math.expm1(place - at);
        });
        assertEquals(place, found, 1e-13);
        assertTrue(trials[0] <= 10, "trials " + trials[0]);
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-6, 0.003, 0.02, 0.0699})
    void aJumpIsFoundToo(double place) {
        assertEquals(place, Landing.length(0.07, -3, 1e-15, at -> at < place ? -3 : 1e-4), 1e-12);
    }
}
