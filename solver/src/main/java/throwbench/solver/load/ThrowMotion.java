package throwbench.solver.load;

import throwbench.solver.mechanism.Sweep;

/**
 * Motion of one throw at the stations of a sweep. Arrays hold one entry a station; they are the owner's to read and this
 * class's to write.
 */
public final class ThrowMotion {

    final double[] velocity;
    final double[] acceleration;
    final double[] rodVelocity;
    final double[] rodAcceleration;

    public ThrowMotion(int count) {
        velocity = new double[count];
        acceleration = new double[count];
        rodVelocity = new double[count];
        rodAcceleration = new double[count];
    }

    /**
     * Solves the motion.
     *
     * @param speed ω at every station, rad/s, above 0
     * @param shaftAcceleration α, rad/s², positive when the shaft gains speed
     */
    public void solve(Sweep sweep, double[] speed, double[] shaftAcceleration) {
        double sign = sweep.rotation().sign();
        velocities(sweep.reach1(), speed, -sign, velocity);
        accelerations(sweep.reach1(), sweep.reach2(), speed, shaftAcceleration, sign, -1, acceleration);
        velocities(sweep.rodAngle1(), speed, sign, rodVelocity);
        accelerations(sweep.rodAngle1(), sweep.rodAngle2(), speed, shaftAcceleration, sign, 1, rodAcceleration);
    }

    /** Solves the piston's acceleration alone, which is all that the rod load needs. */
    public void solveAcceleration(Sweep sweep, double[] speed, double[] shaftAcceleration) {
        double sign = sweep.rotation().sign();
        accelerations(sweep.reach1(), sweep.reach2(), speed, shaftAcceleration, sign, -1, acceleration);
    }

    /** dq/dt = σ q′ ω. */
    private static void velocities(double[] first, double[] speed, double sign, double[] out) {
        for (int i = 0; i < out.length; i++) {
            out[i] = sign * first[i] * speed[i];
        }
    }

    /** d²q/dt² = q″ ω² + σ q′ α, times a sense. */
    private static void accelerations(
            double[] first, double[] second, double[] speed, double[] alpha, double sign, double sense, double[] out) {
        double signed = sense * sign;
        for (int i = 0; i < out.length; i++) {
            out[i] = Math.fma(sense * second[i] * speed[i], speed[i], signed * first[i] * alpha[i]);
        }
    }

    /** ds/dt of the piston, m/s, positive towards the crank. */
    public double[] velocity() {
        return velocity;
    }

    /** d²s/dt², m/s². */
    public double[] acceleration() {
        return acceleration;
    }

    /** dβ/dt, rad/s. */
    public double[] rodVelocity() {
        return rodVelocity;
    }

    /** d²β/dt², rad/s². */
    public double[] rodAcceleration() {
        return rodAcceleration;
    }
}
