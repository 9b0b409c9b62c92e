package throwbench.solver.finding;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
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
            new ReversalRatio(),
            new DischargeTemperature(),
            new MeanPistonSpeed(),
            new RodToCrankRatio(),
            BearingPressure.CROSSHEAD_PIN,
            BearingPressure.CRANK_PIN,
            BearingPressure.MAIN_BEARING,
            new GuidePressure(),
            new PistonRodStress(),
            new PistonRodFatigue(),
            new PistonRodBuckling(),
            new SpeedFluctuation(),
            new PeakToMeanTorque(),
            new SuctionHeadToSpare(),
            new DeliveryVariation(),
            new Capacity(),
            new StageFlowMismatch(),
            Power.INDICATED,
            Power.SHAFT,
            Shaking.FORCE_PRIMARY,
            Shaking.FORCE_SECONDARY,
            Shaking.COUPLE_PRIMARY,
            Shaking.COUPLE_SECONDARY);

    /** A finding that was not judged stands behind every judged one. */
    private static final Comparator<Finding> WORST_FIRST =
            Comparator.comparingDouble(f -> f.margin().orElse(Double.POSITIVE_INFINITY));

    public Judgement {
        findings = List.copyOf(findings);
        refusals = List.copyOf(refusals);
    }

    /** Judges a machine at these duty points, its own or others, on every core; the order is the same each time. */
    public static Judgement of(Machine machine, List<DutyPoint> duties) {
        List<Judgement> each =
                duties.parallelStream().map(duty -> at(machine, duty)).toList();
        List<Finding> findings = new ArrayList<>();
        Set<Refusal> refusals = new LinkedHashSet<>();
        for (Judgement one : each) {
            findings.addAll(one.findings());
            refusals.addAll(one.refusals());
        }
        findings.sort(WORST_FIRST);
        return new Judgement(findings, List.copyOf(refusals));
    }

    private static Judgement at(Machine machine, DutyPoint duty) {
        Settling settling = RunningMachine.settle(machine, duty);
        boolean written = machine.dutyPoints().contains(duty);
        List<Refusal> refusals = settling.refusals().stream()
                .map(r ->
                        written ? r : new Refusal(r.path(), r.sentence() + " (at \"" + duty.name() + "\")", r.failed()))
                .toList();
        return new Judgement(settling.running().map(Judgement::at).orElse(List.of()), refusals);
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
