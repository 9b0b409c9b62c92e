package throwbench.solver.chamber;

import java.util.OptionalDouble;

/**
 * Gas behind valves that open and shut without delay and with a constant share of pressure lost.
 *
 * @param suctionLoss share of the absolute suction line pressure lost in the valve, ≥ 0
 * @param dischargeLoss share of the absolute discharge line pressure, ≥ 0
 * @param compressionExponent n_c of p V^n, ≥ 1; empty: the gas's isentropic exponent
 * @param expansionExponent n_e likewise
 */
public record IdealValves(
        double suctionLoss, double dischargeLoss, OptionalDouble compressionExponent, OptionalDouble expansionExponent)
        implements Cycle {

    @Override
    public String kind() {
        return "ideal-valves";
    }

    @Override
    public CycleOutcome solve(ChamberDuty duty) {
        return IdealValveCycle.solve(this, duty);
    }
}
