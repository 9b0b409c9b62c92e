package throwbench.solver.load;

import static org.junit.jupiter.api.Assertions.assertEquals;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import throwbench.solver.trial.AnyMovingThrow;
import throwbench.solver.trial.MovingThrow;

/**
 * Every force against an independent formulation: three rigid bodies with Lagrange multipliers, for any geometry, both
 * rotations, gravity, friction and changing speed.
 */
class MultibodyPropertyTest {

    @Property
    void pinsGuideAndTorqueAreThoseOfTiedBodies(@ForAll(supplier = AnyMovingThrow.class) MovingThrow at) {
        MultibodyThrow free = new MultibodyThrow(at);
        ThrowForces f = at.solve().forces();
        double peak = peak(at);
        double tolerance = 1e-9 * peak;
        assertEquals(free.crossheadPinX(), f.crossheadPinX()[0], tolerance, "crosshead pin x");
        assertEquals(free.crossheadPinY(), f.crossheadPinY()[0], tolerance, "crosshead pin y");
        assertEquals(free.crankPinX(), f.crankPinX()[0], tolerance, "crank pin x");
        assertEquals(free.crankPinY(), f.crankPinY()[0], tolerance, "crank pin y");
        assertEquals(free.mainBearingX(), f.mainBearingX()[0], tolerance, "main bearing x");
        assertEquals(free.mainBearingY(), f.mainBearingY()[0], tolerance, "main bearing y");
        assertEquals(free.guide(), f.guideForce()[0], tolerance, "guide");
        assertEquals(
                free.torque(), f.torque()[0], tolerance * at.body().linkage().crankRadius(), "torque");
    }

    /** The greatest crosshead pin force of the revolution, at 36 angles. */
    private static double peak(MovingThrow at) {
        double peak = 0;
        for (int i = 0; i < 36; i++) {
            ThrowForces f = at.at(Math.PI / 18 * i).solve().forces();
            peak = Math.max(peak, Math.hypot(f.crossheadPinX()[0], f.crossheadPinY()[0]));
        }
        return peak;
    }
}
