package throwbench.solver.load;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import org.dyn4j.dynamics.Body;
import org.dyn4j.dynamics.Settings;
import org.dyn4j.dynamics.joint.PrismaticJoint;
import org.dyn4j.dynamics.joint.RevoluteJoint;
import org.dyn4j.geometry.Mass;
import org.dyn4j.geometry.Vector2;
import org.dyn4j.world.World;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.trial.MovingThrow;

/** A general rigid-body engine (dyn4j 5.0.2), which knows nothing of our formulas, must converge to our joint forces. */
class RigidBodyEngineTest {

    private static final double SPEED = 900 * Math.PI / 30;
    private static final double START = 0.3;

    @ParameterizedTest
    @CsvSource({
        "0, COUNTER_CLOCKWISE",
        "0, CLOCKWISE",
        "0.06, COUNTER_CLOCKWISE",
        "0.06, CLOCKWISE",
        "-0.035, COUNTER_CLOCKWISE",
    })
    void engineConvergesToOurForces(double offset, Rotation rotation) {
        Errors coarse = new Engine(offset, rotation, 4e-5).turnOnce();
        Errors fine = new Engine(offset, rotation, 1e-5).turnOnce();
        assertTrue(fine.crankPin < 2e-3, () -> "crank pin at 1e-5 s: " + fine.crankPin);
        assertTrue(fine.crossheadPin < 2e-3, () -> "crosshead pin at 1e-5 s: " + fine.crossheadPin);
        assertTrue(fine.guide < 2e-3, () -> "guide at 1e-5 s: " + fine.guide);
        String why = "first order: a quarter of the step, a quarter of the error";
        assertEquals(4.0, coarse.crankPin / fine.crankPin, 0.1, why);
        assertEquals(4.0, coarse.crossheadPin / fine.crossheadPin, 0.1, why);
        assertEquals(4.0, coarse.guide / fine.guide, 0.1, why);
    }

    /** Largest errors of a turn, each as a share of the largest force of its kind. */
    private record Errors(double crankPin, double crossheadPin, double guide) {}

    /** The throw as bodies and joints of the engine. */
    private static final class Engine {

        private final MovingThrow at;
        private final double dt;
        private final World<Body> world = new World<>();
        private final Body slider = new Body();
        private final RevoluteJoint<Body> pin;
        private final RevoluteJoint<Body> wrist;
        private final PrismaticJoint<Body> guide;

        Engine(double offset, Rotation rotation, double dt) {
            this.dt = dt;
            ThrowBody body = ThrowBody.of(
                    new Linkage(0.1, 0.5, offset),
                    new ReciprocatingMasses(7, 2, 3),
                    new ConnectingRod(8, OptionalDouble.of(0.32), OptionalDouble.of(0.25)),
                    new Crank(0, 0),
                    Friction.NONE,
                    0,
                    0);
            at = new MovingThrow(body, rotation, START, SPEED, 0, 0);
            settle(world.getSettings(), dt);
            world.setGravity(0, 0);

            double theta = at.pinAngle();
            double b = body.rodMassCentre();
            MovingThrow.Solved start = at.solve();
            Vector2 pinAt = new Vector2(0.1 * Math.cos(theta), 0.1 * Math.sin(theta));
            Vector2 wristAt = new Vector2(body.linkage().reach(theta), offset);
            double incline = Math.atan2(wristAt.y - pinAt.y, wristAt.x - pinAt.x);
            double turning = -start.motion().rodVelocity()[0];
            double omega = rotation.sign() * SPEED;
            Body ground = new Body();
            ground.setMass(new Mass(new Vector2(), 0, 0));
            Body crank = new Body(); // infinite mass and a speed: a driven crank
            crank.setMass(new Mass(new Vector2(), 0, 0));
            crank.rotate(theta);
            crank.setAngularVelocity(omega);
            Body rod = new Body();
            rod.setMass(new Mass(new Vector2(), body.rodMass(), body.rodInertia()));
            rod.translate(pinAt.x + b * Math.cos(incline), pinAt.y + b * Math.sin(incline));
            rod.rotateAboutCenter(incline);
            rod.setLinearVelocity(
                    -pinAt.y * omega - b * Math.sin(incline) * turning,
                    pinAt.x * omega + b * Math.cos(incline) * turning);
            rod.setAngularVelocity(turning);
            slider.setMass(new Mass(new Vector2(), body.masses().total(), 1));
            slider.translate(wristAt);
            slider.setLinearVelocity(-start.motion().velocity()[0], 0);
            for (Body each : List.of(ground, crank, rod, slider)) {
                each.setLinearDamping(0);
                each.setAngularDamping(0);
                world.addBody(each);
            }
            pin = new RevoluteJoint<>(crank, rod, pinAt);
            wrist = new RevoluteJoint<>(rod, slider, wristAt);
            guide = new PrismaticJoint<>(ground, slider, wristAt, new Vector2(1, 0));
            world.addJoint(pin);
            world.addJoint(wrist);
            world.addJoint(guide);
        }

        private static void settle(Settings settings, double dt) {
            settings.setStepFrequency(dt); // seconds, whatever its name says
            settings.setAtRestDetectionEnabled(false);
            settings.setVelocityConstraintSolverIterations(10);
            settings.setPositionConstraintSolverIterations(10);
            settings.setLinearTolerance(1e-12);
            settings.setBaumgarte(1);
        }

        private static double gasLoad(double crankAngle) {
            return -20_000 * (0.5 + 0.5 * Math.cos(crankAngle));
        }

        Errors turnOnce() {
            int steps = (int) Math.round(2 * Math.PI / SPEED / dt);
            double[] error = new double[3];
            double[] peak = new double[3];
            for (int i = 0; i < steps; i++) {
                double phi = START + SPEED * dt * i;
                slider.applyForce(new Vector2(gasLoad(phi), 0));
                world.step(1);
                if (i >= steps / 20) { // the engine's first steps settle the start
                    compare(new MovingThrow(at.body(), at.rotation(), phi, SPEED, 0, gasLoad(phi)), error, peak);
                }
            }
            return new Errors(error[0] / peak[0], error[1] / peak[1], error[2] / peak[2]);
        }

        private void compare(MovingThrow now, double[] error, double[] peak) {
            ThrowForces f = now.solve().forces();
            // a pin joint reports the force on its first body (crank, rod), the guide that on its second: it balances
            // the
            // wrist's on a crosshead that does not move across
            Vector2 p = pin.getReactionForce(1 / dt);
            Vector2 w = wrist.getReactionForce(1 / dt);
            Vector2 g = guide.getReactionForce(1 / dt);
            note(0, p.x + f.crankPinX()[0], p.y + f.crankPinY()[0], error);
            note(1, w.x + f.crossheadPinX()[0], w.y + f.crossheadPinY()[0], error);
            note(2, 0, g.y - f.guideForce()[0], error);
            note(0, f.crankPinX()[0], f.crankPinY()[0], peak);
            note(1, f.crossheadPinX()[0], f.crossheadPinY()[0], peak);
            note(2, 0, f.guideForce()[0], peak);
        }

        private static void note(int kind, double x, double y, double[] greatest) {
            greatest[kind] = Math.max(greatest[kind], Math.hypot(x, y));
        }
    }
}
