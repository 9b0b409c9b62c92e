package throwbench.solver.document;

import java.util.List;
import java.util.Optional;
import throwbench.solver.machine.Machine;

/**
 * What became of a machine file: a machine, or all that is wrong with it.
 *
 * @param document the text with its values; empty where there is no text or it is no JSON object
 * @param machine empty where there is any fault
 * @param faults in the order of the file; empty where there is a machine
 */
public record Reading(Optional<MachineDocument> document, Optional<Machine> machine, List<Fault> faults) {

    public Reading {
        faults = List.copyOf(faults);
        if (machine.isPresent() != faults.isEmpty()) {
            throw new IllegalArgumentException("a machine or faults, not " + machine + " with " + faults);
        }
    }

    static Reading faulty(Fault fault) {
        return new Reading(Optional.empty(), Optional.empty(), List.of(fault));
    }
}
