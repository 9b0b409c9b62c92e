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
    private final Rule rule;
    private final Shape shape;

    private Key(String name, Kind kind, String meaning, Rule rule, Shape shape) {
        this.name = name;
        this.kind = kind;
        this.meaning = meaning;
        this.rule = rule;
        this.shape = shape;
    }

    /** What a value must obey, and what stands in for a missing one. */
    private record Rule(
            @Nullable Dimension dimension,
            Range range,
            boolean required,
            String otherwise,
            OptionalDouble defaultValue,
            List<String> words,
            @Nullable NameSpace declares,
            @Nullable NameSpace refersTo) {

        static final Rule FREE = new Rule(null, Range.ANY, false, "", OptionalDouble.empty(), List.of(), null, null);
    }

    /** What stands inside: children by variant ("" where there is but one), and the item of a list or map. */
    private record Shape(
            Map<String, Map<String, Key>> variants,
            @Nullable Key item,
            int least) {

        static final Shape NONE = new Shape(Map.of(), null, 0);
    }

    static Key quantity(String name, Dimension dimension, String meaning) {
        Rule free = Rule.FREE;
        Rule rule =
                new Rule(dimension, free.range, false, "", free.defaultValue, free.words, free.declares, free.refersTo);
        return new Key(name, Kind.QUANTITY, meaning, rule, Shape.NONE);
    }

    static Key of(Kind kind, String name, String meaning) {
        return new Key(name, kind, meaning, Rule.FREE, Shape.NONE);
    }

    static Key choice(String name, List<String> words, String meaning) {
        return of(Kind.CHOICE, name, meaning).orWord(words);
    }

    static Key object(String name, String meaning, Key... children) {
        return new Key(
                name, Kind.OBJECT, meaning, Rule.FREE, new Shape(Map.of("", byName(List.of(children))), null, 0));
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
        return new Key(name, Kind.VARIANT, meaning, Rule.FREE, new Shape(shape, null, 0));
    }

    static Key list(String name, String meaning, Key item) {
        return new Key(name, Kind.LIST, meaning, Rule.FREE, new Shape(Map.of(), item, 0));
    }

    static Key map(String name, String meaning, Key item) {
        return new Key(name, Kind.MAP, meaning, Rule.FREE, new Shape(Map.of(), item, 0));
    }

    static Key pair(String name, Dimension dimension, String meaning) {
        Key end = quantity("", dimension, meaning).in(Range.above(0)).required();
        return new Key(name, Kind.PAIR, meaning, Rule.FREE, new Shape(Map.of(), end, 2));
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

    Key in(Range range) {
        return with(new Rule(
                rule.dimension,
                range,
                rule.required,
                rule.otherwise,
                rule.defaultValue,
                rule.words,
                rule.declares,
                rule.refersTo));
    }

    Key required() {
        return with(new Rule(
                rule.dimension,
                rule.range,
                true,
                rule.otherwise,
                rule.defaultValue,
                rule.words,
                rule.declares,
                rule.refersTo));
    }

    /** Other words that may stand in place of the value. */
    Key orWord(List<String> words) {
        return with(new Rule(
                rule.dimension,
                rule.range,
                rule.required,
                rule.otherwise,
                rule.defaultValue,
                words,
                rule.declares,
                rule.refersTo));
    }

    Key declares(NameSpace space) {
        return with(new Rule(
                rule.dimension,
                rule.range,
                rule.required,
                rule.otherwise,
                rule.defaultValue,
                rule.words,
                space,
                rule.refersTo));
    }

    Key refersTo(NameSpace space) {
        return with(new Rule(
                rule.dimension,
                rule.range,
                rule.required,
                rule.otherwise,
                rule.defaultValue,
                rule.words,
                rule.declares,
                space));
    }

    /** The text that a missing value stands for; a quantity's is read at once. */
    Key otherwise(String text) {
        OptionalDouble value = OptionalDouble.empty();
        if (kind == Kind.QUANTITY || kind == Kind.CLEARANCE) {
            // no default is a gauge pressure: the ambient pressure plays no part
            Dimension read = rule.dimension == null ? Dimension.SHARE : rule.dimension;
            value = OptionalDouble.of(((Quantity) QuantityText.read(text, read, 0)).value());
        }
        return with(new Rule(
                rule.dimension, rule.range, rule.required, text, value, rule.words, rule.declares, rule.refersTo));
    }

    /** In words, where the default depends on other keys. */
    Key otherwiseSaid(String words) {
        return with(new Rule(
                rule.dimension,
                rule.range,
                rule.required,
                words,
                OptionalDouble.empty(),
                rule.words,
                rule.declares,
                rule.refersTo));
    }

    Key atLeast(int items) {
        return new Key(name, kind, meaning, rule, new Shape(shape.variants, shape.item, items));
    }

    private Key with(Rule other) {
        return new Key(name, kind, meaning, other, shape);
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
        return Optional.ofNullable(rule.dimension);
    }

    public Range range() {
        return rule.range;
    }

    /** Whether the object in which it stands must have it. */
    public boolean isRequired() {
        return rule.required;
    }

    /** The text that a missing value stands for, or words where it depends on other keys; may be empty. */
    public String otherwise() {
        return rule.otherwise;
    }

    /** SI value of a missing quantity, where it does not depend on other keys. */
    public OptionalDouble defaultValue() {
        return rule.defaultValue;
    }

    /** Words of a choice, or words that may stand in a quantity's place. */
    public List<String> words() {
        return rule.words;
    }

    /** The space in which its text (of a map: its member names) declares a name. */
    public Optional<NameSpace> declares() {
        return Optional.ofNullable(rule.declares);
    }

    /** The space in which its text (of a map: its member names) must be declared. */
    public Optional<NameSpace> refersTo() {
        return Optional.ofNullable(rule.refersTo);
    }

    /** Fewest items of a list. */
    public int leastItems() {
        return shape.least;
    }

    /** What each element of a list, end of a pair or member of a map is. */
    public Key item() {
        return Objects.requireNonNull(shape.item, name);
    }

    /** The words of a variant's {@code kind}, or one empty word for an object. */
    public Collection<String> variants() {
        return shape.variants.keySet();
    }

    /** Children of an object, or of a variant's kind, in the order of the page; none for a word it does not know. */
    public Map<String, Key> children(String variant) {
        return shape.variants.getOrDefault(variant, Map.of());
    }
}
