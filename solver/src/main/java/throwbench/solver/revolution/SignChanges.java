package throwbench.solver.revolution;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;

/**
 * Every sign change of a trace, by bracketing on the samples and root finding on the curve. A step over zero counts at its
 * angle; a touch without a change of sign does not count.
 */
final class SignChanges {

    /** Share of the peak that is rounding: a touch of zero must not become a pair of changes by it. */
    private static final double ROUNDING = 1e-12;

    private final Trace trace;
    private final Turning tops;
    private final Turning bottoms;
    private final List<SignChange> changes = new ArrayList<>();
    private final double zero;
    private double lastAngle;
    private double lastValue;

    private SignChanges(Trace trace) {
        this.trace = trace;
        this.tops = new Turning(trace, 1);
        this.bottoms = new Turning(trace, -1);
        double peak = 0;
        for (int i = 0; i < trace.count(); i++) {
            double size = Math.abs(trace.value(i));
            if (size > peak) { // Math.max waits for itself at each step
                peak = size;
            }
        }
        this.zero = ROUNDING * peak;
    }

    static List<SignChange> of(Trace trace) {
        SignChanges search = new SignChanges(trace);
        search.walk();
        search.changes.sort(Comparator.comparingDouble(SignChange::crankAngle));
        return List.copyOf(search.changes);
    }

    private void walk() {
        int first = 0;
        while (first < trace.count() && isZero(trace.value(first))) {
            first++;
        }
        if (first == trace.count()) {
            return;
        }
        lastAngle = trace.angle(first);
        lastValue = trace.value(first);
        for (int i = first; i < trace.count(); i++) {
            if (clear(i)) {
                meet(trace.angle(i), trace.value(i));
            } else {
                meetWithDip(i);
            }
        }
        // zeros before the first sample that has a sign: from the end of the turn on to that sample
        meet(trace.angle(first) + Angles.TURN, trace.value(first));
    }

    /** Whether a sample between smooth neighbours is farther from zero than the curve could dip beside it. */
    private boolean clear(int i) {
        if (i == 0 || i + 1 == trace.count() || !trace.smooth(i - 1, i + 1)) {
            return false;
        }
        double value = trace.value(i);
        return Math.abs(value) > Math.abs(value - trace.value(i - 1)) + Math.abs(value - trace.value(i + 1));
    }

    /** A dip lies before its sample or behind it. */
    private void meetWithDip(int i) {
        Optional<Extreme> dip = dip(i);
        double angle = trace.angle(i);
        dip.filter(d -> d.crankAngle() < angle).ifPresent(d -> meet(d.crankAngle(), d.value()));
        meet(angle, trace.value(i));
        dip.filter(d -> d.crankAngle() > angle).ifPresent(d -> meet(d.crankAngle(), d.value()));
    }

    private boolean isZero(double value) {
        return Math.abs(value) <= zero;
    }

    /** Takes in the next sample: a change lies between it and the last one that had a sign, if theirs differ. */
    private void meet(double angle, double value) {
        if (isZero(value)) {
            return;
        }
        if (value * lastValue < 0) {
            changes.add(new SignChange(Angles.wrap(root(lastAngle, lastValue, angle, value)), value > 0));
        }
        lastAngle = angle;
        lastValue = value;
    }

    /** A sample nearest to zero among smooth neighbours may hide a short pair of changes: the extreme itself tells. */
    private Optional<Extreme> dip(int i) {
        double value = trace.value(i);
        return isZero(value) ? Optional.empty() : (value > 0 ? bottoms : tops).beside(i, 0);
    }

    private double root(double from, double fromValue, double to, double toValue) {
        // a step: both values stand at one angle
        return to - from < Approach.TOLERANCE ? to : Illinois.root(trace.curve(), from, fromValue, to, toValue);
    }
}
