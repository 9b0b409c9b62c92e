package throwbench.solver.document.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.OptionalDouble;
import throwbench.solver.document.json.Flaw;
import throwbench.solver.document.json.Node;
import throwbench.solver.document.json.Parsed;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.PressureMark;
import throwbench.solver.document.quantity.Quantity;
import throwbench.solver.document.quantity.QuantityText;
import throwbench.solver.document.schema.Key;
import throwbench.solver.document.schema.Kind;
import throwbench.solver.document.schema.NameSpace;
import throwbench.solver.document.schema.Schema;
import throwbench.solver.fluid.GasTable;

/** Walks a file's tree beside the schema: every value by itself, and every name. */
public final class Checker {

    private final Checked checked;
    private final FlawList flaws;
    private final List<Reference> references = new ArrayList<>();

    private record Reference(Node at, String name, NameSpace space) {}

    private Checker(Checked checked) {
        this.checked = checked;
        this.flaws = checked.flaws();
    }

    /** Judges every value by itself; the flaws of the text as JSON are taken along. */
    public static Checked check(Parsed parsed) {
        Node root = parsed.root().orElseThrow();
        Checked checked = new Checked(root, parsed.count(), ambientPressure(root));
        Checker checker = new Checker(checked);
        parsed.flaws().forEach(checked.flaws()::add);
        checker.walk(Schema.root(), root);
        checker.references.forEach(checker::resolve);
        return checked;
    }

    /**
     * The site's ambient pressure, Pa absolute, or the default where the file has none that can be read. Read before all
     * else: every gauge pressure counts from it, wherever it stands in the file.
     */
    public static double ambientPressure(Node root) {
        Key key = schemaOfAmbient();
        Node site = root.member("site");
        Node ambient = site == null ? null : site.member(key.name());
        if (ambient != null
                && ambient.type() == Node.Type.TEXT
                && QuantityText.read(ambient.text(), Dimension.GAS_PRESSURE, 0) instanceof Quantity pressure
                && pressure.mark() == PressureMark.ABSOLUTE
                && key.range().contains(pressure.value())) {
            return pressure.value();
        }
        return key.defaultValue().orElseThrow();
    }

    private static Key schemaOfAmbient() {
        Map<String, Key> site = child(Schema.root(), "site").children("");
        return Objects.requireNonNull(site.get("ambientPressure"));
    }

    private static Key child(Key object, String name) {
        return Objects.requireNonNull(object.children("").get(name));
    }

    private void walk(Key key, Node node) {
        checked.know(node, key);
        switch (key.kind()) {
            case OBJECT -> {
                if (is(Node.Type.OBJECT, node, key)) {
                    fields(key.children(""), node);
                }
            }
            case VARIANT -> {
                if (is(Node.Type.OBJECT, node, key)) {
                    variant(key, node);
                }
            }
            case LIST -> list(key, node);
            case PAIR -> pair(key, node);
            case MAP -> map(key, node);
            default -> value(key, node);
        }
    }

    private boolean is(Node.Type type, Node node, Key key) {
        if (node.type() == type) {
            return true;
        }
        flaws.add(node, Said.node(node), key.kind().said());
        return false;
    }

    private void fields(Map<String, Key> children, Node object) {
        for (Node member : object.members()) {
            Key child = children.get(member.name());
            if (child == null) {
                flaws.add(member, "an unknown key", "one of " + String.join(", ", children.keySet()));
            } else if (!member.isRepeated()) {
                walk(child, member);
            }
        }
        for (Key child : children.values()) {
            if (child.isRequired() && object.member(child.name()) == null) {
                missing(child, object, object.path(child.name()));
            }
        }
    }

    /** At the deepest keys that should stand: of a missing drive, at its speed. */
    private void missing(Key key, Node above, String path) {
        List<Key> deeper = new ArrayList<>();
        if (key.kind() == Kind.OBJECT) {
            for (Key child : key.children("").values()) {
                if (child.isRequired()) {
                    deeper.add(child);
                }
            }
        }
        for (Key child : deeper) {
            missing(child, above, path + '.' + child.name());
        }
        if (deeper.isEmpty()) {
            flaws.add(new Flaw(above.start(), path, FlawList.MISSING, key.wanted()));
        }
    }

    private void variant(Key key, Node object) {
        String word = object.text("kind");
        if (key.variants().contains(word)) {
            fields(key.children(word), object);
            return;
        }
        String wanted = "one of " + String.join(", ", key.variants());
        Node kind = object.member("kind");
        flaws.add(object, "kind", kind == null ? FlawList.MISSING : Said.node(kind), wanted);
    }

    private void list(Key key, Node node) {
        if (!is(Node.Type.LIST, node, key)) {
            return;
        }
        if (node.members().size() < key.leastItems()) {
            flaws.add(node, "an empty list", "at least one");
        }
        for (Node item : node.members()) {
            walk(key.item(), item);
        }
    }

    private void pair(Key key, Node node) {
        if (!is(Node.Type.LIST, node, key)) {
            return;
        }
        if (node.members().size() != 2) {
            flaws.add(node, "a list of " + node.members().size(), key.kind().said());
            return;
        }
        for (Node end : node.members()) {
            walk(key.item(), end);
        }
        OptionalDouble least = value(node.members().get(0));
        OptionalDouble greatest = value(node.members().get(1));
        if (least.isPresent() && greatest.isPresent() && least.getAsDouble() > greatest.getAsDouble()) {
            flaws.add(
                    node,
                    Said.node(node.members().get(0)) + " before "
                            + Said.node(node.members().get(1)),
                    "the lesser first");
        }
    }

    private OptionalDouble value(Node node) {
        return checked.quantity(node).map(q -> OptionalDouble.of(q.value())).orElse(OptionalDouble.empty());
    }

    private void map(Key key, Node node) {
        if (!is(Node.Type.OBJECT, node, key)) {
            return;
        }
        for (Node member : node.members()) {
            if (member.isRepeated()) {
                continue;
            }
            if (member.name().isBlank() && key.declares().isPresent()) {
                flaws.add(member, "a name of nothing", "a name");
            }
            key.declares().ifPresent(space -> checked.declare(space, member.name(), member));
            key.refersTo().ifPresent(space -> references.add(new Reference(member, member.name(), space)));
            walk(key.item(), member);
        }
    }

    private void value(Key key, Node node) {
        switch (key.kind()) {
            case QUANTITY, CLEARANCE -> QuantityCheck.check(key, node, checked);
            case FLAG -> {
                if (node.type() != Node.Type.TRUE && node.type() != Node.Type.FALSE) {
                    wrong(key, node);
                }
            }
            case VERSION -> {
                if (node.type() != Node.Type.NUMBER || Double.parseDouble(node.text()) != 1) {
                    wrong(key, node);
                }
            }
            case CHOICE -> {
                if (node.type() != Node.Type.TEXT || !key.words().contains(node.text())) {
                    wrong(key, node);
                }
            }
            default -> text(key, node);
        }
    }

    private void text(Key key, Node node) {
        boolean named = node.type() == Node.Type.TEXT
                && (key.kind() == Kind.TEXT || !node.text().isBlank());
        if (!named) {
            wrong(key, node);
            return;
        }
        key.refersTo().ifPresent(space -> references.add(new Reference(node, node.text(), space)));
        key.declares().ifPresent(space -> {
            if (!checked.declare(space, node.text(), node)) {
                flaws.add(node, Said.node(node) + " a second time", "a name of its own for each " + space.said());
            }
        });
    }

    private void wrong(Key key, Node node) {
        flaws.add(node, Said.node(node), key.wanted());
    }

    private void resolve(Reference reference) {
        NameSpace space = reference.space();
        boolean known = space == NameSpace.GAS
                ? GasTable.find(reference.name()).isPresent()
                : checked.isDeclared(space, reference.name());
        if (!known) {
            String found = "the unknown " + space.said() + ' ' + QuantityText.quoted(reference.name());
            flaws.add(reference.at(), found, "the name of a " + space.said());
        }
    }
}
