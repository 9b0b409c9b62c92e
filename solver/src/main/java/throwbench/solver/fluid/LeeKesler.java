package throwbench.solver.fluid;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The equation of state of Lee and Kesler for a gas or a mixture: every departure is interpolated in the acentric factor
 * between those of a simple fluid and of n-octane at the same reduced temperature and pressure.
 *
 * <p>Source: B. I. Lee and M. G. Kesler, AIChE Journal 21 (1975) 510, mixing rules included, from memory.
 *
 * @param critical of the gas, or the pseudo-critical point of the mixture
 */
record LeeKesler(CriticalPoint critical) {

    /** What the tables of the paper reach. */
    static final double HIGHEST_REDUCED_PRESSURE = 10;

    /** Likewise; above it pressures are bound by the density of an ideal gas at the tables' corner. */
    static final double HIGHEST_REDUCED_TEMPERATURE = 4;

    /**
     * V_c,i = (0.2905 − 0.085 ω_i) R T_c,i/p_c,i;  V_c = Σ Σ x_j x_k V_jk, V_jk = (V_j^⅓ + V_k^⅓)³/8;
     * T_c = Σ Σ x_j x_k V_jk √(T_c,j T_c,k)/V_c;  ω = Σ x_i ω_i;  p_c = (0.2905 − 0.085 ω) R T_c/V_c. R cancels.
     */
    static LeeKesler of(Composition composition) {
        List<Gas> gases = composition.gases();
        double omega = 0;
        double volume = 0;
        double volumeTemperature = 0;
        for (int j = 0; j < gases.size(); j++) {
            CriticalPoint first = gases.get(j).critical();
            omega += composition.fractions().get(j) * first.acentricFactor();
            for (int k = 0; k < gases.size(); k++) {
                CriticalPoint second = gases.get(k).critical();
                double cubeRoot = Math.cbrt(criticalVolume(first)) + Math.cbrt(criticalVolume(second));
                double pair = composition.fractions().get(j)
                        * composition.fractions().get(k)
                        * (cubeRoot * cubeRoot * cubeRoot / 8);
                volume += pair;
                volumeTemperature += pair * Math.sqrt(first.temperature() * second.temperature());
            }
        }
        double temperature = volumeTemperature / volume;
        return new LeeKesler(
                new CriticalPoint(temperature, criticalCompressibility(omega) * temperature / volume, omega));
    }

    private static double criticalCompressibility(double acentricFactor) {
        return 0.2905 - 0.085 * acentricFactor;
    }

    /** Over R. */
    private static double criticalVolume(CriticalPoint point) {
        return criticalCompressibility(point.acentricFactor()) * point.temperature() / point.pressure();
    }

    /** The departures of the gas, or nothing where one of the two fluids has no gas at this state. */
    Optional<Departures> gas(double temperature, double pressure) {
        double t = temperature / critical.temperature();
        double p = pressure / critical.pressure();
        OptionalDouble simple = LeeKeslerFluid.SIMPLE.gasDensity(t, p);
        OptionalDouble reference = LeeKeslerFluid.REFERENCE.gasDensity(t, p);
        if (simple.isEmpty() || reference.isEmpty()) {
            return Optional.empty();
        }
        Departures ofSimple = LeeKeslerFluid.SIMPLE.departures(t, simple.getAsDouble());
        Departures ofReference = LeeKeslerFluid.REFERENCE.departures(t, reference.getAsDouble());
        return Optional.of(
                ofSimple.towards(ofReference, critical.acentricFactor() / LeeKeslerFluid.REFERENCE_ACENTRIC_FACTOR));
    }

    /** The highest pressure that the equation is used for at a temperature, Pa. */
    double highestPressure(double temperature) {
        double t = temperature / critical.temperature();
        return HIGHEST_REDUCED_PRESSURE * Math.max(1, t / HIGHEST_REDUCED_TEMPERATURE) * critical.pressure();
    }

    /** Whether the (pseudo-)pure fluid is a liquid by the vapour-pressure equation of the same paper. */
    boolean isLiquid(double temperature, double pressure) {
        double t = temperature / critical.temperature();
        if (t >= 1) {
            return false;
        }
        double t6 = Math.pow(t, 6);
        double simple = 5.92714 - 6.09648 / t - 1.28862 * Math.log(t) + 0.169347 * t6;
        double slope = 15.2518 - 15.6875 / t - 13.4721 * Math.log(t) + 0.43577 * t6;
        return Math.log(pressure / critical.pressure()) > simple + critical.acentricFactor() * slope;
    }
}
