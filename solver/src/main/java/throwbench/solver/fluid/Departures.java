package throwbench.solver.fluid;

/**
 * How far a gas departs from the ideal gas at the same temperature and pressure; all dimensionless.
 *
 * @param compressibility Z = p v/(R T)
 * @param temperatureSlope T (∂Z/∂T) at constant p
 * @param pressureSlope p (∂Z/∂p) at constant T
 * @param enthalpy (h − h°)/(R T)
 * @param entropy (s − s°)/R
 * @param heatCapacity (c_p − c_p°)/R
 */
record Departures(
        double compressibility,
        double temperatureSlope,
        double pressureSlope,
        double enthalpy,
        double entropy,
        double heatCapacity) {

    /** this + share · (other − this), each quantity by itself: all of them are linear in the acentric factor. */
    Departures towards(Departures other, double share) {
        return new Departures(
                compressibility + share * (other.compressibility - compressibility),
                temperatureSlope + share * (other.temperatureSlope - temperatureSlope),
                pressureSlope + share * (other.pressureSlope - pressureSlope),
                enthalpy + share * (other.enthalpy - enthalpy),
                entropy + share * (other.entropy - entropy),
                heatCapacity + share * (other.heatCapacity - heatCapacity));
    }

    /** (c_p − c_v)/R = (Z + T Z_T)²/(Z − p Z_p), of the real gas. */
    double heatCapacityDifference() {
        double expansion = compressibility + temperatureSlope;
        return expansion * expansion / (compressibility - pressureSlope);
    }
}
