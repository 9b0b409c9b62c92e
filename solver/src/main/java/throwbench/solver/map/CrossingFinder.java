package throwbench.solver.map;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/** Finds the crossings between the values at which a margin was scanned. */
final class CrossingFinder {

    /** Enough for Brent's method in any interval of the scan. */
    private static final int MOST_EVALUATIONS = 200;

    /** Share of the range that parts the two sides of a crossing: far above rounding, far below what a user tells apart. */
    private static final double SIDE = 1e-9;

    /** Share of the range to which a value is found; below it the margin's own rounding decides. */
    private static final double FINEST = 1e-13;

    /** A margin that changes by more than this share of an interval's change from side to side does not pass smoothly. */
    private static final double JUMP = 1e-2;

    private final LimitSearch.Margin margin;
    private final double range;

    CrossingFinder(LimitSearch.Margin margin, double range) {
        this.margin = margin;
        this.range = range;
    }

    private enum State {
        MET,
        JUST_MET,
        NOT_MET,
        IMPOSSIBLE;

        static State of(Outcome outcome) {
            if (outcome.value().isEmpty()) {
                return IMPOSSIBLE;
            }
            double value = outcome.value().getAsDouble();
            return value > 0 ? MET : value < 0 ? NOT_MET : JUST_MET;
        }
    }

    List<Crossing> all(double[] values, Outcome[] scan) {
        List<Crossing> found = new ArrayList<>();
        for (int i = 0; i + 1 < values.length; i++) {
            if (i > 0) {
                hidden(values, scan, i, found);
            }
            if (State.of(scan[i]) != State.of(scan[i + 1])) {
                add(locate(values[i], scan[i], values[i + 1], scan[i + 1]), found);
            }
        }
        return found;
    }

    /** Passing through a value of the scan that is zero itself is one crossing, found from both sides. */
    private void add(Crossing crossing, List<Crossing> found) {
        Crossing last = found.isEmpty() ? crossing : found.get(found.size() - 1);
        boolean same = !found.isEmpty() && crossing.at() - last.at() <= 2 * SIDE * range;
        if (same) {
            found.set(found.size() - 1, new Crossing(last.kind(), last.at(), last.below(), crossing.above()));
        } else {
            found.add(crossing);
        }
    }

    /** Two crossings between neighbours of the same sign, where the margin comes near to zero and turns. */
    private void hidden(double[] values, Outcome[] scan, int i, List<Crossing> found) {
        State state = State.of(scan[i]);
        boolean judged = state == State.MET || state == State.NOT_MET;
        if (!judged || State.of(scan[i - 1]) != state || State.of(scan[i + 1]) != state) {
            return;
        }
        double here = size(scan[i]);
        double fall = size(scan[i - 1]) - here;
        double rise = size(scan[i + 1]) - here;
        boolean near =
                here <= 2 * Math.max(Math.max(fall, rise), Math.max(steepness(scan, i - 1), steepness(scan, i + 2)));
        if (!(fall >= 0 && rise >= 0 && near)) {
            return;
        }
        double sense = state == State.MET ? 1 : -1;
        double least = leastBetween(values[i - 1], values[i], values[i + 1], sense, size(scan[i - 1]));
        Outcome turn = margin.at(least);
        if (State.of(turn) != state) {
            add(locate(values[i - 1], scan[i - 1], least, turn), found);
            add(locate(least, turn, values[i + 1], scan[i + 1]), found);
        }
    }

    private static double size(Outcome outcome) {
        return Math.abs(outcome.value().orElse(0));
    }

    /** Change of the margin over the interval before a place of the scan; 0 where it is not known. */
    private static double steepness(Outcome[] scan, int i) {
        boolean known = i > 0 && i < scan.length && scan[i].isPossible() && scan[i - 1].isPossible();
        return known ? Math.abs(size(scan[i]) - size(scan[i - 1])) : 0;
    }

    private double leastBetween(double from, double start, double to, double sense, double otherwise) {
        return new BrentOptimizer(1e-10, FINEST * range)
                .optimize(
                        new MaxEval(MOST_EVALUATIONS),
                        GoalType.MINIMIZE,
                        new SearchInterval(from, to, start),
                        new UnivariateObjectiveFunction(x -> {
                            Outcome outcome = margin.at(x);
                            return outcome.isPossible()
                                    ? sense * outcome.value().getAsDouble()
                                    : otherwise;
                        }))
                .getPoint();
    }

    private Crossing locate(double from, Outcome first, double to, Outcome last) {
        double product = first.value().orElse(0) * last.value().orElse(0);
        Optional<Crossing> zero = product < 0 ? smooth(from, first, to, last) : Optional.empty();
        return zero.orElseGet(() -> bisect(from, first, to, last));
    }

    /** By Brent's method; empty where the margin does not pass smoothly where that ends. */
    private Optional<Crossing> smooth(double from, Outcome first, double to, Outcome last) {
        double before = first.value().orElse(0);
        double at = new BrentSolver(1e-15, FINEST * range, 0)
                // what cannot be had counts to the first side: the search then ends on its edge
                .solve(MOST_EVALUATIONS, x -> margin.at(x).value().orElse(before), from, to);
        Outcome below = margin.at(Math.max(from, at - SIDE * range));
        Outcome above = margin.at(Math.min(to, at + SIDE * range));
        boolean passes = below.isPossible() && above.isPossible() && !jumps(below, above, first, last);
        return passes ? Optional.of(new Crossing(Crossing.Kind.ZERO, at, below, above)) : Optional.empty();
    }

    private static boolean jumps(Outcome below, Outcome above, Outcome first, Outcome last) {
        double change = Math.abs(above.value().orElse(0) - below.value().orElse(0));
        return change > JUMP * Math.abs(last.value().orElse(0) - first.value().orElse(0));
    }

    /** Halves the interval until both sides of the change lie as close together as they can. */
    private Crossing bisect(double from, Outcome first, double to, Outcome last) {
        State side = State.of(first);
        double low = from;
        double high = to;
        Outcome below = first;
        Outcome above = last;
        while (high - low > FINEST * range) {
            double middle = low + (high - low) / 2;
            if (middle <= low || middle >= high) {
                break;
            }
            Outcome there = margin.at(middle);
            if (State.of(there) == side) {
                low = middle;
                below = there;
            } else {
                high = middle;
                above = there;
            }
        }
        if (!below.isPossible() || !above.isPossible()) {
            return new Crossing(Crossing.Kind.EDGE, below.isPossible() ? low : high, below, above);
        }
        // where only one end could be had, the change of the whole interval is not known: then any change is a jump
        boolean step = first.isPossible() && last.isPossible() && jumps(below, above, first, last);
        return new Crossing(step ? Crossing.Kind.STEP : Crossing.Kind.ZERO, high, below, above);
    }
}
