package throwbench.solver.mechanism;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Wrapping, refusals, dead centres and the arcsine that stands in for the library's. */
class AnglesTest {

    @ParameterizedTest
    @CsvSource({"0, 0", "1, 1", "-1, 5.283185307179586", "6.283185307179586, 0", "7, 0.7168146928204138", "-1e-18, 0"})
    void anglesAreTakenIntoOneTurn(double angle, double wrapped) {
        assertEquals(wrapped, Angles.wrap(angle), 1e-15);
        assertTrue(Angles.wrap(angle) >= 0 && Angles.wrap(angle) < Angles.TURN);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.05, 0.2, 1.0 / 3, 0.4999, 0.5, 0.51, 0.9, 0.999999})
    void arcsineOfManyIsTheLibrarys(double greatest) {
        double[] sines = new double[1001];
        for (int i = 0; i < sines.length; i++) {
            sines[i] = greatest * (i - 500) / 500;
        }
        double[] angles = new double[sines.length];
        ArcSine.fill(sines, angles, greatest);
        for (int i = 0; i < sines.length; i++) {
            assertEquals(Math.asin(sines[i]), angles[i], 2 * Math.ulp(Math.asin(sines[i])), "asin " + sines[i]);
        }
    }

    @Test
    void linkageThatDoesNotTurnIsRefusedWithItsThreeNumbers() {
        IllegalArgumentException refused =
                assertThrows(IllegalArgumentException.class, () -> new Linkage(0.1, 0.3, -0.2));
        assertEquals("does not turn: r = 0.1 m, l = 0.3 m, e = -0.2 m; l - r must exceed |e|", refused.getMessage());
        assertThrows(IllegalArgumentException.class, () -> new Linkage(Double.NaN, 0.3, 0));
        assertThrows(IllegalArgumentException.class, () -> new Linkage(0.1, Double.NaN, 0));
        assertThrows(IllegalArgumentException.class, () -> new Linkage(0.1, 0.3, Double.NaN));
        assertThrows(IllegalArgumentException.class, () -> new Linkage(0, 0.3, 0));
    }

    @Test
    void travelOutsideTheStrokeIsRefused() {
        Linkage linkage = new Linkage(0.1, 0.3, 0);
        IllegalArgumentException refused =
                assertThrows(IllegalArgumentException.class, () -> linkage.anglesAtTravel(0.21, Rotation.CLOCKWISE));
        assertEquals("travel 0.21 m is outside the stroke of 0.2 m", refused.getMessage());
        assertThrows(IllegalArgumentException.class, () -> linkage.anglesAtTravel(-1e-9, Rotation.CLOCKWISE));
    }

    @Test
    void wholeTurnDoesNotTurn() {
        Sweep turn = Sweep.wholeTurn(new Linkage(0.1, 0.3, 0), Rotation.CLOCKWISE, 0, 8);
        assertThrows(IllegalStateException.class, () -> turn.turnTo(1, Approach.JUST_AFTER));
    }

    /** A dead centre belongs to the stroke that begins there; a hair's breadth beside it counts as it. */
    @ParameterizedTest
    @ValueSource(doubles = {0, 0.03, -0.1})
    void deadCentreBelongsToTheStrokeThatBeginsThere(double offset) {
        Linkage linkage = new Linkage(0.1, 0.3, offset);
        double crankEnd = linkage.crankEndDeadCentre(Rotation.CLOCKWISE);
        assertEquals(true, inward(linkage, 0, Approach.JUST_AFTER));
        assertEquals(true, inward(linkage, -5e-10, Approach.JUST_AFTER));
        assertEquals(false, inward(linkage, 0, Approach.JUST_BEFORE));
        assertEquals(false, inward(linkage, 5e-10, Approach.JUST_BEFORE));
        assertEquals(false, inward(linkage, crankEnd, Approach.JUST_AFTER));
        assertEquals(false, inward(linkage, crankEnd - 5e-10, Approach.JUST_AFTER));
        assertEquals(true, inward(linkage, crankEnd, Approach.JUST_BEFORE));
        assertEquals(true, inward(linkage, crankEnd - 2e-9, Approach.JUST_AFTER));
        assertEquals(false, inward(linkage, -2e-9, Approach.JUST_AFTER));
        assertEquals(true, inward(linkage, 4 * Math.PI, Approach.JUST_AFTER));
    }

    private static boolean inward(Linkage linkage, double angle, Approach approach) {
        Sweep sweep = Sweep.single(linkage, Rotation.CLOCKWISE);
        sweep.turnTo(angle, approach);
        assertEquals(1, sweep.strokes().count());
        return sweep.strokes().inward(0);
    }
}
