package throwbench.solver.map;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import throwbench.solver.document.KeyPath;
import throwbench.solver.document.NumericKey;
import throwbench.solver.document.quantity.PressureMark;
import throwbench.solver.finding.Finding;
import throwbench.solver.revolution.RunningMachine;

/**
 * What tolerances do to the findings of one duty point: every quantity that carries a tolerance is drawn uniformly within
 * it, each by itself, and the machine judged again for every draw.
 *
 * @param samples number of draws
 * @param spreads one for each judged finding of the nominal machine, least often met and least margin first
 * @param impossible number of draws that make no machine that runs; they meet nothing
 * @param reason why the first of those does not; empty where there is none
 * @param meetingAll number of draws that meet every finding
 */
public record ToleranceStudy(int samples, List<Spread> spreads, int impossible, String reason, int meetingAll) {

    private static final KeyPath AMBIENT = KeyPath.ROOT.key("site").key("ambientPressure");

    public ToleranceStudy {
        spreads = List.copyOf(spreads);
    }

    /**
     * One finding over all samples.
     *
     * @param nominal the finding of the machine without tolerances; it is judged
     * @param met number of samples that meet it
     * @param low 5th percentile of the margin over the samples that have one; empty where none has
     * @param high 95th percentile likewise
     */
    public record Spread(Finding nominal, int met, OptionalDouble low, OptionalDouble high) {}

    /** The numbers that carry a tolerance and can have a bearing on the duty point, in the order of the file. */
    public static List<NumericKey> toleranced(Subject subject) {
        return subject.document().numericKeys().stream()
                .filter(number -> number.quantity().tolerance() > 0)
                .filter(number -> subject.bears(new Variable(number.path(), number.dimension())))
                .toList();
    }

    /**
     * Draws and judges; the same seed gives the same study on any number of threads.
     *
     * @param nominal the machine running as the file stands
     * @param samples at least 1
     * @return empty where the watch ended it
     */
    public static Optional<ToleranceStudy> of(
            Subject subject, RunningMachine nominal, int samples, long seed, int threads, Watch watch) {
        if (samples < 1) {
            throw new IllegalArgumentException("number of samples " + samples);
        }
        List<NumericKey> numbers = toleranced(subject);
        MarginTable table = new MarginTable(nominal, samples);
        // a seed of its own for every sample: draws do not depend on which thread makes them, nor overlap
        long[] seeds = new SplittableRandom(seed).longs(samples).toArray();
        boolean whole = Workers.each(
                samples,
                threads,
                watch,
                () -> i -> table.fill(i, subject.with(draw(numbers, new SplittableRandom(seeds[i])))));
        return whole ? Optional.of(table.study()) : Optional.empty();
    }

    /** One draw. A gauge pressure counts from the ambient pressure of its own draw. */
    private static List<Setting> draw(List<NumericKey> numbers, SplittableRandom random) {
        double[] values = new double[numbers.size()];
        double ambientShift = 0;
        for (int i = 0; i < values.length; i++) {
            NumericKey number = numbers.get(i);
            double shift = (2 * random.nextDouble() - 1) * number.quantity().tolerance();
            values[i] = number.quantity().value() + shift;
            ambientShift = number.path().equals(AMBIENT) ? shift : ambientShift;
        }
        List<Setting> settings = new ArrayList<>();
        for (int i = 0; i < values.length; i++) {
            NumericKey number = numbers.get(i);
            boolean gauge = number.quantity().mark() == PressureMark.GAUGE;
            settings.add(new Setting(
                    new Variable(number.path(), number.dimension()), values[i] + (gauge ? ambientShift : 0)));
        }
        return settings;
    }

    /** Share of the samples that meet a finding. */
    public double shareMet(Spread spread) {
        return (double) spread.met() / samples;
    }
}
