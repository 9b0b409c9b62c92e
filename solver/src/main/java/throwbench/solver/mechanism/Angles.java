package throwbench.solver.mechanism;

/** Angles stay continuous inside; this is where they are taken into one turn. */
public final class Angles {

    /** A full turn, rad. */
    public static final double TURN = 2 * Math.PI;

    private Angles() {}

    /** The angle in [0, 2π), rad. */
    public static double wrap(double angle) {
        double turns = Math.floor(angle / TURN);
        double wrapped = angle - turns * TURN;
        // a tiny negative angle rounds up to a whole turn
        return wrapped >= TURN || wrapped < 0 ? 0 : wrapped;
    }
}
