package throwbench.solver.document;

import java.util.ArrayList;
import java.util.List;

/**
 * A place in a machine file: {@code throws[0].chambers[1].bore}. Names of maps stand in it as they are, dots and spaces
 * included; {@link MachineDocument#path} tells them apart.
 */
public final class KeyPath {

    /** The file as a whole. */
    public static final KeyPath ROOT = new KeyPath(List.of());

    private final List<Step> steps;

    private KeyPath(List<Step> steps) {
        this.steps = steps;
    }

    /**
     * One step down.
     *
     * @param key the key; empty for a step into a list
     * @param index from 0; -1 for a step to a key
     */
    public record Step(String key, int index) {

        /** Whether it goes into a list. */
        public boolean isIndex() {
            return index >= 0;
        }
    }

    /** The place of a key inside this one. */
    public KeyPath key(String key) {
        return plus(new Step(key, -1));
    }

    /** The place of a list's element, from 0. */
    public KeyPath item(int index) {
        if (index < 0) {
            throw new IllegalArgumentException("index " + index);
        }
        return plus(new Step("", index));
    }

    private KeyPath plus(Step step) {
        List<Step> longer = new ArrayList<>(steps);
        longer.add(step);
        return new KeyPath(List.copyOf(longer));
    }

    public List<Step> steps() {
        return steps;
    }

    public boolean isRoot() {
        return steps.isEmpty();
    }

    /** The last step. */
    public Step last() {
        return steps.get(steps.size() - 1);
    }

    /** The place in which this one lies. */
    public KeyPath parent() {
        return new KeyPath(steps.subList(0, steps.size() - 1));
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof KeyPath that && steps.equals(that.steps);
    }

    @Override
    public int hashCode() {
        return steps.hashCode();
    }

    /** As messages and commands spell it. */
    @Override
    public String toString() {
        StringBuilder text = new StringBuilder();
        for (Step step : steps) {
            if (step.isIndex()) {
                text.append('[').append(step.index()).append(']');
            } else {
                text.append(text.length() == 0 ? "" : ".").append(step.key());
            }
        }
        return text.toString();
    }
}
