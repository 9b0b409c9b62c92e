package throwbench.solver.mechanism;

import java.util.concurrent.atomic.AtomicReferenceArray;

/** Sines and cosines of 2π i/N: the same for every throw and machine, so they are made once for each N in use. */
final class StationCircle {

    /** Counts up to this one are kept; the few larger ones that a table may ask for are made anew. */
    private static final int KEPT = 2048;

    private static final AtomicReferenceArray<StationCircle> CIRCLES = new AtomicReferenceArray<>(KEPT + 1);

    private final double step;
    private final double[] sines;
    private final double[] cosines;

    private StationCircle(int count) {
        step = Angles.TURN / count;
        sines = new double[count];
        cosines = new double[count];
        for (int i = 0; i < count; i++) {
            sines[i] = Math.sin(angle(i));
            cosines[i] = Math.cos(angle(i));
        }
    }

    static StationCircle of(int count) {
        StationCircle kept = count <= KEPT ? CIRCLES.get(count) : null;
        if (kept != null) {
            return kept;
        }
        StationCircle circle = new StationCircle(count);
        if (count <= KEPT) {
            CIRCLES.set(count, circle); // two threads may both make it: the same numbers
        }
        return circle;
    }

    double step() {
        return step;
    }

    double angle(int station) {
        return step * station;
    }

    double[] sines() {
        return sines;
    }

    double[] cosines() {
        return cosines;
    }
}
