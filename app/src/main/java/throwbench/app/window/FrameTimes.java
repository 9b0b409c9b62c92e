package throwbench.app.window;

import java.util.Arrays;

/** The last few hundred frames: how often they came, and how long the window's thread worked on one. */
final class FrameTimes {

    private static final int KEPT = 600;

    private final double[] intervals = new double[KEPT];
    private final long[] work = new long[KEPT];
    private int count;

    void add(double interval, long nanos) {
        intervals[count % KEPT] = interval;
        work[count % KEPT] = nanos;
        count++;
    }

    /** Frames a second over the last second or so; 0 before there are any. */
    double perSecond() {
        int size = Math.min(count, 60);
        double sum = 0;
        for (int i = 1; i <= size; i++) {
            sum += intervals[(count - i) % KEPT];
        }
        return sum > 0 ? size / sum : 0;
    }

    /** Milliseconds that the window's thread worked on a frame, at this share of the sorted frames (0.5: the median). */
    double workMillis(double share) {
        int size = Math.min(count, KEPT);
        if (size == 0) {
            return 0;
        }
        long[] sorted = Arrays.copyOf(work, size);
        Arrays.sort(sorted);
        return sorted[(int) Math.min(size - 1L, Math.round(share * size))] / 1e6;
    }
}
