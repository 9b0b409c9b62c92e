package throwbench.solver.chamber;

/**
 * Gas that flows through valves of given effective flow area (the flow coefficient is in it).
 *
 * @param suctionFlowArea m², above 0
 * @param dischargeFlowArea m², above 0
 */
public record FlowValves(double suctionFlowArea, double dischargeFlowArea) implements Cycle {

    @Override
    public String kind() {
        return "valve-flow";
    }

    @Override
    public CycleOutcome solve(ChamberDuty duty) {
        return FlowValveCycle.solve(this, duty);
    }
}
