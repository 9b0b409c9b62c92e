package throwbench.app.strip;

import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.Summary;

/**
 * The scale of one lane: its least and greatest value stand a little inside its edges.
 *
 * @param least of all its traces, SI
 * @param greatest of all its traces, SI
 * @param from value at the lane's lower edge (bottom)
 * @param to value at its upper edge (top)
 * @param top y of the upper edge
 * @param bottom y of the lower edge
 */
record LaneScale(double least, double greatest, double from, double to, double top, double bottom) {

    /** Points left free above the greatest and below the least value: half of the heaviest line. */
    private static final double INSET = 4;

    static LaneScale of(Lane lane, Summary summary, double top, double bottom) {
        double least = Double.POSITIVE_INFINITY;
        double greatest = Double.NEGATIVE_INFINITY;
        for (StripTrace trace : lane.traces()) {
            Extremes extremes = trace.signal().extremes(summary);
            least = Math.min(least, extremes.least().value());
            greatest = Math.max(greatest, extremes.greatest().value());
        }
        double low = lane.kind().showsZero() ? Math.min(0, least) : least;
        double high = lane.kind().showsZero() ? Math.max(0, greatest) : greatest;
        if (!(high - low > 1e-9 * Math.max(Math.abs(low), Math.abs(high)))) {
            // a flat line stands in the middle of its lane
            double half = high == 0 ? 1 : 0.05 * Math.abs(high);
            low -= half;
            high += half;
        }
        double perPoint = (high - low) / Math.max(1, bottom - top - 2 * INSET);
        return new LaneScale(least, greatest, low - INSET * perPoint, high + INSET * perPoint, top, bottom);
    }

    /** Where a value stands, y downwards. */
    double y(double value) {
        return bottom - (value - from) / (to - from) * (bottom - top);
    }

    /** Whether zero lies on the scale. */
    boolean hasZero() {
        return from <= 0 && to >= 0;
    }
}
