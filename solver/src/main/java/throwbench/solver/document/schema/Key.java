package throwbench.solver.document.schema;

import java.util.Arrays;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.Quantity;
import throwbench.solver.document.quantity.QuantityText;

/** One key of the machine file, with all that is known of it. Immutable. */
public final class Key {

    private final String name;
    private final Kind kind;
    private final String meaning;
    // set while a key is declared, by the methods below that give a changed copy; never afterwards
    private @Nullable Dimension dimension;
    private Range range = Range.ANY;
    private boolean required;
    private String otherwise = "";
    private OptionalDouble defaultValue = OptionalDouble.empty();
    private List<String> words = List.of();
    private @Nullable NameSpace declares;
    private @Nullable NameSpace refersTo;
    private Map<String, Map<String, Key>> variants = Map.of();
    private @Nullable Key item;
    private int leastItems;

    private Key(Kind kind, String name, String meaning) {
        this.kind = kind;
        this.name = name;
        this.meaning = meaning;
    }

    private Key(Key other) {
        this(other.kind, other.name, other.meaning);
        dimension = other.dimension;
        range = other.range;
        required = other.required;
        otherwise = other.otherwise;
        defaultValue = other.defaultValue;
        words = other.words;
        declares = other.declares;
        refersTo = other.refersTo;
        variants = other.variants;
        item = other.item;
        leastItems = other.leastItems;
    }

    static Key of(Kind kind, String name, String meaning) {
        return new Key(kind, name, meaning);
    }

    static Key quantity(String name, Dimension dimension, String meaning) {
        Key key = new Key(Kind.QUANTITY, name, meaning);
        key.dimension = dimension;
        return key;
    }

    static Key choice(String name, List<String> words, String meaning) {
        return of(Kind.CHOICE, name, meaning).orWord(words);
    }

    static Key object(String name, String meaning, Key... children) {
        Key key = new Key(Kind.OBJECT, name, meaning);
        // one variant without a word
        key.variants = Map.of("", byName(List.of(children)));
        return key;
    }

    static Key list(String name, String meaning, Key item) {
        return nest(Kind.LIST, name, meaning, item);
    }

    static Key map(String name, String meaning, Key item) {
        return nest(Kind.MAP, name, meaning, item);
    }

    static Key pair(String name, Dimension dimension, String meaning) {
        return nest(Kind.PAIR, name, meaning, quantity("", dimension, meaning).in(Range.above(0)));
    }

    private static Key nest(Kind kind, String name, String meaning, Key item) {
        Key key = new Key(kind, name, meaning);
        key.item = item;
        return key;
    }

    /** What a word of {@code kind} brings with it. */
    record Variant(String word, List<Key> keys) {}

    static Variant when(String word, Key... keys) {
        return new Variant(word, List.of(keys));
    }

    /** An object whose {@code kind} chooses its children. */
    static Key variant(String name, String meaning, String kindMeaning, Variant... variants) {
        List<String> words = Arrays.stream(variants).map(Variant::word).toList();
        Key kindKey = choice("kind", words, kindMeaning).required();
        Map<String, Map<String, Key>> shape = new LinkedHashMap<>();
        for (Variant variant : variants) {
            Map<String, Key> children = new LinkedHashMap<>();
            children.put(kindKey.name(), kindKey);
            children.putAll(byName(variant.keys()));
            shape.put(variant.word(), children);
        }
        Key key = new Key(Kind.VARIANT, name, meaning);
        key.variants = shape;
        return key;
    }

    private static Map<String, Key> byName(List<Key> keys) {
        Map<String, Key> children = new LinkedHashMap<>();
        for (Key key : keys) {
            if (children.put(key.name(), key) != null) {
                throw new IllegalArgumentException("key declared twice: " + key.name());
            }
        }
        return children;
    }

    Key in(Range allowed) {
        Key copy = new Key(this);
        copy.range = allowed;
        return copy;
    }

    Key required() {
        Key copy = new Key(this);
        copy.required = true;
        return copy;
    }

    /** Words of a choice, or words that may stand in place of the value. */
    Key orWord(List<String> others) {
        Key copy = new Key(this);
        copy.words = List.copyOf(others);
        return copy;
    }

    Key declares(NameSpace space) {
        Key copy = new Key(this);
        copy.declares = space;
        return copy;
    }

    Key refersTo(NameSpace space) {
        Key copy = new Key(this);
        copy.refersTo = space;
        return copy;
    }

    /** The text that a missing value stands for; a quantity's is read at once. */
    Key otherwise(String text) {
        Key copy = otherwiseSaid(text);
        if (kind == Kind.QUANTITY || kind == Kind.CLEARANCE) {
            // no default is a gauge pressure: the ambient pressure plays no part
            Dimension read = dimension == null ? Dimension.SHARE : dimension;
            copy.defaultValue = OptionalDouble.of(((Quantity) QuantityText.read(text, read, 0)).value());
        }
        return copy;
    }

    /** In words, where the default depends on other keys. */
    Key otherwiseSaid(String text) {
        Key copy = new Key(this);
        copy.otherwise = text;
        return copy;
    }

    Key atLeast(int items) {
        Key copy = new Key(this);
        copy.leastItems = items;
        return copy;
    }

    /** As the file spells it; empty for an item of a list or map. */
    public String name() {
        return name;
    }

    public Kind kind() {
        return kind;
    }

    /** One sentence for a tooltip. */
    public String meaning() {
        return meaning;
    }

    /** Dimension of a quantity; empty for everything else, a clearance too: it is a share or a volume. */
    public Optional<Dimension> dimension() {
        return Optional.ofNullable(dimension);
    }

    public Range range() {
        return range;
    }

    /** Whether the object in which it stands must have it. */
    public boolean isRequired() {
        return required;
    }

    /** What may stand here, for sentences: {@code a length, as "75 mm", above 0}. */
    public String wanted() {
        String allowed = range.said().isEmpty() ? "" : ", " + range.said();
        if (dimension != null) {
            String others = words.isEmpty() ? "" : ", or " + String.join(", ", words);
            return dimension.wanted() + allowed + others;
        }
        return words.isEmpty() ? kind.said() + allowed : "one of " + String.join(", ", words);
    }

    /** The text that a missing value stands for, or words where it depends on other keys; may be empty. */
    public String otherwise() {
        return otherwise;
    }

    /** SI value of a missing quantity, where it does not depend on other keys. */
    public OptionalDouble defaultValue() {
        return defaultValue;
    }

    /** Words of a choice, or words that may stand in a quantity's place. */
    public List<String> words() {
        return words;
    }

    /** The space in which its text (of a map: its member names) declares a name. */
    public Optional<NameSpace> declares() {
        return Optional.ofNullable(declares);
    }

    /** The space in which its text (of a map: its member names) must be declared. */
    public Optional<NameSpace> refersTo() {
        return Optional.ofNullable(refersTo);
    }

    /** Fewest items of a list. */
    public int leastItems() {
        return leastItems;
    }

    /** What each element of a list, end of a pair or member of a map is. */
    public Key item() {
        return Objects.requireNonNull(item, name);
    }

    /** The words of a variant's {@code kind}, or one empty word for an object. */
    public Collection<String> variants() {
        return variants.keySet();
    }

    /** Children of an object, or of a variant's kind, in the order of the page; none for a word it does not know. */
    public Map<String, Key> children(String variant) {
        return variants.getOrDefault(variant, Map.of());
    }
}
