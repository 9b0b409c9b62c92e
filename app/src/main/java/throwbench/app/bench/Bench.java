package throwbench.app.bench;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Executor;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import throwbench.solver.document.Fault;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.MachineFile;
import throwbench.solver.document.Reading;
import throwbench.solver.document.quantity.UnitSystem;
import throwbench.solver.finding.Finding;
import throwbench.solver.machine.Machine;
import throwbench.solver.revolution.Refusal;
import throwbench.solver.revolution.RunningMachine;

/**
 * What is open, and what the user does to it. Edits become the next document at once or are refused with their faults; a
 * worker solves and judges it, and one consistent state is published whole. Used from the window's thread only.
 */
public final class Bench {

    private final ReadOnlyObjectWrapper<Shown> shown;
    private final ReadOnlyObjectWrapper<Status> status = new ReadOnlyObjectWrapper<>(this, "status", Status.QUIET);
    private final ReadOnlyObjectWrapper<FileState> file;
    private final Playhead playhead = new Playhead();
    private final NewestWins<Wish> toWorker;
    private Wish wish;
    private History history;

    /**
     * A bench with a machine already solved, so that the window opens on it running.
     *
     * @param worker runs the solving, one task after the other
     * @param window runs what publishes a result
     */
    public Bench(Opened opened, Executor worker, Executor window) {
        Solving solving = new Solving();
        this.wish = wish(opened, new Wish.Choice(0, 0, UnitSystem.SI));
        Shown first = solving.solve(wish).shown().orElseThrow();
        this.history = new History(opened.document());
        this.shown = new ReadOnlyObjectWrapper<>(this, "shown", first);
        this.file = new ReadOnlyObjectWrapper<>(this, "file", opened.file());
        NewestWins<Solving.Outcome> toWindow = new NewestWins<>(window, this::publish);
        this.toWorker = new NewestWins<>(worker, w -> toWindow.offer(solving.solve(w)));
    }

    private static Wish wish(Opened opened, Wish.Choice choice) {
        return new Wish(opened.document(), opened.machine(), choice.within(opened.machine()), OptionalDouble.empty());
    }

    /** The state that every view draws. */
    public ReadOnlyObjectProperty<Shown> shown() {
        return shown.getReadOnlyProperty();
    }

    /** What the status line says. */
    public ReadOnlyObjectProperty<Status> status() {
        return status.getReadOnlyProperty();
    }

    /** The file that is open, and what it holds. */
    public ReadOnlyObjectProperty<FileState> file() {
        return file.getReadOnlyProperty();
    }

    public Playhead playhead() {
        return playhead;
    }

    /** The document as edited; what is shown may be a moment behind. */
    public MachineDocument document() {
        return wish.document();
    }

    /** Whether the document differs from the file. */
    public boolean edited() {
        return !document().text().equals(file.get().savedText());
    }

    /** Says something in the status line. */
    public void say(Status next) {
        status.set(next);
    }

    /**
     * Edits one value of the machine.
     *
     * @param path key path of the value
     * @param text as the file will hold it
     * @param name of the edit, for undo
     * @param joins whether a run of such edits of the same value is one step to undo
     * @return what is wrong with it; empty when it was taken
     */
    public List<Fault> edit(String path, String text, String name, boolean joins) {
        return change(document().with(document().path(path), text), name, path, joins);
    }

    /** Takes a value out of the file, so that its default holds; what is wrong with that is returned. */
    public List<Fault> leaveOut(String path, String name) {
        return change(document().without(document().path(path)), name, path, false);
    }

    private List<Fault> change(MachineDocument next, String name, String path, boolean joins) {
        if (next.equals(document())) {
            return List.of();
        }
        List<Fault> faults = take(next);
        if (faults.isEmpty()) {
            history.add(next, name, path, joins);
            status.set(Status.QUIET);
        }
        return faults;
    }

    private List<Fault> take(MachineDocument next) {
        Reading reading = next.read(file.get().attached());
        if (reading.machine().isEmpty()) {
            return reading.faults();
        }
        Machine machine = reading.machine().get();
        Wish.Choice choice = wish.choice().within(machine);
        List<Refusal> refusals = RunningMachine.settle(
                        machine, machine.dutyPoints().get(choice.dutyIndex()))
                .refusals();
        if (refusals.isEmpty()) {
            ask(new Wish(next, machine, choice, OptionalDouble.empty()));
        }
        return Opened.faults(refusals);
    }

    private void ask(Wish next) {
        wish = next;
        toWorker.offer(next);
    }

    private void publish(Solving.Outcome outcome) {
        outcome.refusals().stream()
                .findFirst()
                .ifPresent(r -> status.set(Status.trouble(r.path() + ": " + r.sentence())));
        outcome.shown().ifPresent(next -> {
            Shown before = shown.get();
            if (next.throwIndex() != before.throwIndex() && next.document().equals(before.document())) {
                // the machine stands still: only the throw whose angle is told changes
                playhead.turnBy(next.running().angleBetween(before.throwIndex(), next.throwIndex()));
            }
            outcome.wish().turnTo().ifPresent(playhead::turnTo);
            shown.set(next);
        });
    }

    /** Name of the edit that undo would take back. */
    public Optional<String> undoName() {
        return history.undoName();
    }

    /** Name of the edit that redo would make again. */
    public Optional<String> redoName() {
        return history.redoName();
    }

    /** Takes the last edit back. */
    public void undo() {
        history.undoName().ifPresent(name -> {
            take(history.undo());
            status.set(Status.said("Undone: " + name));
        });
    }

    /** Makes the edit again that was taken back last. */
    public void redo() {
        history.redoName().ifPresent(name -> {
            take(history.redo());
            status.set(Status.said("Done again: " + name));
        });
    }

    /** Shows another duty point; an index beyond the last one is left out of account. */
    public void chooseDuty(int index) {
        choose(wish.choice().duty(index), OptionalDouble.empty());
    }

    /** Shows another throw in full. */
    public void chooseThrow(int index) {
        choose(wish.choice().ofThrow(index), OptionalDouble.empty());
    }

    /** Shows values in other units. */
    public void chooseUnits(UnitSystem units) {
        choose(wish.choice().units(units), OptionalDouble.empty());
    }

    private void choose(Wish.Choice choice, OptionalDouble angle) {
        if (choice.equals(wish.choice())) {
            angle.ifPresent(playhead::turnTo);
        } else if (choice.equals(choice.within(wish.machine()))) {
            ask(wish.with(choice, angle));
        }
    }

    /** Goes to where a finding happens: its duty point, its throw, its crank angle; the crank stops there. */
    public void goTo(Finding finding) {
        Machine machine = wish.machine();
        List<String> duties = machine.dutyPoints().stream().map(d -> d.name()).toList();
        List<String> names = machine.throwsInOrder().stream().map(t -> t.name()).toList();
        int duty = duties.indexOf(finding.where().duty());
        int throwIndex = finding.where()
                .throwName()
                .map(names::indexOf)
                .orElse(wish.choice().throwIndex());
        if (duty >= 0 && throwIndex >= 0) {
            playhead.setPlaying(false);
            choose(wish.choice().duty(duty).ofThrow(throwIndex), finding.angle());
        }
    }

    /** Opens a file, or says in the status line why not; then everything stays as it was. */
    public void open(Path path) {
        Opened.Outcome outcome = Opened.read(path);
        outcome.opened().ifPresent(opened -> {
            history = new History(opened.document());
            file.set(opened.file());
            ask(wish(opened, new Wish.Choice(0, 0, wish.choice().units())));
            status.set(Status.said("Opened " + path));
        });
        if (outcome.opened().isEmpty()) {
            status.set(Status.trouble(told(path, outcome.faults())));
        }
    }

    private static String told(Path path, List<Fault> faults) {
        String more = faults.size() > 1 ? " (and " + (faults.size() - 1) + " more)" : "";
        return path.getFileName() + ": " + faults.get(0).line() + more;
    }

    /**
     * Saves the document, or says in the status line why not.
     *
     * @return whether the file now holds it
     */
    public boolean save(Path path) {
        try {
            MachineFile.save(path, document());
        } catch (IOException e) {
            status.set(Status.trouble("Not saved: " + path + " cannot be written (" + e.getMessage() + ")"));
            return false;
        }
        file.set(new FileState(Optional.of(path), document().text()));
        status.set(Status.said("Saved " + path));
        return true;
    }
}
