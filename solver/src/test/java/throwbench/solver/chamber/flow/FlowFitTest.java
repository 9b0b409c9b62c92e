package throwbench.solver.chamber.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The fits against the law they fit, from no flow at all to far beyond choking. */
class FlowFitTest {

    @ParameterizedTest
    @ValueSource(doubles = {1.01, 1.1, 1.29, 1.4, 1.6666666666666667})
    void whatEntersFollowsTheLaw(double k) {
        FlowFunction law = new FlowFunction(k);
        FlowFit fit = FlowFit.inward(law);
        for (double u = 1e-4; u < 1; u += 0.0007) {
            double exact = law.at(1 - u * u);
            assertEquals(exact, fit.at(u), 1e-7 * exact, "u = " + u);
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {1.01, 1.1, 1.29, 1.4, 1.6666666666666667})
    void whatLeavesFollowsTheLaw(double k) {
        FlowFunction law = new FlowFunction(k);
        FlowFit fit = FlowFit.outward(law);
        FlowFit onIsentrope = FlowFit.outwardOnIsentrope(law);
        for (double u = 1e-4; u < 2; u += 0.0007) {
            double y = 1 + u * u;
            double exact = y * law.at(1 / y);
            assertEquals(exact, fit.at(u), 1e-7 * exact, "u = " + u);
            double hotter = Math.pow(y, (3 * k - 1) / (2 * k)) * law.at(1 / y);
            assertEquals(hotter, onIsentrope.at(u), 1e-7 * hotter, "u = " + u);
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.01, 0.3, 0.6, 0.8, 1.5})
    void theSlopeIsTheDerivative(double u) {
        FlowFunction law = new FlowFunction(1.29);
        double d = 1e-5;
        for (FlowFit fit : new FlowFit[] {FlowFit.inward(law), FlowFit.outward(law), FlowFit.outwardOnIsentrope(law)}) {
            assertEquals((fit.at(u + d) - fit.at(u - d)) / (2 * d), fit.slopeAt(u), 1e-7);
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-12, 1e-6, 1e-3, 0.1, 1, 30})
    void theFlowThatBalancesAStageIsFound(double free) {
        FlowFunction law = new FlowFunction(1.29);
        for (double scale : new double[] {1e-6, 1e-2, 1, 1e4}) {
            for (double guess : new double[] {0, 1e-5, 0.5, 2}) {
                for (FlowFit fit : new FlowFit[] {FlowFit.inward(law), FlowFit.outwardOnIsentrope(law)}) {
                    StageFlow stage = new StageFlow(fit, 1e-5);
                    stage.solve(1.1, scale, free, guess);
                    double u = stage.u();
                    assertEquals(free, 1.1 * u * u + scale * fit.at(u), 1e-9 * free);
                    assertEquals(fit.at(u), stage.psi(), 1e-9 * fit.at(u));
                }
            }
        }
    }
}
