package throwbench.app.bench;

import java.util.List;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.quantity.UnitSystem;
import throwbench.solver.finding.Finding;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Throw;
import throwbench.solver.revolution.Revolution;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Summary;

/**
 * One consistent state of the bench: every view draws from it and from nothing else. Immutable.
 *
 * @param document the text that describes the machine
 * @param machine as last valid
 * @param dutyIndex the duty point shown
 * @param throwIndex the throw shown
 * @param summary extremes, reversal and stations of the shown throw at that duty point
 * @param findings of every duty point, worst first
 * @param units in which values are shown
 * @param solveMillis how long solving the shown duty point took, ms
 */
public record Shown(
        MachineDocument document,
        Machine machine,
        int dutyIndex,
        int throwIndex,
        Summary summary,
        List<Finding> findings,
        UnitSystem units,
        double solveMillis) {

    public Shown {
        findings = List.copyOf(findings);
    }

    /** The machine settled at the duty point shown. */
    public RunningMachine running() {
        return summary.running();
    }

    /** The stations of the shown throw's revolution. */
    public Revolution revolution() {
        return summary.revolution();
    }

    /** The throw shown, as described. */
    public Throw shownThrow() {
        return machine.throwsInOrder().get(throwIndex);
    }

    /** Name of the duty point shown. */
    public String dutyName() {
        return machine.dutyPoints().get(dutyIndex).name();
    }
}
