package throwbench.solver.revolution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.IdealValves;
import throwbench.solver.chamber.Side;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.ShaftPlace;
import throwbench.solver.machine.Stage;
import throwbench.solver.machine.StageConditions;
import throwbench.solver.machine.Throw;
import throwbench.solver.trial.Machines;

/** Interstage pressures, against closed forms. */
class InterstageBalanceTest {

    private static final OptionalDouble BALANCED = OptionalDouble.empty();
    private static final double STROKE = Machines.boosterThrow(0).linkage().stroke();

    private final List<Stage> stages = new ArrayList<>();
    private final List<Throw> throwsInOrder = new ArrayList<>();
    private final Map<String, StageConditions> lines = new LinkedHashMap<>();

    /** A throw with one head end of a swept volume (m³) that is a stage by itself; temperature K, pressures Pa. */
    private InterstageBalanceTest with(
            String stage,
            Optional<String> follows,
            double swept,
            double clearance,
            double temperature,
            OptionalDouble suction,
            OptionalDouble discharge) {
        double bore = Math.sqrt(swept / STROKE * 4 / Math.PI);
        IdealValves valves = new IdealValves(0, 0, OptionalDouble.of(1.25), OptionalDouble.of(1.25));
        Chamber chamber = new Chamber(
                stage + " head",
                Side.HEAD,
                Optional.of(stage),
                bore,
                0,
                new Clearance(clearance, true),
                valves,
                0,
                Limits.NONE);
        Throw t = Machines.boosterThrow(0);
        throwsInOrder.add(
                Machines.changed(t, stage, new ShaftPlace(0, 0, 0), t.linkage(), t.friction(), List.of(chamber)));
        stages.add(new Stage(stage, "gas", follows, Optional.empty(), Limits.NONE));
        lines.put(stage, new StageConditions(suction, OptionalDouble.of(temperature), discharge));
        return this;
    }

    private Settling settle() {
        DutyPoint duty = new DutyPoint("only", 60, lines, Map.of());
        Machine m = Machines.booster(0);
        Machine machine = new Machine(
                "series",
                "",
                m.site(),
                m.drive(),
                m.fluids(),
                stages,
                throwsInOrder,
                List.of(duty),
                Limits.NONE,
                List.of(),
                m.ranges(),
                List.of());
        return RunningMachine.settle(machine, duty);
    }

    private static double suction(RunningMachine running, String stage) {
        return conditions(running, stage).suctionPressure().getAsDouble();
    }

    private static StageConditions conditions(RunningMachine running, String stage) {
        return Optional.ofNullable(running.dutyPoint().stages().get(stage)).orElseThrow();
    }

    private static OptionalDouble pa(double pressure) {
        return OptionalDouble.of(pressure);
    }

    /** Closed form: without clearance a stage takes in p V / (R T), whatever its discharge pressure. */
    @Test
    void stagesWithoutClearancePassWhatTheirVolumesHold() {
        RunningMachine running = with("low", Optional.empty(), 6e-3, 1e-12, 300, pa(2e5), BALANCED)
                .with("high", Optional.of("low"), 2e-3, 1e-12, 315, BALANCED, pa(12e5))
                .settle()
                .get();
        double between = 2e5 * (6e-3 / 300) / (2e-3 / 315);
        assertEquals(between, suction(running, "high"), 1e-9 * between);
        assertEquals(between, conditions(running, "low").dischargePressure().getAsDouble(), 1e-9 * between);
        StageMismatch mismatch = InterstageBalance.mismatches(running).get(0);
        assertEquals(0, mismatch.relative().orElseThrow(), 1e-10);
        assertEquals(List.of("high"), mismatch.followers());
    }

    /** Closed form: volumes in the ratio of the pressures share them evenly, whatever the common clearance. */
    @Test
    void volumesInTheRatioOfThePressuresShareThemEvenly() {
        double ratio = 2.5;
        RunningMachine running = with("a", Optional.empty(), 6e-3, 0.12, 300, pa(1e5), BALANCED)
                .with("b", Optional.of("a"), 6e-3 / ratio, 0.12, 300, BALANCED, BALANCED)
                .with("c", Optional.of("b"), 6e-3 / ratio / ratio, 0.12, 300, BALANCED, BALANCED)
                .with(
                        "d",
                        Optional.of("c"),
                        6e-3 / ratio / ratio / ratio,
                        0.12,
                        300,
                        BALANCED,
                        pa(1e5 * Math.pow(ratio, 4)))
                .settle()
                .get();
        assertEquals(1e5 * ratio, suction(running, "b"), 1e-9 * 1e5 * ratio);
        assertEquals(1e5 * ratio * ratio, suction(running, "c"), 1e-9 * 1e5 * ratio * ratio);
        assertEquals(1e5 * Math.pow(ratio, 3), suction(running, "d"), 1e-9 * 1e5 * Math.pow(ratio, 3));
    }

    /** Identity: whatever the chain, every stage passes the same; the whole machine runs on the found pressures. */
    @Test
    void everyStageOfAnUnevenChainPassesTheSame() {
        RunningMachine running = with("a", Optional.empty(), 6e-3, 0.1, 295, pa(1.2e5), BALANCED)
                .with("b", Optional.of("a"), 2.4e-3, 0.17, 310, BALANCED, BALANCED)
                .with("c", Optional.of("b"), 0.7e-3, 0.14, 318, BALANCED, pa(24e5))
                .settle()
                .get();
        Map<String, OptionalDouble> passed =
                Summary.of(running, 0, Optional.empty()).machineFlow().capacity();
        double first = passed.getOrDefault("a", BALANCED).orElseThrow();
        assertEquals(first, passed.getOrDefault("b", BALANCED).orElseThrow(), 1e-9 * first);
        assertEquals(first, passed.getOrDefault("c", BALANCED).orElseThrow(), 1e-9 * first);
        assertTrue(suction(running, "b") > 1.2e5 && suction(running, "c") > suction(running, "b"));
    }

    /** Two equal followers are one of twice the volume. */
    @Test
    void followersSideBySideShareTheMass() {
        RunningMachine split = with("a", Optional.empty(), 6e-3, 0.1, 295, pa(1.2e5), BALANCED)
                .with("b", Optional.of("a"), 1.2e-3, 0.17, 310, BALANCED, pa(9e5))
                .with("c", Optional.of("a"), 1.2e-3, 0.17, 310, BALANCED, pa(9e5))
                .settle()
                .get();
        RunningMachine whole = new InterstageBalanceTest()
                .with("a", Optional.empty(), 6e-3, 0.1, 295, pa(1.2e5), BALANCED)
                .with("b", Optional.of("a"), 2.4e-3, 0.17, 310, BALANCED, pa(9e5))
                .settle()
                .get();
        assertEquals(suction(whole, "b"), suction(split, "b"), 1e-9 * suction(whole, "b"));
        assertEquals(suction(split, "b"), suction(split, "c"));
    }

    /** Closed form: pressures as given leave the difference of p V / T. */
    @Test
    void givenPressuresLeaveAMismatch() {
        RunningMachine running = with("low", Optional.empty(), 6e-3, 1e-12, 300, pa(2e5), pa(5e5))
                .with("high", Optional.of("low"), 2e-3, 1e-12, 315, pa(5e5), pa(12e5))
                .settle()
                .get();
        double expected = 1 - 5e5 * 2e-3 / 315 / (2e5 * 6e-3 / 300);
        StageMismatch mismatch = InterstageBalance.mismatches(running).get(0);
        assertEquals(expected, mismatch.relative().orElseThrow(), 1e-9);
        assertEquals("low", mismatch.stage());
    }

    @Test
    void followerTooLargeIsSaidToBeSo() {
        refused(
                with("low", Optional.empty(), 2e-3, 0.1, 300, pa(2e5), BALANCED)
                        .with("high", Optional.of("low"), 6e-3, 0.1, 300, BALANCED, pa(4e5)),
                "stage high takes in more than stage low can pass at any of them");
    }

    @Test
    void followerTooSmallIsSaidToBeSo() {
        refused(
                with("low", Optional.empty(), 6e-3, 0.1, 300, pa(2e5), BALANCED)
                        .with("high", Optional.of("low"), 1e-3, 0.1, 300, BALANCED, pa(4e5)),
                "stage low passes more than stage high can take in at any of them");
    }

    /** Clearances so large that neither ratio opens the valves: no pressure between makes anything flow. */
    @Test
    void stagesThatCannotReachThePressureAreSaidNotToOpen() {
        refused(
                with("low", Optional.empty(), 6e-3, 2, 300, pa(1e5), BALANCED)
                        .with("high", Optional.of("low"), 3e-3, 2, 300, BALANCED, pa(40e5)),
                "at none do the valves of both open");
    }

    private static void refused(InterstageBalanceTest machine, String why) {
        Settling settling = machine.settle();
        assertEquals(
                List.of(new Refusal(
                        "dutyPoints[0].stages.high.suctionPressure",
                        "no pressure between stage low and stage high balances them: " + why)),
                settling.refusals());
    }

    @Test
    void massThatIsNotKnownIsAskedFor() {
        with("low", Optional.empty(), 6e-3, 0.1, 300, pa(2e5), BALANCED)
                .with("high", Optional.of("low"), 3e-3, 0.1, 300, BALANCED, pa(9e5));
        lines.put("high", new StageConditions(BALANCED, OptionalDouble.empty(), pa(9e5)));
        assertEquals(
                List.of(
                        new Refusal(
                                "dutyPoints[0].stages.high.suctionPressure",
                                "high head: the mass that it passes is not known; a gas needs a suctionTemperature at the duty point")),
                settle().refusals());
    }
}
