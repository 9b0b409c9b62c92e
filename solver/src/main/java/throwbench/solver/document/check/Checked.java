package throwbench.solver.document.check;

import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import throwbench.solver.chamber.RecordedPressure;
import throwbench.solver.document.json.Flaw;
import throwbench.solver.document.json.Node;
import throwbench.solver.document.quantity.Quantity;
import throwbench.solver.document.schema.Key;
import throwbench.solver.document.schema.NameSpace;

/** A file's tree with what each value means, as far as it means anything, and the flaws found on the way. */
public final class Checked {

    private final Node root;
    private final double ambientPressure;
    private final @Nullable Key[] keys;
    private final @Nullable Quantity[] quantities;
    private final Map<NameSpace, Map<String, Node>> names = new EnumMap<>(NameSpace.class);
    private final Map<Node, RecordedPressure> recordings = new HashMap<>();
    private final FlawList flaws = new FlawList();

    Checked(Node root, int count, double ambientPressure) {
        this.root = root;
        this.ambientPressure = ambientPressure;
        this.keys = new @Nullable Key[count];
        this.quantities = new @Nullable Quantity[count];
    }

    Node root() {
        return root;
    }

    double ambientPressure() {
        return ambientPressure;
    }

    /** All that is wrong, in the order of the file. */
    public List<Flaw> flawsInOrder() {
        return flaws.inOrder();
    }

    FlawList flaws() {
        return flaws;
    }

    void know(Node node, Key key) {
        keys[node.serial()] = key;
    }

    /** What the page says of a value; null where it knows no such key. */
    public @Nullable Key key(Node node) {
        return keys[node.serial()];
    }

    void measure(Node node, Quantity quantity) {
        quantities[node.serial()] = quantity;
    }

    /** The quantity at a node, where there is one within its range. */
    public Optional<Quantity> quantity(Node node) {
        return Optional.ofNullable(quantities[node.serial()]);
    }

    void record(Node cycle, RecordedPressure recording) {
        recordings.put(cycle, recording);
    }

    /** The table of a recorded cycle whose file could be read. */
    Optional<RecordedPressure> recording(Node cycle) {
        return Optional.ofNullable(recordings.get(cycle));
    }

    /** Takes a name; false where its space has it already. */
    boolean declare(NameSpace space, String name, Node at) {
        return names.computeIfAbsent(space, any -> new HashMap<>()).putIfAbsent(name, at) == null;
    }

    boolean isDeclared(NameSpace space, String name) {
        Map<String, Node> declared = names.get(space);
        return declared != null && declared.containsKey(name);
    }
}
