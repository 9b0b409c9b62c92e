package throwbench.solver.chamber;

/**
 * Liquid behind valves with a pressure loss and a closing lag.
 *
 * @param suctionLoss Pa, ≥ 0
 * @param dischargeLoss Pa, ≥ 0
 * @param lossGrowsWithSpeed false: the losses are constant; true: they hold at the mean piston speed and grow with the
 *     square of the speed
 * @param closingLag crank angle after the dead centre at which a valve shuts, rad, ≥ 0
 */
public record LiquidValves(double suctionLoss, double dischargeLoss, boolean lossGrowsWithSpeed, double closingLag)
        implements Cycle {

    @Override
    public String kind() {
        return "liquid";
    }

    @Override
    public CycleOutcome solve(ChamberDuty duty) {
        return LiquidCycleSolver.solve(this, duty);
    }
}
