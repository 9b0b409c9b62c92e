package throwbench.solver.drive;

import java.util.ArrayList;
import java.util.List;
import throwbench.solver.machine.Driver;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;

/**
 * Solves ½ d(I ω²)/dφ₁ = T_driver − T_load over one turn, so that it repeats and its mean speed is the one asked for: by
 * collocation on pieces between the break angles, all pieces and both conditions together, made linear about the pass before
 * (Newton). The load is read at the speeds of the pass before: friction that depends on them converges along with it. At the end
 * J α = T_driver − Σ throw torque is held against the machine between the nodes, and pieces that miss it are halved.
 */
public final class SpeedSolver {

    private static final double LONGEST_PIECE = Angles.TURN / 12;

    /** A piece is not halved below this length, rad: what is left there is a step that no break angle names. */
    private static final double SHORTEST_PIECE = 1e-4;

    /** Change of K from pass to pass, as a share of it, at which it stands; rounding lies at 1e-14. */
    private static final double ENERGY_STANDS = 1e-12;

    /** The same of Jα, as a share of the greatest torque. */
    private static final double TORQUE_STANDS = 1e-9;

    /** What J α = T_driver − Σ throw torque may miss between nodes, as a share of the greatest torque. */
    private static final double TORQUE_MISSED = 1e-8;

    /** A stiff driver's torque is no better known than its speed: D ω times this. */
    private static final double SPEED_ROUNDING = 1e-14;

    private static final int MOST_PASSES = 80;
    private static final int MOST_HALVINGS = 16;

    /** Where a piece is held against the machine: its start, and between nodes. */
    private static final double[] TRIED = {0, 0.2, 0.5, 0.95};

    private final ShaftLoad shaft;
    private final double rotatingInertia;
    private final double meanSpeed;
    private final double perSpeed;
    private List<SpeedPiece> pieces = List.of();
    private DrivingTorque driving;
    private double greatestTorque;

    /**
     * @param rotatingInertia J, kg m², above 0
     * @param driver one whose speed varies
     * @param meanSpeed ω_mean, rad/s, above 0
     */
    public SpeedSolver(ShaftLoad shaft, double rotatingInertia, Driver driver, double meanSpeed) {
        this.shaft = shaft;
        this.rotatingInertia = rotatingInertia;
        this.meanSpeed = meanSpeed;
        this.perSpeed = driver instanceof Driver.Slip slip
                ? slip.ratedTorque() * (1 - slip.ratedSlip()) / (slip.ratedSlip() * meanSpeed)
                : 0;
        this.driving = new DrivingTorque(0, perSpeed, meanSpeed);
    }

    /**
     * Solves the turn.
     *
     * @param breaks crank angles at which the load may bend or step, rad, rising from 0, in [0, 2π)
     * @param before a curve to start from
     */
    public SpeedOutcome solve(double[] breaks, SpeedCurve before) {
        SpeedOutcome outcome = solveOnce(breaks, before);
        for (int n = 0; n < MOST_HALVINGS && outcome.curve().isPresent(); n++) {
            if (!halve(outcome.curve().get())) {
                return outcome;
            }
            outcome = converge();
        }
        return outcome;
    }

    /** The same without the halving of pieces that miss the machine's torque: good enough to find break angles by. */
    public SpeedOutcome solveOnce(double[] breaks, SpeedCurve before) {
        List<SpeedPiece> whole = new ArrayList<>();
        for (int i = 0; i < breaks.length; i++) {
            double to = i + 1 < breaks.length ? breaks[i + 1] : Angles.TURN;
            int parts = (int) Math.ceil((to - breaks[i]) / LONGEST_PIECE);
            double length = (to - breaks[i]) / parts;
            for (int k = 0; k < parts; k++) {
                whole.add(new SpeedPiece(breaks[i] + k * length, length, before));
            }
        }
        pieces = whole;
        return converge();
    }

    private SpeedOutcome converge() {
        for (int n = 0; n < MOST_PASSES; n++) {
            greatestTorque = 0;
            for (SpeedPiece piece : pieces) {
                piece.read(shaft, rotatingInertia);
                piece.linearise(driving);
                for (int i = 0; i <= Collocation.NODES; i++) {
                    double own = piece.slope[i] * piece.speed[i] * piece.speed[i] / 2;
                    greatestTorque = Math.max(greatestTorque, Math.abs(piece.load[i]) + Math.abs(own));
                }
            }
            if (step(closing())) {
                SpeedCurve curve = curve();
                // between the nodes of a shaft that all but stops the polynomial falls below 0
                return curve.least() > 0
                        ? SpeedOutcome.solved(curve)
                        : SpeedOutcome.refused(EnergyShortage.sentence(pieces, rotatingInertia, meanSpeed));
            }
        }
        return SpeedOutcome.refused(EnergyShortage.sentence(pieces, rotatingInertia, meanSpeed));
    }

    /** The changes of the energy at angle 0 and of T_0 with which the turn repeats and takes its time. */
    private double[] closing() {
        double[] start = {1, 0, 0};
        double[] time = {0, 0, -Angles.TURN / meanSpeed};
        for (int k = 0; k < pieces.size(); k++) {
            SpeedPiece piece = pieces.get(k);
            for (int i = 0; i < Collocation.NODES; i++) {
                double speed = piece.speed[i + 1];
                double weight = piece.weight(i);
                double perEnergy = -weight / (piece.inertia[i + 1] * speed * speed * speed);
                double[] node = chained(piece.affine[i], start);
                time[0] += perEnergy * node[0];
                time[1] += perEnergy * node[1];
                time[2] += weight / speed + perEnergy * node[2];
            }
            start = chained(piece.affine[Collocation.NODES - 1], start);
            start[2] += piece.gap(next(k));
        }
        double[] repeats = {start[0] - 1, start[1], start[2]};
        double determinant = repeats[0] * time[1] - repeats[1] * time[0];
        return new double[] {
            (repeats[1] * time[2] - repeats[2] * time[1]) / determinant,
            (repeats[2] * time[0] - repeats[0] * time[2]) / determinant
        };
    }

    private SpeedPiece next(int piece) {
        return pieces.get(piece + 1 < pieces.size() ? piece + 1 : 0);
    }

    private static double[] chained(double[] node, double[] start) {
        return new double[] {node[0] * start[0], node[0] * start[1] + node[1], node[0] * start[2] + node[2]};
    }

    /** Goes to the new energies, or as far towards them as keeps the shaft turning; whether they are the old ones. */
    private boolean step(double[] closing) {
        double[][] changes = changes(closing);
        double share = share(changes);
        driving = new DrivingTorque(driving.atMeanSpeed() + share * closing[1], perSpeed, meanSpeed);
        boolean stands = share == 1;
        double near = TORQUE_STANDS * greatestTorque + SPEED_ROUNDING * perSpeed * meanSpeed;
        for (int k = 0; k < pieces.size(); k++) {
            SpeedPiece piece = pieces.get(k);
            for (int i = 0; i <= Collocation.NODES; i++) {
                double old = piece.energy(i);
                double oldAcceleration = piece.acceleration[i];
                piece.set(i, old + share * changes[k][i], driving);
                double turned = Math.abs(piece.acceleration[i] - oldAcceleration) * piece.inertia[i];
                stands &= Math.abs(changes[k][i]) <= ENERGY_STANDS * old && turned <= near;
            }
        }
        return stands;
    }

    /** The change of the energy at the start and the nodes of every piece. */
    private double[][] changes(double[] closing) {
        double[][] changes = new double[pieces.size()][Collocation.NODES + 1];
        double start = closing[0];
        for (int k = 0; k < pieces.size(); k++) {
            changes[k][0] = start;
            for (int i = 0; i < Collocation.NODES; i++) {
                changes[k][i + 1] = pieces.get(k).change(i, start, closing[1]);
            }
            start = changes[k][Collocation.NODES] + pieces.get(k).gap(next(k));
        }
        return changes;
    }

    /** 1, or the share of the step at which the least energy has fallen to a tenth. */
    private double share(double[][] changes) {
        double share = 1;
        for (int k = 0; k < pieces.size(); k++) {
            for (int i = 0; i <= Collocation.NODES; i++) {
                double most = 0.9 * pieces.get(k).energy(i);
                if (-changes[k][i] > most) {
                    share = Math.min(share, most / -changes[k][i]);
                }
            }
        }
        return share;
    }

    private SpeedCurve curve() {
        double[] starts = new double[pieces.size() + 1];
        double[][] squares = new double[pieces.size()][];
        double[][] accelerations = new double[pieces.size()][];
        for (int i = 0; i < pieces.size(); i++) {
            starts[i] = pieces.get(i).from;
            squares[i] = pieces.get(i).squareTerms();
            accelerations[i] = pieces.get(i).accelerationTerms();
        }
        starts[pieces.size()] = Angles.TURN;
        return SpeedCurve.of(driving, starts, squares, accelerations);
    }

    /** Halves every piece on which the curve misses the machine's torque; whether there was one. */
    private boolean halve(SpeedCurve curve) {
        List<SpeedPiece> next = new ArrayList<>();
        double allowed = TORQUE_MISSED * greatestTorque + SPEED_ROUNDING * perSpeed * meanSpeed;
        for (SpeedPiece piece : pieces) {
            if (piece.length > SHORTEST_PIECE && !(missed(piece, curve) <= allowed)) {
                next.add(new SpeedPiece(piece.from, piece.length / 2, curve));
                next.add(new SpeedPiece(piece.from + piece.length / 2, piece.length / 2, curve));
            } else {
                next.add(piece);
            }
        }
        boolean halved = next.size() > pieces.size();
        pieces = next;
        return halved;
    }

    private double missed(SpeedPiece piece, SpeedCurve curve) {
        double worst = 0;
        for (double place : TRIED) {
            double angle = piece.from + place * piece.length;
            double speed = curve.speedAt(angle, Approach.JUST_AFTER);
            double acceleration = curve.accelerationAt(angle, Approach.JUST_AFTER);
            shaft.turnTo(angle, Approach.JUST_AFTER, speed, acceleration);
            double inertia = rotatingInertia + shaft.inertia();
            double taken = shaft.torque() + inertia * acceleration + shaft.inertiaSlope() * speed * speed / 2;
            worst = Math.max(worst, Math.abs(driving.at(speed) - taken));
        }
        return worst;
    }
}
