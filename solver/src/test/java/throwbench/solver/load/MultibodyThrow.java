package throwbench.solver.load;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;
import throwbench.solver.trial.MovingThrow;

/**
 * A throw as three free bodies tied by constraints: M q" + Jᵀ λ = Q, J q" = γ, solved for accelerations and multipliers
 * together. Nothing of it knows a slider-crank formula: places and speeds come from the constraints by Newton's method.
 *
 * <p>q = (x, y, angle) of the crank's lump, of the connecting rod at its mass centre, and of the crosshead. Constraints:
 * crank pivot (2), crank pin (2), crosshead pin (2), guide, no turning of the crosshead, the driven angle. A multiplier is the
 * force on the second body of its joint.
 */
final class MultibodyThrow {

    /** Distance of the crank's lump from the centre, m: any will do, its mass follows from U − W. */
    private static final double LUMP_AT = 0.1;

    private static final int BODIES = 9;

    private final MovingThrow at;
    private final double r;
    private final double l;
    private final double b;
    private final double e;
    private final double driven;
    private double[] multipliers = new double[BODIES];

    MultibodyThrow(MovingThrow at) {
        this.at = at;
        r = at.body().linkage().crankRadius();
        l = at.body().linkage().rodLength();
        e = at.body().linkage().guideOffset();
        b = at.body().rodMassCentre();
        driven = at.pinAngle();
        solve();
    }

    private void solve() {
        RealVector q = assemble();
        RealMatrix j = jacobian(q);
        RealVector demanded = new ArrayRealVector(BODIES);
        demanded.setEntry(8, at.rotation().sign() * at.speed());
        RealVector velocity = new LUDecomposition(j).getSolver().solve(demanded);
        RealVector gamma = new ArrayRealVector(BODIES);
        accelerationTerms(q, velocity, gamma);
        gamma.setEntry(8, at.rotation().sign() * at.alpha());
        // friction of the guide follows from a multiplier: repeat until it stands
        double guide = 0;
        for (int i = 0; i < 200; i++) {
            multipliers = multipliers(j, gamma, velocity.getEntry(6), guide);
            double change = Math.abs(-multipliers[6] - guide);
            guide = -multipliers[6];
            if (change <= 1e-14 * Math.abs(guide)) {
                return;
            }
        }
    }

    /** Places that meet the constraints, by Newton's method from a rod laid along the line of stroke. */
    private RealVector assemble() {
        double c = Math.cos(driven);
        double s = Math.sin(driven);
        RealVector q = new ArrayRealVector(
                new double[] {LUMP_AT * c, LUMP_AT * s, driven, r * c + b, r * s, 0, r * c + l, e, 0});
        for (int i = 0; i < 50; i++) {
            RealVector step = new LUDecomposition(jacobian(q)).getSolver().solve(constraints(q));
            q = q.subtract(step);
        }
        return q;
    }

    private RealVector constraints(RealVector q) {
        double crank = q.getEntry(2);
        double rod = q.getEntry(5);
        return new ArrayRealVector(new double[] {
            q.getEntry(0) - LUMP_AT * Math.cos(crank),
            q.getEntry(1) - LUMP_AT * Math.sin(crank),
            q.getEntry(0) + (r - LUMP_AT) * Math.cos(crank) - q.getEntry(3) + b * Math.cos(rod),
            q.getEntry(1) + (r - LUMP_AT) * Math.sin(crank) - q.getEntry(4) + b * Math.sin(rod),
            q.getEntry(3) + (l - b) * Math.cos(rod) - q.getEntry(6),
            q.getEntry(4) + (l - b) * Math.sin(rod) - q.getEntry(7),
            q.getEntry(7) - e,
            q.getEntry(8),
            crank - driven
        });
    }

    private RealMatrix jacobian(RealVector q) {
        double cc = Math.cos(q.getEntry(2));
        double sc = Math.sin(q.getEntry(2));
        double cr = Math.cos(q.getEntry(5));
        double sr = Math.sin(q.getEntry(5));
        double outer = r - LUMP_AT;
        return new Array2DRowRealMatrix(new double[][] {
            {1, 0, LUMP_AT * sc, 0, 0, 0, 0, 0, 0},
            {0, 1, -LUMP_AT * cc, 0, 0, 0, 0, 0, 0},
            {1, 0, -outer * sc, -1, 0, -b * sr, 0, 0, 0},
            {0, 1, outer * cc, 0, -1, b * cr, 0, 0, 0},
            {0, 0, 0, 1, 0, -(l - b) * sr, -1, 0, 0},
            {0, 0, 0, 0, 1, (l - b) * cr, 0, -1, 0},
            {0, 0, 0, 0, 0, 0, 0, 1, 0},
            {0, 0, 0, 0, 0, 0, 0, 0, 1},
            {0, 0, 1, 0, 0, 0, 0, 0, 0}
        });
    }

    /** γ = −(dJ/dt) q': centripetal terms. */
    private void accelerationTerms(RealVector q, RealVector v, RealVector gamma) {
        double crank = v.getEntry(2) * v.getEntry(2);
        double rod = v.getEntry(5) * v.getEntry(5);
        double outer = r - LUMP_AT;
        double cc = Math.cos(q.getEntry(2));
        double sc = Math.sin(q.getEntry(2));
        double cr = Math.cos(q.getEntry(5));
        double sr = Math.sin(q.getEntry(5));
        gamma.setEntry(0, -LUMP_AT * cc * crank);
        gamma.setEntry(1, -LUMP_AT * sc * crank);
        gamma.setEntry(2, outer * cc * crank + b * cr * rod);
        gamma.setEntry(3, outer * sc * crank + b * sr * rod);
        gamma.setEntry(4, (l - b) * cr * rod);
        gamma.setEntry(5, (l - b) * sr * rod);
    }

    private double[] multipliers(RealMatrix j, RealVector gamma, double crossheadVelocity, double guide) {
        ThrowBody body = at.body();
        double lump = body.crankNet() / LUMP_AT;
        double slider = body.masses().total();
        double[] masses = {lump, lump, 0, body.rodMass(), body.rodMass(), body.rodInertia(), slider, slider, 0};
        double gx = -body.gravity() * Math.sin(body.axisDirection());
        double gy = -body.gravity() * Math.cos(body.axisDirection());
        double friction = -Math.signum(crossheadVelocity)
                * (body.friction().packing() + body.friction().guideCoefficient() * Math.abs(guide));
        double[] forces = new double[BODIES];
        for (int body3 = 0; body3 < BODIES; body3 += 3) {
            forces[body3] = masses[body3] * gx;
            forces[body3 + 1] = masses[body3 + 1] * gy;
        }
        forces[6] += at.gasLoad() + friction;

        RealMatrix whole = new Array2DRowRealMatrix(2 * BODIES, 2 * BODIES);
        RealVector right = new ArrayRealVector(2 * BODIES);
        for (int i = 0; i < BODIES; i++) {
            whole.setEntry(i, i, masses[i]);
            right.setEntry(i, forces[i]);
            right.setEntry(BODIES + i, gamma.getEntry(i));
        }
        whole.setSubMatrix(j.transpose().getData(), 0, BODIES);
        whole.setSubMatrix(j.getData(), BODIES, 0);
        RealVector solved = new LUDecomposition(whole, 1e-300).getSolver().solve(right);
        return solved.getSubVector(BODIES, BODIES).toArray();
    }

    /** On the crosshead. */
    double crossheadPinX() {
        return multipliers[4];
    }

    double crossheadPinY() {
        return multipliers[5];
    }

    /** On the connecting rod's big end. */
    double crankPinX() {
        return multipliers[2];
    }

    double crankPinY() {
        return multipliers[3];
    }

    /** On the crankshaft, without the weight of the crank's lump, which the bearing carries besides. */
    double mainBearingX() {
        ThrowBody body = at.body();
        return -multipliers[0] - body.crankNet() / LUMP_AT * body.gravity() * Math.sin(body.axisDirection());
    }

    double mainBearingY() {
        ThrowBody body = at.body();
        return -multipliers[1] - body.crankNet() / LUMP_AT * body.gravity() * Math.cos(body.axisDirection());
    }

    /** On the crosshead, along +y. */
    double guide() {
        return -multipliers[6];
    }

    /** In the sense of rotation, without what turns the lump faster: that belongs to the shaft's own inertia. */
    double torque() {
        double lumpInertia = at.body().crankNet() * LUMP_AT;
        return -at.rotation().sign() * multipliers[8] - lumpInertia * at.alpha();
    }
}
