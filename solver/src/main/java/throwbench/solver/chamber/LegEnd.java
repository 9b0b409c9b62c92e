package throwbench.solver.chamber;

import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.apache.commons.math3.optim.univariate.UnivariatePointValuePair;

/**
 * Where a leg of shut-in liquid first meets the open pressure of a valve. By the volume alone where that pressure is
 * constant; by bracketing and root finding where it moves with the piston's speed.
 */
final class LegEnd {

    /** Steps in which a moving open pressure is followed; a shorter pair of meetings shows as a top between them. */
    private static final int STEPS = 128;

    /** rad. */
    private static final double ANGLE_ACCURACY = 1e-13;

    private static final int MOST_EVALUATIONS = 1000;

    private final ChamberDuty duty;
    private final OpenPressures open;
    private final boolean moving;
    private final LiquidPlace place;

    LegEnd(ChamberDuty duty, OpenPressures open, boolean moving) {
        this.duty = duty;
        this.open = open;
        this.moving = moving;
        this.place = new LiquidPlace(duty, open);
    }

    /** Where rising pressure opens the discharge valve while the volume falls between two crank angles; empty: nowhere. */
    OptionalDouble dischargeOpens(LiquidLeg leg, double from, double to) {
        if (moving) {
            return first(
                    angle -> {
                        place.turnTo(angle);
                        return leg.pressureAt(place.volume()) - place.discharge();
                    },
                    from,
                    to);
        }
        double volume = leg.volumeAt(open.discharge(1));
        return volume >= duty.volume().least()
                ? OptionalDouble.of(angle(volume, false, from, to))
                : OptionalDouble.empty();
    }

    /** Where falling pressure opens the suction valve while the volume grows between two crank angles; empty: nowhere. */
    OptionalDouble suctionOpens(LiquidLeg leg, double from, double to) {
        if (moving) {
            return first(
                    angle -> {
                        place.turnTo(angle);
                        return place.suction() - leg.pressureAt(place.volume());
                    },
                    from,
                    to);
        }
        double volume = leg.volumeAt(open.suction(1));
        return volume <= duty.volume().greatest()
                ? OptionalDouble.of(angle(volume, true, from, to))
                : OptionalDouble.empty();
    }

    /** The crank angle of a volume, counted on from where the leg begins. */
    private double angle(double volume, boolean growing, double from, double to) {
        double middle = (from + to) / 2;
        double turned = Math.IEEEremainder(duty.crankAngleAt(volume, growing) - middle, 2 * Math.PI);
        return Math.max(from, Math.min(to, middle + turned));
    }

    /** The first angle at which a gap that begins below zero comes up to it. */
    private static OptionalDouble first(DoubleUnaryOperator gap, double from, double to) {
        double step = (to - from) / STEPS;
        double before = gap.applyAsDouble(from);
        double here = before;
        for (int i = 1; i <= STEPS; i++) {
            double angle = i == STEPS ? to : from + i * step;
            double next = gap.applyAsDouble(angle);
            if (i > 1 && here >= before && here > next) {
                double top = top(gap, angle - 2 * step, angle);
                if (gap.applyAsDouble(top) >= 0) {
                    return OptionalDouble.of(root(gap, angle - 2 * step, top));
                }
            }
            if (next >= 0) {
                return OptionalDouble.of(root(gap, angle - step, angle));
            }
            before = here;
            here = next;
        }
        return OptionalDouble.empty();
    }

    private static double top(DoubleUnaryOperator gap, double from, double to) {
        UnivariatePointValuePair top = new BrentOptimizer(1e-10, 1e-12)
                .optimize(
                        GoalType.MAXIMIZE,
                        new UnivariateObjectiveFunction(gap::applyAsDouble),
                        new SearchInterval(from, to),
                        new MaxEval(MOST_EVALUATIONS));
        return top.getPoint();
    }

    private static double root(DoubleUnaryOperator gap, double from, double to) {
        if (gap.applyAsDouble(from) >= 0) {
            return from;
        }
        return new BrentSolver(0, ANGLE_ACCURACY, 0).solve(MOST_EVALUATIONS, gap::applyAsDouble, from, to);
    }
}
