package throwbench.solver.load;

import org.apache.commons.math3.analysis.differentiation.DerivativeStructure;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.trial.MovingThrow;

/**
 * Where the parts of a throw are, as functions of time round one instant, differentiated by Commons Math: a second way to
 * every velocity and acceleration that uses none of the solver's derivatives.
 */
final class DifferentiatedThrow {

    /** θ, and the places of the parts in throw axes. */
    final DerivativeStructure pinAngle;

    final DerivativeStructure rodAngle;
    final DerivativeStructure reach;
    final DerivativeStructure centreX;
    final DerivativeStructure centreY;
    final DerivativeStructure crankX;
    final DerivativeStructure crankY;
    private final MovingThrow at;

    DifferentiatedThrow(MovingThrow at) {
        this.at = at;
        Linkage linkage = at.body().linkage();
        double r = linkage.crankRadius();
        double l = linkage.rodLength();
        double e = linkage.guideOffset();
        DerivativeStructure t = new DerivativeStructure(1, 2, 0, 0);
        // turned since: omega t + alpha t^2 / 2, in the sense of rotation
        DerivativeStructure turned = t.multiply(at.speed()).add(t.multiply(t).multiply(at.alpha() / 2));
        pinAngle = turned.multiply(at.rotation().sign()).add(at.pinAngle());
        DerivativeStructure pinX = pinAngle.cos().multiply(r);
        DerivativeStructure pinY = pinAngle.sin().multiply(r);
        rodAngle = pinY.subtract(e).divide(l).asin();
        reach = pinX.add(rodAngle.cos().multiply(l));
        // the mass centre divides the line from the crank pin to the crosshead pin
        double share = at.body().rodMassCentre() / l;
        centreX = pinX.multiply(1 - share).add(reach.multiply(share));
        centreY = pinY.multiply(1 - share).add(e * share);
        crankX = pinAngle.cos();
        crankY = pinAngle.sin();
    }

    /** d(KE + PE)/dt of piston, crosshead, connecting rod and U − W. */
    double energyRate() {
        ThrowBody body = at.body();
        double kinetic = body.masses().total() * first(reach) * second(reach)
                + body.rodMass() * (first(centreX) * second(centreX) + first(centreY) * second(centreY))
                + body.rodInertia() * first(rodAngle) * second(rodAngle);
        double gx = -body.gravity() * Math.sin(body.axisDirection());
        double gy = -body.gravity() * Math.cos(body.axisDirection());
        double potential = -body.masses().total() * gx * first(reach)
                - body.rodMass() * (gx * first(centreX) + gy * first(centreY))
                - body.crankNet() * (gx * first(crankX) + gy * first(crankY));
        return kinetic + potential;
    }

    /** d/dt Σ m v along x of piston, crosshead, connecting rod and U − W. */
    double momentumRateX() {
        ThrowBody body = at.body();
        return body.masses().total() * second(reach)
                + body.rodMass() * second(centreX)
                + body.crankNet() * second(crankX);
    }

    double momentumRateY() {
        return at.body().rodMass() * second(centreY) + at.body().crankNet() * second(crankY);
    }

    static double first(DerivativeStructure quantity) {
        return quantity.getPartialDerivative(1);
    }

    static double second(DerivativeStructure quantity) {
        return quantity.getPartialDerivative(2);
    }
}
