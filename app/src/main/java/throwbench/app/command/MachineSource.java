package throwbench.app.command;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import throwbench.solver.document.Fault;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.MachineFile;
import throwbench.solver.document.Reading;
import throwbench.solver.document.attached.AttachedFiles;
import throwbench.solver.finding.JudgedPoints;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Throw;
import throwbench.solver.map.Subject;
import throwbench.solver.revolution.Refusal;

/** A machine that was read, with the name of its file for everything that is wrong with it. */
final class MachineSource {

    private final String file;
    private final MachineDocument document;
    private final Machine machine;
    private final Terminal terminal;

    private MachineSource(String file, MachineDocument document, Machine machine, Terminal terminal) {
        this.file = file;
        this.document = document;
        this.machine = machine;
        this.terminal = terminal;
    }

    /** Reads a machine file; empty when it has any fault, each of which then has been said. */
    static Optional<MachineSource> read(String file, Terminal terminal) {
        try {
            return of(file, MachineFile.read(Path.of(file)), terminal);
        } catch (InvalidPathException e) {
            terminal.complain(file, "is no file name: " + e.getReason());
            return Optional.empty();
        }
    }

    /** Takes what was read under a name. */
    static Optional<MachineSource> of(String file, Reading reading, Terminal terminal) {
        for (Fault fault : reading.faults()) {
            terminal.complain(file, fault.line());
        }
        return reading.machine()
                .map(machine -> new MachineSource(file, reading.document().orElseThrow(), machine, terminal));
    }

    /** The machine at the duty point and with the throw of the command's options; empty, and said, where there is none. */
    Optional<Subject> subject(Arguments arguments) {
        Optional<Integer> duty = writtenDuty(arguments.value(Option.DUTY));
        Optional<Integer> shown = throwIndex(arguments.value(Option.THROW));
        if (duty.isEmpty() || shown.isEmpty()) {
            return Optional.empty();
        }
        AttachedFiles files = MachineFile.attachedTo(Path.of(file));
        return Optional.of(new Subject(document, machine, files, duty.get(), shown.get()));
    }

    /** The index of a duty point of the file itself: those of its ranges have no numbers there that could be varied. */
    private Optional<Integer> writtenDuty(Optional<String> name) {
        List<String> written =
                machine.dutyPoints().stream().map(DutyPoint::name).toList();
        if (name.isEmpty() || written.contains(name.get())) {
            return Optional.of(name.map(written::indexOf).orElse(0));
        }
        missing("dutyPoints", "duty point", name.get(), written);
        return Optional.empty();
    }

    /** Says what is wrong at a place of the file. */
    void complain(String path, String what) {
        terminal.complain(file, path, what);
    }

    Machine machine() {
        return machine;
    }

    /** Every duty point that is judged: the written ones and those of the load steps and ranges. */
    JudgedPoints points() {
        return JudgedPoints.of(machine);
    }

    /** The duty point of this name, or the first where none is given; empty, and said, where there is no such one. */
    Optional<DutyPoint> duty(Optional<String> name) {
        if (name.isEmpty()) {
            return Optional.of(machine.dutyPoints().get(0));
        }
        List<String> existing = new ArrayList<>();
        for (DutyPoint duty : points().points()) {
            if (duty.name().equals(name.get())) {
                return Optional.of(duty);
            }
            existing.add(duty.name());
        }
        missing("dutyPoints", "duty point", name.get(), existing);
        return Optional.empty();
    }

    /** The index of the throw of this name, or of the first where none is given; empty, and said, where there is none. */
    Optional<Integer> throwIndex(Optional<String> name) {
        if (name.isEmpty()) {
            return Optional.of(0);
        }
        List<String> existing = new ArrayList<>();
        for (Throw candidate : machine.throwsInOrder()) {
            if (candidate.name().equals(name.get())) {
                return Optional.of(existing.size());
            }
            existing.add(candidate.name());
        }
        missing("throws", "throw", name.get(), existing);
        return Optional.empty();
    }

    private void missing(String path, String kind, String name, List<String> existing) {
        terminal.complain(
                file, path, "no " + kind + " \"" + name + "\", the file has " + NearWords.existing(name, existing));
    }

    /** Says why the machine cannot be solved; the exit code tells a wrong machine from a solver that did not get there. */
    ExitCode refuse(List<Refusal> refusals) {
        for (Refusal refusal : refusals) {
            terminal.complain(file, refusal.path(), refusal.sentence());
        }
        return refusals.stream().anyMatch(Refusal::failed) ? ExitCode.FAILED : ExitCode.REFUSED;
    }
}
