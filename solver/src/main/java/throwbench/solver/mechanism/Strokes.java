package throwbench.solver.mechanism;

/**
 * Cuts a run of stations into the stretches that lie on one stroke: inward (towards the crank) for 0 ≤ φ < φc, outward
 * for the rest. A whole turn has at most three.
 */
public final class Strokes {

    private final int[] from = new int[3];
    private final int[] to = new int[3];
    private final boolean[] inward = new boolean[3];
    private int count;

    Strokes() {}

    void divide(double first, double step, int stations, double crankEndDeadCentre, Approach approach) {
        count = 0;
        double start = Angles.wrap(first + approach.bias());
        boolean inwardNow = start < crankEndDeadCentre;
        double end = inwardNow ? crankEndDeadCentre : Angles.TURN;
        int at = 0;
        while (at < stations && count < 3) {
            int next = stations == 1 ? 1 : Math.min(stations, (int) Math.ceil((end - start) / step));
            if (next > at) {
                from[count] = at;
                to[count] = next;
                inward[count] = inwardNow;
                count++;
                at = next;
            }
            inwardNow = !inwardNow;
            end += inwardNow ? crankEndDeadCentre : Angles.TURN - crankEndDeadCentre;
        }
    }

    /** Number of stretches. */
    public int count() {
        return count;
    }

    /** First station of a stretch. */
    public int from(int stretch) {
        return from[stretch];
    }

    /** One past its last station. */
    public int to(int stretch) {
        return to[stretch];
    }

    /** Whether the piston moves towards the crank on it. */
    public boolean inward(int stretch) {
        return inward[stretch];
    }
}
