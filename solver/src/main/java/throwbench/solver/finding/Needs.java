package throwbench.solver.finding;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** The values of an optional part that a criterion cannot do without, and which of them the machine file lacks. */
final class Needs {

    private final String part;
    private final List<String> missing = new ArrayList<>();

    /** @param part its key in the machine file */
    Needs(String part) {
        this.part = part;
    }

    Needs value(String key, OptionalDouble value) {
        if (value.isEmpty()) {
            missing.add(part + "." + key);
        }
        return this;
    }

    /** The missing keys in a sentence; empty where nothing is missing. */
    Optional<String> missing() {
        if (missing.isEmpty()) {
            return Optional.empty();
        }
        int last = missing.size() - 1;
        return Optional.of(
                last == 0
                        ? missing.get(0) + " is missing"
                        : String.join(", ", missing.subList(0, last)) + " and " + missing.get(last) + " are missing");
    }
}
