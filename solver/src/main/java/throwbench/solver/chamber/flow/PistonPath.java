package throwbench.solver.chamber.flow;

import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;

/**
 * A chamber's volume and its slope by crank angle, followed in small steps: sine and cosine of the pin's angle are turned
 * on by the step, so that nothing but a square root and a division is left to do.
 */
public final class PistonPath {

    /** Longest look ahead, rad: the series for its sine and cosine are exact to 1e-16 up to here. */
    public static final double LONGEST = 0.08;

    private final double headEndAngle;
    private final double sign;
    private final double radius;
    private final double ratio;
    private final double offset;
    private final double rodLength;
    private final double atOrigin;
    private final double area;
    private double sin;
    private double cos;
    private double aheadSin;
    private double aheadCos;
    private double volume;
    private double slope;

    /**
     * @param volumeAtHeadEnd the chamber's volume at head-end dead centre, m³
     * @param growth of the volume by travel from there, m²: the piston's area, negative for a crank end
     */
    public PistonPath(Linkage linkage, Rotation rotation, double volumeAtHeadEnd, double growth) {
        headEndAngle = linkage.headEndAngle();
        sign = rotation.sign();
        radius = linkage.crankRadius();
        rodLength = linkage.rodLength();
        ratio = radius / rodLength;
        offset = linkage.guideOffset() / rodLength;
        area = growth;
        atOrigin = volumeAtHeadEnd + area * linkage.greatestReach();
    }

    /** Stands at a crank angle φ (rad) and looks there. */
    void standAt(double crankAngle) {
        double pinAngle = headEndAngle + sign * crankAngle;
        sin = Math.sin(pinAngle);
        cos = Math.cos(pinAngle);
        look(0);
    }

    /** Looks ahead by an angle (rad) of at most {@link #LONGEST}: sets volume and slope there. */
    void look(double ahead) {
        double h2 = ahead * ahead;
        double sinAhead = ahead * Math.fma(h2, Math.fma(h2, Math.fma(h2, -1 / 5040.0, 1 / 120.0), -1 / 6.0), 1);
        double cosAhead =
                Math.fma(h2, Math.fma(h2, Math.fma(h2, Math.fma(h2, 1 / 40320.0, -1 / 720.0), 1 / 24.0), -0.5), 1);
        double turned = sign * sinAhead;
        aheadSin = Math.fma(sin, cosAhead, cos * turned);
        aheadCos = Math.fma(cos, cosAhead, -sin * turned);
        double sinBeta = Math.fma(ratio, aheadSin, -offset);
        double cosBeta = Math.sqrt((1 - sinBeta) * (1 + sinBeta));
        // x = r cos θ + l cos β,  dx/dθ = −r (sin θ + cos θ tan β)
        volume = atOrigin - area * Math.fma(radius, aheadCos, rodLength * cosBeta);
        slope = sign * area * radius * Math.fma(aheadCos, sinBeta / cosBeta, aheadSin);
    }

    /** Stands where it last looked. */
    void advance() {
        sin = aheadSin;
        cos = aheadCos;
    }

    /** V, m³. */
    double volume() {
        return volume;
    }

    /** dV/dφ, m³/rad. */
    double slope() {
        return slope;
    }
}
