package throwbench.solver.fluid;

/**
 * A real gas at one temperature and pressure. "Ideal" is the same gas as an ideal gas at the same temperature and pressure.
 *
 * @param temperature K
 * @param pressure Pa absolute
 * @param compressibility Z = p v/(R T)
 * @param density kg/m³
 * @param enthalpyDeparture h − h(ideal), J/mol; negative where the molecules attract each other
 * @param entropyDeparture s − s(ideal), J/(mol K)
 * @param heatCapacity c_p of the real gas, J/(mol K)
 * @param heatCapacityRatio c_p/c_v of the real gas
 */
public record GasState(
        double temperature,
        double pressure,
        double compressibility,
        double density,
        double enthalpyDeparture,
        double entropyDeparture,
        double heatCapacity,
        double heatCapacityRatio) {}
