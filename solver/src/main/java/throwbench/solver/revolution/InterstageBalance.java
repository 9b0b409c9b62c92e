package throwbench.solver.revolution;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Stage;
import throwbench.solver.machine.StageConditions;

/**
 * Stages in series: finds the interstage pressures at which every stage passes what the stages that follow it take in. A stage
 * passes less the higher its discharge pressure, its followers more: the pressure between them is bracketed by the suction
 * pressure of the one and the discharge pressure of the others, which for a longer chain are found within.
 */
public final class InterstageBalance {

    /** Of the logarithm of a pressure: well within what a valve-flow cycle repeats to. */
    private static final double PRESSURE_ACCURACY = 1e-13;

    /** Two masses that agree within this share are in balance; a valve-flow cycle repeats to 1e-8. */
    private static final double BALANCED = 1e-6;

    private static final int MOST_EVALUATIONS = 200;

    private final Machine machine;
    private final DutyPoint duty;
    private final StageMasses masses;
    private final Map<String, StageConditions> settled;
    private final List<Refusal> refusals = new ArrayList<>();

    private InterstageBalance(Machine machine, DutyPoint duty) {
        this.machine = machine;
        this.duty = duty;
        this.masses = new StageMasses(machine, duty);
        this.settled = new LinkedHashMap<>(duty.stages());
    }

    /** The duty point with every interstage pressure found; where there is none, a refusal that names the stages. */
    static DutyPoint settle(Machine machine, DutyPoint duty, List<Refusal> refusals) {
        InterstageBalance balance = new InterstageBalance(machine, duty);
        for (Stage stage : machine.stages()) {
            StageConditions lines = balance.masses.conditions(stage.name());
            boolean first = lines.suctionPressure().isPresent();
            if (first && lines.dischargePressure().isEmpty() && duty.stages().containsKey(stage.name())) {
                balance.settle(stage.name(), lines.suctionPressure().getAsDouble());
            }
        }
        refusals.addAll(balance.refusals);
        if (balance.settled.equals(duty.stages())) {
            return duty;
        }
        return new DutyPoint(duty.name(), duty.speed(), balance.settled, duty.chambers());
    }

    /** How far each stage that others follow is from passing what they take in. */
    public static List<StageMismatch> mismatches(RunningMachine running) {
        Map<String, OptionalDouble> passed = new LinkedHashMap<>();
        for (int i = 0; i < running.throwsInOrder().size(); i++) {
            TurnMeans.capacityByStage(running, i)
                    .forEach((stage, mass) -> passed.merge(stage, mass, StageMismatch::sum));
        }
        List<StageMismatch> mismatches = new ArrayList<>();
        for (Stage stage : running.machine().stages()) {
            List<String> followers = followers(running.machine(), stage.name());
            if (!followers.isEmpty() && passed.containsKey(stage.name())) {
                OptionalDouble taken = followers.stream()
                        .map(f -> passed.getOrDefault(f, OptionalDouble.of(0)))
                        .reduce(OptionalDouble.of(0), StageMismatch::sum);
                OptionalDouble own = passed.getOrDefault(stage.name(), OptionalDouble.empty());
                mismatches.add(new StageMismatch(stage.name(), followers, own, taken));
            }
        }
        return List.copyOf(mismatches);
    }

    private static List<String> followers(Machine machine, String stage) {
        return machine.stages().stream()
                .filter(s -> s.follows().filter(stage::equals).isPresent())
                .map(Stage::name)
                .toList();
    }

    /** Settles a stage of known suction pressure and all balanced ones that follow it. */
    private void settle(String stage, double suction) {
        StageConditions lines = masses.conditions(stage);
        if (lines.dischargePressure().isPresent()) {
            put(stage, lines, suction, lines.dischargePressure().getAsDouble());
            return;
        }
        List<String> followers = followers(machine, stage);
        double between = between(stage, followers, suction);
        double passed = masses.at(stage, suction, between);
        String trouble = masses.trouble();
        double taken = 0;
        for (String follower : followers) {
            taken += through(follower, between);
            trouble = trouble.isEmpty() ? masses.trouble() : trouble;
        }
        put(stage, lines, suction, between);
        boolean balanced = passed > 0 && Math.abs(passed - taken) <= BALANCED * passed;
        if (!trouble.isEmpty() || !balanced) {
            String sentence = trouble.isEmpty() ? unbalanced(stage, followers, passed, taken) : trouble;
            refusals.add(new Refusal(path(followers.get(0)), sentence));
            return;
        }
        for (String follower : followers) {
            settle(follower, between);
        }
    }

    private void put(String stage, StageConditions lines, double suction, double discharge) {
        settled.put(
                stage,
                new StageConditions(
                        OptionalDouble.of(suction), lines.suctionTemperature(), OptionalDouble.of(discharge)));
    }

    /** The pressure behind a stage at which its followers take in what it passes, or the end that comes nearest to it. */
    private double between(String stage, List<String> followers, double suction) {
        double highest = ceiling(stage);
        double atLeast = excess(stage, followers, suction, suction);
        if (atLeast <= 0 || highest <= suction) {
            return suction;
        }
        if (excess(stage, followers, suction, highest) >= 0) {
            return highest;
        }
        double root = new BrentSolver(1e-15, PRESSURE_ACCURACY, 0)
                .solve(
                        MOST_EVALUATIONS,
                        p -> excess(stage, followers, suction, Math.exp(p)),
                        Math.log(suction),
                        Math.log(highest));
        return Math.exp(root);
    }

    private double excess(String stage, List<String> followers, double suction, double between) {
        double excess = masses.at(stage, suction, between);
        for (String follower : followers) {
            excess -= through(follower, between);
        }
        return excess;
    }

    /** What passes a stage at a suction pressure, with those that follow it in balance. */
    private double through(String stage, double suction) {
        OptionalDouble given = masses.conditions(stage).dischargePressure();
        double discharge = given.isPresent() ? given.getAsDouble() : between(stage, followers(machine, stage), suction);
        return masses.at(stage, suction, discharge);
    }

    /** The pressure that no interstage pressure behind a stage may pass: the least that its last followers discharge to. */
    private double ceiling(String stage) {
        OptionalDouble given = masses.conditions(stage).dischargePressure();
        return given.isPresent()
                ? given.getAsDouble()
                : followers(machine, stage).stream()
                        .mapToDouble(this::ceiling)
                        .min()
                        .orElse(0);
    }

    private String unbalanced(String stage, List<String> followers, double passed, double taken) {
        String behind = "stage " + String.join(" and stage ", followers);
        String why = passed == 0 && taken == 0
                ? "at none do the valves of both open"
                : passed > taken
                        ? "stage " + stage + " passes more than " + behind + " can take in at any of them"
                        : behind + " takes in more than stage " + stage + " can pass at any of them";
        return "no pressure between stage " + stage + " and " + behind + " balances them: " + why;
    }

    private String path(String follower) {
        int index = machine.dutyPoints().indexOf(duty);
        return index < 0
                ? "stages." + follower + ".follows"
                : "dutyPoints[" + index + "].stages." + follower + ".suctionPressure";
    }
}
