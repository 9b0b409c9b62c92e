package throwbench.solver.fluid;

import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/**
 * The gases a mixture may name. A name is matched without regard to case; formulas and a few other spellings are
 * understood too.
 */
public final class GasTable {

    private static final List<Gas> GASES = GasRows.all();
    private static final Map<String, Gas> BY_NAME = byName();

    private GasTable() {}

    private static Map<String, Gas> byName() {
        Map<String, Gas> found = new HashMap<>();
        for (Gas gas : GASES) {
            put(found, gas.name(), gas);
            gas.otherNames().forEach(name -> put(found, name, gas));
        }
        return Map.copyOf(found);
    }

    private static void put(Map<String, Gas> found, String name, Gas gas) {
        if (found.put(key(name), gas) != null) {
            throw new IllegalStateException("two gases are called " + name);
        }
    }

    private static String key(String name) {
        return name.strip().toLowerCase(Locale.ROOT);
    }

    /** The gas of that name, if the table has it. */
    public static Optional<Gas> find(String name) {
        return Optional.ofNullable(BY_NAME.get(key(name)));
    }

    /** The names as a machine file should write them: hydrocarbons first, then the rest. */
    public static List<String> names() {
        return GASES.stream().map(Gas::name).toList();
    }

    /** All rows, in the order of {@link #names}. */
    static List<Gas> gases() {
        return GASES;
    }
}
