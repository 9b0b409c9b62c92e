package throwbench.solver.mechanism;

import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * The greatest speed of the piston on each stroke, at constant speed of the shaft: where the exact acceleration is zero.
 *
 * @param inward on the stroke towards the crank
 * @param outward on the stroke away from it
 */
public record PistonSpeed(Peak inward, Peak outward) {

    /** Crank angle to which a peak is found, rad. */
    private static final double ANGLE_ACCURACY = 1e-13;

    private static final int MOST_EVALUATIONS = 200;

    /**
     * A greatest speed.
     *
     * @param crankAngle φ, rad, in [0, 2π)
     * @param velocity ds/dt, m/s, positive towards the crank
     */
    public record Peak(double crankAngle, double velocity) {}

    /**
     * Finds both peaks.
     *
     * @param shaftSpeed ω, rad/s
     */
    public static PistonSpeed of(Linkage linkage, Rotation rotation, double shaftSpeed) {
        double crankEnd = linkage.crankEndDeadCentre(rotation);
        Sweep sweep = Sweep.single(linkage, rotation);
        return new PistonSpeed(peak(sweep, 0, crankEnd, shaftSpeed), peak(sweep, crankEnd, Angles.TURN, shaftSpeed));
    }

    /** 2 · stroke · n, m/s: the mean of the speed without its sign, at a shaft speed ω (rad/s). */
    public static double mean(Linkage linkage, double shaftSpeed) {
        return 2 * linkage.stroke() * shaftSpeed / Angles.TURN;
    }

    /** Between dead centres the acceleration changes its sign once: from towards the crank to away, or back. */
    private static Peak peak(Sweep sweep, double from, double to, double shaftSpeed) {
        double angle = new BrentSolver(1e-15, ANGLE_ACCURACY, 0)
                .solve(
                        MOST_EVALUATIONS,
                        crankAngle -> {
                            sweep.turnTo(crankAngle, Approach.JUST_AFTER);
                            return sweep.reach2()[0];
                        },
                        from,
                        to);
        sweep.turnTo(angle, Approach.JUST_AFTER);
        return new Peak(angle, -sweep.rotation().sign() * sweep.reach1()[0] * shaftSpeed);
    }
}
