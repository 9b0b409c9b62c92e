package throwbench.solver.mechanism;

import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * The customary short formulas of the slider-crank beside the exact values: cos β ≈ 1 − ½ sin² β and β ≈ sin β. With
 * λ = r/l and the pin's angle θ
 *
 * <pre>
 * x  ≈ l − e²/(2l) + r (cos θ − λ/4 (1 − cos 2θ)) + e λ sin θ
 * x′ ≈ −r (sin θ + λ/2 sin 2θ) + e λ cos θ
 * x″ ≈ −r (cos θ + λ cos 2θ) − e λ sin θ
 * β  ≈ λ sin θ − e/l
 * </pre>
 *
 * In line these are r (1 − cos θ) + …, r ω (sin θ + λ/2 sin 2θ) and r ω² (cos θ + λ cos 2θ) of every handbook. Travel counts
 * from the exact head-end dead centre. Not for several threads.
 */
public final class TwoTermSeries {

    /** What the series give, by crank angle: multiply by ω or ω² for values by time at constant speed. */
    public enum Quantity {
        /** s, m. */
        TRAVEL,
        /** ds/dφ, m: the velocity over ω. */
        VELOCITY,
        /** d²s/dφ², m: the acceleration over ω². */
        ACCELERATION,
        /** β, rad. */
        ROD_ANGLE
    }

    /** A value of the series beside the exact one. */
    public record Value(double series, double exact) {

        /** What the series is too large by. */
        public double error() {
            return series - exact;
        }
    }

    /**
     * Where a series is farthest off.
     *
     * @param crankAngle φ, rad, in [0, 2π)
     */
    public record Worst(double crankAngle, Value value) {}

    /** The error swings no faster than the fourth order: its largest swing is met within one step. */
    private static final int SCANNED = 180;

    private static final int MOST_EVALUATIONS = 200;

    private final Sweep sweep;
    private final double r;
    private final double e;
    private final double lambda;
    private final double shortest;
    private final int sigma;

    public TwoTermSeries(Linkage linkage, Rotation rotation) {
        sweep = Sweep.single(linkage, rotation);
        r = linkage.crankRadius();
        e = linkage.guideOffset();
        double l = linkage.rodLength();
        lambda = r / l;
        shortest = l - e * e / (2 * l);
        sigma = rotation.sign();
    }

    /** Both values at a crank angle φ, rad. */
    public Value at(Quantity quantity, double crankAngle) {
        sweep.turnTo(crankAngle, Approach.JUST_AFTER);
        double sin = sweep.sinPin()[0];
        double cos = sweep.cosPin()[0];
        double cos2 = (cos - sin) * (cos + sin);
        return switch (quantity) {
            case TRAVEL -> {
                double reach = shortest + r * (cos - lambda / 4 * (1 - cos2)) + e * lambda * sin;
                yield new Value(sweep.linkage().greatestReach() - reach, sweep.travel()[0]);
            }
            case VELOCITY -> {
                double reach1 = -r * (sin + lambda * sin * cos) + e * lambda * cos;
                yield new Value(-sigma * reach1, -sigma * sweep.reach1()[0]);
            }
            case ACCELERATION -> {
                double reach2 = -r * (cos + lambda * cos2) - e * lambda * sin;
                yield new Value(-reach2, -sweep.reach2()[0]);
            }
            case ROD_ANGLE -> new Value(lambda * sin - e / sweep.linkage().rodLength(), sweep.rodAngle()[0]);
        };
    }

    /** Where the error is largest over the revolution. */
    public Worst worst(Quantity quantity) {
        double step = Angles.TURN / SCANNED;
        double near = 0;
        for (int i = 1; i < SCANNED; i++) {
            if (size(quantity, i * step) > size(quantity, near)) {
                near = i * step;
            }
        }
        double angle = new BrentOptimizer(1e-10, 1e-12)
                .optimize(
                        new MaxEval(MOST_EVALUATIONS),
                        new UnivariateObjectiveFunction(crankAngle -> size(quantity, crankAngle)),
                        GoalType.MAXIMIZE,
                        new SearchInterval(near - step, near + step, near))
                .getPoint();
        double taken = size(quantity, angle) > size(quantity, near) ? Angles.wrap(angle) : near;
        return new Worst(taken, at(quantity, taken));
    }

    private double size(Quantity quantity, double crankAngle) {
        return Math.abs(at(quantity, crankAngle).error());
    }
}
