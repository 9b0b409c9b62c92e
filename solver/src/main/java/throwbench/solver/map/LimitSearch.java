package throwbench.solver.map;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;

/**
 * A margin over a range of one variable, with every value at which the limit is just met. A pair of sign changes closer
 * than a two-hundredth of the range is found where the margin comes near to zero between them.
 *
 * @param from the lesser end, SI
 * @param to the greater end, SI
 * @param scan the margin at equally spaced values, both ends counted
 * @param crossings by rising value
 */
public record LimitSearch(double from, double to, List<Outcome> scan, List<Crossing> crossings) {

    /** Two pairs of crossings in one interval stay hidden; of the margins known, none has more than two in a tenth. */
    private static final int INTERVALS = 200;

    public LimitSearch {
        scan = List.copyOf(scan);
        crossings = List.copyOf(crossings);
    }

    /** A margin as a function of one variable; for one thread. */
    @FunctionalInterface
    public interface Margin {

        /** The margin at a value, SI. */
        Outcome at(double value);
    }

    /** Searches a range of a machine's input; empty where the watch ended it. */
    public static Optional<LimitSearch> of(
            Subject subject,
            Variable variable,
            double from,
            double to,
            FindingResult margin,
            int threads,
            Watch watch) {
        return of(
                () -> {
                    Probe probe = margin.probe(subject.shownThrow());
                    return value ->
                            subject.with(List.of(new Setting(variable, value))).ask(probe);
                },
                from,
                to,
                threads,
                watch);
    }

    /**
     * Searches a range of any margin.
     *
     * @param margin makes the function for one thread
     * @throws IllegalArgumentException when the range is none
     */
    public static Optional<LimitSearch> of(Supplier<Margin> margin, double from, double to, int threads, Watch watch) {
        if (!(Double.isFinite(to - from) && from < to)) {
            throw new IllegalArgumentException("no range from " + from + " to " + to);
        }
        Outcome[] scan = new Outcome[INTERVALS + 1];
        boolean whole = Workers.each(scan.length, threads, watch, () -> {
            Margin own = margin.get();
            return i -> scan[i] = own.at(value(from, to, i));
        });
        if (!whole) {
            return Optional.empty();
        }
        double[] values = new double[scan.length];
        Arrays.setAll(values, i -> value(from, to, i));
        CrossingFinder finder = new CrossingFinder(margin.get(), to - from);
        return Optional.of(new LimitSearch(from, to, List.of(scan), finder.all(values, scan)));
    }

    private static double value(double from, double to, int place) {
        return place == INTERVALS ? to : from + (to - from) * place / INTERVALS;
    }

    /** SI value of a place of the scan. */
    public double at(int place) {
        return value(from, to, place);
    }
}
