package throwbench.solver.revolution;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;

/**
 * Every sign change of a trace, by bracketing on the samples and root finding on the curve. A step over zero counts at its
 * angle; a touch without a change of sign does not count.
 */
final class SignChanges {

    /** Crank angle to which a change is found, rad: well below what any drawing or criterion tells apart. */
    private static final double ANGLE_ACCURACY = 1e-13;

    private static final int MOST_EVALUATIONS = 200;

    private final Trace trace;
    private final List<SignChange> changes = new ArrayList<>();
    private double lastAngle;
    private double lastValue;

    private SignChanges(Trace trace) {
        this.trace = trace;
    }

    static List<SignChange> of(Trace trace) {
        SignChanges search = new SignChanges(trace);
        search.walk();
        search.changes.sort(Comparator.comparingDouble(SignChange::crankAngle));
        return List.copyOf(search.changes);
    }

    private void walk() {
        int first = 0;
        while (first < trace.count() && trace.value(first) == 0) {
            first++;
        }
        if (first == trace.count()) {
            return;
        }
        lastAngle = trace.angle(first);
        lastValue = trace.value(first);
        for (int i = first + 1; i < trace.count(); i++) {
            Optional<Extreme> dip = dip(i);
            double angle = trace.angle(i);
            dip.filter(d -> d.crankAngle() < angle).ifPresent(d -> meet(d.crankAngle(), d.value()));
            meet(angle, trace.value(i));
            dip.filter(d -> d.crankAngle() > angle).ifPresent(d -> meet(d.crankAngle(), d.value()));
        }
        // zeros before the first sample that has a sign: from the end of the turn on to that sample
        meet(trace.angle(first) + Angles.TURN, trace.value(first));
    }

    /** Takes in the next sample: a change lies between it and the last one that had a sign, if theirs differ. */
    private void meet(double angle, double value) {
        if (value == 0) {
            return;
        }
        if (value * lastValue < 0) {
            changes.add(new SignChange(Angles.wrap(root(lastAngle, lastValue, angle, value)), value > 0));
        }
        lastAngle = angle;
        lastValue = value;
    }

    /** A sample nearest to zero between smooth neighbours may hide a short pair of changes: the extreme itself tells. */
    private Optional<Extreme> dip(int i) {
        if (i + 1 >= trace.count() || !trace.smooth(i - 1, i + 1)) {
            return Optional.empty();
        }
        double value = trace.value(i);
        double sense = Math.signum(value);
        double before = sense * (trace.value(i - 1) - value);
        double after = sense * (trace.value(i + 1) - value);
        boolean near = sense != 0 && before >= 0 && after >= 0 && sense * value < before + after;
        return near ? Optional.of(Extremes.refine(trace, i)) : Optional.empty();
    }

    private double root(double from, double fromValue, double to, double toValue) {
        if (to - from < ANGLE_ACCURACY) {
            return to;
        }
        double atFrom = trace.curve().at(from, Approach.JUST_AFTER);
        double atTo = trace.curve().at(to, Approach.JUST_BEFORE);
        // the bracket may end on a step whose other side was sampled
        if (atFrom * fromValue <= 0) {
            return from;
        }
        if (atTo * toValue <= 0) {
            return to;
        }
        return new BrentSolver(1e-15, ANGLE_ACCURACY, 0)
                .solve(MOST_EVALUATIONS, x -> trace.curve().at(x, Approach.JUST_AFTER), from, to);
    }
}
