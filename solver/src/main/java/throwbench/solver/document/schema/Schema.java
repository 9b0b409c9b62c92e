package throwbench.solver.document.schema;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The machine file's keys as one tree. */
public final class Schema {

    private static final Key ROOT = MachineKeys.root();

    private Schema() {}

    /**
     * One key of the page.
     *
     * @param pattern its path with [] for any index and * for any name: {@code throws[].chambers[].bore}
     * @param variant the word of its object's kind where only that one has it
     */
    public record Entry(String pattern, Optional<String> variant, Key key) {}

    /** The file as a whole. */
    public static Key root() {
        return ROOT;
    }

    /** Every key once, nests before what they hold, in the order of the page. */
    public static List<Entry> entries() {
        List<Entry> entries = new ArrayList<>();
        collectChildren(ROOT, "", entries);
        return entries;
    }

    private static void collectChildren(Key nest, String pattern, List<Entry> entries) {
        switch (nest.kind()) {
            case LIST -> collectChildren(nest.item(), pattern + "[]", entries);
            case MAP -> collectMembers(nest, pattern, entries);
            case OBJECT, VARIANT -> collectFields(nest, pattern, entries);
            default -> {
                // a value, or a pair of values, holds no keys
            }
        }
    }

    private static void collectMembers(Key map, String pattern, List<Entry> entries) {
        if (map.item().kind().isNest()) {
            collectChildren(map.item(), pattern + ".*", entries);
        } else {
            entries.add(new Entry(pattern + ".*", Optional.empty(), map.item()));
        }
    }

    private static void collectFields(Key object, String pattern, List<Entry> entries) {
        boolean kindSeen = false;
        for (String word : object.variants()) {
            for (Key child : object.children(word).values()) {
                boolean isKind = object.kind() == Kind.VARIANT && child.name().equals("kind");
                if (isKind && kindSeen) {
                    continue;
                }
                kindSeen |= isKind;
                String path = pattern.isEmpty() ? child.name() : pattern + '.' + child.name();
                boolean one = isKind || word.isEmpty();
                entries.add(new Entry(path, one ? Optional.empty() : Optional.of(word), child));
                collectChildren(child, path, entries);
            }
        }
    }
}
