package throwbench.solver.chamber;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import throwbench.solver.fluid.Fluid;
import throwbench.solver.fluid.GasMixture;
import throwbench.solver.fluid.Liquid;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.mechanism.Sweep;

/** States of a chamber, what is said of them, and what is refused. */
class ValveFlowStatesTest {

    private static final double K = 1.29;

    private static LeakyFlow leaky(FlowSample sample, ChamberDuty duty) {
        return new LeakyFlow(sample.valves(), duty, ((PerfectGas) duty.fluid()).gasConstant(), K, 305.15);
    }

    @ParameterizedTest
    @CsvSource({"A,HEAD", "B,CRANK", "C,HEAD", "D,HEAD", "D,CRANK"})
    void theGeneralSchemeFindsTheWorkingChamberToo(FlowSample sample, Side side) {
        // second method: two states on every step instead of one number for the whole turn
        ChamberDuty duty = sample.duty(side);
        PressureCurve special = FlowSample.solved(sample.valves(), duty);
        LeakyFlow general = leaky(sample, duty);
        assertTrue(general.search(1e-8, 20));
        PressureCurve curve = general.curve(List.of());
        double[] expected = FlowSample.pressures(special, duty, 720);
        double[] found = FlowSample.pressures(curve, duty, 720);
        double peak = FlowSample.greatest(expected);
        for (int i = 0; i < 720; i++) {
            assertEquals(expected[i], found[i], 1.5e-4 * peak, "station " + i);
        }
        double mass = special.massPerTurn().orElseThrow();
        assertEquals(mass, curve.massPerTurn().orElseThrow(), 1e-4 * mass);
        assertEquals(special.events().size(), curve.events().size());
        for (ValveEvent event : special.events()) {
            ValveEvent same = curve.events().stream()
                    .filter(other -> other.valve() == event.valve() && other.opens() == event.opens())
                    .findFirst()
                    .orElseThrow();
            double apart = Math.IEEEremainder(same.crankAngle() - event.crankAngle(), 2 * Math.PI);
            assertEquals(0, apart, Math.toRadians(0.05), event.toString());
        }
    }

    @ParameterizedTest
    @EnumSource(FlowSample.class)
    void aFailedSuctionValveThatLeaksLikeItFlowsIsHeldOpen(FlowSample sample) {
        double area = sample.valves().suctionFlowArea();
        ChamberDuty failed = sample.duty(Side.CRANK, ChamberState.FAILED_SUCTION, area);
        ChamberDuty held = sample.duty(Side.CRANK, ChamberState.HELD_OPEN, 0);
        assertArrayEquals(
                FlowSample.pressures(FlowSample.solved(sample.valves(), held), held, 360),
                FlowSample.pressures(FlowSample.solved(sample.valves(), failed), failed, 360),
                1e-6);
    }

    @ParameterizedTest
    @EnumSource(FlowSample.class)
    void aLeakThatVanishesLeavesAWorkingChamber(FlowSample sample) {
        PressureCurve working = FlowSample.solved(sample.valves(), sample.duty(Side.HEAD));
        double mass = working.massPerTurn().orElseThrow();
        for (ChamberState state : List.of(ChamberState.FAILED_SUCTION, ChamberState.FAILED_DISCHARGE)) {
            ChamberDuty duty = sample.duty(Side.HEAD, state, 1e-9);
            double leaking =
                    FlowSample.solved(sample.valves(), duty).massPerTurn().orElseThrow();
            assertEquals(mass, leaking, 1e-4 * mass);
        }
    }

    @ParameterizedTest
    @EnumSource(FlowSample.class)
    void aLeakCostsCapacity(FlowSample sample) {
        double before = FlowSample.solved(sample.valves(), sample.duty(Side.HEAD))
                .massPerTurn()
                .orElseThrow();
        for (ChamberState state : List.of(ChamberState.FAILED_SUCTION, ChamberState.FAILED_DISCHARGE)) {
            double small = massWithLeak(sample, state, 1e-5);
            double large = massWithLeak(sample, state, 1e-4);
            assertTrue(small < before && large < small, state + ": " + before + ", " + small + ", " + large);
        }
    }

    private static double massWithLeak(FlowSample sample, ChamberState state, double leakArea) {
        return FlowSample.solved(sample.valves(), sample.duty(Side.HEAD, state, leakArea))
                .massPerTurn()
                .orElseThrow();
    }

    @ParameterizedTest
    @CsvSource({
        "A,HELD_OPEN,0", "B,HELD_OPEN,0", "C,HELD_OPEN,0", "D,HELD_OPEN,0",
        "A,FAILED_SUCTION,3e-4", "B,FAILED_SUCTION,3e-4", "C,FAILED_SUCTION,3e-4", "D,FAILED_SUCTION,3e-4",
        "A,FAILED_DISCHARGE,3e-4", "B,FAILED_DISCHARGE,3e-4", "C,FAILED_DISCHARGE,3e-4", "D,FAILED_DISCHARGE,3e-4"
    })
    void aLeakingChamberRepeatsAfterTenTurns(FlowSample sample, ChamberState state, double leakArea) {
        for (Side side : Side.values()) {
            LeakyFlow flow = leaky(sample, sample.duty(side, state, leakArea));
            assertTrue(flow.search(1e-8, 10), side + ": " + flow.turns());
        }
    }

    @Test
    void twoRotationsGiveTheSameCycle() {
        ChamberDuty one = FlowSample.D.duty(Side.HEAD);
        ChamberDuty other = new ChamberDuty(
                one.linkage(),
                Rotation.CLOCKWISE,
                one.volume(),
                one.fluid(),
                one.lines(),
                one.condition(),
                one.meanSpeed(),
                0);
        assertArrayEquals(
                FlowSample.pressures(FlowSample.solved(FlowSample.D.valves(), one), one, 360),
                FlowSample.pressures(FlowSample.solved(FlowSample.D.valves(), other), other, 360),
                1e-3);
    }

    @Test
    void aSingleAngleReadsLikeTheWholeTurn() {
        ChamberDuty duty = FlowSample.A.duty(Side.HEAD);
        PressureCurve curve = FlowSample.solved(FlowSample.A.valves(), duty);
        double[] turn = FlowSample.pressures(curve, duty, 720);
        Sweep single = Sweep.single(duty.linkage(), duty.rotation());
        ChamberSweep sweep = new ChamberSweep(single, duty.volume());
        double[] one = new double[1];
        for (int i = 0; i < 720; i++) {
            single.turnTo(i * Math.PI / 360, Approach.JUST_AFTER);
            curve.fill(sweep, one);
            assertEquals(turn[i], one[0], 1e-13 * 1.5e6, "station " + i);
        }
    }

    @Test
    void aDischargeLineBelowTheSuctionLineIsBlownThrough() {
        ChamberDuty sample = FlowSample.A.duty(Side.HEAD);
        ChamberDuty duty = with(sample, sample.fluid(), new LineConditions(5e5, 4.9e5, OptionalDouble.of(305.15)));
        PressureCurve curve = FlowSample.solved(FlowSample.A.valves(), duty);
        // both valves stand open when the piston rests: more passes than the chamber sweeps
        assertTrue(curve.inletVolumePerTurn() > duty.volume().swept());
        assertEquals(4, curve.events().size());
    }

    @Test
    void aStateThatDoesNotRepeatIsAFailureOfTheProgram() {
        ChamberDuty duty = FlowSample.D.duty(Side.HEAD);
        CycleOutcome outcome = FlowValveCycle.solve(FlowSample.D.valves(), duty, (PerfectGas) duty.fluid(), 305.15, 1);
        assertTrue(outcome.failed());
        assertEquals("pressure and mass do not repeat after 1 turns", outcome.refusal());
        assertTrue(outcome.curve().isEmpty());
    }

    @Test
    void whatIsMissingIsSaid() {
        ChamberDuty duty = FlowSample.A.duty(Side.HEAD);
        LineConditions cold = new LineConditions(5e5, 1.2e6, OptionalDouble.empty());
        refused("valve flow needs the stage's suctionTemperature at the duty point", with(duty, duty.fluid(), cold));
        refused(
                "valves of a flow area pass gas, and the stage's fluid is a liquid",
                with(duty, new Liquid(1000, 2.2e9, 2300), duty.lines()));
        refused(
                "a failed valve needs a leakArea above 0",
                FlowSample.A.duty(Side.HEAD, ChamberState.FAILED_SUCTION, 0));
    }

    private static void refused(String sentence, ChamberDuty duty) {
        CycleOutcome outcome = FlowSample.A.valves().solve(duty);
        assertEquals(sentence, outcome.refusal());
        assertFalse(outcome.failed());
        assertTrue(outcome.curve().isEmpty());
    }

    @Test
    void aMixtureFlowsAsThePerfectGasOfItsSuctionTemperature() {
        ChamberDuty sample = FlowSample.A.duty(Side.HEAD);
        GasMixture mixture = new GasMixture(Map.of("methane", 0.62, "carbon dioxide", 0.38), true);
        PerfectGas gas = mixture.perfectAt(305.15).value().orElseThrow();
        PressureCurve mixed = FlowSample.solved(FlowSample.A.valves(), with(sample, mixture, sample.lines()));
        PressureCurve perfect = FlowSample.solved(FlowSample.A.valves(), with(sample, gas, sample.lines()));
        assertEquals(perfect.massPerTurn(), mixed.massPerTurn());
        assertEquals(perfect.dischargeTemperature(), mixed.dischargeTemperature());
        assertEquals(
                List.of("valve flow stays on the perfect gas; the real model changes nothing here"), mixed.notes());
    }

    @Test
    void theJointsSplitAnIntegralWhereItCanBeDone() {
        // the work by Gauss's rule between events and joints, and by very many stations
        ChamberDuty duty = FlowSample.A.duty(Side.HEAD);
        PressureCurve curve = FlowSample.solved(FlowSample.A.valves(), duty);
        Sweep single = Sweep.single(duty.linkage(), duty.rotation());
        ChamberSweep sweep = new ChamberSweep(single, duty.volume());
        double[] breaks = DoubleStream.concat(
                        DoubleStream.of(curve.joints()), curve.events().stream().mapToDouble(ValveEvent::crankAngle))
                .sorted()
                .toArray();
        double work = 0;
        double[] pressure = new double[1];
        for (int i = 0; i < breaks.length; i++) {
            double to = i + 1 < breaks.length ? breaks[i + 1] : breaks[0] + 2 * Math.PI;
            if (to - breaks[i] < 1e-12) {
                continue;
            }
            var rule = new GaussIntegratorFactory().legendre(12, breaks[i], to);
            for (int j = 0; j < rule.getNumberOfPoints(); j++) {
                single.turnTo(rule.getPoint(j), Approach.JUST_AFTER);
                curve.fill(sweep, pressure);
                work -= rule.getWeight(j) * pressure[0] * FlowSample.volumeSlope(duty, rule.getPoint(j));
            }
        }
        double many = FlowSample.work(FlowSample.pressures(curve, duty, 72_000), duty);
        assertEquals(many, work, 1e-6 * many);
    }

    @Test
    void theFlowAllowanceIsNotTakenOffAndThatIsSaid() {
        ChamberDuty duty = FlowSample.A.duty(Side.HEAD);
        ChamberDuty allowed = new ChamberDuty(
                duty.linkage(),
                duty.rotation(),
                duty.volume(),
                duty.fluid(),
                duty.lines(),
                duty.condition(),
                duty.meanSpeed(),
                0.04);
        PressureCurve with = FlowSample.solved(FlowSample.A.valves(), allowed);
        assertEquals(FlowSample.solved(FlowSample.A.valves(), duty).massPerTurn(), with.massPerTurn());
        assertEquals(
                List.of("the flowAllowance is not taken off: the capacity of valve flow is its net suction flow"),
                with.notes());
    }

    private static ChamberDuty with(ChamberDuty duty, Fluid fluid, LineConditions lines) {
        return new ChamberDuty(
                duty.linkage(),
                duty.rotation(),
                duty.volume(),
                fluid,
                lines,
                duty.condition(),
                duty.meanSpeed(),
                duty.flowAllowance());
    }
}
