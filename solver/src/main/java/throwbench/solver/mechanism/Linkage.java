package throwbench.solver.mechanism;

/**
 * Geometry of one slider-crank, in line or offset. Lengths in m, measured centre to centre.
 *
 * @param crankRadius r, above 0
 * @param rodLength l, above r + |e|: a linkage that cannot turn is refused
 * @param guideOffset e, height of the line of stroke above the crank centre, positive along +y
 */
public record Linkage(double crankRadius, double rodLength, double guideOffset) {

    public Linkage {
        if (!(crankRadius > 0 && turns(crankRadius, rodLength, guideOffset))) {
            throw new IllegalArgumentException("does not turn: r = " + crankRadius + " m, l = " + rodLength + " m, e = "
                    + guideOffset + " m; l - r must exceed |e|");
        }
    }

    /** Whether a linkage of these lengths (m) turns fully: l − r > |e|. */
    public static boolean turns(double crankRadius, double rodLength, double guideOffset) {
        return rodLength - crankRadius > Math.abs(guideOffset);
    }

    /** θh: the pin's angle from x at head-end dead centre, rad; 0 in line. */
    public double headEndAngle() {
        return Math.asin(guideOffset / (rodLength + crankRadius));
    }

    /** θc: the pin's angle from x at crank-end dead centre, rad; π in line. */
    public double crankEndAngle() {
        return Math.PI + Math.asin(guideOffset / (rodLength - crankRadius));
    }

    /** x of the crosshead pin at head-end dead centre, m. */
    public double greatestReach() {
        return leg(rodLength + crankRadius);
    }

    /** x of the crosshead pin at crank-end dead centre, m. */
    public double leastReach() {
        return leg(rodLength - crankRadius);
    }

    private double leg(double hypotenuse) {
        return Math.sqrt((hypotenuse - guideOffset) * (hypotenuse + guideOffset));
    }

    /** Distance between the dead centres, m; 2r in line, more with an offset. */
    public double stroke() {
        // the difference of the two reaches, written without their cancellation
        return 4 * crankRadius * rodLength / (greatestReach() + leastReach());
    }

    /** φc: crank angle of crank-end dead centre, rad in (0, 2π); π in line. */
    public double crankEndDeadCentre(Rotation rotation) {
        double turned = crankEndAngle() - headEndAngle();
        return rotation == Rotation.COUNTER_CLOCKWISE ? turned : 2 * Math.PI - turned;
    }

    /** Time of the inward stroke (towards the crank) over that of the outward one, at constant speed. */
    public double timeRatio(Rotation rotation) {
        double inward = crankEndDeadCentre(rotation);
        return inward / (2 * Math.PI - inward);
    }

    /** sin β at a pin angle θ (rad): β > 0 when the pin stands on the +y side of the line of stroke. */
    public double sinRodAngle(double pinAngle) {
        return (crankRadius * Math.sin(pinAngle) - guideOffset) / rodLength;
    }

    /** The greatest |sin β| of a turn, (r + |e|)/l. */
    public double greatestSinRodAngle() {
        return (crankRadius + Math.abs(guideOffset)) / rodLength;
    }

    /** A bound of |x″|, m: no second derivative of the reach by the pin's angle is larger. */
    public double greatestBend() {
        double sin = greatestSinRodAngle();
        double cos = Math.sqrt((1 - sin) * (1 + sin));
        double ratio = crankRadius / rodLength;
        // |β′| ≤ ratio/cos and |β″| ≤ (sin β′² + ratio)/cos in x″ = −r cos θ − l (cos β β′² + sin β β″)
        return crankRadius + rodLength * (ratio * ratio / (cos * cos * cos) + sin * ratio / cos);
    }

    /** x of the crosshead pin at a pin angle θ (rad), m. */
    public double reach(double pinAngle) {
        double sinBeta = sinRodAngle(pinAngle);
        return crankRadius * Math.cos(pinAngle) + rodLength * Math.sqrt((1 - sinBeta) * (1 + sinBeta));
    }

    /** Travel s from head-end dead centre at a crank angle φ (rad), m, positive towards the crank. */
    public double travel(double crankAngle, Rotation rotation) {
        return greatestReach() - reach(headEndAngle() + rotation.sign() * crankAngle);
    }

    /**
     * The crank angles at which the piston stands at a travel: on the inward stroke and on the outward one.
     *
     * @param travel s, m, in [0, stroke]
     * @return φ on both strokes, rad; the inward one in [0, φc], the outward one in [φc, 2π]
     * @throws IllegalArgumentException when the travel lies outside the stroke
     */
    public TravelAngles anglesAtTravel(double travel, Rotation rotation) {
        double stroke = stroke();
        if (!(travel >= 0 && travel <= stroke)) {
            throw new IllegalArgumentException("travel " + travel + " m is outside the stroke of " + stroke + " m");
        }
        if (travel == 0 || travel == stroke) {
            double deadCentre = travel == 0 ? 0 : crankEndDeadCentre(rotation);
            return new TravelAngles(deadCentre, travel == 0 ? 2 * Math.PI : deadCentre);
        }
        // the pin, the crosshead and the crank centre make a triangle with sides r, l and d
        double x = greatestReach() - travel;
        double d = Math.hypot(x, guideOffset);
        double cosine = (d * d + (crankRadius - rodLength) * (crankRadius + rodLength)) / (2 * d * crankRadius);
        double opening = Math.acos(Math.max(-1, Math.min(1, cosine)));
        double line = Math.atan2(guideOffset, x);
        double above = Angles.wrap(rotation.sign() * (line + opening - headEndAngle()));
        double below = Angles.wrap(rotation.sign() * (line - opening - headEndAngle()));
        return new TravelAngles(Math.min(above, below), Math.max(above, below));
    }

    /** Crank angles φ (rad) of one piston position: towards the crank, and back. */
    public record TravelAngles(double inward, double outward) {}
}
