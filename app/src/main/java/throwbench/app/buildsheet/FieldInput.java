package throwbench.app.buildsheet;

import java.util.List;
import java.util.Optional;
import throwbench.app.bench.Bench;
import throwbench.solver.document.Fault;
import throwbench.solver.document.KeyPath;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.TypedInput;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.Quantity;
import throwbench.solver.document.quantity.Refusal;
import throwbench.solver.document.quantity.UnitSystem;
import throwbench.solver.document.schema.Key;

/** One input without its control: what it holds, what a typed text becomes, what is wrong with it. */
final class FieldInput {

    private static final int DIGITS_BESIDE = 4;

    private final Bench bench;
    private final SheetEntry entry;

    FieldInput(Bench bench, SheetEntry entry) {
        this.bench = bench;
        this.entry = entry;
    }

    SheetEntry entry() {
        return entry;
    }

    private MachineDocument document() {
        return bench.document();
    }

    private KeyPath path() {
        return document().path(entry.path());
    }

    private Optional<Key> key() {
        return document().key(path());
    }

    /** One sentence for a tooltip. */
    String meaning() {
        return key().map(Key::meaning).orElse("");
    }

    /** The user's own text, or nothing where the file leaves the value out. */
    String text() {
        return document().valueText(path()).orElse("");
    }

    /** What a missing value stands for; empty where it must be there. */
    String otherwise() {
        return key().map(Key::otherwise).orElse("");
    }

    /** The same value in the other system of units; empty where it would read the same. */
    String beside() {
        Optional<Quantity> present = document().quantity(path());
        Optional<Dimension> dimension = key().flatMap(Key::dimension);
        if (present.isEmpty() || dimension.isEmpty() || dimension.get().isDimensionless()) {
            return "";
        }
        Quantity quantity = present.get();
        boolean american = UnitSystem.US.unit(dimension.get()) == quantity.unit();
        UnitSystem other = american ? UnitSystem.SI : UnitSystem.US;
        return other.unit(dimension.get()) == quantity.unit()
                ? ""
                : other.show(
                        quantity.value(),
                        dimension.get(),
                        quantity.mark(),
                        document().ambientPressure(),
                        DIGITS_BESIDE);
    }

    /**
     * Takes a typed text into the machine; an empty one takes an optional value out of the file.
     *
     * @return what is wrong, in a sentence; empty when it was taken
     */
    String commit(String typed) {
        if (typed.isBlank()) {
            return text().isEmpty() ? "" : told(bench.leaveOut(entry.path(), entry.label() + " left out"));
        }
        TypedInput input = document().typed(path(), typed);
        return input.refusal()
                .map(Refusal::sentence)
                .orElseGet(() -> put(input.text().orElseThrow(), false));
    }

    /**
     * Moves the value by steps of its last written digit.
     *
     * @return what is wrong, in a sentence; empty when it was taken
     */
    String step(double steps) {
        Optional<Quantity> present = document().quantity(path());
        if (present.isEmpty()) {
            return "";
        }
        Quantity quantity = present.get();
        double place = Steps.lastPlace(quantity.text());
        double zero = quantity.mark().zero(document().ambientPressure());
        double shown = quantity.unit().fromSi(quantity.value() - zero) + steps * place;
        double rounded = Math.rint(shown / place) * place;
        String text = quantity.rewritten(
                quantity.unit().toSi(rounded) + zero, document().ambientPressure(), Steps.DIGITS);
        return put(text, true);
    }

    /** Takes back the last edit of the machine, or makes it again. */
    void undo(boolean again) {
        if (again) {
            bench.redo();
        } else {
            bench.undo();
        }
    }

    private String put(String text, boolean live) {
        String before = text();
        if (text.equals(before)) {
            return "";
        }
        String name = entry.label() + (before.isEmpty() ? " " : " " + before + " → ") + text;
        return told(bench.edit(entry.path(), text, name, live));
    }

    /** The fault of this place, or else the first one. */
    private String told(List<Fault> faults) {
        return faults.stream()
                .filter(f -> f.path().equals(entry.path()))
                .findFirst()
                .map(f -> f.found() + "; wanted " + f.wanted())
                .orElseGet(() -> faults.isEmpty() ? "" : faults.get(0).line());
    }
}
