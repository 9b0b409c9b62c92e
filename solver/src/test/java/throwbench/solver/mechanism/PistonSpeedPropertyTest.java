package throwbench.solver.mechanism;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import throwbench.solver.trial.AnyLinkage;

/** Peaks of the piston's speed for any linkage that turns. */
class PistonSpeedPropertyTest {

    @Property
    void peaksAreMetAndNeverExceeded(@ForAll(supplier = AnyLinkage.class) Linkage linkage, @ForAll Rotation rotation) {
        double omega = 3;
        PistonSpeed speed = PistonSpeed.of(linkage, rotation, omega);
        double size = linkage.crankRadius() * omega;
        Sweep sweep = Sweep.wholeTurn(linkage, rotation, 0, 3600);
        double fastest = Double.NEGATIVE_INFINITY;
        double slowest = Double.POSITIVE_INFINITY;
        for (double slope : sweep.reach1()) {
            fastest = Math.max(fastest, -rotation.sign() * slope * omega);
            slowest = Math.min(slowest, -rotation.sign() * slope * omega);
        }
        assertTrue(speed.inward().velocity() >= fastest - 1e-12 * size, () -> speed + " is exceeded");
        assertTrue(speed.outward().velocity() <= slowest + 1e-12 * size, () -> speed + " is exceeded");
        assertEquals(fastest, speed.inward().velocity(), 1e-3 * size);
        assertEquals(slowest, speed.outward().velocity(), 1e-3 * size);
        Sweep there = Sweep.single(linkage, rotation);
        there.turnTo(speed.inward().crankAngle(), Approach.JUST_AFTER);
        assertEquals(speed.inward().velocity(), -rotation.sign() * there.reach1()[0] * omega, 1e-13 * size);
    }

    /** In line both strokes are alike; the crank turns back through the same places. */
    @Property
    void inLineTheStrokesAreAlike(@ForAll(supplier = AnyLinkage.class) Linkage any, @ForAll Rotation rotation) {
        Linkage linkage = new Linkage(any.crankRadius(), any.rodLength(), 0);
        PistonSpeed speed = PistonSpeed.of(linkage, rotation, 10);
        assertEquals(Angles.TURN - speed.inward().crankAngle(), speed.outward().crankAngle(), 1e-11);
        assertEquals(-speed.inward().velocity(), speed.outward().velocity(), 1e-12 * 10 * linkage.crankRadius());
    }

    /** The mean is the travel of a turn over its time. */
    @Property
    void meanIsTwoStrokesATurn(@ForAll(supplier = AnyLinkage.class) Linkage linkage) {
        double turnsPerSecond = 7;
        double mean = PistonSpeed.mean(linkage, turnsPerSecond * 2 * Math.PI);
        assertEquals(2 * linkage.stroke() * turnsPerSecond, mean, 1e-13 * mean);
    }
}
