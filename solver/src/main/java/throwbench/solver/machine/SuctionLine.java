package throwbench.solver.machine;

import java.util.OptionalDouble;

/**
 * The suction line of a pump.
 *
 * @param length L, m, above 0
 * @param bore m, above 0
 * @param staticHead m of liquid above the pump, any sign
 * @param frictionLoss head lost at mean flow, m, ≥ 0
 * @param sourcePressure Pa absolute at the source; empty: the duty point's suction pressure
 * @param liquidFactor K_h of the acceleration head, above 0
 */
public record SuctionLine(
        OptionalDouble length,
        OptionalDouble bore,
        double staticHead,
        double frictionLoss,
        OptionalDouble sourcePressure,
        OptionalDouble liquidFactor) {}
