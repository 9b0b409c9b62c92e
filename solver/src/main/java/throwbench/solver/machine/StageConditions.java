package throwbench.solver.machine;

import java.util.OptionalDouble;

/**
 * Line conditions of a stage at a duty point.
 *
 * @param suctionPressure Pa absolute; empty: found from balance with the stage it follows
 * @param suctionTemperature K, where the file has it
 * @param dischargePressure Pa absolute; empty: found from balance with the stage that follows it
 */
public record StageConditions(
        OptionalDouble suctionPressure, OptionalDouble suctionTemperature, OptionalDouble dischargePressure) {}
