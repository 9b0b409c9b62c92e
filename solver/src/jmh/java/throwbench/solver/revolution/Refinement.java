package throwbench.solver.revolution;

import java.util.List;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;

/** One refinement between stations, as a revolution makes it for a sign change or a top of the rod load. */
public final class Refinement {

    private static final double STEP = Angles.TURN / Trace.STATIONS;

    private final RodLoadCurve curve;
    private final Turning turning;
    private final int sample;
    private final double above;
    private final double from;
    private final double fromValue;
    private final double to;
    private final double toValue;

    public Refinement(RunningMachine running, int throwIndex) {
        curve = new RodLoadCurve(running, throwIndex);
        Trace trace = Traces.rodLoad(Revolution.solve(running, throwIndex, Trace.STATIONS));
        List<SignChange> changes = SignChanges.of(trace);
        from = Math.floor(changes.get(0).crankAngle() / STEP) * STEP;
        to = from + STEP;
        fromValue = curve.at(from, Approach.JUST_AFTER);
        toValue = curve.at(to, Approach.JUST_AFTER);
        Turning tops = new Turning(trace, 1);
        Turning bottoms = new Turning(trace, -1);
        int top = first(tops, trace.count(), Double.NEGATIVE_INFINITY);
        turning = top < 0 ? bottoms : tops;
        above = top < 0 ? Double.POSITIVE_INFINITY : Double.NEGATIVE_INFINITY;
        sample = top < 0 ? first(bottoms, trace.count(), above) : top;
    }

    /** The first sample beside which the curve turns, or −1: in line the rod load may have its tops at dead centres. */
    private static int first(Turning turning, int count, double above) {
        for (int i = 1; i + 1 < count; i++) {
            if (turning.beside(i, above).isPresent()) {
                return i;
            }
        }
        return -1;
    }

    /** Angle of the first sign change, rad. */
    public double signChange() {
        return Illinois.root(curve, from, fromValue, to, toValue);
    }

    /** Value of the first smooth top, or else bottom, N. */
    public double extreme() {
        return turning.beside(sample, above).orElseThrow().value();
    }
}
