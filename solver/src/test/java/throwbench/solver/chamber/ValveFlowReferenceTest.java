package throwbench.solver.chamber;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Second method: the same equations under an explicit integrator of Commons Math, turn after turn from the suction line's
 * state, against the implicit schemes and their search for the state that repeats.
 */
class ValveFlowReferenceTest {

    private static final int STATIONS = 720;

    private static ReferenceFlow.Turn reference(FlowSample sample, ChamberDuty duty) {
        ReferenceFlow reference = new ReferenceFlow(sample.valves(), duty, 1e-9);
        reference.settle(1e-6);
        return reference.turn(STATIONS);
    }

    private static void same(
            ReferenceFlow.Turn turn, PressureCurve curve, ChamberDuty duty, double pressure, double integral) {
        double[] found = FlowSample.pressures(curve, duty, STATIONS);
        double peak = FlowSample.greatest(turn.pressures());
        for (int i = 0; i < STATIONS; i++) {
            assertEquals(turn.pressures()[i], found[i], pressure * peak, "station " + i);
        }
        assertEquals(peak, FlowSample.greatest(found), pressure * peak);
        double mass = curve.massPerTurn().orElseThrow();
        assertEquals(turn.drawn(), mass, integral * turn.drawn() + 1e-8);
        if (!Double.isNaN(turn.temperature())) {
            double temperature = curve.dischargeTemperature().orElseThrow();
            assertEquals(turn.temperature(), temperature, integral * turn.temperature());
        } else {
            assertTrue(curve.dischargeTemperature().isEmpty());
        }
        ValveLossWork loss = curve.valveLossWork().orElseThrow();
        // as shares of what the gas takes up in a turn
        assertEquals(turn.loss().suction(), loss.suction(), integral * turn.work());
        assertEquals(turn.loss().discharge(), loss.discharge(), integral * turn.work());
        double work = FlowSample.work(FlowSample.pressures(curve, duty, 7200), duty);
        assertEquals(turn.work(), work, integral * turn.work());
    }

    @ParameterizedTest
    @CsvSource({"A,HEAD", "A,CRANK", "B,HEAD", "B,CRANK", "C,HEAD", "C,CRANK", "D,HEAD", "D,CRANK"})
    void workingValvesFollowTheEquations(FlowSample sample, Side side) {
        ChamberDuty duty = sample.duty(side);
        ReferenceFlow.Turn turn = reference(sample, duty);
        same(turn, FlowSample.solved(sample.valves(), duty), duty, 2e-4, 1e-4);
        same(turn, FlowSample.solved(sample.valves(), duty.followed(CycleAccuracy.MAP)), duty, 5e-4, 5e-4);
    }

    @ParameterizedTest
    @CsvSource({
        "A,HEAD,HELD_OPEN,0",
        "D,CRANK,HELD_OPEN,0",
        "A,HEAD,FAILED_SUCTION,3e-4",
        "A,CRANK,FAILED_SUCTION,26e-4",
        "D,HEAD,FAILED_SUCTION,1e-5",
        "A,CRANK,FAILED_DISCHARGE,3e-4",
        "D,HEAD,FAILED_DISCHARGE,2e-3",
        "D,CRANK,FAILED_DISCHARGE,1e-5"
    })
    void leakingValvesFollowTheEquations(FlowSample sample, Side side, ChamberState state, double leakArea) {
        ChamberDuty duty = sample.duty(side, state, leakArea);
        ReferenceFlow.Turn turn = reference(sample, duty);
        same(turn, FlowSample.solved(sample.valves(), duty), duty, 2e-4, 1e-4);
        same(turn, FlowSample.solved(sample.valves(), duty.followed(CycleAccuracy.MAP)), duty, 5e-4, 5e-4);
    }
}
