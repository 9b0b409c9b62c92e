package throwbench.solver.chamber.flow;

/**
 * A line and the way to it. The flow inwards carries the line's temperature, the flow outwards the chamber's; the areas may
 * differ, as they do behind a broken valve. Flows are given as R T ṁ/ω: what they add to p V/k, in Pa m³/rad.
 */
public final class Port {

    private final double line;
    private final double temperature;
    private final double inward;
    private final double outwardPerRootKelvin;
    private final FlowFit entering;
    private final FlowFit leaving;

    /**
     * @param line pressure, Pa
     * @param temperature of what enters, K
     * @param inwardArea m², ≥ 0
     * @param outwardArea m², ≥ 0
     * @param rootGasConstant √R/ω
     */
    public Port(
            double line,
            double temperature,
            double inwardArea,
            double outwardArea,
            double rootGasConstant,
            FlowFunction law) {
        this.line = line;
        this.temperature = temperature;
        this.inward = inwardArea * line * rootGasConstant * Math.sqrt(temperature);
        this.outwardPerRootKelvin = outwardArea * line * rootGasConstant;
        this.entering = FlowFit.inward(law);
        this.leaving = FlowFit.outward(law);
    }

    /** Line pressure, Pa. */
    double line() {
        return line;
    }

    /** Temperature of what enters, K. */
    double temperature() {
        return temperature;
    }

    /** Whether gas can pass between the line and a chamber at this side of the line's pressure. */
    boolean passes(boolean above) {
        return above ? outwardPerRootKelvin > 0 : inward > 0;
    }

    /** How steeply the flow sets in, √2 · its scale, at the chamber's temperature. */
    double onset(double rootTemperature) {
        return Math.max(inward * entering.slopeAt(0), outwardPerRootKelvin * rootTemperature * leaving.slopeAt(0));
    }

    /** u = √|p/p_line − 1|. */
    double distance(double pressure) {
        return Math.sqrt(Math.abs(pressure / line - 1));
    }

    /** What leaves (above 0) or enters (below 0). */
    double leaving(boolean above, double u, double rootTemperature) {
        return above ? outwardPerRootKelvin * rootTemperature * leaving.at(u) : -inward * entering.at(u);
    }

    /** Its derivative by u. */
    double slope(boolean above, double u, double rootTemperature) {
        return above ? outwardPerRootKelvin * rootTemperature * leaving.slopeAt(u) : -inward * entering.slopeAt(u);
    }
}
