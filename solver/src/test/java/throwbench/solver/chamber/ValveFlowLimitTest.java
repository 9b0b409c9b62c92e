package throwbench.solver.chamber;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import throwbench.solver.fluid.PerfectGas;

/** Limits in closed form: generous valves at low speed, a chamber that reaches neither line, a nearly closed valve. */
class ValveFlowLimitTest {

    private static ChamberDuty at(ChamberDuty duty, double speed) {
        return new ChamberDuty(
                duty.linkage(),
                duty.rotation(),
                duty.volume(),
                duty.fluid(),
                duty.lines(),
                duty.condition(),
                speed,
                duty.flowAllowance());
    }

    @ParameterizedTest
    @EnumSource(Side.class)
    void generousValvesAtLowSpeedAreIdeal(Side side) {
        ChamberDuty duty = at(FlowSample.A.duty(side), 1);
        PressureCurve flow = FlowSample.solved(new FlowValves(0.05, 0.05), duty);
        PressureCurve ideal =
                FlowSample.solved(new IdealValves(0, 0, OptionalDouble.empty(), OptionalDouble.empty()), duty);
        double[] found = FlowSample.pressures(flow, duty, 720);
        double[] expected = FlowSample.pressures(ideal, duty, 720);
        for (int i = 0; i < found.length; i++) {
            assertEquals(expected[i], found[i], 1e-6 * 1.25e6, "station " + i);
        }
        double mass = ideal.massPerTurn().orElseThrow();
        assertEquals(mass, flow.massPerTurn().orElseThrow(), 1e-6 * mass);
        assertEquals(
                ideal.dischargeTemperature().orElseThrow(),
                flow.dischargeTemperature().orElseThrow(),
                1e-3);
        for (ValveEvent event : ideal.events()) {
            ValveEvent same = flow.events().stream()
                    .filter(other -> other.valve() == event.valve() && other.opens() == event.opens())
                    .findFirst()
                    .orElseThrow();
            double apart = Math.IEEEremainder(same.crankAngle() - event.crankAngle(), 2 * Math.PI);
            assertEquals(0, apart, 1e-5, event.toString());
        }
        ValveLossWork loss = flow.valveLossWork().orElseThrow();
        assertEquals(0, loss.suction() + loss.discharge(), 1e-2);
    }

    @Test
    void aChamberThatDoesNotReachTheDischargeLineBreathes() {
        ChamberDuty sample = FlowSample.A.duty(Side.CRANK);
        ChamberVolume volume = sample.volume();
        ChamberDuty duty = new ChamberDuty(
                sample.linkage(),
                sample.rotation(),
                new ChamberVolume(Side.CRANK, volume.area(), volume.stroke(), 1.1 * volume.swept()),
                sample.fluid(),
                sample.lines(),
                sample.condition(),
                sample.meanSpeed(),
                0.05);
        PressureCurve curve = FlowSample.solved(FlowSample.A.valves(), duty);
        double[] found = FlowSample.pressures(curve, duty, 360);
        for (int i = 0; i < 360; i++) {
            double v = duty.volume().at(duty.linkage().travel(Math.toRadians(i), duty.rotation()));
            double isentrope =
                    duty.lines().suctionPressure() * Math.pow(duty.volume().greatest() / v, 1.29);
            assertEquals(isentrope, found[i], 1e-9 * isentrope);
        }
        assertEquals(0, curve.massPerTurn().orElseThrow());
        assertEquals(0, curve.inletVolumePerTurn());
        assertEquals(OptionalDouble.empty(), curve.dischargeTemperature());
        assertEquals(List.of(), curve.events());
        assertEquals(new ValveLossWork(0, 0), curve.valveLossWork().orElseThrow());
        assertEquals(
                "no valve opens: the gas trapped in the clearance is compressed and expands again, nothing is delivered",
                curve.notes().get(1));
    }

    @Test
    void aHeldOpenValveLosesWhatAnOrificeLoses() {
        // Bernoulli: |p − p_s| = ½ ρ (ω V′/A_e)², good to a few times 1 − p/p_s = 1e-3
        ChamberDuty duty = FlowSample.C.duty(Side.HEAD, ChamberState.HELD_OPEN, 0);
        PressureCurve curve = FlowSample.solved(FlowSample.C.valves(), duty);
        double[] found = FlowSample.pressures(curve, duty, 72);
        double line = duty.lines().suctionPressure();
        double density = line / (((PerfectGas) duty.fluid()).gasConstant() * 305.15);
        for (int i = 0; i < 72; i++) {
            double velocity = duty.meanSpeed()
                    * FlowSample.volumeSlope(duty, Math.toRadians(5 * i))
                    / FlowSample.C.valves().suctionFlowArea();
            double loss = Math.copySign(density / 2 * velocity * velocity, velocity);
            assertEquals(line - loss, found[i], 0.01 * 420, "at " + 5 * i);
        }
        assertEquals(0, curve.massPerTurn().orElseThrow());
        assertEquals(List.of(), curve.events());
        assertEquals(OptionalDouble.empty(), curve.dischargeTemperature());
    }
}
