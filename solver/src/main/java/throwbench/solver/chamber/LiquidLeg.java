package throwbench.solver.chamber;

/**
 * Liquid shut in between two valves, at constant bulk modulus: p = p_0 + K ln(V_0/V).
 *
 * @param volume V_0 at shutting, m³
 * @param pressure p_0 there, Pa
 * @param bulkModulus K, Pa
 */
record LiquidLeg(double volume, double pressure, double bulkModulus) {

    /** p at a volume (m³), Pa. */
    double pressureAt(double atVolume) {
        return pressure + bulkModulus * Math.log(volume / atVolume);
    }

    /** V at a pressure (Pa), m³. */
    double volumeAt(double atPressure) {
        return volume * Math.exp((pressure - atPressure) / bulkModulus);
    }
}
