package throwbench.solver.revolution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;

/** Sign changes of curves whose answer is known in closed form, the awkward ones above all. */
class SignChangesTest {

    private static final double STATION = Angles.TURN / Trace.STATIONS;

    private static List<SignChange> of(DoubleUnaryOperator curve) {
        return SignChanges.of(Sampled.smooth(curve));
    }

    private static void assertChanges(List<SignChange> found, double tolerance, SignChange... expected) {
        assertEquals(expected.length, found.size(), () -> "" + found);
        for (int i = 0; i < expected.length; i++) {
            assertEquals(expected[i].crankAngle(), found.get(i).crankAngle(), tolerance, () -> "" + found);
            assertEquals(expected[i].toTension(), found.get(i).toTension(), () -> "" + found);
        }
    }

    /** F1 cos φ + F0 = 0 at φ = ± acos(−F0/F1). */
    @ParameterizedTest
    @ValueSource(doubles = {0, 0.3, -0.7, 0.991444861373810, 0.999999})
    void shiftedCosineChangesAtItsArccosine(double shift) {
        double angle = Math.acos(-shift);
        assertChanges(
                of(phi -> 4e4 * (Math.cos(phi) + shift)),
                1e-9,
                new SignChange(angle, false),
                new SignChange(Angles.TURN - angle, true));
    }

    @ParameterizedTest
    @ValueSource(doubles = {1.0000001, 1.5, -1.2})
    void shiftedCosineThatStaysOnOneSideNeverChanges(double shift) {
        assertEquals(List.of(), of(phi -> Math.cos(phi) + shift));
    }

    @ParameterizedTest
    @ValueSource(doubles = {1, 240 * Angles.TURN / 720, 240.5 * Angles.TURN / 720, 0.0001, 6.2831})
    void touchIsNoChange(double touched) {
        assertEquals(List.of(), of(phi -> 1 - Math.cos(phi - touched)));
        assertEquals(List.of(), of(phi -> Math.cos(phi - touched) - 1));
        // and rounding at the touch makes none
        assertEquals(List.of(), of(phi -> 1 - Math.cos(phi - touched) - 1e-14));
    }

    /** A dip of a known width, shorter than the distance of stations: both changes are found, wherever it lies. */
    @ParameterizedTest
    @CsvSource({
        "100.25, 0.4",
        "100, 0.4",
        "100.49, 0.4",
        "100.25, 0.01",
        "77.1, 0.001",
        "0.3, 0.1",
        "0.06, 0.1",
        "359.9, 0.1",
        "179.8, 0.05",
        "180.21, 0.05",
        "180.03, 0.05",
        "359.97, 0.05"
    })
    void pairCloserThanAStationIsFound(double middleDeg, double widthDeg) {
        double middle = Math.toRadians(middleDeg);
        double half = Math.toRadians(widthDeg) / 2;
        double depth = 2 * Math.sin(half / 2) * Math.sin(half / 2); // 1 - cos half
        DoubleUnaryOperator curve = phi -> 2 * Math.pow(Math.sin((phi - middle) / 2), 2) - depth;
        Trace trace = Sampled.of((phi, side) -> curve.applyAsDouble(phi), 0, Math.PI);
        assertChanges(
                SignChanges.of(trace), 1e-9, new SignChange(middle - half, false), new SignChange(middle + half, true));
        Trace over = Sampled.of((phi, side) -> -curve.applyAsDouble(phi), 0, Math.PI);
        assertChanges(
                SignChanges.of(over), 1e-9, new SignChange(middle - half, true), new SignChange(middle + half, false));
    }

    /** A square wave: no value between, each change at its step exactly. */
    @Test
    void stepOverZeroCountsAtTheStepsAngle() {
        double back = 3.3;
        Curve square = (phi, side) -> inside(phi, side, back) ? 5 : -2;
        assertChanges(
                SignChanges.of(Sampled.of(square, 0, back)), 0, new SignChange(0, true), new SignChange(back, false));
    }

    private static boolean inside(double phi, Approach side, double back) {
        double nudge = side == Approach.JUST_AFTER ? 1e-9 : -1e-9;
        return Angles.wrap(phi + nudge) < back;
    }

    /** The curve goes through zero within the last station before a step that takes it back. */
    @ParameterizedTest
    @ValueSource(doubles = {0.2, 0.5, 0.9, 1.7})
    void changeJustBeforeAStepThatUndoesItIsFound(double stations) {
        double step = 2.2;
        double root = step - stations * STATION;
        Curve curve = (phi, side) -> {
            double nudge = side == Approach.JUST_AFTER ? 1e-9 : -1e-9;
            double turned = Angles.wrap(phi + nudge);
            return turned < step ? Math.sin((root - turned + nudge) / 2) : 3 + Math.cos(phi);
        };
        Trace trace = Sampled.of(curve, 0, step);
        assertChanges(SignChanges.of(trace), 1e-9, new SignChange(root, false), new SignChange(step, true));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.2, 0.5, 0.9, 1.7})
    void changeJustAfterAStepThatPreparedItIsFound(double stations) {
        double step = 2.2;
        double root = step + stations * STATION;
        Curve curve = (phi, side) -> {
            double nudge = side == Approach.JUST_AFTER ? 1e-9 : -1e-9;
            double turned = Angles.wrap(phi + nudge);
            return turned < step ? 2 + Math.cos(phi) : Math.sin((turned - nudge - root) / 2);
        };
        Trace trace = Sampled.of(curve, 0, step);
        assertChanges(SignChanges.of(trace), 1e-9, new SignChange(step, false), new SignChange(root, true));
    }

    /** Where a curve rests on zero between two signs the change lies on the rest; between equal signs there is none. */
    @Test
    void restOnZeroIsOneChangeOrNone() {
        DoubleUnaryOperator rests = phi -> phi < 2
                ? Math.sin(phi / 2 * Math.PI)
                : phi < 3 ? 0 : -Math.sin((phi - 3) / 3.283185307179586 * Math.PI);
        List<SignChange> changes =
                SignChanges.of(Sampled.of((phi, side) -> rests.applyAsDouble(Angles.wrap(phi)), 0, 2, 3));
        assertEquals(2, changes.size(), () -> "" + changes);
        SignChange down = changes.get(changes.get(0).toTension() ? 1 : 0);
        assertTrue(down.crankAngle() >= 2 && down.crankAngle() <= 3, () -> "" + changes);
        assertEquals(
                List.of(),
                SignChanges.of(Sampled.of((phi, side) -> Math.abs(rests.applyAsDouble(Angles.wrap(phi))), 0, 2, 3)));
    }

    /** A rest through the seam. */
    @Test
    void restThroughTheSeamIsNoChangeBetweenEqualSigns() {
        DoubleUnaryOperator rests = phi -> Math.max(0, Math.cos(phi - Math.PI) + 0.9);
        double edge = Math.PI - Math.acos(-0.9);
        Trace trace = Sampled.of((phi, side) -> rests.applyAsDouble(phi), 0, edge, Angles.TURN - edge);
        assertEquals(List.of(), SignChanges.of(trace));
    }

    @Test
    void nothingButZeroNeverChanges() {
        assertEquals(List.of(), of(phi -> 0));
    }

    /** Roots on the seam and on stations. */
    @Test
    void sineChangesOnTheSeamAndHalfWayRound() {
        assertChanges(of(Math::sin), 1e-12, new SignChange(0, true), new SignChange(Math.PI, false));
        assertChanges(
                of(phi -> Math.sin(3 * phi)),
                1e-12,
                new SignChange(0, true),
                new SignChange(Math.PI / 3, false),
                new SignChange(2 * Math.PI / 3, true),
                new SignChange(Math.PI, false),
                new SignChange(4 * Math.PI / 3, true),
                new SignChange(5 * Math.PI / 3, false));
    }

    /** Cost is counted, not timed: a change takes a dozen values of the curve at most. */
    @Test
    void changeCostsFewValues() {
        int[] asked = {0};
        Curve counted = (phi, side) -> {
            asked[0]++;
            return Math.cos(phi) + 0.3;
        };
        Trace trace = Sampled.of(counted, 0);
        asked[0] = 0;
        assertEquals(2, SignChanges.of(trace).size());
        assertTrue(asked[0] <= 2 * 12, () -> asked[0] + " values for two changes");
    }
}
