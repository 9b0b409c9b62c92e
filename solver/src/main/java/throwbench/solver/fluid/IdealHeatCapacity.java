package throwbench.solver.fluid;

/**
 * Molar heat capacity of the ideal gas at constant pressure, c_p/R = a0 + a1 T + a2 T² + a3 T³ + a4 T⁴, T in K.
 *
 * @param from lowest temperature the polynomial was made for, K
 * @param to highest such temperature, K
 * @param source where the coefficients come from
 */
public record IdealHeatCapacity(
        double a0, double a1, double a2, double a3, double a4, double from, double to, String source) {

    public IdealHeatCapacity {
        if (!(from > 0 && to > from)) {
            throw new IllegalArgumentException("no range: " + from + " K to " + to + " K");
        }
    }

    /** Whether a temperature, K, is in the range of the polynomial. */
    public boolean isKnownAt(double temperature) {
        return temperature >= from && temperature <= to;
    }

    /** c_p/R, dimensionless; outside the range it is an extrapolation: ask {@link #isKnownAt} first. */
    public double at(double temperature) {
        double t = temperature;
        return a0 + t * (a1 + t * (a2 + t * (a3 + t * a4)));
    }

    /** ∫ c_p/(R T) dT from one temperature to another: the entropy gained on the way at constant pressure, over R. */
    public double entropyRise(double start, double end) {
        return a0 * Math.log(end / start) + entropyPowers(end) - entropyPowers(start);
    }

    private double entropyPowers(double t) {
        return t * (a1 + t * (a2 / 2 + t * (a3 / 3 + t * a4 / 4)));
    }
}
