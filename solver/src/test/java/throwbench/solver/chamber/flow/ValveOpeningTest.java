package throwbench.solver.chamber.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;

/** One suction stroke of the head end of a chamber of 0.0804 m², 0.15 m stroke and 14 % clearance. */
class ValveOpeningTest {

    private static final Linkage LINKAGE = new Linkage(0.075, 0.4, 0);
    private static final double AREA = 0.0804;
    private static final double CLEARANCE = 0.14 * AREA * 0.15;

    private static ValveOpening opening(double scale, double longestDegrees) {
        PistonPath path = new PistonPath(LINKAGE, Rotation.COUNTER_CLOCKWISE, CLEARANCE, AREA);
        StepRule rule = new StepRule(Math.toRadians(longestDegrees), 1e-5, 1, 1 + longestDegrees / 4, 1e-5);
        ValveOpening opening = new ValveOpening(path, new FlowFunction(1.29), true, rule);
        opening.run(Math.toRadians(40), scale);
        return opening;
    }

    @ParameterizedTest
    @CsvSource({"0.0003", "0.002", "0.01", "0.05"})
    void theErrorFallsWithTheSquareOfTheStep(double scale) {
        ValveOpening fine = opening(scale, 0.02);
        double coarse = Math.abs(opening(scale, 2).lostVolume() - fine.lostVolume());
        double finer = Math.abs(opening(scale, 0.5).lostVolume() - fine.lostVolume());
        // a quarter of the step: a sixteenth of the error, less what the kink at the opening leaves
        assertTrue(finer < coarse / 8, scale + ": " + coarse + ", " + finer);
    }

    @ParameterizedTest
    @CsvSource({"0.0003", "0.002", "0.01", "0.05", "5"})
    void whatFlowedInIsWhatTheEnergyInTheChamberTells(double scale) {
        // d(pV)/(k−1) = k/(k−1) R T_s dm − p dV between the two angles at which p = p_s
        ValveOpening opening = opening(scale, 1);
        double opened = CLEARANCE + AREA * LINKAGE.travel(Math.toRadians(40), Rotation.COUNTER_CLOCKWISE);
        double drawn = opening.shutVolume() - opened - 0.29 / 1.29 * opening.lostVolume();
        assertEquals(drawn, opening.flow(), 1e-5 * drawn);
    }

    @Test
    void aGenerousValveShutsAtTheDeadCentre() {
        assertEquals(Math.PI, opening(5, 1).shutAngle(), 1e-5);
        assertEquals(Math.PI, opening(5, 4).shutAngle(), 1e-5);
    }

    @Test
    void aNarrowValveShutsWhereTheGasIsBackOnItsIsentrope() {
        // hardly anything enters: V at shutting is V at opening
        ValveOpening opening = opening(1e-11, 1);
        double opened = CLEARANCE + AREA * LINKAGE.travel(Math.toRadians(40), Rotation.COUNTER_CLOCKWISE);
        assertEquals(opened, opening.shutVolume(), 1e-6 * opened);
        assertEquals(Math.toRadians(320), opening.shutAngle(), 1e-6);
    }
}
