package throwbench.solver.map;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.finding.Criterion;
import throwbench.solver.finding.Finding;
import throwbench.solver.finding.JudgedDuty;
import throwbench.solver.finding.ReversalDuration;
import throwbench.solver.revolution.ReversalStudy;
import throwbench.solver.revolution.RunningMachine;

/**
 * Value or margin of a finding. Of several findings of one criterion (its chambers', its stages') the worst counts: the
 * least margin, or, where nothing is judged, the value nearest to what a limit would forbid.
 *
 * @param margin the margin, unit 1 (with a limit of 0 the difference in the criterion's unit), and not the value
 */
public record FindingResult(Criterion criterion, boolean margin) implements Result {

    @Override
    public String text() {
        return criterion.id() + (margin ? ".margin" : "");
    }

    @Override
    public String unit() {
        return margin ? "1" : criterion.unit();
    }

    @Override
    public Probe probe(int throwIndex) {
        if (criterion instanceof ReversalDuration) {
            ReversalStudy study = new ReversalStudy(throwIndex);
            return running -> taken(reversal(running, throwIndex, study.duration(running)));
        }
        return running -> at(running, throwIndex);
    }

    /** The quick way to the same finding: geometry is kept from machine to machine. */
    private Finding reversal(RunningMachine running, int throwIndex, double duration) {
        JudgedDuty duty = new JudgedDuty(running);
        OptionalDouble limit = duty.limit(criterion, throwIndex);
        return Finding.judged(
                criterion, duty.place(throwIndex), Math.toDegrees(duration), limit, OptionalDouble.empty(), "");
    }

    /** The finding that counts; empty where the machine has nothing that it could be found of. */
    public Optional<Finding> finding(RunningMachine running, int throwIndex) {
        return worst(criterion.judge(new JudgedDuty(running)), running, throwIndex);
    }

    private Outcome at(RunningMachine running, int throwIndex) {
        Optional<Finding> worst = finding(running, throwIndex);
        return worst.isPresent()
                ? taken(worst.get())
                : Outcome.impossible("nothing here that " + criterion.id() + " could be found of");
    }

    private Outcome taken(Finding finding) {
        if (margin && finding.value().isPresent() && finding.limit().isEmpty()) {
            return Outcome.impossible("no limit given");
        }
        OptionalDouble value = margin ? finding.margin() : finding.value();
        return value.isPresent() ? Outcome.of(value.getAsDouble()) : Outcome.impossible(finding.note());
    }

    private Optional<Finding> worst(List<Finding> findings, RunningMachine running, int throwIndex) {
        String name = running.throwsInOrder().get(throwIndex).described().name();
        return findings.stream()
                .filter(f -> f.where().throwName().map(name::equals).orElse(true))
                .reduce((a, b) -> badness(b) > badness(a) ? b : a);
    }

    private double badness(Finding finding) {
        if (finding.margin().isPresent()) {
            return -finding.margin().getAsDouble();
        }
        double sense = criterion.limitIsGreatest() ? 1 : -1;
        return finding.value().isPresent() ? sense * finding.value().getAsDouble() : Double.NEGATIVE_INFINITY;
    }
}
