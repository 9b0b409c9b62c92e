package throwbench.solver.document;

import java.util.Locale;
import java.util.Optional;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.Quantity;
import throwbench.solver.document.quantity.QuantityReading;
import throwbench.solver.document.quantity.QuantityText;
import throwbench.solver.document.quantity.Refusal;
import throwbench.solver.document.quantity.TypedValue;
import throwbench.solver.document.schema.Key;

/**
 * What a user typed for a key, read with good will.
 *
 * @param text what the file will hold; empty where there is a refusal
 * @param refusal why the typed text cannot stand there
 */
public record TypedInput(Optional<String> text, Optional<Refusal> refusal) {

    private static TypedInput taken(String text) {
        return new TypedInput(Optional.of(text), Optional.empty());
    }

    private static TypedInput refused(String typed, String wanted) {
        return new TypedInput(Optional.empty(), Optional.of(new Refusal(QuantityText.quoted(typed), wanted)));
    }

    static TypedInput read(String typed, Key key, Optional<Quantity> present, double ambientPressure) {
        String stripped = typed.strip();
        return switch (key.kind()) {
            case QUANTITY -> quantity(typed, key, present, ambientPressure);
            case CLEARANCE -> clearance(typed, key, present);
            case CHOICE -> word(stripped, key).map(TypedInput::taken).orElseGet(() -> refused(typed, key.wanted()));
            case TEXT -> taken(typed);
            case NAME, REFERENCE -> stripped.isEmpty() ? refused(typed, key.wanted()) : taken(stripped);
            case FLAG -> flag(typed, stripped.toLowerCase(Locale.ROOT), key);
            default -> refused(typed, key.wanted());
        };
    }

    private static Optional<String> word(String stripped, Key key) {
        return key.words().stream().filter(stripped::equalsIgnoreCase).findFirst();
    }

    private static TypedInput flag(String typed, String word, Key key) {
        return word.equals("true") || word.equals("false") ? taken(word) : refused(typed, key.wanted());
    }

    private static TypedInput quantity(String typed, Key key, Optional<Quantity> present, double ambientPressure) {
        Optional<String> word = word(typed.strip(), key);
        Dimension dimension = key.dimension().orElseThrow();
        return word.isPresent()
                ? taken(word.get())
                : judged(typed, TypedValue.read(typed, dimension, present, ambientPressure), key);
    }

    /** A number alone is what stands there now: a share, or a volume in its unit. */
    private static TypedInput clearance(String typed, Key key, Optional<Quantity> present) {
        boolean volume =
                present.isPresent() && Dimension.VOLUME.holds(present.get().unit());
        Dimension first = volume ? Dimension.VOLUME : Dimension.SHARE;
        QuantityReading reading = TypedValue.read(typed, first, present, 0);
        if (reading instanceof Refusal) {
            reading = TypedValue.read(typed, volume ? Dimension.SHARE : Dimension.VOLUME, Optional.empty(), 0);
        }
        return reading instanceof Refusal ? refused(typed, key.wanted()) : judged(typed, reading, key);
    }

    private static TypedInput judged(String typed, QuantityReading reading, Key key) {
        if (reading instanceof Quantity quantity) {
            return key.range().contains(quantity.value()) ? taken(quantity.text()) : refused(typed, key.wanted());
        }
        return new TypedInput(Optional.empty(), Optional.of((Refusal) reading));
    }
}
