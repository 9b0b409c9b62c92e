package throwbench.solver.chamber;

import java.util.OptionalDouble;

/**
 * The lines of a chamber at a duty point.
 *
 * @param suctionPressure Pa absolute, above 0
 * @param dischargePressure Pa absolute, above 0
 * @param suctionTemperature K, where known
 */
public record LineConditions(double suctionPressure, double dischargePressure, OptionalDouble suctionTemperature) {}
