package throwbench.solver.revolution;

import java.util.Arrays;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;

/**
 * A curve sampled once around: equally spaced stations, with both sides of every break angle between them. Sign changes and
 * extremes are bracketed on the samples and found on the curve itself.
 */
public final class Trace {

    /** Enough that a bracket holds one extreme; what is shorter is looked for where the curve comes near to zero. */
    static final int STATIONS = 720;

    private final Curve curve;
    private final double[] angles;
    private final double[] values;
    /** For each sample, the number of breaks passed: two samples with equal numbers have no break between them. */
    private final int[] piece;

    private final int count;

    /**
     * @param grid the curve at equally spaced angles from 0, just after any step
     * @param breaks rad, rising, in [0, 2π); the first is 0, the shown throw's dead centre, so that no stretch runs
     *     through the seam
     */
    Trace(Curve curve, double[] grid, double[] breaks) {
        this(curve, grid, breaks, false);
    }

    /** A trace for sign changes alone: break angles are not sampled where the curve is far from zero on both sides. */
    static Trace ofSigns(Curve curve, double[] grid, double[] breaks) {
        return new Trace(curve, grid, breaks, true);
    }

    private Trace(Curve curve, double[] grid, double[] breaks, boolean signsAlone) {
        if (breaks.length == 0 || breaks[0] != 0) {
            throw new IllegalArgumentException("angle 0 is not among the breaks " + Arrays.toString(breaks));
        }
        this.curve = curve;
        int size = grid.length + 2 * breaks.length + 1;
        angles = new double[size];
        values = new double[size];
        piece = new int[size];
        int at = 0;
        int next = 0;
        double step = Angles.TURN / grid.length;
        for (int i = 0; i < grid.length; i++) {
            double angle = i * step;
            boolean onBreak = false;
            while (next < breaks.length && breaks[next] <= angle + Approach.TOLERANCE) {
                if (!signsAlone || nearZero(grid, i)) {
                    at = addBreak(at, breaks[next], next);
                    onBreak = angle - breaks[next] < 2 * Approach.TOLERANCE;
                }
                next++;
            }
            if (!onBreak) {
                at = add(at, angle, grid[i], next);
            }
        }
        while (next < breaks.length) {
            if (!signsAlone || nearZero(grid, grid.length)) {
                at = addBreak(at, breaks[next], next);
            }
            next++;
        }
        this.count = closed(at, breaks);
    }

    /** Whether a curve that runs on as it does round two stations might reach zero between them, or changes its sign. */
    private static boolean nearZero(double[] grid, int station) {
        int n = grid.length;
        double before = grid[(station + n - 1) % n];
        double after = grid[station % n];
        double change = Math.abs(after - before);
        double steepest = Math.max(
                change,
                Math.max(Math.abs(before - grid[(station + n - 2) % n]), Math.abs(grid[(station + 1) % n] - after)));
        return before * after <= 0 || Math.min(Math.abs(before), Math.abs(after)) < 2 * steepest;
    }

    /**
     * Samples a curve.
     *
     * @param breaks angles at which it may bend or step, rad, rising, in [0, 2π)
     */
    public static Trace of(Curve curve, double[] breaks) {
        double[] grid = new double[STATIONS];
        for (int i = 0; i < grid.length; i++) {
            grid[i] = curve.at(i * (Angles.TURN / STATIONS), Approach.JUST_AFTER);
        }
        return new Trace(curve, grid, breaks);
    }

    private int addBreak(int at, double angle, int passed) {
        int next = add(at, angle, curve.at(angle, Approach.JUST_BEFORE), passed);
        return add(next, angle, curve.at(angle, Approach.JUST_AFTER), passed + 1);
    }

    private int add(int at, double angle, double value, int passed) {
        angles[at] = angle;
        values[at] = value;
        piece[at] = passed;
        return at + 1;
    }

    /** Repeats the first sample a turn later, so that the last piece has its end. */
    private int closed(int at, double[] breaks) {
        return add(at, angles[0] + Angles.TURN, values[0], breaks.length);
    }

    Curve curve() {
        return curve;
    }

    /** Number of samples, the first one repeated a turn later. */
    int count() {
        return count;
    }

    /** Crank angle of a sample, rad, in [0, 2π]. */
    double angle(int sample) {
        return angles[sample];
    }

    double value(int sample) {
        return values[sample];
    }

    /** Whether the curve is smooth from one sample to a later one. */
    boolean smooth(int from, int to) {
        return piece[from] == piece[to];
    }
}
