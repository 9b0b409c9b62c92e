package throwbench.solver.drive;

import java.util.Arrays;
import java.util.Optional;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;

/**
 * ω and α of the shaft at any crank angle of the first throw: one speed, or a smooth polynomial between each two break angles.
 * Immutable.
 */
public final class SpeedCurve {

    private final double meanSpeed;
    private final Optional<DrivingTorque> driving;
    /** Where each piece begins, rad, rising from 0, and a turn at the end; empty for one speed. */
    private final double[] starts;
    /** Chebyshev coefficients of ω² and of α over each piece. */
    private final double[][] squares;

    private final double[][] accelerations;
    private final double greatest;
    private final double least;

    private SpeedCurve(
            double meanSpeed,
            Optional<DrivingTorque> driving,
            double[] starts,
            double[][] squares,
            double[][] accelerations) {
        this.meanSpeed = meanSpeed;
        this.driving = driving;
        this.starts = starts;
        this.squares = squares;
        this.accelerations = accelerations;
        this.greatest = squares.length == 0 ? meanSpeed : extreme(1);
        this.least = squares.length == 0 ? meanSpeed : extreme(-1);
    }

    /** The shaft of a driver that holds one speed (rad/s, above 0). */
    public static SpeedCurve constant(double speed) {
        return new SpeedCurve(speed, Optional.empty(), new double[0], new double[0][], new double[0][]);
    }

    /** Takes the arrays over. */
    static SpeedCurve of(DrivingTorque driving, double[] starts, double[][] squares, double[][] accelerations) {
        return new SpeedCurve(driving.meanSpeed(), Optional.of(driving), starts, squares, accelerations);
    }

    /** Whether it is one speed all round. */
    public boolean constant() {
        return squares.length == 0;
    }

    /** 2π over the time of a revolution, rad/s. */
    public double meanSpeed() {
        return meanSpeed;
    }

    /** ω_max, rad/s. */
    public double greatest() {
        return greatest;
    }

    /** ω_min, rad/s. */
    public double least() {
        return least;
    }

    /** (ω_max − ω_min)/ω_mean. */
    public double fluctuation() {
        return (greatest - least) / meanSpeed;
    }

    /** What the driver delivers; empty for a driver that holds one speed: it delivers whatever the shaft asks for. */
    public Optional<DrivingTorque> driving() {
        return driving;
    }

    /** ω at a crank angle of the first throw (rad, any number of turns), rad/s. */
    public double speedAt(double crankAngle, Approach approach) {
        if (constant()) {
            return meanSpeed;
        }
        double angle = Angles.wrap(crankAngle);
        int piece = pieceAt(angle + approach.bias());
        return Math.sqrt(Collocation.value(squares[piece], place(piece, angle)));
    }

    /** α there, rad/s². */
    public double accelerationAt(double crankAngle, Approach approach) {
        if (constant()) {
            return 0;
        }
        double angle = Angles.wrap(crankAngle);
        int piece = pieceAt(angle + approach.bias());
        return Collocation.value(accelerations[piece], place(piece, angle));
    }

    /**
     * Fills ω and α at crank angles.
     *
     * @param crankAngles rad
     * @param shift what turns them into crank angles of the first throw, rad
     */
    public void fill(double[] crankAngles, double shift, Approach approach, double[] speed, double[] acceleration) {
        if (constant()) {
            Arrays.fill(speed, meanSpeed);
            Arrays.fill(acceleration, 0);
            return;
        }
        for (int i = 0; i < crankAngles.length; i++) {
            double angle = Angles.wrap(crankAngles[i] + shift);
            int piece = pieceAt(angle + approach.bias());
            double place = place(piece, angle);
            speed[i] = Math.sqrt(Collocation.value(squares[piece], place));
            acceleration[i] = Collocation.value(accelerations[piece], place);
        }
    }

    /** @param angle rad, less than a turn from [0, 2π) on either side */
    private int pieceAt(double angle) {
        double inside = angle < 0 ? angle + Angles.TURN : angle >= Angles.TURN ? angle - Angles.TURN : angle;
        int found = Arrays.binarySearch(starts, inside);
        int piece = found >= 0 ? found : -found - 2;
        return Math.min(piece, squares.length - 1);
    }

    /** Where an angle lies on a piece that it is on or next to, 0 … 1 but for the tolerance of a break angle. */
    private double place(int piece, double angle) {
        double from = starts[piece];
        double length = starts[piece + 1] - from;
        double moved = angle - from;
        // the last piece read just before angle 0, the first just after a whole turn
        double near = moved > Angles.TURN / 2 && length < Angles.TURN / 2
                ? moved - Angles.TURN
                : moved < -Angles.TURN / 2 ? moved + Angles.TURN : moved;
        return near / length;
    }

    /** The greatest (sense 1) or least (−1) speed: at a piece's end or where α goes through zero. */
    private double extreme(double sense) {
        double best = Double.NEGATIVE_INFINITY;
        for (int piece = 0; piece < squares.length; piece++) {
            double[] terms = accelerations[piece];
            double place = 0;
            double value = Collocation.value(terms, place);
            best = Math.max(best, sense * Collocation.value(squares[piece], place));
            for (int i = 0; i < Collocation.NODES; i++) {
                double next = Collocation.radau().node(i);
                double nextValue = Collocation.value(terms, next);
                if (value * nextValue < 0) {
                    double top = new BrentSolver(1e-12).solve(100, x -> Collocation.value(terms, x), place, next);
                    best = Math.max(best, sense * Collocation.value(squares[piece], top));
                }
                place = next;
                value = nextValue;
            }
        }
        return Math.sqrt(sense * best);
    }
}
