package throwbench.solver.machine;

import java.util.EnumMap;
import java.util.Map;
import java.util.OptionalDouble;

/** Limits set at one level (machine, stage, throw or chamber), SI; a narrower level goes before a wider one. */
public final class Limits {

    public static final Limits NONE = new Limits(Map.of());

    private final EnumMap<LimitKey, Double> values = new EnumMap<>(LimitKey.class);

    public Limits(Map<LimitKey, Double> values) {
        this.values.putAll(values);
    }

    /** The limit in SI, where this level sets it. */
    public OptionalDouble get(LimitKey key) {
        Double value = values.get(key);
        return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Limits that && values.equals(that.values);
    }

    @Override
    public int hashCode() {
        return values.hashCode();
    }

    @Override
    public String toString() {
        return values.toString();
    }
}
