package throwbench.solver.map;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import throwbench.solver.document.NumericKey;
import throwbench.solver.document.quantity.Dimension;

/**
 * How much a margin changes with each number of the machine file: for 1 % of its SI value (absolute for pressures and
 * temperatures), for 1° of an angle. Numbers that are zero are left out, and those without a bearing on the duty point.
 *
 * @param margin as the file stands
 * @param influences the greatest change first; those that cannot be had last
 */
public record Sensitivity(double margin, List<Influence> influences) {

    private static final double SHARE = 0.01;

    private static final double ANGLE = Math.toRadians(1);

    public Sensitivity {
        influences = List.copyOf(influences);
    }

    /**
     * What one number does.
     *
     * @param number as the file has it
     * @param raised change of the margin when the number grows by 1 % of its size, or 1°
     * @param lowered the same when it falls
     */
    public record Influence(NumericKey number, Outcome raised, Outcome lowered) {

        /** The greater of both changes by size; 0 where neither can be had. */
        public double size() {
            return Math.max(
                    Math.abs(raised.value().orElse(0)), Math.abs(lowered.value().orElse(0)));
        }

        /** Whether a change can be had at all. */
        public boolean isPossible() {
            return raised.isPossible() || lowered.isPossible();
        }
    }

    /**
     * Changes every number in turn; empty where the watch ended it.
     *
     * @param margin as the file stands, of the same finding
     */
    public static Optional<Sensitivity> of(
            Subject subject, FindingResult finding, double margin, int threads, Watch watch) {
        List<NumericKey> numbers = subject.document().numericKeys().stream()
                .filter(number -> number.quantity().value() != 0)
                .filter(number -> subject.bears(new Variable(number.path(), number.dimension())))
                .toList();
        Influence[] found = new Influence[numbers.size()];
        boolean whole = Workers.each(found.length, threads, watch, () -> {
            Probe probe = finding.probe(subject.shownThrow());
            return i -> found[i] = influence(subject, probe, numbers.get(i), margin);
        });
        List<Influence> ranked = new ArrayList<>(whole ? Arrays.asList(found) : List.of());
        ranked.sort(Comparator.comparing(Influence::isPossible)
                .thenComparing(Influence::size)
                .reversed());
        return whole ? Optional.of(new Sensitivity(margin, ranked)) : Optional.empty();
    }

    private static Influence influence(Subject subject, Probe probe, NumericKey number, double margin) {
        double value = number.quantity().value();
        double step = number.dimension() == Dimension.ANGLE ? ANGLE : SHARE * Math.abs(value);
        Variable variable = new Variable(number.path(), number.dimension());
        return new Influence(
                number,
                change(
                        subject.with(List.of(new Setting(variable, value + step)))
                                .ask(probe),
                        margin),
                change(
                        subject.with(List.of(new Setting(variable, value - step)))
                                .ask(probe),
                        margin));
    }

    private static Outcome change(Outcome changed, double margin) {
        return changed.isPossible() ? Outcome.of(changed.value().getAsDouble() - margin) : changed;
    }
}
