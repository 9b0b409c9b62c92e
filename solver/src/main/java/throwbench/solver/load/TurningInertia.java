package throwbench.solver.load;

import throwbench.solver.mechanism.Sweep;

/**
 * What the moving parts of one throw add to the inertia about the shaft: I = m_rec x′² + m_c (x_G′² + y_G′²) + I_c β′², at one
 * angle. Crank and counterweight are not in it.
 */
public final class TurningInertia {

    private final ThrowBody body;
    private double inertia;
    private double slope;

    public TurningInertia(ThrowBody body) {
        this.body = body;
    }

    /** Reads the place of a single sweep. */
    public void turnTo(Sweep sweep) {
        double fromCrosshead = body.linkage().rodLength() - body.rodMassCentre();
        double sin = sweep.sinRod()[0];
        double cos = sweep.cosRod()[0];
        double x1 = sweep.reach1()[0];
        double x2 = sweep.reach2()[0];
        double b1 = sweep.rodAngle1()[0];
        double b2 = sweep.rodAngle2()[0];
        double xg1 = x1 + fromCrosshead * sin * b1;
        double yg1 = fromCrosshead * cos * b1;
        double xg2 = x2 + fromCrosshead * (b2 * sin + b1 * b1 * cos);
        double yg2 = fromCrosshead * (b2 * cos - b1 * b1 * sin);
        double reciprocating = body.masses().total();
        inertia = reciprocating * x1 * x1 + body.rodMass() * (xg1 * xg1 + yg1 * yg1) + body.rodInertia() * b1 * b1;
        double half = reciprocating * x1 * x2 + body.rodMass() * (xg1 * xg2 + yg1 * yg2) + body.rodInertia() * b1 * b2;
        slope = 2 * sweep.rotation().sign() * half;
    }

    /** I, kg m². */
    public double inertia() {
        return inertia;
    }

    /** dI/dφ by the crank angle, kg m². */
    public double slope() {
        return slope;
    }
}
