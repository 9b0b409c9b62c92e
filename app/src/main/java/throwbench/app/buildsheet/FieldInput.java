package throwbench.app.buildsheet;

import java.util.List;
import java.util.Optional;
import throwbench.app.bench.Bench;
import throwbench.solver.document.Fault;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.PressureMark;
import throwbench.solver.document.quantity.Quantity;
import throwbench.solver.document.quantity.QuantityReading;
import throwbench.solver.document.quantity.QuantityText;
import throwbench.solver.document.quantity.Refusal;
import throwbench.solver.document.quantity.TypedValue;
import throwbench.solver.document.quantity.Unit;
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

    private Optional<Key> key() {
        MachineDocument document = bench.document();
        return document.key(document.path(entry.path()));
    }

    /** One sentence for a tooltip. */
    String meaning() {
        return key().map(Key::meaning).orElse("");
    }

    /** The user's own text, or nothing where the file leaves the value out. */
    String text() {
        MachineDocument document = bench.document();
        return document.valueText(document.path(entry.path())).orElse("");
    }

    /** What a missing value stands for; empty where it must be there. */
    String otherwise() {
        return key().map(Key::otherwise).orElse("");
    }

    private Dimension dimension() {
        // a clearance is a share unless it is written as a volume
        return key().flatMap(Key::dimension)
                .orElse(text().endsWith("%") || text().isEmpty() ? Dimension.SHARE : clearanceDimension());
    }

    private Dimension clearanceDimension() {
        QuantityReading asVolume =
                QuantityText.read(text(), Dimension.VOLUME, bench.document().ambientPressure());
        return asVolume instanceof Quantity ? Dimension.VOLUME : Dimension.SHARE;
    }

    /** What the field holds now. */
    Optional<Quantity> present() {
        String text = text().isEmpty() ? otherwise() : text();
        QuantityReading reading =
                QuantityText.read(text, dimension(), bench.document().ambientPressure());
        return reading instanceof Quantity quantity ? Optional.of(quantity) : Optional.empty();
    }

    /** The same value in the other system of units; empty where it would read the same. */
    String beside() {
        Optional<Quantity> present = present();
        if (present.isEmpty() || dimension().isDimensionless()) {
            return "";
        }
        Quantity quantity = present.get();
        Unit unit = quantity.unit();
        boolean american = UnitSystem.US.unit(dimension()) == unit;
        UnitSystem other = american ? UnitSystem.SI : UnitSystem.US;
        if (other.unit(dimension()) == unit) {
            return "";
        }
        PressureMark mark = quantity.mark();
        return other.show(quantity.value(), dimension(), mark, bench.document().ambientPressure(), DIGITS_BESIDE);
    }

    /**
     * Takes a typed text into the machine.
     *
     * @return what is wrong, in a sentence; empty when it was taken
     */
    String commit(String typed) {
        if (typed.isBlank()) {
            return text().isEmpty() ? "" : "empty; a value is wanted, such as " + text();
        }
        QuantityReading reading =
                TypedValue.read(typed, dimension(), present(), bench.document().ambientPressure());
        if (dimension() == Dimension.SHARE
                && reading instanceof Refusal
                && key().flatMap(Key::dimension).isEmpty()) {
            reading = TypedValue.read(
                    typed, Dimension.VOLUME, Optional.empty(), bench.document().ambientPressure());
        }
        if (reading instanceof Refusal refusal) {
            return refusal.sentence();
        }
        return reading instanceof Quantity quantity ? put(quantity.text(), false) : "";
    }

    /**
     * Moves the value by steps of its last written digit.
     *
     * @return what is wrong, in a sentence; empty when it was taken
     */
    String step(double steps) {
        Optional<Quantity> present = present();
        if (present.isEmpty()) {
            return "";
        }
        Quantity quantity = present.get();
        double place = Steps.lastPlace(quantity.text());
        double zero = quantity.mark().zero(bench.document().ambientPressure());
        double shown = quantity.unit().fromSi(quantity.value() - zero) + steps * place;
        double rounded = Math.rint(shown / place) * place;
        String text = quantity.rewritten(
                quantity.unit().toSi(rounded) + zero, bench.document().ambientPressure(), Steps.DIGITS);
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
        List<Fault> faults = bench.edit(entry.path(), text, name, live);
        return faults.stream()
                .filter(f -> f.path().equals(entry.path()))
                .findFirst()
                .map(f -> f.found() + "; wanted " + f.wanted())
                .orElseGet(() -> faults.isEmpty() ? "" : faults.get(0).line());
    }
}
