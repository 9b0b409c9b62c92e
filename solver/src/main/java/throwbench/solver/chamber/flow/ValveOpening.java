package throwbench.solver.chamber.flow;

/**
 * One valve from opening to shutting, the other one shut. Pressure alone is then a scalar equation. With y = p/p_line,
 * e = |1 − y| = u², s = 1 for suction and −1 for discharge, a the flow scale in m³/rad:
 *
 * <pre>    y′ = k/V (s a ψ(u) − y V′)</pre>
 *
 * <p>Steps are those of the L-stable SDIRK method of order 2 (γ = 1 − 1/√2), in the variable y V^n: n = 0 where the valve
 * is generous and y stays near 1, n → k where it throttles and the gas is nearly shut in, so that both limits are exact.
 * A stage is a quadratic in u. Every choice of a step's length depends continuously on the state, which lets the periodic
 * state be found to 1e-8. Used by one solution at a time.
 */
public final class ValveOpening {

    private static final double GAMMA = 1 - Math.sqrt(0.5);

    private static final double CARRY = (1 - GAMMA) / GAMMA;

    /** A step is at least this long however near the closing is, rad (0.1°): it is then landed on by root finding. */
    private static final double NEAR = Math.toRadians(0.1);

    private static final double SHORTEST_START = 1e-5;

    private final PistonPath path;
    private final double k;
    private final FlowFit fit;
    private final double sense;
    private final double longest;
    private final double growth;
    private final FlowSteps.Log log = new FlowSteps.Log();

    private double flowScale;
    private double exponent;
    private double angle;
    private double ratio;
    private double u;
    private double slope;
    private double volume;
    private double volumeSlope;
    private double approach;
    private double area;
    private double flow;

    // what a trial step leaves: state at its end and the flow over it
    private double endU;
    private double endVolume;
    private double endVolumeSlope;
    private double meanFlow;

    /**
     * @param suction whether gas enters from the suction line, or leaves towards the discharge line
     * @param longest step, rad, at most {@link PistonPath#LONGEST}
     * @param growth of each step over the one before, above 1
     */
    public ValveOpening(PistonPath path, FlowFunction law, boolean suction, double longest, double growth) {
        this.path = path;
        this.k = law.k();
        this.fit = suction ? FlowFit.inward(law) : FlowFit.outwardOnIsentrope(law);
        this.sense = suction ? 1 : -1;
        this.longest = longest;
        this.growth = growth;
    }

    /**
     * Follows the valve from a crank angle (rad) at which the pressure passes the line's, until it shuts.
     *
     * @param scale a = A_e √(R T)/ω, m³/rad
     */
    public void run(double opening, double scale) {
        flowScale = scale;
        angle = opening;
        path.standAt(opening);
        volume = path.volume();
        volumeSlope = path.slope();
        ratio = 1;
        u = 0;
        slope = -k * volumeSlope / volume;
        approach = 0;
        area = 0;
        flow = 0;
        log.clear();
        log.add(angle, ratio, slope);
        double h = firstStep();
        if (open(h) <= 0) {
            // the dead centre is nearer than that: nothing passes
            return;
        }
        do {
            double step = Math.min(h, limit());
            advance(step);
            h = Math.min(growth * step, longest);
        } while (u > 0);
    }

    /** A twentieth of the angle over which the flow comes to follow the piston. */
    private double firstStep() {
        double leaving = k * Math.abs(volumeSlope) / volume;
        double response = k * flowScale * fit.slopeAt(0) / volume;
        double relaxation = leaving / (response * response);
        double stiffness = longest / relaxation;
        double share = Math.max(0, 1 - 2 * stiffness);
        exponent = k * share * share;
        return Math.max(SHORTEST_START, Math.min(longest / 4, relaxation / 20));
    }

    /** Half the way to the closing, straight on along the last step's chord. */
    private double limit() {
        return approach > 0 ? Math.min(longest, Math.max(NEAR, u * u / approach / 2)) : longest;
    }

    private void advance(double step) {
        if (open(step) > 0) {
            accept(step);
            return;
        }
        double shutting = Landing.length(step, u * u, this::open);
        open(shutting);
        if (sense * endVolumeSlope < 0) {
            land(shutting);
        } else if (openByEuler(step) > 0) {
            // a valve can't shut before the dead centre: the second stage overshot
            accept(step);
        } else {
            double slower = Landing.length(step, u * u, this::openByEuler);
            openByEuler(slower);
            land(slower);
        }
    }

    private void land(double step) {
        endU = 0;
        accept(step);
    }

    /** Tries a step of this length (rad): above 0 while the valve is still open at its end, and what drives it there. */
    private double open(double step) {
        path.look(step);
        endVolume = path.volume();
        endVolumeSlope = path.slope();
        double endTurns = exponent == 0 ? 1 : Math.pow(endVolume / volume, exponent);
        path.look(GAMMA * step);
        double v = path.volume();
        double turns = exponent == 0 ? 1 : Math.pow(v / volume, exponent);
        double weight = GAMMA * step * k;
        double c = weight / v;
        double b = Math.fma(c * (1 - exponent / k), path.slope(), 1);
        double free = sense * (b - ratio / turns);
        if (free <= 0) {
            return free;
        }
        double u1 = fit.solve(b, c * flowScale, free, u);
        double y1 = 1 - sense * u1 * u1;
        double carried = Math.fma(CARRY, turns * y1 - ratio, ratio);
        c = weight / endVolume;
        b = Math.fma(c * (1 - exponent / k), endVolumeSlope, 1);
        free = sense * (b - carried / endTurns);
        if (free <= 0) {
            return free;
        }
        endU = fit.solve(b, c * flowScale, free, u1);
        meanFlow = flowScale * ((1 - GAMMA) * fit.at(u1) + GAMMA * fit.at(endU));
        return free;
    }

    /** Tries the implicit Euler step, which keeps a valve open up to the dead centre. */
    private double openByEuler(double step) {
        path.look(step);
        endVolume = path.volume();
        endVolumeSlope = path.slope();
        double c = step * k / endVolume;
        double b = Math.fma(c, endVolumeSlope, 1);
        double free = sense * (b - ratio);
        endU = free > 0 ? fit.solve(b, c * flowScale, free, u) : 0;
        meanFlow = flowScale * fit.at(endU);
        return free;
    }

    private void accept(double step) {
        path.look(step);
        path.advance();
        double endRatio = 1 - sense * endU * endU;
        double endSlope = k / endVolume * (sense * flowScale * fit.at(endU) - endRatio * endVolumeSlope);
        // Simpson's rule on V y′ of the two cubics
        double middleVolume = (volume + endVolume) / 2 + step / 8 * (volumeSlope - endVolumeSlope);
        double middleSlope = 1.5 * (endRatio - ratio) / step - (slope + endSlope) / 4;
        approach = (u * u - endU * endU) / step;
        area += step / 6 * (volume * slope + 4 * middleVolume * middleSlope + endVolume * endSlope);
        flow += step * meanFlow;
        angle += step;
        ratio = endRatio;
        u = endU;
        slope = endSlope;
        volume = endVolume;
        volumeSlope = endVolumeSlope;
        log.add(angle, ratio, slope);
    }

    /** Crank angle at which it shut, rad. */
    public double shutAngle() {
        return angle;
    }

    /** Volume at which it shut, m³. */
    public double shutVolume() {
        return volume;
    }

    /** ∫ V dy over the opening, m³: the work lost, over the line's pressure. */
    public double lostVolume() {
        return area;
    }

    /** ∫ a ψ dφ, m³. */
    public double flow() {
        return flow;
    }

    /** p/p_line over the crank angle. */
    public FlowSteps.Log log() {
        return log;
    }
}
