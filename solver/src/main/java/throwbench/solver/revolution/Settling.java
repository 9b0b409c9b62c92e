package throwbench.solver.revolution;

import java.util.List;
import java.util.Optional;

/** The outcome of settling a machine at a duty point: it runs, or the reasons why it cannot. */
public record Settling(Optional<RunningMachine> running, List<Refusal> refusals) {

    /** The running machine, where the caller knows that there is one. */
    public RunningMachine get() {
        return running.orElseThrow(() -> new IllegalStateException("does not run: " + refusals));
    }
}
