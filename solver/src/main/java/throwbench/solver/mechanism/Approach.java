package throwbench.solver.mechanism;

/**
 * From which side an angle is read where something steps there (a dead centre that turns friction round, a valve held
 * open). An angle within {@link #TOLERANCE} of a dead centre counts as that dead centre.
 */
public enum Approach {
    /** The value just after the step; what every column holds. */
    JUST_AFTER(1),
    /** The value just before it. */
    JUST_BEFORE(-1);

    /** Crank angle, rad, within which an angle counts as a dead centre. */
    public static final double TOLERANCE = 1e-9;

    private final double bias;

    Approach(int direction) {
        this.bias = direction * TOLERANCE;
    }

    /** What is added to a crank angle before its stroke is told from a comparison, rad. */
    public double bias() {
        return bias;
    }
}
