package throwbench.solver.chamber.flow;

/**
 * Finds the two numbers that a turn leaves as it found them. Plain turns come closer by a share each, which may be a small
 * one; what turns did to the change they made tells where it vanishes (Broyden's method). A move is kept only when the next
 * turn changes less, else a shorter one is made from the best place so far, so that the search can't run away where a valve
 * begins or ceases to open. Where such a kink holds it fast, a number of plain turns leads past.
 */
public final class RepeatSearch {

    /** No number is moved further than this at once; both are logarithms. */
    private static final double FURTHEST = 1;

    /** How far the slope is measured, where it has to be. */
    private static final double PROBE = 1e-3;

    /** Moves that may fail before the slope is measured instead of learnt. */
    private static final int PATIENCE = 2;

    private final double[] at = new double[2];
    private final double[] best = new double[2];
    private final double[] bestChange = new double[2];

    /** How the change varies with the two numbers, by rows; −1 each when a turn forgets where it began. */
    private final double[] slope = new double[4];

    private double reach = FURTHEST;
    private boolean begun;
    private int failures;
    private int probe;
    private double sizeWhenMeasured = Double.POSITIVE_INFINITY;
    private int plainTurns;
    private int nextPlainTurns = 8;

    public RepeatSearch(double first, double second) {
        at[0] = first;
        at[1] = second;
        forget();
    }

    public double first() {
        return at[0];
    }

    public double second() {
        return at[1];
    }

    /**
     * Takes what a turn made of the two numbers and moves on.
     *
     * @return the larger of the two changes
     */
    public double ended(double first, double second) {
        double[] change = {first - at[0], second - at[1]};
        if (plainTurns > 0) {
            walk(change);
        } else if (probe > 0) {
            measured(change);
        } else {
            judge(change);
        }
        return size(change);
    }

    private void judge(double[] change) {
        boolean better = !begun || size(change) < size(bestChange);
        if (begun) {
            learn(change);
        }
        if (better) {
            reach = Math.min(FURTHEST, 2 * reach);
            failures = 0;
            System.arraycopy(at, 0, best, 0, 2);
            System.arraycopy(change, 0, bestChange, 0, 2);
        } else {
            reach = Math.min(reach, size(new double[] {at[0] - best[0], at[1] - best[1]})) / 4;
            failures++;
        }
        begun = true;
        if (failures == 0 || failures % PATIENCE != 0) {
            move();
        } else if (size(bestChange) > sizeWhenMeasured / 2) {
            at[0] = best[0];
            at[1] = best[1];
            plainTurns = nextPlainTurns;
            nextPlainTurns *= 2;
            walk(bestChange);
        } else {
            sizeWhenMeasured = size(bestChange);
            probe = 1;
            at[0] = best[0] + PROBE;
            at[1] = best[1];
        }
    }

    private void walk(double[] change) {
        at[0] += change[0];
        at[1] += change[1];
        plainTurns--;
        if (plainTurns == 0) {
            begun = false;
            failures = 0;
            reach = FURTHEST;
            sizeWhenMeasured = Double.POSITIVE_INFINITY;
            forget();
        }
    }

    private void measured(double[] change) {
        slope[probe - 1] = (change[0] - bestChange[0]) / PROBE;
        slope[probe + 1] = (change[1] - bestChange[1]) / PROBE;
        at[0] = best[0];
        at[1] = best[1] + PROBE;
        probe++;
        if (probe > 2) {
            probe = 0;
            move();
        }
    }

    private void forget() {
        slope[0] = -1;
        slope[1] = 0;
        slope[2] = 0;
        slope[3] = -1;
    }

    /** Makes the slope true along the way from the best place to the present one. */
    private void learn(double[] change) {
        double x = at[0] - best[0];
        double y = at[1] - best[1];
        double square = x * x + y * y;
        if (square > 0) {
            for (int i = 0; i < 2; i++) {
                double missed = (change[i] - bestChange[i] - slope[2 * i] * x - slope[2 * i + 1] * y) / square;
                slope[2 * i] += missed * x;
                slope[2 * i + 1] += missed * y;
            }
        }
    }

    private void move() {
        double determinant = slope[0] * slope[3] - slope[1] * slope[2];
        if (!(determinant > 0)) {
            // a turn that comes closer in every direction has a positive one
            forget();
            determinant = 1;
        }
        double x = -(slope[3] * bestChange[0] - slope[1] * bestChange[1]) / determinant;
        double y = -(slope[0] * bestChange[1] - slope[2] * bestChange[0]) / determinant;
        double shorter = Math.min(1, reach / Math.max(Math.abs(x), Math.abs(y)));
        at[0] = best[0] + shorter * x;
        at[1] = best[1] + shorter * y;
    }

    private static double size(double[] a) {
        return Math.max(Math.abs(a[0]), Math.abs(a[1]));
    }
}
