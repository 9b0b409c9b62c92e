package throwbench.solver.drive;

import org.apache.commons.math3.linear.DecompositionSolver;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.RealMatrix;
import throwbench.solver.mechanism.Approach;

/**
 * The shaft's kinetic energy K = ½ I ω² over one smooth piece of the turn, K′ = T_0 − D (ω − ω_mean) − T_load, at the nodes of
 * a collocation. Made linear about the speeds of the pass before, the change of K at every node is p times that at the start,
 * plus q times the change of T_0, plus r. (Changes, not K itself: a stiff driver multiplies rounding.)
 */
final class SpeedPiece {

    private static final int NODES = Collocation.NODES;
    private static final Collocation SCHEME = Collocation.radau();

    final double from;
    final double length;
    /** At the start (index 0) and at the nodes. */
    final double[] speed = new double[NODES + 1];

    final double[] acceleration = new double[NODES + 1];
    final double[] inertia = new double[NODES + 1];
    final double[] slope = new double[NODES + 1];
    final double[] load = new double[NODES + 1];
    /** p, q, r at every node. */
    final double[][] affine = new double[NODES][3];

    SpeedPiece(double from, double length, SpeedCurve before) {
        this.from = from;
        this.length = length;
        for (int i = 0; i <= NODES; i++) {
            speed[i] = before.speedAt(angle(i), side(i));
            acceleration[i] = before.accelerationAt(angle(i), side(i));
        }
    }

    /** Crank angle of the start (0) or of a node, rad. */
    double angle(int i) {
        return i == 0 ? from : from + length * SCHEME.node(i - 1);
    }

    /** The last node lies on the piece's end, where something may step. */
    private static Approach side(int i) {
        return i == NODES ? Approach.JUST_BEFORE : Approach.JUST_AFTER;
    }

    /** Reads the load at the speeds and accelerations of the pass before. */
    void read(ShaftLoad shaft, double rotatingInertia) {
        for (int i = 0; i <= NODES; i++) {
            shaft.turnTo(angle(i), side(i), speed[i], acceleration[i]);
            inertia[i] = rotatingInertia + shaft.inertia();
            slope[i] = shaft.inertiaSlope();
            load[i] = shaft.torque();
        }
    }

    double energy(int i) {
        return inertia[i] * speed[i] * speed[i] / 2;
    }

    /** Solves the piece, made linear, for the changes at the nodes. */
    void linearise(DrivingTorque driving) {
        RealMatrix left = MatrixUtils.createRealMatrix(NODES, NODES);
        RealMatrix right = MatrixUtils.createRealMatrix(NODES, 3);
        for (int i = 0; i < NODES; i++) {
            double both = 0;
            double gained = 0;
            for (int j = 0; j < NODES; j++) {
                double weight = length * SCHEME.integral(i, j);
                double damping = driving.perSpeed() / (inertia[j + 1] * speed[j + 1]);
                left.setEntry(i, j, (i == j ? 1 : 0) + weight * damping);
                both += weight;
                gained += weight * (driving.at(speed[j + 1]) - load[j + 1]);
            }
            right.setRow(i, new double[] {1, both, energy(0) + gained - energy(i + 1)});
        }
        DecompositionSolver solver = new LUDecomposition(left).getSolver();
        RealMatrix solved = driving.perSpeed() == 0 ? right : solver.solve(right);
        for (int i = 0; i < NODES; i++) {
            affine[i] = solved.getRow(i);
        }
    }

    /** The change of K at a node for changes of the energy at the start and of T_0. */
    double change(int node, double atStart, double torque) {
        return affine[node][0] * atStart + affine[node][1] * torque + affine[node][2];
    }

    /** What K at the end is above K at the start of the next piece. */
    double gap(SpeedPiece next) {
        return energy(NODES) - next.energy(0);
    }

    /** What a constant torque (N·m) and the load do on the shaft from the start to a node, J. */
    double work(int node, double torque) {
        double work = 0;
        for (int j = 0; j < NODES; j++) {
            work += length * SCHEME.integral(node, j) * (torque - load[j + 1]);
        }
        return work;
    }

    /** Weight of a node in an integral over the piece, rad. */
    double weight(int node) {
        return length * SCHEME.weight(node);
    }

    /** Takes over an energy: speed and acceleration follow from it, with the load as it was read. */
    void set(int i, double energy, DrivingTorque driving) {
        double square = 2 * energy / inertia[i];
        speed[i] = Math.sqrt(square);
        acceleration[i] = (driving.at(speed[i]) - load[i] - slope[i] * square / 2) / inertia[i];
    }

    double[] squareTerms() {
        double[] squares = new double[NODES + 1];
        for (int i = 0; i <= NODES; i++) {
            squares[i] = speed[i] * speed[i];
        }
        return SCHEME.coefficients(squares);
    }

    double[] accelerationTerms() {
        double[] atNodes = new double[NODES];
        System.arraycopy(acceleration, 1, atNodes, 0, NODES);
        return SCHEME.coefficients(atNodes);
    }
}
