package throwbench.solver.revolution;

import java.util.Optional;
import throwbench.solver.mechanism.Approach;

/**
 * Where a smooth stretch of a trace turns round between its samples. Beside a sample that lies inside a stretch the two
 * neighbours enclose the top; beside one that begins or ends a stretch it can only lie on the stretch's side.
 */
final class Turning {

    /** Shrinkings of the three points round a top; each divides their distance by ten. */
    private static final int REFINEMENTS = 3;

    private final Trace trace;
    private final double sense;

    /** @param sense 1 for tops, −1 for bottoms */
    Turning(Trace trace, double sense) {
        this.trace = trace;
        this.sense = sense;
    }

    /**
     * The top beside a sample that is no lower than its smooth neighbours, if it may reach above a value.
     *
     * @param above what a top is looked for above; lower tops may be given or left out
     */
    Optional<Extreme> beside(int sample, double above) {
        boolean left = sample > 0 && trace.smooth(sample - 1, sample);
        boolean right = sample + 1 < trace.count() && trace.smooth(sample, sample + 1);
        if (left && right) {
            return inside(sample, above);
        }
        if (left) {
            return atEnd(sample, -1, above);
        }
        return right ? atEnd(sample, 1, above) : Optional.empty();
    }

    private Optional<Extreme> inside(int i, double above) {
        double fromLeft = sense * (trace.value(i) - trace.value(i - 1));
        double fromRight = sense * (trace.value(i) - trace.value(i + 1));
        // a parabola through three samples rises above the middle one by an eighth of both differences at most
        boolean reaches = sense * (trace.value(i) - above) > -(fromLeft + fromRight);
        if (!(fromLeft >= 0 && fromRight >= 0 && fromLeft + fromRight > 0 && reaches)) {
            return Optional.empty();
        }
        double top = vertex(
                trace.angle(i - 1),
                trace.value(i - 1),
                trace.angle(i),
                trace.value(i),
                trace.angle(i + 1),
                trace.value(i + 1));
        return Optional.of(refine(trace.angle(i - 1), top, trace.angle(i + 1)));
    }

    /** @param inwards 1 where a stretch begins, −1 where it ends */
    private Optional<Extreme> atEnd(int i, int inwards, double above) {
        int next = i + inwards;
        double fall = sense * (trace.value(i) - trace.value(next));
        int beyond = next + inwards;
        boolean three = beyond >= 0 && beyond < trace.count() && trace.smooth(Math.min(i, beyond), Math.max(i, beyond));
        double room =
                three ? Math.abs(fall) + Math.abs(trace.value(next) - trace.value(beyond)) : Double.POSITIVE_INFINITY;
        if (!(fall >= 0 && room > 0 && sense * (trace.value(i) - above) > -room)) {
            return Optional.empty();
        }
        double left = trace.angle(Math.min(i, next));
        double right = trace.angle(Math.max(i, next));
        if (right - left < 4 * Approach.TOLERANCE) {
            return Optional.empty(); // nothing inside that is not read as one of its ends
        }
        double middle = (left + right) / 2;
        double top = vertex(
                left,
                trace.value(Math.min(i, next)),
                middle,
                trace.curve().at(middle, Approach.JUST_AFTER),
                right,
                trace.value(Math.max(i, next)));
        return top > left && top < right ? Optional.of(refine(left, top, right)) : Optional.empty();
    }

    private Extreme refine(double left, double start, double right) {
        Curve curve = trace.curve();
        double top = start;
        double value = curve.at(top, side(left, top, right));
        double step = (right - left) / 2;
        for (int n = 0; n < REFINEMENTS; n++) {
            step /= 10;
            double from = Math.max(left, top - step);
            double to = Math.min(right, top + step);
            double moved = vertex(
                    from, curve.at(from, Approach.JUST_AFTER), top, value, to, curve.at(to, Approach.JUST_BEFORE));
            double moves = curve.at(moved, side(left, moved, right));
            if (sense * (moves - value) < 0) {
                break; // rounding: the three points lie too close by now
            }
            top = moved;
            value = moves;
        }
        return new Extreme(value, top);
    }

    /** A stretch may end on steps: each end is read from inside. */
    static Approach side(double left, double angle, double right) {
        return angle - left < right - angle ? Approach.JUST_AFTER : Approach.JUST_BEFORE;
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
        // the slope at x1 is the mean of both secants weighted by the other's length; the vertex is where it is zero
        double slope = (slopeLeft * b + slopeRight * a) / (a + b);
        double moved = x1 - slope * (a + b) / (2 * bend);
        return Math.max(x0, Math.min(x2, moved));
    }
}
