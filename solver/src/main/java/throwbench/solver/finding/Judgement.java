package throwbench.solver.finding;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Machine;
import throwbench.solver.revolution.Refusal;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Settling;

/**
 * All findings of a machine, the least margin first, those not judged last.
 *
 * @param refusals reasons why a duty point could not be solved; its findings are missing
 */
public record Judgement(List<Finding> findings, List<Refusal> refusals) {

    /** Every criterion, in the order of the machine file's limits. */
    public static final List<Criterion> CRITERIA = List.of(
            PeakLoad.GAS_TENSION,
            PeakLoad.GAS_COMPRESSION,
            PeakLoad.ROD_TENSION,
            PeakLoad.ROD_COMPRESSION,
            new ReversalDuration(),
            new ReversalRatio());

    /** A finding that was not judged stands behind every judged one. */
    private static final Comparator<Finding> WORST_FIRST =
            Comparator.comparingDouble(f -> f.margin().orElse(Double.POSITIVE_INFINITY));

    public Judgement {
        findings = List.copyOf(findings);
        refusals = List.copyOf(refusals);
    }

    /** Judges a machine at these of its duty points. */
    public static Judgement of(Machine machine, List<DutyPoint> duties) {
        List<Finding> findings = new ArrayList<>();
        List<Refusal> refusals = new ArrayList<>();
        for (DutyPoint duty : duties) {
            Settling settling = RunningMachine.settle(machine, duty);
            settling.running().ifPresent(running -> findings.addAll(at(running)));
            settling.refusals().stream().filter(r -> !refusals.contains(r)).forEach(refusals::add);
        }
        findings.sort(WORST_FIRST);
        return new Judgement(findings, refusals);
    }

    private static List<Finding> at(RunningMachine running) {
        JudgedDuty duty = new JudgedDuty(running);
        List<Finding> findings = new ArrayList<>();
        for (Criterion criterion : CRITERIA) {
            findings.addAll(criterion.judge(duty));
        }
        return findings;
    }

    /** Whether every judged finding is met. */
    public boolean allMet() {
        return findings.stream().noneMatch(f -> f.verdict() == Verdict.NOT_MET);
    }
}
