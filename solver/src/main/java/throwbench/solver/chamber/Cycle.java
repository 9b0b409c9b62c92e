package throwbench.solver.chamber;

import java.util.Optional;

/**
 * The law by which a chamber's pressure follows its volume. A described cycle makes its own solution; adding a kind means
 * a record here, its key in the machine file's schema, and nothing else.
 */
public sealed interface Cycle permits IdealValves, FlowValves, LiquidValves, RecordedPressure {

    /** The word of the machine file. */
    String kind();

    /** Solves the cycle of a chamber at a duty point, or says in a sentence why it cannot. */
    CycleOutcome solve(ChamberDuty duty);

    /** Solves a cycle that needs no lines and no fluid, so that its chamber may go without a stage; empty: it needs them. */
    default Optional<CycleOutcome> solveAlone(ChamberCondition condition) {
        return Optional.empty();
    }
}
