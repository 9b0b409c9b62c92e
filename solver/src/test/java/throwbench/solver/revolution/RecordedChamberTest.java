package throwbench.solver.revolution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import throwbench.solver.chamber.ChamberCondition;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.RecordedPressure;
import throwbench.solver.chamber.Side;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.trial.Pumps;

/** A machine one of whose chambers has a measured pressure. */
class RecordedChamberTest {

    private static final double BORE = 0.07;
    private static final Linkage LINKAGE = new Linkage(0.06, 0.28, 0.01);

    /** 8 uneven rows and more: nothing about them is smooth. */
    private static RecordedPressure recorded(int rows) {
        List<Double> angles = new ArrayList<>();
        List<Double> pressures = new ArrayList<>();
        for (int i = 0; i < rows; i++) {
            angles.add((i + 0.3 * Math.sin(i)) * 6.2 / rows + 0.02);
            pressures.add(2e5 + 1.8e6 * (0.5 + 0.5 * Math.sin(angles.get(i) + 2)) + 1e5 * Math.sin(7.0 * i));
        }
        return new RecordedPressure("head.csv", angles, pressures);
    }

    private static Chamber measured(RecordedPressure recorded, Optional<String> stage) {
        return new Chamber("measured", Side.HEAD, stage, BORE, 0, Clearance.NONE, recorded, 0, Limits.NONE);
    }

    private static RunningMachine running(Chamber... chambers) {
        Throw t = Pumps.throwOf("A", 0, LINKAGE, List.of(chambers));
        return Pumps.running(List.of(t), Pumps.duty(Pumps.WATER));
    }

    @Test
    void itNeedsNeitherStageNorClearance() {
        RecordedPressure recorded = recorded(40);
        RunningMachine running = running(measured(recorded, Optional.empty()));
        Instant instant = new Instant(running, 0).turnTo(recorded.crankAngles().get(7));
        assertEquals(recorded.pressures().get(7), instant.pressure(0, 0), 1e-7);
        double area = Math.PI / 4 * BORE * BORE;
        double frame = running.machine().site().framePressure();
        assertEquals((frame - recorded.pressures().get(7)) * area, instant.at(Column.GAS_LOAD), 1e-9);
    }

    /** Simpson's rule between the rows, where the integrand is a cubic times a smooth speed: a second method. */
    @Test
    void powerIsTheIntegralOfTheMeasuredPressure() {
        for (int rows : new int[] {8, 40, 360}) {
            RecordedPressure recorded = recorded(rows);
            RunningMachine running = running(measured(recorded, Optional.empty()));
            Instant instant = new Instant(running, 0);
            double area = Math.PI / 4 * BORE * BORE;
            double work = 0;
            for (int k = 0; k < rows; k++) {
                double from = recorded.crankAngles().get(k);
                double to = recorded.crankAngles().get((k + 1) % rows) + (k + 1 == rows ? Angles.TURN : 0);
                int parts = 2 * Math.max(4, 8000 / rows);
                for (int i = 0; i <= parts; i++) {
                    double weight = i == 0 || i == parts ? 1 : i % 2 == 1 ? 4 : 2;
                    instant.turnTo(from + i * (to - from) / parts);
                    double rate = instant.at(Column.VELOCITY) / running.meanSpeed();
                    work -= weight / 3 * (to - from) / parts * instant.pressure(0, 0) * area * rate;
                }
            }
            Summary summary = Summary.of(running, 0, Optional.empty());
            double expected = work * running.turnsPerSecond();
            assertEquals(expected, summary.throwFlow().totalPower(), 1e-9 * 400);
            assertEquals(Map.of(), summary.throwFlow().indicatedPower());
        }
    }

    @Test
    void torqueTakesUpThePower() {
        RunningMachine running = running(measured(recorded(40), Optional.empty()));
        Summary summary = Summary.of(running, 0, Optional.empty());
        double power = summary.meanShaftTorque() * running.meanSpeed();
        assertEquals(summary.machineFlow().totalPower(), power, 1e-9 * 400);
    }

    @Test
    void flowOfItsStageIsNotKnownAndSaidSo() {
        RunningMachine running = running(
                measured(recorded(40), Optional.of(Pumps.STAGE)),
                Pumps.chamber("pumped", Side.CRANK, BORE, 0.02, 0.3, Pumps.IDEAL));
        Summary summary = Summary.of(running, 0, Optional.empty());
        assertEquals(
                Map.of(Pumps.STAGE, OptionalDouble.empty()), summary.throwFlow().inletVolume());
        assertEquals(
                Map.of(Pumps.STAGE, OptionalDouble.empty()), summary.throwFlow().capacity());
        assertTrue(summary.notes()
                .contains("measured: the pressure is recorded: valve events, capacity, volume flow and discharge"
                        + " temperature are not known"));
    }

    @Test
    void otherCyclesWithoutAStageAreRefused() {
        Chamber loose = new Chamber(
                "loose", Side.HEAD, Optional.empty(), BORE, 0, new Clearance(0.2, true), Pumps.IDEAL, 0, Limits.NONE);
        assertRefused(loose, ChamberCondition.WORKING, "a liquid cycle needs a stage");
    }

    @Test
    void heldOpenIsRefused() {
        assertRefused(
                measured(recorded(8), Optional.empty()),
                new ChamberCondition(ChamberState.HELD_OPEN, 0, Clearance.NONE),
                "a recorded pressure cannot be had held-open: it is what was measured");
    }

    private static void assertRefused(Chamber chamber, ChamberCondition condition, String sentence) {
        Throw t = Pumps.throwOf("A", 0, LINKAGE, List.of(chamber));
        Machine machine = Pumps.machine(
                List.of(t),
                Rotation.COUNTER_CLOCKWISE,
                Pumps.duty(Pumps.WATER).with(Map.of(chamber.name(), condition)));
        assertEquals(
                List.of(new Refusal("throws[0].chambers[0].cycle", sentence)),
                RunningMachine.settle(machine, machine.dutyPoints().get(0)).refusals());
    }
}
