package throwbench.app.bench;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import throwbench.solver.document.Fault;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.MachineFile;
import throwbench.solver.document.Reading;
import throwbench.solver.machine.Machine;
import throwbench.solver.revolution.Refusal;
import throwbench.solver.revolution.RunningMachine;

/**
 * A machine that can go on the bench, with the file it came from.
 *
 * @param file path and text as read
 */
public record Opened(MachineDocument document, Machine machine, FileState file) {

    /** What came of opening: a machine, or every reason why not. */
    public record Outcome(Optional<Opened> opened, List<Fault> faults) {}

    /** Reads a file from disk. */
    public static Outcome read(Path path) {
        return judge(MachineFile.read(path), Optional.of(path));
    }

    /** A reading that no file is behind, such as a sample's. */
    public static Outcome of(Reading reading) {
        return judge(reading, Optional.empty());
    }

    private static Outcome judge(Reading reading, Optional<Path> path) {
        if (reading.document().isEmpty() || reading.machine().isEmpty()) {
            return new Outcome(Optional.empty(), reading.faults());
        }
        MachineDocument document = reading.document().get();
        Machine machine = reading.machine().get();
        List<Refusal> refusals =
                RunningMachine.settle(machine, machine.dutyPoints().get(0)).refusals();
        return refusals.isEmpty()
                ? new Outcome(
                        Optional.of(new Opened(document, machine, new FileState(path, document.text()))), List.of())
                : new Outcome(Optional.empty(), faults(refusals));
    }

    /** Reasons why a machine cannot be solved, as faults of its file. */
    static List<Fault> faults(List<Refusal> refusals) {
        return refusals.stream()
                .map(r -> new Fault(r.path(), r.sentence(), "something else there"))
                .toList();
    }
}
