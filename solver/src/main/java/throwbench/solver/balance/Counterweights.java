package throwbench.solver.balance;

import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.SingularValueDecomposition;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Rotation;

/** Counterweights on the cranks, as static moments opposite the pin, kg m. */
public final class Counterweights {

    /**
     * The customary share of the reciprocating masses that a counterweight takes: it halves the primary force of a single crank
     * (table of forces and couples in Bloch and Hoefner, Reciprocating Compressors: Operation and Maintenance, 1996, p. 91).
     */
    public static final double CUSTOMARY_SHARE = 0.5;

    /** Singular values below this share of the greatest are rounding: pins all in one line. */
    private static final double RANK = 1e-9;

    private Counterweights() {}

    /**
     * W that balances all that turns with the crank and a share of what reciprocates, one throw by itself:
     * W = U + r [m_c (1 − b/l) + share (m_rec + m_c b/l)]. The connecting rod counts by its mass centre, which gives its force
     * exactly.
     *
     * @param share of the reciprocating masses, usually between 0 and 1
     */
    public static double usual(Throw t, double share) {
        double r = t.linkage().crankRadius();
        double l = t.linkage().rodLength();
        double reciprocatingShare = t.connectingRod().massCentre(l) / l;
        double turning = t.connectingRod().mass() * (1 - reciprocatingShare);
        double reciprocating = t.masses().total() + t.connectingRod().mass() * reciprocatingShare;
        return t.crank().unbalance() + r * (turning + share * reciprocating);
    }

    /**
     * The least changes of the counterweights (by sum of squares) that make a machine's primary force smallest. Counterweights
     * turn with the shaft: they can take off the part of the force that turns with it, and nothing of the part that turns
     * against it. At the constant mean speed.
     *
     * @param primary the shaking force of order 1
     * @param meanSpeed rad/s, above 0
     * @param pinAngles of every throw, from X, counter-clockwise, when the first stands at head-end dead centre, rad
     * @return for every throw what to add to W, kg m
     */
    public static double[] leastPrimaryForce(
            OrderVector primary, double meanSpeed, Rotation rotation, double[] pinAngles) {
        RealMatrix pins = MatrixUtils.createRealMatrix(2, pinAngles.length);
        for (int i = 0; i < pinAngles.length; i++) {
            pins.setEntry(0, i, Math.cos(pinAngles[i]));
            pins.setEntry(1, i, Math.sin(pinAngles[i]));
        }
        // ΔW pulls at the frame against the pin with ΔW ω²
        double moment = primary.length(rotation) / (meanSpeed * meanSpeed);
        double angle = primary.angle(rotation);
        double[] wanted = {moment * Math.cos(angle), moment * Math.sin(angle)};
        return pseudoInverse(pins).operate(new ArrayRealVector(wanted)).toArray();
    }

    private static RealMatrix pseudoInverse(RealMatrix pins) {
        SingularValueDecomposition parts = new SingularValueDecomposition(pins);
        double[] values = parts.getSingularValues();
        RealMatrix inverse = MatrixUtils.createRealMatrix(values.length, values.length);
        for (int i = 0; i < values.length; i++) {
            inverse.setEntry(i, i, values[i] > RANK * values[0] ? 1 / values[i] : 0);
        }
        return parts.getV().multiply(inverse).multiply(parts.getUT());
    }
}
