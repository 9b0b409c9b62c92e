package throwbench.solver.chamber.flow;

/**
 * One step of a chamber between two ports in its two states, pressure and content M = m R: the L-stable SDIRK method of order
 * 2 (γ = 1 − 1/√2), the energy in the variable p V^n, n = 0 where the ports are generous, n → k where hardly anything
 * passes and the gas stays on its isentrope:
 *
 * <pre>    p′ = −k/V (Σ R T ṁ/ω + p V′),   M′ = −Σ R ṁ/ω,   T = p V/M</pre>
 */
final class LeakyStep {

    private static final double GAMMA = 1 - Math.sqrt(0.5);

    private static final double CARRY = (1 - GAMMA) / GAMMA;

    /** The temperature, which enters by its root alone, is put right until it repeats this well. */
    private static final double SAME_TEMPERATURE = 1e-9;

    private static final int MOST = 20;

    private final PistonPath path;
    private final double k;
    private final Port lower;
    private final Port upper;
    private final LeakyStage stage;

    // the state stepped from
    private double pressure;
    private double content;
    private double volume;
    private double volumeSlope;

    // the stage last solved
    private double stageTemperature;
    private double stageContent;
    private double lowerMass;
    private double upperMass;

    // what the step leaves
    private double endVolume;
    private double endVolumeSlope;
    private double lowerEnergyPassed;
    private double upperEnergyPassed;
    private double lowerMassPassed;
    private double upperMassPassed;

    LeakyStep(PistonPath path, double k, Port lower, Port upper) {
        this.path = path;
        this.k = k;
        this.lower = lower;
        this.upper = upper;
        this.stage = new LeakyStage(lower, upper);
    }

    /** Stands where the path stands, with a pressure (Pa) and a content m R (Pa m³/K). */
    void standAt(double pressureThere, double contentThere) {
        path.look(0);
        pressure = pressureThere;
        content = contentThere;
        volume = path.volume();
        volumeSlope = path.slope();
    }

    /** Tries a step (rad) and gives the pressure at its end, Pa. */
    double take(double step) {
        path.look(step);
        endVolume = path.volume();
        endVolumeSlope = path.slope();
        double share = share(step);
        double endTurns = Math.pow(endVolume / volume, share * k);
        path.look(GAMMA * step);
        double v = path.volume();
        double turns = Math.pow(v / volume, share * k);
        double temperature = pressure * volume / content;
        if (solve(GAMMA * step, v, path.slope(), share, pressure / turns, content, pressure, temperature)) {
            double carried = Math.fma(CARRY, turns * stage.pressure() - pressure, pressure);
            double carriedContent = Math.fma(CARRY, stageContent - content, content);
            begin();
            add((1 - GAMMA) * step);
            double guess = stage.pressure();
            if (carriedContent > 0
                    && solve(
                            GAMMA * step,
                            endVolume,
                            endVolumeSlope,
                            share,
                            carried / endTurns,
                            carriedContent,
                            guess,
                            stageTemperature)) {
                add(GAMMA * step);
                return stage.pressure();
            }
        }
        // the second stage reaches below zero when a step is far too long: implicit Euler never does
        solve(step, endVolume, endVolumeSlope, 0, pressure, content, pressure, temperature);
        begin();
        add(step);
        return stage.pressure();
    }

    /** n/k: near 0 when the ports answer within the step, near 1 when they take much longer. */
    private double share(double step) {
        double moved = k * Math.abs(volumeSlope) / volume * step;
        double rootTemperature = Math.sqrt(pressure * volume / content);
        double rate = rate(lower, moved, rootTemperature) + rate(upper, moved, rootTemperature);
        double answers = step * k / volume * rate;
        return 1 / (1 + answers * answers);
    }

    private double rate(Port port, double moved, double rootTemperature) {
        double distance = Math.abs(pressure / port.line() - 1);
        return port.onset(rootTemperature) / (2 * port.line() * Math.sqrt(distance + moved));
    }

    private boolean solve(
            double weight,
            double v,
            double slope,
            double share,
            double known,
            double knownContent,
            double guess,
            double temperature) {
        double c = weight * k / v;
        double b = Math.fma(c * (1 - share), slope, 1);
        double pressureGuess = guess;
        stageTemperature = temperature;
        for (int i = 0; i < MOST; i++) {
            if (!stage.solve(b, c, known, pressureGuess, stageTemperature)) {
                return false;
            }
            double before = stageTemperature;
            settleTemperature(weight, v, knownContent);
            boolean same = Math.abs(before - stageTemperature) <= SAME_TEMPERATURE * before;
            boolean needless = stage.lowerFlow() <= 0 && stage.upperFlow() <= 0;
            if (same || needless) {
                break;
            }
            pressureGuess = stage.pressure();
        }
        return true;
    }

    /**
     * The temperature at which the content is what was known plus what entered less what left: what leaves is o/√T, so that
     * p V x² + w o x = known + w Σ entering for x = 1/√T, which has one root above 0.
     */
    private void settleTemperature(double weight, double v, double knownContent) {
        double rootBefore = Math.sqrt(stageTemperature);
        double lowerFlow = stage.lowerFlow();
        double upperFlow = stage.upperFlow();
        double leaving = (Math.max(lowerFlow, 0) + Math.max(upperFlow, 0)) / rootBefore;
        double entering = Math.min(lowerFlow, 0) / lower.temperature() + Math.min(upperFlow, 0) / upper.temperature();
        double held = stage.pressure() * v;
        double out = weight * leaving;
        double have = knownContent - weight * entering;
        double x = 2 * have / (out + Math.sqrt(Math.fma(out, out, 4 * held * have)));
        stageTemperature = 1 / (x * x);
        stageContent = held * x * x;
        lowerMass = lowerFlow > 0 ? lowerFlow / rootBefore * x : lowerFlow / lower.temperature();
        upperMass = upperFlow > 0 ? upperFlow / rootBefore * x : upperFlow / upper.temperature();
    }

    private void begin() {
        lowerEnergyPassed = 0;
        upperEnergyPassed = 0;
        lowerMassPassed = 0;
        upperMassPassed = 0;
    }

    private void add(double weight) {
        lowerEnergyPassed += weight * stage.lowerFlow();
        upperEnergyPassed += weight * stage.upperFlow();
        lowerMassPassed += weight * lowerMass;
        upperMassPassed += weight * upperMass;
    }

    /** Content at the end of the step, Pa m³/K: from what has passed. */
    double content() {
        return content - lowerMassPassed - upperMassPassed;
    }

    /** dp/dφ at its end, Pa/rad. */
    double pressureSlope() {
        return -k / endVolume * (stage.lowerFlow() + stage.upperFlow() + stage.pressure() * endVolumeSlope);
    }

    double endVolume() {
        return endVolume;
    }

    double endVolumeSlope() {
        return endVolumeSlope;
    }

    /** ∫ R T ṁ/ω dφ of what left through the port (below 0: entered), Pa m³. */
    double energyPassed(Port port) {
        return port == lower ? lowerEnergyPassed : upperEnergyPassed;
    }

    /** ∫ R ṁ/ω dφ likewise, Pa m³/K. */
    double massPassed(Port port) {
        return port == lower ? lowerMassPassed : upperMassPassed;
    }
}
