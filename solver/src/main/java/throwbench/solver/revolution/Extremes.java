package throwbench.solver.revolution;

import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;

/**
 * Least and greatest value of a continuous curve over the revolution: break angles are candidates on both sides, smooth
 * tops are refined between the samples.
 */
public record Extremes(Extreme least, Extreme greatest) {

    /** Shrinkings of the three points round a top; each divides their distance by ten. */
    private static final int REFINEMENTS = 3;

    /** Finds both extremes of a trace. */
    public static Extremes of(Trace trace) {
        return new Extremes(find(trace, -1), find(trace, 1));
    }

    private static Extreme find(Trace trace, double sense) {
        int best = 0;
        for (int i = 1; i < trace.count(); i++) {
            if (sense * trace.value(i) > sense * trace.value(best)) {
                best = i;
            }
        }
        double value = trace.value(best);
        double angle = trace.angle(best);
        for (int i = 1; i < trace.count() - 1; i++) {
            double rise = sense * (trace.value(i) - trace.value(i - 1));
            double fall = sense * (trace.value(i) - trace.value(i + 1));
            boolean top = rise >= 0 && fall >= 0 && rise + fall > 0 && trace.smooth(i - 1, i + 1);
            // a parabola through three samples rises above the middle one by an eighth of rise + fall at most
            if (top && sense * (trace.value(i) - value) > -(rise + fall)) {
                Extreme refined = refine(trace, i);
                if (sense * refined.value() > sense * value) {
                    value = refined.value();
                    angle = refined.crankAngle();
                }
            }
        }
        return new Extreme(value, Angles.wrap(angle));
    }

    /** The top of the curve near a sample that is above (or below) both its smooth neighbours. */
    static Extreme refine(Trace trace, int sample) {
        double left = trace.angle(sample - 1);
        double right = trace.angle(sample + 1);
        double middle = trace.angle(sample);
        double top = vertex(left, trace.value(sample - 1), middle, trace.value(sample), right, trace.value(sample + 1));
        double step = Math.max(middle - left, right - middle);
        Curve curve = trace.curve();
        double value = curve.at(top, Approach.JUST_AFTER);
        for (int n = 0; n < REFINEMENTS; n++) {
            step /= 10;
            double from = Math.max(left, top - step);
            double to = Math.min(right, top + step);
            double moved = vertex(
                    from, curve.at(from, Approach.JUST_AFTER), top, value, to, curve.at(to, Approach.JUST_BEFORE));
            top = Math.max(left, Math.min(right, moved));
            value = curve.at(top, Approach.JUST_AFTER);
        }
        return new Extreme(value, top);
    }

    /** Where the parabola through three points has its vertex; the middle one where they lie on a line. */
    private static double vertex(double x0, double y0, double x1, double y1, double x2, double y2) {
        double a = x1 - x0;
        double b = x2 - x1;
        double slopeLeft = (y1 - y0) / a;
        double slopeRight = (y2 - y1) / b;
        double bend = slopeRight - slopeLeft;
        if (!(a > 0 && b > 0) || bend == 0) {
            return x1;
        }
        // the slope at x1 is the mean of both secants weighted by the other's length; the vertex is where it comes to
        // zero
        double slope = (slopeLeft * b + slopeRight * a) / (a + b);
        double moved = x1 - slope * (a + b) / (2 * bend);
        return Math.max(x0, Math.min(x2, moved));
    }
}
