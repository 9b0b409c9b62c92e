package throwbench.solver.chamber;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.mechanism.Sweep;

/** Recorded pressures: rows, the smooth curve between them, and what is refused. */
class RecordedPressureTest {

    private static double smooth(double angle) {
        return 6e5 + 4e5 * Math.cos(angle - 0.3) + 5e4 * Math.sin(2 * angle);
    }

    private static RecordedPressure sampled(DoubleUnaryOperator pressure, int rows, double first) {
        List<Double> angles = new ArrayList<>();
        List<Double> pressures = new ArrayList<>();
        for (int i = 0; i < rows; i++) {
            angles.add(first + i * Angles.TURN / rows);
            pressures.add(pressure.applyAsDouble(first + i * Angles.TURN / rows));
        }
        return new RecordedPressure("a.csv", angles, pressures);
    }

    private static double[] filled(RecordedPressure recorded, double start, int count) {
        Linkage linkage = new Linkage(0.06, 0.3, 0);
        Sweep turn = Sweep.wholeTurn(linkage, Rotation.COUNTER_CLOCKWISE, start, count);
        double[] pressures = new double[count];
        ChamberSweep sweep = new ChamberSweep(turn, new ChamberVolume(Side.HEAD, 0.01, linkage.stroke(), 0));
        PressureCurve curve = recorded.solveAlone(ChamberCondition.WORKING)
                .orElseThrow()
                .curve()
                .orElseThrow();
        curve.fill(sweep, pressures);
        return pressures;
    }

    @Test
    void stationsOnRowsHaveTheirPressures() {
        RecordedPressure recorded = sampled(RecordedPressureTest::smooth, 90, 0);
        double[] pressures = filled(recorded, 0, 360);
        for (int i = 0; i < 90; i++) {
            // both angles are 4° i, rounded apart
            assertEquals(recorded.pressures().get(i), pressures[4 * i], 1e-8);
        }
    }

    @Test
    void lastRowJoinsTheFirst() {
        RecordedPressure recorded = sampled(RecordedPressureTest::smooth, 24, 0.2);
        double[] pressures = filled(recorded, 0, 3600);
        double greatestStep = 0;
        for (int i = 0; i < 3600; i++) {
            greatestStep = Math.max(greatestStep, Math.abs(pressures[i] - pressures[(i + 1) % 3600]));
        }
        assertEquals(4.9e5 * Angles.TURN / 3600, greatestStep, 0.05 * 4.9e5 * Angles.TURN / 3600);
    }

    /** Slopes are exact to second order, but set to 0 beside a top: a curve of third order but there, second at the tops. */
    @Test
    void errorFallsWithTheSquareOfTheSteps() {
        double coarse = error(60);
        double fine = error(120);
        assertTrue(coarse / fine > 3.5 && coarse / fine < 4.5, () -> coarse + " and " + fine);
        assertTrue(fine < 1e-3 * 4.5e5, () -> "error " + fine);
    }

    /** The greatest error wherever the tops stand between the rows. */
    private static double error(int rows) {
        double greatest = 0;
        for (int shift = 0; shift < 10; shift++) {
            double first = shift * Angles.TURN / rows / 10;
            double[] pressures = filled(sampled(RecordedPressureTest::smooth, rows, first), 0, 3600);
            for (int i = 0; i < 3600; i++) {
                double exact = smooth(i * Angles.TURN / 3600);
                greatest = Math.max(greatest, Math.abs(pressures[i] - exact));
            }
        }
        return greatest;
    }

    @Test
    void nothingIsKnownOfItsValves() {
        RecordedPressure recorded = sampled(RecordedPressureTest::smooth, 8, 0.2);
        PressureCurve curve = recorded.solveAlone(ChamberCondition.WORKING)
                .orElseThrow()
                .curve()
                .orElseThrow();
        assertFalse(curve.flowKnown());
        assertEquals(List.of(), curve.events());
        assertTrue(curve.massPerTurn().isEmpty() && curve.dischargeTemperature().isEmpty());
        assertEquals(
                List.of(
                        "the pressure is recorded: valve events, capacity, volume flow and discharge temperature are not"
                                + " known"),
                curve.notes());
        double[] rows =
                recorded.crankAngles().stream().mapToDouble(Double::doubleValue).toArray();
        assertArrayEquals(rows, curve.joints(), 0);
    }

    @Test
    void statesAndPocketsAreRefused() {
        RecordedPressure recorded = sampled(RecordedPressureTest::smooth, 8, 0);
        assertEquals(
                "a recorded pressure cannot be had held-open: it is what was measured",
                recorded.solveAlone(new ChamberCondition(ChamberState.HELD_OPEN, 0, Clearance.NONE))
                        .orElseThrow()
                        .refusal());
        assertEquals(
                "a recorded pressure does not follow an addedClearance: it is what was measured",
                recorded.solveAlone(new ChamberCondition(ChamberState.WORKING, 0, new Clearance(0.1, true)))
                        .orElseThrow()
                        .refusal());
    }

    @Test
    void tablesThatAreNoneAreRefused() {
        RecordedPressure good = sampled(RecordedPressureTest::smooth, 8, 0);
        List<Double> pressures = good.pressures();
        assertRefused(good.crankAngles().subList(0, 7), pressures.subList(0, 7), "7 crank angles and 7 pressures");
        assertRefused(good.crankAngles(), pressures.subList(0, 7), "8 crank angles and 7 pressures");
        assertRefused(
                changed(good.crankAngles(), 3, good.crankAngles().get(2)),
                pressures,
                "row 3: 1.5707963267948966 rad, " + pressures.get(3) + " Pa");
        assertRefused(changed(good.crankAngles(), 7, 6.3), pressures, "row 7: 6.3 rad, " + pressures.get(7) + " Pa");
        assertRefused(good.crankAngles(), changed(pressures, 0, 0), "row 0: 0.0 rad, 0.0 Pa");
        assertRefused(good.crankAngles(), changed(pressures, 0, Double.NaN), "row 0: 0.0 rad, NaN Pa");
    }

    private static List<Double> changed(List<Double> list, int index, double value) {
        List<Double> copy = new ArrayList<>(list);
        copy.set(index, value);
        return copy;
    }

    private static void assertRefused(List<Double> angles, List<Double> pressures, String message) {
        assertEquals(
                message,
                assertThrows(IllegalArgumentException.class, () -> new RecordedPressure("a.csv", angles, pressures))
                        .getMessage());
    }
}
