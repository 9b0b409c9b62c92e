package throwbench.solver.document;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import throwbench.solver.document.attached.AttachedFiles;
import throwbench.solver.document.check.Checked;
import throwbench.solver.document.check.Checker;
import throwbench.solver.document.check.MachineBuilder;
import throwbench.solver.document.check.Rules;
import throwbench.solver.document.json.Flaw;
import throwbench.solver.document.json.JsonText;
import throwbench.solver.document.json.Node;
import throwbench.solver.document.json.Parsed;
import throwbench.solver.document.json.TextEdit;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.Quantity;
import throwbench.solver.document.quantity.QuantityReading;
import throwbench.solver.document.quantity.QuantityText;
import throwbench.solver.document.schema.Key;
import throwbench.solver.document.schema.Kind;

/**
 * A machine file's text with the place of every value in it. Immutable: an edit gives another document, whose text differs
 * in the edited value alone. The text need not be free of faults, but it is one JSON object.
 */
public final class MachineDocument {

    private final String text;
    private final Parsed parsed;
    private final Node root;

    private MachineDocument(String text, Parsed parsed, Node root) {
        this.text = text;
        this.parsed = parsed;
        this.root = root;
    }

    /** Reads a text in one go; the reading holds its document wherever the text is a JSON object. */
    public static Reading read(String text, AttachedFiles files) {
        Parsed parsed = JsonText.parse(text);
        if (parsed.root().isEmpty()) {
            List<Fault> faults =
                    parsed.flaws().stream().map(MachineDocument::fault).toList();
            return new Reading(Optional.empty(), Optional.empty(), faults);
        }
        return new MachineDocument(text, parsed, parsed.root().get()).read(files);
    }

    /** The document of a text that is known to be a JSON object. */
    private static MachineDocument of(String text) {
        Parsed parsed = JsonText.parse(text);
        return new MachineDocument(
                text,
                parsed,
                parsed.root().orElseThrow(() -> new IllegalArgumentException("no value: " + parsed.flaws())));
    }

    /** Reads the machine, or every fault. */
    public Reading read(AttachedFiles files) {
        Checked checked = Checker.check(parsed);
        Rules.judge(checked, files);
        List<Fault> faults =
                checked.flawsInOrder().stream().map(MachineDocument::fault).toList();
        return new Reading(
                Optional.of(this),
                faults.isEmpty() ? Optional.of(MachineBuilder.build(checked)) : Optional.empty(),
                faults);
    }

    private static Fault fault(Flaw flaw) {
        return new Fault(flaw.path(), flaw.found(), flaw.wanted());
    }

    /** Every character of the file. */
    public String text() {
        return text;
    }

    /** The ambient pressure, Pa absolute: the site's, or the default where the file has none that can be read. */
    public double ambientPressure() {
        return Checker.ambientPressure(root);
    }

    /** The place that a text means here: map names may hold dots, spaces and brackets. */
    public KeyPath path(String spelled) {
        return PathReader.read(spelled, root);
    }

    /** What the page says of a place; empty where it has no such key. */
    public Optional<Key> key(KeyPath path) {
        return Optional.ofNullable(PathReader.key(path, root));
    }

    /** The user's own text of a value; empty where none stands, or an object or list. */
    public Optional<String> valueText(KeyPath path) {
        Node node = PathReader.node(path, root);
        return node == null || node.isNest() ? Optional.empty() : Optional.of(node.text());
    }

    /** The quantity at a place: as written, else the default; empty where there is none, or none that can be read. */
    public Optional<Quantity> quantity(KeyPath path) {
        Key key = PathReader.key(path, root);
        if (key == null || (key.kind() != Kind.QUANTITY && key.kind() != Kind.CLEARANCE)) {
            return Optional.empty();
        }
        String written = valueText(path).orElse(key.defaultValue().isPresent() ? key.otherwise() : "");
        Dimension dimension = key.dimension().orElseGet(() -> clearanceDimension(path));
        QuantityReading reading = QuantityText.read(written, dimension, ambientPressure());
        return reading instanceof Quantity quantity ? Optional.of(quantity) : Optional.empty();
    }

    /**
     * Reads what a user typed for a place, with a decimal comma, a sum, or a unit as the SI writes it; what is there now
     * lends its unit to a number alone.
     *
     * @return the text for {@link #with}, or a sentence
     * @throws IllegalArgumentException when the page has no such key
     */
    public TypedInput typed(KeyPath path, String typed) {
        Key key = key(path).orElseThrow(() -> new IllegalArgumentException("no key " + path));
        return TypedInput.read(typed, key, quantity(path), ambientPressure());
    }

    /** Whether something stands at a place. */
    public boolean has(KeyPath path) {
        return PathReader.node(path, root) != null;
    }

    /** Keys of an object's members, in the order of the file; empty for anything else. */
    public List<String> names(KeyPath path) {
        Node node = PathReader.node(path, root);
        if (node == null || node.type() != Node.Type.OBJECT) {
            return List.of();
        }
        return node.members().stream().map(Node::name).toList();
    }

    /** Number of elements of a list; 0 for anything else. */
    public int size(KeyPath path) {
        Node node = PathReader.node(path, root);
        return node == null || node.type() != Node.Type.LIST
                ? 0
                : node.members().size();
    }

    /** A value's JSON, its lines indented from 0, as {@link #insertItem} takes it. */
    public Optional<String> json(KeyPath path) {
        return Optional.ofNullable(PathReader.node(path, root)).map(new TextEdit(text)::json);
    }

    /** Every number that the file holds and that can be read, in the order of the file. */
    public List<NumericKey> numericKeys() {
        return NumericKey.collect(root, Checker.check(parsed));
    }

    /**
     * Another text for one value; a missing key is inserted, with the objects above it.
     *
     * @param value as {@link #valueText} would give it: 75 mm, 14 %, 1.29, true, head
     * @throws IllegalArgumentException when the place leads through a value that is no object or list, or beyond the end of
     *     a list, or when the text is longer than a file may hold
     */
    public MachineDocument with(KeyPath path, String value) {
        Node node = PathReader.node(path, root);
        if (node != null && !node.isNest() && node.text().equals(value)) {
            return this;
        }
        return withJson(path, Literals.json(value, PathReader.key(path, root), node));
    }

    /**
     * Another number at a key, written in the coherent SI unit so that it reads back as the very same double.
     *
     * @param si SI value; Pa absolute for a pressure in a line
     * @throws IllegalArgumentException when the page has no number at the place
     */
    public MachineDocument withNumber(KeyPath path, double si) {
        return with(path, exact(path, si));
    }

    /** Several numbers at once, each as {@link #withNumber} writes it. */
    public MachineDocument withNumbers(Map<KeyPath, Double> numbers) {
        Map<Node, String> present = new HashMap<>();
        Map<KeyPath, Double> missing = new LinkedHashMap<>();
        for (Map.Entry<KeyPath, Double> number : numbers.entrySet()) {
            KeyPath path = number.getKey();
            Node node = PathReader.node(path, root);
            if (node == null || node.isNest()) {
                missing.put(path, number.getValue());
            } else {
                String value = exact(path, number.getValue());
                present.put(node, Literals.json(value, PathReader.key(path, root), node));
            }
        }
        MachineDocument next = present.isEmpty() ? this : of(edit().replace(present));
        for (Map.Entry<KeyPath, Double> number : missing.entrySet()) {
            next = next.withNumber(number.getKey(), number.getValue());
        }
        return next;
    }

    private String exact(KeyPath path, double si) {
        Key key = PathReader.key(path, root);
        boolean clearance = key != null && key.kind() == Kind.CLEARANCE;
        Dimension dimension = clearance
                ? clearanceDimension(path)
                : key == null ? null : key.dimension().orElse(null);
        if (dimension == null) {
            throw new IllegalArgumentException("no number at " + path);
        }
        return QuantityText.exact(si, dimension);
    }

    private Dimension clearanceDimension(KeyPath path) {
        String present = valueText(path).orElse("");
        boolean volume = QuantityText.read(present, Dimension.VOLUME, 0) instanceof Quantity;
        return volume ? Dimension.VOLUME : Dimension.SHARE;
    }

    /** A piece of JSON for a value: an object, a list; what is missing above it is inserted too. */
    public MachineDocument withJson(KeyPath path, String json) {
        Node node = PathReader.node(path, root);
        if (node != null) {
            return of(edit().replace(node, json));
        }
        KeyPath.Step last = path.last();
        Node above = PathReader.node(path.parent(), root);
        if (above == null) {
            String wrapped =
                    last.isIndex() ? "[" + json + "]" : "{ " + TextEdit.quoted(last.key()) + ": " + json + " }";
            return withJson(path.parent(), wrapped);
        }
        boolean fits = above.type() == (last.isIndex() ? Node.Type.LIST : Node.Type.OBJECT);
        if (!fits || (last.isIndex() && last.index() != above.members().size())) {
            throw new IllegalArgumentException("nothing can stand at " + path);
        }
        int end = above.members().size();
        return of(
                last.isIndex()
                        ? edit().insertItem(above, end, json)
                        : edit().insertMember(above, end, last.key(), json));
    }

    /** The document without a key or a list's element; this one where there is none. */
    public MachineDocument without(KeyPath path) {
        Node node = PathReader.node(path, root);
        return node == null || node == root ? this : of(edit().remove(node));
    }

    /**
     * One more element of a list.
     *
     * @param index that it will have, from 0 to the list's size
     * @param json the element
     */
    public MachineDocument insertItem(KeyPath list, int index, String json) {
        return of(edit().insertItem(nest(list, Node.Type.LIST), index, json));
    }

    /** One more member of an object, in a place among the others. */
    public MachineDocument insertMember(KeyPath object, int index, String name, String json) {
        return of(edit().insertMember(nest(object, Node.Type.OBJECT), index, name, json));
    }

    /** An element or member moved to another place among its neighbours. */
    public MachineDocument move(KeyPath path, int index) {
        return of(edit().move(there(path), index));
    }

    /** A member of an object under another key; what refers to it elsewhere stays. */
    public MachineDocument rename(KeyPath path, String name) {
        return of(edit().rename(there(path), name));
    }

    private Node nest(KeyPath path, Node.Type type) {
        Node node = there(path);
        if (node.type() != type) {
            throw new IllegalArgumentException(path + " is " + node.type().said() + ", not " + type.said());
        }
        return node;
    }

    private Node there(KeyPath path) {
        @Nullable Node node = PathReader.node(path, root);
        if (node == null) {
            throw new IllegalArgumentException("nothing stands at " + path);
        }
        return node;
    }

    private TextEdit edit() {
        return new TextEdit(text);
    }

    /** Documents are equal when their texts are. */
    @Override
    public boolean equals(Object other) {
        return other instanceof MachineDocument that && text.equals(that.text);
    }

    @Override
    public int hashCode() {
        return text.hashCode();
    }

    @Override
    public String toString() {
        return text;
    }
}
