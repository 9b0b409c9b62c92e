package throwbench.solver.map;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import throwbench.solver.document.Fault;
import throwbench.solver.document.KeyPath;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.Reading;
import throwbench.solver.document.attached.AttachedFiles;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Machine;
import throwbench.solver.revolution.Refusal;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Settling;

/**
 * What a study looks at: a machine file without faults, at one of its duty points, and the throw that results of a throw are
 * taken from. Immutable; any thread may ask.
 */
public final class Subject {

    private final MachineDocument document;
    private final AttachedFiles files;
    private final Machine machine;
    private final int duty;
    private final int shownThrow;
    private final KeyPath dutyPath;
    private final boolean ownSpeed;

    /**
     * @param machine what the document describes
     * @param duty index of the duty point
     * @param shownThrow index of the throw
     */
    public Subject(MachineDocument document, Machine machine, AttachedFiles files, int duty, int shownThrow) {
        Map<String, AttachedFiles.Attached> known = new ConcurrentHashMap<>();
        this.document = document;
        // a table is read once, and not again for every point
        this.files = path -> known.computeIfAbsent(path, files::read);
        this.machine = machine;
        this.duty = duty;
        this.shownThrow = shownThrow;
        this.dutyPath = KeyPath.ROOT.key("dutyPoints").item(duty);
        this.ownSpeed = document.valueText(dutyPath.key("speed")).isPresent();
    }

    /** A machine that runs, or the sentence why it does not. */
    public record Attempt(Optional<RunningMachine> running, String reason) {

        /** A result of the running machine. */
        public Outcome ask(Probe probe) {
            return running.isPresent() ? probe.at(running.get()) : Outcome.impossible(reason);
        }
    }

    public MachineDocument document() {
        return document;
    }

    public Machine machine() {
        return machine;
    }

    /** The duty point as the file has it. */
    public DutyPoint dutyPoint() {
        return machine.dutyPoints().get(duty);
    }

    /** Where the duty point stands in the file. */
    public KeyPath dutyPath() {
        return dutyPath;
    }

    /** Index of the throw that results of a throw are taken from. */
    public int shownThrow() {
        return shownThrow;
    }

    /**
     * Whether a number can have a bearing on this duty point at all: not another duty point's, nor the drive's speed where
     * the duty point has its own.
     */
    public boolean bears(Variable variable) {
        KeyPath path = variable.path();
        KeyPath.Step first = path.steps().get(0);
        if (first.key().equals("dutyPoints")) {
            return path.steps().get(1).index() == duty;
        }
        boolean ofDrive = path.equals(KeyPath.ROOT.key("drive").key("speed"));
        return !(ofDrive && ownSpeed)
                && !List.of("ranges", "loadSteps", "bookmarks").contains(first.key());
    }

    /** Settles the machine with other numbers in place of the file's. */
    public Attempt with(List<Setting> settings) {
        Optional<DutyPoint> changed = changedDuty(settings);
        if (changed.isPresent()) {
            return settle(machine, changed.get());
        }
        Map<KeyPath, Double> numbers = new LinkedHashMap<>();
        settings.forEach(setting -> numbers.put(setting.variable().path(), setting.value()));
        return settle(document.withNumbers(numbers));
    }

    /** Settles a machine that another text describes, at the same duty point. */
    Attempt settle(MachineDocument other) {
        Reading reading = other.read(files);
        if (reading.machine().isEmpty()) {
            return new Attempt(Optional.empty(), said(reading.faults()));
        }
        Machine next = reading.machine().get();
        return settle(next, next.dutyPoints().get(duty));
    }

    private static String said(List<Fault> faults) {
        int more = faults.size() - 1;
        return faults.get(0).line() + (more > 0 ? "; and " + more + " more" : "");
    }

    private static Attempt settle(Machine machine, DutyPoint duty) {
        Settling settling = RunningMachine.settle(machine, duty);
        if (settling.running().isPresent()) {
            return new Attempt(settling.running(), "");
        }
        Refusal first = settling.refusals().get(0);
        return new Attempt(Optional.empty(), first.path() + ": " + first.sentence());
    }

    private Optional<DutyPoint> changedDuty(List<Setting> settings) {
        DutyPoint next = dutyPoint();
        for (Setting setting : settings) {
            Optional<DutyPoint> changed = DutyQuantity.change(next, dutyPath, ownSpeed, setting);
            if (changed.isEmpty()) {
                return Optional.empty();
            }
            next = changed.get();
        }
        return DutyQuantity.pressuresRise(next) ? Optional.of(next) : Optional.empty();
    }
}
