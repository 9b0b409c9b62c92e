package throwbench.solver.revolution;

/**
 * Root of a curve between two values of different sign, by false position with the Illinois step (Dowell and Jarratt 1971):
 * it keeps its bracket, asks for each value once and needs four or five of them for a smooth curve.
 */
final class Illinois {

    /** Crank angle to which a root is found, rad: well below what any drawing or criterion tells apart. */
    private static final double ANGLE_ACCURACY = 1e-11;

    /** False position that has not ended by then bisects: each further step halves the bracket. */
    private static final int PATIENCE = 30;

    private static final int MOST_STEPS = 90;

    private Illinois() {}

    /** The angle between from and to, rad, at which the curve is zero. */
    static double root(Curve curve, double from, double fromValue, double to, double toValue) {
        double a = from;
        double fa = fromValue;
        double b = to;
        double fb = toValue;
        double found = b;
        for (int n = 0; n < MOST_STEPS && Math.abs(b - a) > ANGLE_ACCURACY; n++) {
            double secant = b - fb * (b - a) / (fb - fa);
            double x = n < PATIENCE ? secant : a + (b - a) / 2;
            double moved = Math.abs(x - found);
            found = x;
            double fx = curve.at(x, Turning.side(from, x, to));
            if (fx == 0 || (n > 0 && moved < ANGLE_ACCURACY)) {
                return x;
            }
            if ((fx > 0) == (fb > 0)) {
                fa /= 2; // the far end was kept: its value counts half, so that the next step comes from its side
            } else {
                a = b;
                fa = fb;
            }
            b = x;
            fb = fx;
        }
        return found;
    }
}
