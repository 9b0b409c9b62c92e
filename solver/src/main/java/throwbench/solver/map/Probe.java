package throwbench.solver.map;

import throwbench.solver.revolution.RunningMachine;

/** Takes one result from one running machine after another; may keep what it can use again, so for one thread only. */
@FunctionalInterface
public interface Probe {

    /** The result of a running machine, or why it has none. */
    Outcome at(RunningMachine running);
}
