package throwbench.solver.pump;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import throwbench.solver.chamber.ChamberCondition;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.IdealValves;
import throwbench.solver.chamber.LiquidValves;
import throwbench.solver.chamber.RecordedPressure;
import throwbench.solver.chamber.Side;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.trial.Pumps;

/** Flow in the lines of a pump: identities, and integrals and differences as a second method. */
class ManifoldFlowTest {

    private static final LiquidValves LATE = new LiquidValves(0.1e5, 0.3e5, false, Math.toRadians(6));

    private static RunningMachine triplex(LiquidValves valves) {
        return Pumps.running(Pumps.plungers(5, valves, 0, 120, 240), Pumps.duty(Pumps.WATER));
    }

    private static ManifoldFlow discharge(RunningMachine running) {
        return ManifoldFlow.discharge(running, Pumps.STAGE).value().orElseThrow();
    }

    private static ManifoldFlow suction(RunningMachine running) {
        return ManifoldFlow.suction(running, Pumps.STAGE).value().orElseThrow();
    }

    private static Throw offsetThrow(String name, double phase, double offset) {
        return Pumps.throwOf(
                name,
                phase,
                new Linkage(0.06, 0.27, offset),
                List.of(
                        Pumps.chamber(name + " head", Side.HEAD, 0.07, 0, 0.4, LATE),
                        Pumps.chamber(name + " crank", Side.CRANK, 0.07, 0.03, 0.3, LATE)));
    }

    private static List<RunningMachine> several() {
        List<RunningMachine> all = new ArrayList<>();
        for (Rotation rotation : Rotation.values()) {
            List<Throw> throwsInOrder = List.of(offsetThrow("P1", 0, 0.02), offsetThrow("P2", 70, -0.03));
            all.add(Pumps.running(throwsInOrder, rotation, Pumps.duty(Pumps.WATER)));
        }
        all.add(triplex(LATE));
        return all;
    }

    /** The mean of equally spaced samples comes to the mean by volumes with the first power of the step: the flow steps. */
    @Test
    void meanIsTheIntegralOverTheTurn() {
        for (RunningMachine running : several()) {
            for (ManifoldFlow flow : List.of(discharge(running), suction(running))) {
                double coarse = Math.abs(sampledMean(flow, 1_000) / flow.mean() - 1);
                double fine = Math.abs(sampledMean(flow, 200_000) / flow.mean() - 1);
                assertTrue(coarse < 5e-3 && fine < 2.5e-5, () -> coarse + ", " + fine);
            }
        }
    }

    private static double sampledMean(ManifoldFlow flow, int count) {
        double sum = 0;
        for (int i = 0; i < count; i++) {
            sum += flow.at((i + 0.5) * Angles.TURN / count, Approach.JUST_AFTER);
        }
        return sum / count;
    }

    @Test
    void rateOfChangeIsTheDerivativeByTime() {
        for (RunningMachine running : several()) {
            for (ManifoldFlow flow : List.of(discharge(running), suction(running))) {
                double scale = flow.mean() * running.meanSpeed();
                for (double angle : new double[] {0.9, 1.3, 2.2, 3.5, 4.4, 5.9}) {
                    double h = 1e-5;
                    double slope = (flow.at(angle + h, Approach.JUST_AFTER) - flow.at(angle - h, Approach.JUST_AFTER))
                            / (2 * h);
                    assertEquals(
                            slope * running.meanSpeed(), flow.rateOfChange(angle, Approach.JUST_AFTER), 1e-8 * scale);
                }
            }
        }
    }

    @Test
    void suctionPassesTheCapacity() {
        for (RunningMachine running : several()) {
            double perTurn = running.throwsInOrder().stream()
                    .flatMap(t -> t.curves().stream())
                    .mapToDouble(curve -> curve.inletVolumePerTurn())
                    .sum();
            assertEquals(perTurn * running.turnsPerSecond(), suction(running).mean(), 1e-14);
        }
    }

    @Test
    void lateValveLetsLiquidBack() {
        RunningMachine running = Pumps.running(Pumps.plungers(5, LATE, 0), Pumps.duty(Pumps.WATER));
        ManifoldFlow flow = discharge(running);
        assertEquals(0, flow.at(0, Approach.JUST_AFTER), 1e-12);
        double area = Math.PI / 4 * 0.07 * 0.07;
        double travel = running.throwsInOrder().get(0).body().linkage().travel(LATE.closingLag(), running.rotation());
        double before =
                running.throwsInOrder().get(0).body().linkage().travel(LATE.closingLag() - 1e-6, running.rotation());
        double back = -(travel - before) / 1e-6 * area * running.meanSpeed();
        assertEquals(back, flow.at(LATE.closingLag(), Approach.JUST_BEFORE), 1e-5 * Math.abs(back));
        assertEquals(0, flow.at(LATE.closingLag(), Approach.JUST_AFTER), 0);
        assertEquals(back, flow.extremes().least().value(), 1e-5 * Math.abs(back));
        assertEquals(LATE.closingLag(), flow.extremes().least().crankAngle(), 1e-12);
    }

    @Test
    void compressibleLiquidStepsWhereItsValveOpensLate() {
        RunningMachine running = Pumps.running(Pumps.plungers(5, Pumps.IDEAL, 0), Pumps.duty(Pumps.WATER));
        double opens = running.throwsInOrder().get(0).curves().get(0).events().stream()
                .filter(event -> event.opens() && event.valve().text().equals("discharge"))
                .mapToDouble(event -> event.crankAngle())
                .findFirst()
                .orElseThrow();
        ManifoldFlow flow = discharge(running);
        assertEquals(flow.at(opens, Approach.JUST_AFTER), flow.greatestStep(), 0);
        assertEquals(0, flow.at(opens, Approach.JUST_BEFORE), 0);
        RunningMachine rigid = Pumps.running(Pumps.plungers(5, Pumps.IDEAL, 0), Pumps.duty(Pumps.RIGID));
        assertEquals(0, discharge(rigid).greatestStep(), 1e-12);
    }

    @Test
    void oneSimplexVariesByTheGreatestPistonSpeed() {
        RunningMachine running = Pumps.running(Pumps.plungers(1e6, Pumps.IDEAL, 0), Pumps.duty(Pumps.RIGID));
        FlowVariation variation =
                FlowVariation.ofDelivery(running, Pumps.STAGE).value().orElseThrow();
        // a pure sine over half the turn: greatest over mean is π
        assertEquals(Math.PI, variation.total(), 1e-5);
        assertEquals(1, variation.below(), 1e-12);
        assertEquals(Math.PI - 1, variation.above(), 1e-5);
    }

    @Test
    void heldOpenChamberMovesTheSuctionLineAndDeliversNothing() {
        RunningMachine running = Pumps.running(
                Pumps.plungers(5, Pumps.IDEAL, 0),
                Pumps.duty(Pumps.WATER)
                        .with(Map.of("P1 head", new ChamberCondition(ChamberState.HELD_OPEN, 0, Clearance.NONE))));
        assertEquals(0, suction(running).mean(), 1e-15);
        double inward = suction(running).at(1, Approach.JUST_AFTER);
        assertEquals(-inward, suction(running).at(Angles.TURN - 1, Approach.JUST_AFTER), 1e-12);
        assertEquals(
                "stage lift delivers nothing",
                FlowVariation.ofDelivery(running, Pumps.STAGE).reason());
    }

    @Test
    void gasAndRecordedPressureGiveNoFlow() {
        IdealValves valves = new IdealValves(0, 0, OptionalDouble.empty(), OptionalDouble.empty());
        Pumps.Duty gas = new Pumps.Duty(new PerfectGas(0.029, 1.4), 30, 1e5, 3e5, Pumps.NO_LINE, Map.of());
        assertEquals(
                "the flow over the revolution is told of liquids only, and stage lift holds a gas",
                ManifoldFlow.discharge(Pumps.running(Pumps.plungers(5, valves, 0), gas), Pumps.STAGE)
                        .reason());
        RecordedPressure recorded = new RecordedPressure(
                "x.csv",
                List.of(0.0, 1.0, 2.0, 3.0, 4.0, 5.0, 5.5, 6.0),
                List.of(1e5, 1e5, 1e5, 1e5, 4e5, 4e5, 4e5, 2e5));
        RunningMachine measured = Pumps.running(Pumps.plungers(5, recorded, 0), Pumps.duty(Pumps.WATER));
        assertEquals(
                "the pressure of P1 head is recorded, so what it passes is not known",
                ManifoldFlow.suction(measured, Pumps.STAGE).reason());
        assertTrue(VolumetricEfficiency.ofStage(measured, Pumps.STAGE).isEmpty());
        assertTrue(VolumetricEfficiency.ofChamber(measured.throwsInOrder().get(0), 0)
                .isEmpty());
    }
}
