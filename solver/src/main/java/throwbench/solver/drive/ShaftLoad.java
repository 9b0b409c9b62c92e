package throwbench.solver.drive;

import throwbench.solver.mechanism.Approach;

/** What the machine hangs on its shaft, read at one crank angle of the first throw after the other. */
public interface ShaftLoad {

    /**
     * Turns to a crank angle.
     *
     * @param crankAngle rad, any number of turns
     * @param speed ω there, rad/s, above 0: friction may depend on it
     * @param acceleration α there, rad/s²
     */
    void turnTo(double crankAngle, Approach approach, double speed, double acceleration);

    /** T_load: the torque of gas, friction and weight, N·m, without any inertia. */
    double torque();

    /** I − J: what the moving parts of the throws add to the rotating inertia, kg m², ≥ 0. */
    double inertia();

    /** dI/dφ₁, kg m². */
    double inertiaSlope();
}
