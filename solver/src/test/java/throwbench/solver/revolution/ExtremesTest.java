package throwbench.solver.revolution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;

/** Extremes of curves whose answer is known. */
class ExtremesTest {

    /** Tops anywhere between stations, on them, and on either side of the seam. */
    @ParameterizedTest
    @ValueSource(doubles = {0, 1, 2.5, Math.PI, 0.0001, 0.004, 0.0086, 6.2831, 6.2790, 6.2745})
    void cosineHasItsTopWhereItIsShifted(double top) {
        Extremes extremes = Extremes.of(Sampled.smooth(phi -> 7 * Math.cos(phi - top) + 2));
        assertEquals(9, extremes.greatest().value(), 1e-14);
        assertEquals(-5, extremes.least().value(), 1e-14);
        assertAngle(top, extremes.greatest().crankAngle());
        assertAngle(top + Math.PI, extremes.least().crankAngle());
    }

    private static void assertAngle(double expected, double found) {
        assertEquals(1, Math.cos(expected - found), 1e-14);
        assertEquals(0, Math.sin(expected - found), 1e-7);
    }

    /** Of two tops that differ by less than what stations tell apart the higher one is taken. */
    @Test
    void higherOfTwoNearlyEqualTopsIsTaken() {
        double first = 100 * Angles.TURN / 720; // on a station
        double second = 500.5 * Angles.TURN / 720; // between two: its samples are the lower ones
        DoubleUnaryOperator curve = phi ->
                Math.exp(-40 * (1 - Math.cos(phi - first))) + (1 + 1e-7) * Math.exp(-40 * (1 - Math.cos(phi - second)));
        Extreme top = Extremes.of(Sampled.smooth(curve)).greatest();
        assertEquals(1 + 1e-7, top.value(), 1e-12);
        assertAngle(second, top.crankAngle());
    }

    @ParameterizedTest
    @ValueSource(doubles = {1.234, 2, 0.003, 6.28})
    void kinkIsAnExtremeAtItsAngleExactly(double kink) {
        Trace trace = Sampled.of((phi, side) -> -Math.abs(Math.sin((phi - kink) / 2)), 0, kink);
        Extreme top = Extremes.of(trace).greatest();
        assertEquals(0, top.value(), 1e-300);
        assertEquals(kink, top.crankAngle());
    }

    @Test
    void bothSidesOfAStepAreLookedAt() {
        double step = 2.2;
        Curve saw = (phi, side) -> {
            double nudge = side == Approach.JUST_AFTER ? 1e-9 : -1e-9;
            return Angles.wrap(phi - step + nudge) - nudge;
        };
        Extremes extremes = Extremes.of(Sampled.of(saw, 0, step));
        assertEquals(new Extreme(Angles.TURN, step), rounded(extremes.greatest()));
        assertEquals(new Extreme(0, step), rounded(extremes.least()));
    }

    private static Extreme rounded(Extreme extreme) {
        return new Extreme(
                Math.abs(extreme.value() - Angles.TURN) < 1e-8
                        ? Angles.TURN
                        : Math.abs(extreme.value()) < 1e-8 ? 0 : extreme.value(),
                extreme.crankAngle());
    }

    /** A top inside the first or last station of a smooth stretch. */
    @ParameterizedTest
    @ValueSource(doubles = {-0.008, -0.004, -0.0005, 0.0005, 0.004, 0.008})
    void topBesideABreakIsFound(double away) {
        double bend = 2.2;
        double top = bend + away;
        Curve curve = (phi, side) -> {
            boolean onTopsSide = away > 0 == phi > bend;
            double low = Math.abs(Math.sin((phi - bend) / 2));
            // joins at the bend; only on one side of it the curve has its top
            return Math.cos(phi - top) - (onTopsSide ? 0 : low);
        };
        Extreme found = Extremes.of(Sampled.of(curve, 0, bend)).greatest();
        assertEquals(1, found.value(), 1e-12);
        assertAngle(top, found.crankAngle());
    }

    @Test
    void levelCurveIsItsOwnExtreme() {
        Extremes extremes = Extremes.of(Sampled.smooth(phi -> -3));
        assertEquals(-3, extremes.greatest().value());
        assertEquals(-3, extremes.least().value());
    }

    @Test
    void traceWithoutABreakAtItsSeamIsRefused() {
        IllegalArgumentException refused =
                assertThrows(IllegalArgumentException.class, () -> Sampled.of((phi, side) -> phi, 1.5));
        assertEquals("angle 0 is not among the breaks [1.5]", refused.getMessage());
    }
}
