package throwbench.app.command;

import java.nio.file.Path;
import throwbench.solver.document.MachineFile;
import throwbench.solver.machine.Machine;
import throwbench.solver.revolution.RunningMachine;

/** What the solver itself says of a machine file, to hold what was written against. */
final class SampleMachine {

    private SampleMachine() {}

    static Machine read(Path file) {
        return MachineFile.read(file).machine().orElseThrow();
    }

    static RunningMachine running(Path file, int duty) {
        Machine machine = read(file);
        return RunningMachine.settle(machine, machine.dutyPoints().get(duty)).get();
    }
}
