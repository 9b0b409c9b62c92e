package throwbench.solver.document.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import throwbench.solver.document.json.Node;
import throwbench.solver.document.quantity.Quantity;
import throwbench.solver.document.schema.Key;
import throwbench.solver.document.schema.Kind;

/** An object of a checked file by its keys, the schema's defaults standing in for what is not written. */
final class Fields {

    private final Checked checked;
    private final @Nullable Node node;
    private final Map<String, Key> children;

    private Fields(Checked checked, @Nullable Node node, Map<String, Key> children) {
        this.checked = checked;
        this.node = node;
        this.children = children;
    }

    static Fields root(Checked checked) {
        return of(checked, checked.root(), Objects.requireNonNull(checked.key(checked.root())));
    }

    /** What is no object is read as if it were not there; it has its fault already. */
    private static Fields of(Checked checked, @Nullable Node node, Key key) {
        boolean there = node != null && node.type() == Node.Type.OBJECT;
        String word = node != null && key.kind() == Kind.VARIANT ? node.text("kind") : "";
        return new Fields(checked, there ? node : null, key.children(word));
    }

    /** Whether the file has the object. */
    boolean isThere() {
        return node != null;
    }

    /** The object's own key: of a map's member, its name. */
    String name() {
        return Objects.requireNonNull(node).name();
    }

    /** The word of its kind; empty where it has none that the page knows. */
    String kind() {
        return node == null || children.isEmpty() ? "" : node.text("kind");
    }

    /** Its node, which the file must have. */
    Node node() {
        return Objects.requireNonNull(node);
    }

    private Key key(String name) {
        return Objects.requireNonNull(children.get(name), name);
    }

    private @Nullable Node at(String name) {
        return node == null ? null : node.member(name);
    }

    /** Whether something stands at a key, right or wrong. */
    boolean has(String name) {
        return at(name) != null;
    }

    /** The quantity that the file has at a key, where it is right. */
    Optional<Quantity> quantity(String name) {
        Node value = at(name);
        return value == null ? Optional.empty() : checked.quantity(value);
    }

    /** SI value as written, else the default; empty where it is wrong, a word, or has no default. */
    OptionalDouble number(String name) {
        Node value = at(name);
        if (value == null) {
            return key(name).defaultValue();
        }
        Quantity quantity = checked.quantity(value).orElse(null);
        return quantity == null ? OptionalDouble.empty() : OptionalDouble.of(quantity.value());
    }

    /** SI value of what a file without faults must have or has a default for. */
    double value(String name) {
        return number(name).orElseThrow(() -> new IllegalStateException("no value at " + name));
    }

    /** The text or word at a key, else the default's; empty where neither is. */
    String text(String name) {
        Node value = at(name);
        if (value == null) {
            return key(name).otherwise();
        }
        return value.type() == Node.Type.TEXT ? value.text() : "";
    }

    /** The text at a key, where the file has one. */
    Optional<String> given(String name) {
        Node value = at(name);
        return value == null || value.type() != Node.Type.TEXT ? Optional.empty() : Optional.of(value.text());
    }

    boolean flag(String name) {
        Node value = at(name);
        return value == null ? Boolean.parseBoolean(key(name).otherwise()) : value.type() == Node.Type.TRUE;
    }

    /** Whether one of the key's words stands in place of its quantity. */
    boolean hasWord(String name) {
        Node value = at(name);
        return value != null
                && value.type() == Node.Type.TEXT
                && key(name).words().contains(value.text());
    }

    Fields object(String name) {
        return of(checked, at(name), key(name));
    }

    /** The objects of a list or map; none where there is none. */
    List<Fields> items(String name) {
        Node nest = at(name);
        List<Fields> items = new ArrayList<>();
        if (nest != null) {
            Key item = key(name).item();
            for (Node member : nest.members()) {
                if (member.type() == Node.Type.OBJECT && !member.isRepeated()) {
                    items.add(of(checked, member, item));
                }
            }
        }
        return items;
    }

    /** A member of a map by its name, there or not. */
    Fields member(String map, String name) {
        Node nest = at(map);
        return of(checked, nest == null ? null : nest.member(name), key(map).item());
    }

    /** The quantities of a list or map of plain values. */
    List<Node> values(String name) {
        Node nest = at(name);
        return nest == null ? List.of() : nest.members();
    }

    Checked checked() {
        return checked;
    }

    /** How a message calls a key's value: bore "320 mm", or what it is by default. */
    String said(String name) {
        Node value = at(name);
        return name + ' ' + (value == null ? key(name).otherwise() : Said.node(value));
    }

    void fault(String name, String found, String wanted) {
        checked.flaws().add(node(), name, found, wanted);
    }
}
