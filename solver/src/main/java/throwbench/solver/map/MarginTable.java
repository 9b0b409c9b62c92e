package throwbench.solver.map;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.apache.commons.math3.stat.descriptive.rank.Percentile;
import throwbench.solver.finding.Criterion;
import throwbench.solver.finding.Finding;
import throwbench.solver.finding.JudgedDuty;
import throwbench.solver.finding.Judgement;
import throwbench.solver.revolution.RunningMachine;

/** The margins of every sample of a tolerance study. Threads may fill different samples at once. */
final class MarginTable {

    private static final double LOW = 5;
    private static final double HIGH = 95;

    /** What the nominal machine is judged by. */
    private final List<Finding> judged = new ArrayList<>();

    private final List<Criterion> criteria = new ArrayList<>();
    /** By finding and sample; what {@link #known} does not know holds nothing. */
    private final double[][] margins;

    private final boolean[][] known;
    /** By sample: why it does not run; empty where it does. */
    private final String[] reasons;

    MarginTable(RunningMachine nominal, int samples) {
        JudgedDuty duty = new JudgedDuty(nominal);
        for (Criterion criterion : Judgement.CRITERIA) {
            List<Finding> own = criterion.judge(duty).stream()
                    .filter(finding -> finding.margin().isPresent())
                    .toList();
            judged.addAll(own);
            if (!own.isEmpty()) {
                criteria.add(criterion);
            }
        }
        margins = new double[judged.size()][samples];
        known = new boolean[judged.size()][samples];
        reasons = new String[samples];
    }

    void fill(int sample, Subject.Attempt attempt) {
        reasons[sample] = attempt.reason();
        attempt.running().ifPresent(running -> {
            JudgedDuty duty = new JudgedDuty(running);
            criteria.forEach(criterion -> criterion.judge(duty).forEach(finding -> fill(sample, finding)));
        });
    }

    private void fill(int sample, Finding finding) {
        for (int i = 0; i < judged.size(); i++) {
            Finding nominal = judged.get(i);
            boolean same = nominal.criterion() == finding.criterion()
                    && nominal.where().equals(finding.where());
            if (same && finding.margin().isPresent()) {
                margins[i][sample] = finding.margin().getAsDouble();
                known[i][sample] = true;
            }
        }
    }

    ToleranceStudy study() {
        List<ToleranceStudy.Spread> spreads = new ArrayList<>();
        for (int i = 0; i < judged.size(); i++) {
            spreads.add(spread(i));
        }
        spreads.sort(Comparator.comparingInt(ToleranceStudy.Spread::met)
                .thenComparingDouble(spread -> spread.low().orElse(Double.NEGATIVE_INFINITY)));
        String[] failed = IntStream.range(0, reasons.length)
                .mapToObj(sample -> reasons[sample])
                .filter(reason -> !reason.isEmpty())
                .toArray(String[]::new);
        int all =
                (int) IntStream.range(0, reasons.length).filter(this::meetsAll).count();
        return new ToleranceStudy(reasons.length, spreads, failed.length, failed.length == 0 ? "" : failed[0], all);
    }

    private ToleranceStudy.Spread spread(int i) {
        int met = 0;
        double[] present = new double[reasons.length];
        int count = 0;
        for (int sample = 0; sample < reasons.length; sample++) {
            if (known[i][sample]) {
                present[count++] = margins[i][sample];
                met += margins[i][sample] >= 0 ? 1 : 0;
            }
        }
        return new ToleranceStudy.Spread(
                judged.get(i), met, percentile(present, count, LOW), percentile(present, count, HIGH));
    }

    private static OptionalDouble percentile(double[] values, int count, double percent) {
        return count == 0
                ? OptionalDouble.empty()
                : OptionalDouble.of(new Percentile().evaluate(values, 0, count, percent));
    }

    private boolean meetsAll(int sample) {
        boolean all = reasons[sample].isEmpty();
        for (int i = 0; i < judged.size(); i++) {
            all &= known[i][sample] && margins[i][sample] >= 0;
        }
        return all;
    }
}
