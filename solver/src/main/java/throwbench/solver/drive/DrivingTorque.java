package throwbench.solver.drive;

/**
 * T_driver = T_0 − D (ω − ω_mean).
 *
 * @param atMeanSpeed T_0, N·m
 * @param perSpeed D, N·m s, ≥ 0; 0 for a driver of constant torque
 * @param meanSpeed ω_mean, rad/s
 */
public record DrivingTorque(double atMeanSpeed, double perSpeed, double meanSpeed) {

    /** The torque at a speed (rad/s), N·m. */
    public double at(double speed) {
        return atMeanSpeed - perSpeed * (speed - meanSpeed);
    }
}
