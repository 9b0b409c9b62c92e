package throwbench.solver.trial;

import throwbench.solver.load.ThrowBody;
import throwbench.solver.load.ThrowForces;
import throwbench.solver.load.ThrowMotion;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.mechanism.Sweep;

/**
 * One throw at one instant, pushed by a given gas load and gaining or losing speed.
 *
 * @param crankAngle φ, rad
 * @param speed ω, rad/s
 * @param alpha α, rad/s²
 * @param gasLoad F_gas, N, tension positive
 */
public record MovingThrow(
        ThrowBody body, Rotation rotation, double crankAngle, double speed, double alpha, double gasLoad) {

    /** What the solver makes of it. */
    public record Solved(Sweep sweep, ThrowMotion motion, ThrowForces forces) {}

    public Solved solve() {
        Sweep sweep = Sweep.single(body.linkage(), rotation);
        sweep.turnTo(crankAngle, Approach.JUST_AFTER);
        ThrowMotion motion = new ThrowMotion(1);
        ThrowForces forces = new ThrowForces(body, 1);
        double[] speeds = {speed};
        double[] alphas = {alpha};
        motion.solve(sweep, speeds, alphas);
        forces.solve(sweep, motion, new double[] {gasLoad}, speeds, alphas);
        return new Solved(sweep, motion, forces);
    }

    /** θ, rad. */
    public double pinAngle() {
        return body.linkage().headEndAngle() + rotation.sign() * crankAngle;
    }

    public MovingThrow at(double angle) {
        return new MovingThrow(body, rotation, angle, speed, alpha, gasLoad);
    }
}
