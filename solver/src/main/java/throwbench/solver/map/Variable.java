package throwbench.solver.map;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import throwbench.solver.document.KeyPath;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.NumericKey;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.Quantity;
import throwbench.solver.document.schema.Key;
import throwbench.solver.document.schema.Kind;
import throwbench.solver.document.schema.NameSpace;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Stage;

/**
 * A number of the machine file that a study varies.
 *
 * @param path where it stands, or would stand: a default may be varied too
 * @param dimension what it measures; of a clearance, the share or volume as which it is written
 */
public record Variable(KeyPath path, Dimension dimension) {

    /**
     * The number at a key path as a user spells it.
     *
     * @param machine what the document describes
     */
    public static Choice<Variable> find(MachineDocument document, Machine machine, String spelled) {
        KeyPath path = document.path(spelled);
        Optional<Key> key = document.key(path);
        if (key.isEmpty() || path.isRoot() || !standsInFile(path, document, machine)) {
            return Choice.none("no such key in this file");
        }
        if (!isNumber(key.get())) {
            return Choice.none("holds " + key.get().kind().said() + ", a number is wanted");
        }
        return Choice.of(new Variable(path, dimension(document, path, key.get())));
    }

    private static boolean isNumber(Key key) {
        return key.kind() == Kind.QUANTITY || key.kind() == Kind.CLEARANCE;
    }

    private static Dimension dimension(MachineDocument document, KeyPath path, Key key) {
        return key.dimension().orElseGet(() -> {
            Optional<Quantity> present = document.quantity(path);
            boolean volume =
                    present.isPresent() && Dimension.VOLUME.holds(present.get().unit());
            return volume ? Dimension.VOLUME : Dimension.SHARE;
        });
    }

    /** Whether every element and every name on the way is there; other keys may be missing, they have defaults. */
    private static boolean standsInFile(KeyPath path, MachineDocument document, Machine machine) {
        KeyPath above = KeyPath.ROOT;
        for (KeyPath.Step step : path.steps()) {
            if (step.isIndex() && step.index() >= document.size(above)) {
                return false;
            }
            Optional<Key> nest = document.key(above);
            boolean named = nest.isPresent() && nest.get().kind() == Kind.MAP;
            if (named && !names(nest.get(), above, document, machine).contains(step.key())) {
                return false;
            }
            above = step.isIndex() ? above.item(step.index()) : above.key(step.key());
        }
        return true;
    }

    private static Set<String> names(Key map, KeyPath path, MachineDocument document, Machine machine) {
        Set<String> names = new LinkedHashSet<>(document.names(path));
        if (map.refersTo().filter(NameSpace.CHAMBER::equals).isPresent()) {
            machine.throwsInOrder().stream()
                    .flatMap(t -> t.chambers().stream())
                    .map(Chamber::name)
                    .forEach(names::add);
        }
        if (map.refersTo().filter(NameSpace.STAGE::equals).isPresent()) {
            machine.stages().stream().map(Stage::name).forEach(names::add);
        }
        return names;
    }

    /** Key paths that {@link #find} takes: every number of the file, and those missing beside them. */
    public static List<String> paths(MachineDocument document) {
        Set<String> paths = new LinkedHashSet<>();
        for (NumericKey number : document.numericKeys()) {
            paths.add(number.path().toString());
        }
        for (NumericKey number : document.numericKeys()) {
            KeyPath nest = number.path().parent();
            document.key(nest)
                    .filter(key -> key.kind() == Kind.OBJECT || key.kind() == Kind.VARIANT)
                    .ifPresent(key -> {
                        String word = document.valueText(nest.key("kind")).orElse("");
                        key.children(word).values().stream()
                                .filter(Variable::isNumber)
                                .forEach(child ->
                                        paths.add(nest.key(child.name()).toString()));
                    });
        }
        return List.copyOf(paths);
    }

    /** An SI value as tables have it: degrees for an angle. */
    public double inTables(double si) {
        return dimension == Dimension.ANGLE ? Math.toDegrees(si) : si;
    }

    @Override
    public String toString() {
        return path.toString();
    }
}
