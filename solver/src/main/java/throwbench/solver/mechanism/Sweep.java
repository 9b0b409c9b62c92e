package throwbench.solver.mechanism;

/**
 * The geometry of one throw at a run of equally spaced crank angles: a whole turn of stations, or one angle. Derivatives
 * are by the pin's angle θ and depend on geometry alone, so a sweep serves every speed, pressure and mass.
 *
 * <p>The arrays that the accessors give are the sweep's own, one entry a station: read them, never write. A whole turn is
 * not changed after it is made and may be shared between threads; a single angle is turned from place to place by its one
 * owner.
 */
public final class Sweep {

    private final Linkage linkage;
    private final Rotation rotation;
    private final int count;
    private final double crankEndDeadCentre;
    private final double[] crankAngle;
    private final double[] sinPin;
    private final double[] cosPin;
    private final double[] sinRod;
    private final double[] cosRod;
    private final double[] secRod;
    private final double[] rodAngle;
    private final double[] reach1;
    private final double[] reach2;
    private final double[] rodAngle1;
    private final double[] rodAngle2;
    private final double[] travel;
    private final Strokes strokes = new Strokes();
    private int turns;
    private int rodAngleTurn;

    private Sweep(Linkage linkage, Rotation rotation, int count) {
        this.linkage = linkage;
        this.rotation = rotation;
        this.count = count;
        this.crankEndDeadCentre = linkage.crankEndDeadCentre(rotation);
        crankAngle = new double[count];
        sinPin = new double[count];
        cosPin = new double[count];
        sinRod = new double[count];
        cosRod = new double[count];
        secRod = new double[count];
        rodAngle = new double[count];
        reach1 = new double[count];
        reach2 = new double[count];
        rodAngle1 = new double[count];
        rodAngle2 = new double[count];
        travel = new double[count];
    }

    /**
     * A whole turn of stations.
     *
     * @param start crank angle of the first station, rad
     * @param count stations, 2π/count apart; the first is not repeated at the end
     */
    public static Sweep wholeTurn(Linkage linkage, Rotation rotation, double start, int count) {
        Sweep sweep = new Sweep(linkage, rotation, count);
        sweep.fill(start, StationCircle.of(count), Approach.JUST_AFTER);
        sweep.rodAngle(); // complete before other threads see it
        return sweep;
    }

    /** One angle, at head-end dead centre until it is turned. */
    public static Sweep single(Linkage linkage, Rotation rotation) {
        Sweep sweep = new Sweep(linkage, rotation, 1);
        sweep.fill(0, StationCircle.of(1), Approach.JUST_AFTER);
        return sweep;
    }

    /** Turns a single angle to a crank angle φ (rad, any number of turns), read from one side of a step. */
    public void turnTo(double angle, Approach approach) {
        if (count != 1) {
            throw new IllegalStateException("a whole turn stays as it is; only a single angle turns");
        }
        fill(angle, StationCircle.of(1), approach);
    }

    private void fill(double start, StationCircle circle, Approach approach) {
        double first = Angles.wrap(start);
        turns++;
        crankAngles(first, circle);
        strokes.divide(first, circle.step(), count, crankEndDeadCentre, approach);
        pins(linkage.headEndAngle() + rotation.sign() * start, circle);
        rods();
        reaches();
    }

    private void crankAngles(double first, StationCircle circle) {
        for (int i = 0; i < count; i++) {
            double angle = first + circle.angle(i);
            crankAngle[i] = angle >= Angles.TURN ? angle - Angles.TURN : angle;
        }
    }

    private void pins(double pinAngle, StationCircle circle) {
        double sin0 = Math.sin(pinAngle);
        double cos0 = Math.cos(pinAngle);
        double sign = rotation.sign();
        double[] cos = circle.cosines();
        double[] sin = circle.sines();
        for (int i = 0; i < count; i++) {
            double turned = sign * sin[i];
            sinPin[i] = Math.fma(sin0, cos[i], cos0 * turned);
            cosPin[i] = Math.fma(cos0, cos[i], -sin0 * turned);
        }
    }

    private void rods() {
        double perLength = 1 / linkage.rodLength();
        double ratio = linkage.crankRadius() * perLength;
        double offset = linkage.guideOffset() * perLength;
        for (int i = 0; i < count; i++) {
            double s = Math.fma(ratio, sinPin[i], -offset);
            sinRod[i] = s;
            cosRod[i] = Math.sqrt((1 - s) * (1 + s));
        }
        for (int i = 0; i < count; i++) {
            secRod[i] = 1 / cosRod[i];
        }
        for (int i = 0; i < count; i++) {
            rodAngle1[i] = ratio * cosPin[i] * secRod[i];
        }
        for (int i = 0; i < count; i++) {
            rodAngle2[i] = Math.fma(sinRod[i], rodAngle1[i] * rodAngle1[i], -ratio * sinPin[i]) * secRod[i];
        }
    }

    private void reaches() {
        double r = linkage.crankRadius();
        double l = linkage.rodLength();
        double greatest = linkage.greatestReach();
        for (int i = 0; i < count; i++) {
            travel[i] = greatest - Math.fma(r, cosPin[i], l * cosRod[i]);
        }
        for (int i = 0; i < count; i++) {
            reach1[i] = -Math.fma(r, sinPin[i], l * sinRod[i] * rodAngle1[i]);
        }
        for (int i = 0; i < count; i++) {
            double first = rodAngle1[i];
            double bend = Math.fma(cosRod[i], first * first, sinRod[i] * rodAngle2[i]);
            reach2[i] = -Math.fma(r, cosPin[i], l * bend);
        }
    }

    public Linkage linkage() {
        return linkage;
    }

    public Rotation rotation() {
        return rotation;
    }

    /** Number of stations. */
    public int count() {
        return count;
    }

    /** Crank angle from station to station, rad; a whole turn for a single angle. */
    public double step() {
        return Angles.TURN / count;
    }

    /** Grows each time a single angle is turned: what was kept for another place is stale. */
    public int turns() {
        return turns;
    }

    /** The runs of stations that lie on one stroke each. */
    public Strokes strokes() {
        return strokes;
    }

    /** φ, rad, in [0, 2π). */
    public double[] crankAngle() {
        return crankAngle;
    }

    /** sin θ of the pin's angle from x. */
    public double[] sinPin() {
        return sinPin;
    }

    /** cos θ. */
    public double[] cosPin() {
        return cosPin;
    }

    /** sin β of the connecting rod's angle. */
    public double[] sinRod() {
        return sinRod;
    }

    /** cos β, above 0. */
    public double[] cosRod() {
        return cosRod;
    }

    /** 1/cos β. */
    public double[] secRod() {
        return secRod;
    }

    /** β, rad: made when first asked for, since no force needs it. */
    public double[] rodAngle() {
        if (rodAngleTurn != turns) {
            ArcSine.fill(sinRod, rodAngle, linkage.greatestSinRodAngle());
            rodAngleTurn = turns;
        }
        return rodAngle;
    }

    /** x′ = dx/dθ of the crosshead pin, m. */
    public double[] reach1() {
        return reach1;
    }

    /** x″, m. */
    public double[] reach2() {
        return reach2;
    }

    /** β′ = dβ/dθ, 1. */
    public double[] rodAngle1() {
        return rodAngle1;
    }

    /** β″, 1. */
    public double[] rodAngle2() {
        return rodAngle2;
    }

    /** s, m, from head-end dead centre towards the crank. */
    public double[] travel() {
        return travel;
    }
}
