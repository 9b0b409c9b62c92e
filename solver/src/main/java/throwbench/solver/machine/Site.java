package throwbench.solver.machine;

/**
 * Where the machine stands.
 *
 * @param ambientPressure Pa absolute; gauge pressures count from it
 * @param framePressure Pa absolute, acting on what of the pistons no chamber covers
 * @param gravity whether weights count
 */
public record Site(double ambientPressure, double framePressure, boolean gravity) {

    /** Standard acceleration of free fall, m/s² (exact by convention, CGPM 1901). */
    public static final double STANDARD_GRAVITY = 9.80665;

    /** g at this site, m/s²: standard gravity, or 0 where weights do not count. */
    public double gravityAcceleration() {
        return gravity ? STANDARD_GRAVITY : 0;
    }
}
