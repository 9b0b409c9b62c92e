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

    /** The valve is shut when so small a share of what the last step left is left of the pressure difference. */
    private static final double SHUT = 1e-8;

    private static final int TERMS = 8;

    private static final double SMALL = 0.06;

    private final PistonPath path;
    private final double k;
    private final StageFlow stage;
    private final double onset;
    private final double sense;
    private final StepRule rule;
    private final double longest;
    private final FlowSteps.Log log = new FlowSteps.Log();

    private double flowScale;
    private double exponent;

    /** How much of the piston's share of y′ is left to the steps: 1 − n/k. */
    private double piston;

    private double angle;
    private double ratio;
    private double u;
    private double trend;
    private double slope;
    private double volume;
    private double volumeSlope;
    private double approach;
    private double area;
    private double flow;

    // what a trial step leaves: state at its end and the flow over it
    private double endU;
    private double endPsi;
    private double endTrend;
    private double endVolume;
    private double endVolumeSlope;
    private double meanPsi;

    /** @param suction whether gas enters from the suction line, or leaves towards the discharge line */
    public ValveOpening(PistonPath path, FlowFunction law, boolean suction, StepRule rule) {
        this.path = path;
        this.k = law.k();
        FlowFit fit = suction ? FlowFit.inward(law) : FlowFit.outwardOnIsentrope(law);
        this.stage = new StageFlow(fit, rule.near());
        this.onset = fit.slopeAt(0);
        this.sense = suction ? 1 : -1;
        this.rule = rule;
        this.longest = rule.longest();
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
        trend = 0;
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
            h = Math.min(rule.growth() * step, longest);
        } while (u > 0);
    }

    /** A twentieth of the angle over which the flow comes to follow the piston. */
    private double firstStep() {
        double leaving = k * Math.abs(volumeSlope) / volume;
        double response = k * flowScale * onset / volume;
        double relaxation = leaving / (response * response);
        double stiffness = longest / relaxation;
        double share = Math.max(0, 1 - 2 * stiffness);
        exponent = k * share * share;
        piston = 1 - share * share;
        return Math.max(rule.shortest(), Math.min(longest / 4, relaxation / 20));
    }

    /** Half the way to the closing, straight on along the last step's chord; less where the volume changes quickly. */
    private double limit() {
        double quick = rule.change() * volume / (k * Math.abs(volumeSlope));
        double closing = approach > 0 ? Math.max(NEAR, u * u / approach / 2) : longest;
        return Math.min(longest, Math.min(quick, closing));
    }

    private void advance(double step) {
        if (open(step) > 0) {
            accept(step);
            return;
        }
        double shutting = Landing.length(step, u * u, SHUT * u * u, this::open);
        open(shutting);
        if (sense * endVolumeSlope < 0) {
            land(shutting);
        } else if (openByEuler(step) > 0) {
            // a valve can't shut before the dead centre: the second stage overshot
            accept(step);
        } else {
            double slower = Landing.length(step, u * u, SHUT * u * u, this::openByEuler);
            openByEuler(slower);
            land(slower);
        }
    }

    private void land(double step) {
        ends(0, 0, meanPsi);
        accept(step);
    }

    /** Tries a step of this length (rad): above 0 while the valve is still open at its end, and what drives it there. */
    private double open(double step) {
        path.look(GAMMA * step);
        double stageVolume = path.volume();
        double stageVolumeSlope = path.slope();
        look(step);
        double turns = exponent == 0 ? 1 : power(stageVolume / volume - 1);
        double endTurns = exponent == 0 ? 1 : power(endVolume / volume - 1);
        double weight = GAMMA * step * k;
        double c = weight / stageVolume;
        double b = Math.fma(c * piston, stageVolumeSlope, 1);
        double free = sense * (b - ratio / turns);
        if (free <= 0) {
            // shut before the first stage: far beyond the place that a step is to land on
            return free - u * u;
        }
        stage.solve(b, c * flowScale, free, Math.max(u / 2, Math.fma(GAMMA * step, trend, u)));
        double u1 = stage.u();
        double psi1 = stage.psi();
        double carried = Math.fma(CARRY, turns * (1 - sense * u1 * u1) - ratio, ratio);
        c = weight / endVolume;
        b = Math.fma(c * piston, endVolumeSlope, 1);
        free = sense * (b - carried / endTurns);
        if (free <= 0) {
            return free;
        }
        stage.solve(b, c * flowScale, free, Math.max(u1 / 2, u1 + CARRY * (u1 - u)));
        ends(stage.u(), stage.psi(), (1 - GAMMA) * psi1 + GAMMA * stage.psi());
        endTrend = (endU - u1) / ((1 - GAMMA) * step);
        return free;
    }

    /** (1 + d)^n, by eight terms of the binomial series while they leave less than 1e-11. */
    private double power(double d) {
        if (Math.abs(d) > SMALL) {
            return Math.pow(1 + d, exponent);
        }
        double sum = 1;
        for (int i = TERMS; i > 0; i--) {
            sum = Math.fma((exponent - i + 1) / i * d, sum, 1);
        }
        return sum;
    }

    /** Tries the implicit Euler step, which keeps a valve open up to the dead centre. */
    private double openByEuler(double step) {
        look(step);
        double c = step * k / endVolume;
        double b = Math.fma(c, endVolumeSlope, 1);
        double free = sense * (b - ratio);
        if (free > 0) {
            stage.solve(b, c * flowScale, free, u);
            ends(stage.u(), stage.psi(), stage.psi());
            endTrend = 0;
        }
        return free;
    }

    private void look(double step) {
        path.look(step);
        endVolume = path.volume();
        endVolumeSlope = path.slope();
    }

    private void ends(double reached, double psi, double mean) {
        endU = reached;
        endPsi = psi;
        meanPsi = mean;
    }

    /** Takes the step last tried. */
    private void accept(double step) {
        path.advance();
        double endRatio = 1 - sense * endU * endU;
        double endSlope = k / endVolume * (sense * flowScale * endPsi - endRatio * endVolumeSlope);
        // Simpson's rule on V y′ of the two cubics
        double middleVolume = (volume + endVolume) / 2 + step / 8 * (volumeSlope - endVolumeSlope);
        double middleSlope = 1.5 * (endRatio - ratio) / step - (slope + endSlope) / 4;
        area += step / 6 * (volume * slope + 4 * middleVolume * middleSlope + endVolume * endSlope);
        flow += step * flowScale * meanPsi;
        approach = (u * u - endU * endU) / step;
        angle += step;
        ratio = endRatio;
        u = endU;
        trend = endTrend;
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
