package throwbench.solver.finding;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import org.junit.jupiter.api.Test;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.StageConditions;
import throwbench.solver.revolution.Refusal;
import throwbench.solver.trial.JudgedMachine;

/** Load steps at the corners of the ranges. */
class JudgedPointsTest {

    private static final String STEPS = "\"loadSteps\": [ { \"name\": \"all ends\" }, { \"name\": \"crank end open\","
            + " \"chambers\": { \"A crank\": { \"state\": \"held-open\" } } } ]";

    /** One stage alone: the second one's throw becomes part of the first. */
    private static JudgedMachine oneStage() {
        return JudgedMachine.twoStages()
                .with(", \"second\": { \"fluid\": \"gas\", \"follows\": \"first\" }", "")
                .with("\"stage\": \"second\"", "\"stage\": \"first\"")
                .with(
                        "\"4 bar a\" },\n      \"second\": { \"suctionPressure\": \"4 bar a\", \"suctionTemperature\": \"35 degC\","
                                + " \"dischargePressure\": \"9 bar a\" }",
                        "\"4 bar a\" }");
    }

    private static List<String> names(JudgedMachine file) {
        JudgedPoints points = JudgedPoints.of(file.machine());
        assertEquals(List.of(), points.refusals());
        return points.points().stream().map(DutyPoint::name).toList();
    }

    private static DutyPoint point(JudgedMachine file, String name) {
        return JudgedPoints.of(file.machine()).named(name).orElseThrow();
    }

    private static StageConditions lines(DutyPoint point, String stage) {
        return Objects.requireNonNull(point.stages().get(stage));
    }

    private static List<Refusal> refusals(JudgedMachine file) {
        return JudgedPoints.of(file.machine()).refusals();
    }

    @Test
    void withoutLoadStepsAndRangesTheWrittenOnesAreAll() {
        Machine machine = oneStage().machine();
        assertEquals(machine.dutyPoints(), JudgedPoints.of(machine).points());
    }

    @Test
    void everyLoadStepIsJudgedAtEveryCornerAndAtReliefPressureAtEverySuctionCorner() {
        JudgedMachine file = oneStage()
                .and(STEPS)
                .and(
                        "\"ranges\": { \"speed\": [\"500 rpm\", \"600 rpm\"], \"stages\": { \"first\": { \"suctionPressure\":"
                                + " [\"0.1 bar g\", \"0.5 bar g\"], \"dischargePressure\": [\"3 bar g\", \"4.25 bar g\"],"
                                + " \"reliefPressure\": \"5 bar g\" } } }");
        List<String> names = names(file);
        assertEquals(1 + 2 * 2 * 2 * 3, names.size());
        assertEquals(names.size(), new HashSet<>(names).size(), "no name twice");
        assertEquals(
                List.of(
                        "normal",
                        "all ends · 500 rpm · suction 0.1 bar g · discharge 3 bar g",
                        "all ends · 500 rpm · suction 0.1 bar g · discharge 4.25 bar g",
                        "all ends · 500 rpm · suction 0.1 bar g · discharge at relief 5 bar g",
                        "all ends · 500 rpm · suction 0.5 bar g · discharge 3 bar g"),
                names.subList(0, 5));
        DutyPoint last = point(file, "crank end open · 600 rpm · suction 0.5 bar g · discharge at relief 5 bar g");
        assertEquals(names.get(names.size() - 1), last.name());
        assertEquals(20 * Math.PI, last.speed(), 1e-12);
        assertEquals(101_325 + 0.5e5, lines(last, "first").suctionPressure().orElseThrow(), 1e-6);
        assertEquals(101_325 + 5e5, lines(last, "first").dischargePressure().orElseThrow(), 1e-6);
        assertEquals(293.15, lines(last, "first").suctionTemperature().orElseThrow(), 1e-9);
        assertEquals(ChamberState.HELD_OPEN, last.condition("A crank").state());
        assertEquals(ChamberState.WORKING, last.condition("A head").state());
    }

    @Test
    void loadStepsWithoutRangesAreJudgedAtTheFirstDutyPoint() {
        JudgedMachine file = oneStage().and(STEPS);
        assertEquals(List.of("normal", "all ends · normal", "crank end open · normal"), names(file));
        DutyPoint open = point(file, "crank end open · normal");
        assertEquals(point(file, "normal").stages(), open.stages());
        assertEquals(ChamberState.HELD_OPEN, open.condition("A crank").state());
    }

    @Test
    void rangesWithoutLoadStepsKeepTheStatesOfTheFirstDutyPoint() {
        JudgedMachine file = oneStage()
                .with(
                        "{ \"name\": \"normal\"",
                        "{ \"name\": \"normal\", \"chambers\": { \"A head\": { \"state\": \"held-open\" } }")
                .and(
                        "\"ranges\": { \"stages\": { \"first\": { \"suctionTemperature\": [\"-5 degC\", \"20 degC\"] } } }");
        assertEquals(List.of("normal", "normal · suction -5 degC", "normal · suction 20 degC"), names(file));
        DutyPoint cold = point(file, "normal · suction -5 degC");
        assertEquals(ChamberState.HELD_OPEN, cold.condition("A head").state());
        assertEquals(268.15, lines(cold, "first").suctionTemperature().orElseThrow(), 1e-9);
    }

    @Test
    void endsThatAreEqualMakeOneCorner() {
        JudgedMachine file = oneStage().and("\"ranges\": { \"speed\": [\"600 rpm\", \"600 rpm\"] }");
        assertEquals(List.of("normal", "normal · 600 rpm"), names(file));
    }

    @Test
    void stagesAreNamedWhereThereAreSeveral() {
        JudgedMachine file = JudgedMachine.twoStages()
                .and(
                        "\"ranges\": { \"stages\": { \"second\": { \"dischargePressure\": [\"7 bar g\", \"8 bar g\"] } } }");
        assertEquals(
                List.of("normal", "normal · second discharge 7 bar g", "normal · second discharge 8 bar g"),
                names(file));
    }

    @Test
    void reliefBeforeABalancedStageIsThatStagesSuction() {
        JudgedMachine balanced = JudgedMachine.twoStages()
                .with("\"dischargePressure\": \"4 bar a\"", "\"dischargePressure\": \"balanced\"")
                .with("\"suctionPressure\": \"4 bar a\"", "\"suctionPressure\": \"balanced\"");
        JudgedMachine file =
                balanced.and("\"ranges\": { \"stages\": { \"first\": { \"reliefPressure\": \"6 bar a\" } } }");
        assertEquals(List.of("normal", "normal · first discharge at relief 4.98675 bar g"), names(file));
        DutyPoint relief = point(file, "normal · first discharge at relief 4.98675 bar g");
        assertEquals(6e5, lines(relief, "first").dischargePressure().orElseThrow(), 1e-6);
        assertEquals(6e5, lines(relief, "second").suctionPressure().orElseThrow(), 1e-6);
        assertEquals(9e5, lines(relief, "second").dischargePressure().orElseThrow(), 1e-6);
        JudgedMachine ranged = balanced.and(
                "\"ranges\": { \"stages\": { \"second\": { \"suctionPressure\": [\"3 bar a\", \"4 bar a\"] } } }");
        assertEquals(
                List.of(new Refusal(
                        "ranges.stages.second.suctionPressure",
                        "this pressure is balanced at \"normal\"; a range needs a pressure there")),
                refusals(ranged));
    }

    @Test
    void aCornerThatDoesNotCompressIsRefused() {
        JudgedMachine file = oneStage()
                .and("\"ranges\": { \"stages\": { \"first\": { \"suctionPressure\": [\"1 bar g\", \"4 bar g\"] } } }");
        assertEquals(
                List.of(new Refusal(
                        "ranges.stages.first",
                        "2.98675 bar g of discharge with 4 bar g of suction at a corner; wanted is a discharge pressure"
                                + " above the suction pressure")),
                refusals(file));
    }

    @Test
    void moreCornersThanAnybodyReadsAreRefused() {
        StringBuilder stages = new StringBuilder();
        StringBuilder ranges = new StringBuilder();
        StringBuilder lines = new StringBuilder();
        for (int i = 0; i < 6; i++) {
            stages.append(", \"s" + i + "\": { \"fluid\": \"gas\" }");
            lines.append(", \"s" + i + "\": { \"suctionPressure\": \"1 bar a\", \"dischargePressure\": \"4 bar a\" }");
            ranges.append((i == 0 ? "" : ", ") + "\"s" + i + "\": { \"suctionPressure\": [\"1 bar a\", \"2 bar a\"],"
                    + " \"dischargePressure\": [\"3 bar a\", \"4 bar a\"], \"reliefPressure\": \"5 bar a\" }");
        }
        JudgedMachine file = oneStage()
                .with("\"first\": { \"fluid\": \"gas\" }", "\"first\": { \"fluid\": \"gas\" }" + stages)
                .with("\"dischargePressure\": \"4 bar a\" } }", "\"dischargePressure\": \"4 bar a\" }" + lines + " }")
                .and("\"ranges\": { \"stages\": { " + ranges + " } }");
        // six stages of two suctions and three discharges: 6⁶
        assertEquals(
                List.of(new Refusal(
                        "ranges",
                        "load steps and corners make 46656 duty points (1 × 46656), at most 20000 are judged")),
                refusals(file));
    }

    @Test
    void judgementOnManyCoresIsTheSameEachTimeAndThatOfEachPointAlone() {
        Machine machine = oneStage()
                .and(STEPS)
                .and("\"ranges\": { \"speed\": [\"500 rpm\", \"600 rpm\"] }")
                .machine();
        List<DutyPoint> points = JudgedPoints.of(machine).points();
        Judgement together = Judgement.of(machine, points);
        assertEquals(together, Judgement.of(machine, points));
        for (DutyPoint point : points) {
            List<Finding> there = together.findings().stream()
                    .filter(f -> f.where().duty().equals(point.name()))
                    .toList();
            assertEquals(Judgement.of(machine, List.of(point)).findings(), there);
        }
    }

    @Test
    void aRefusalAtACornerNamesIt() {
        JudgedMachine file = oneStage()
                .with(
                        "\"speed\": \"600 rpm\"",
                        "\"speed\": \"600 rpm\", \"rotatingInertia\": \"0.5 kg m2\", \"driver\": {"
                                + " \"kind\": \"constant-torque\" }")
                .and("\"ranges\": { \"speed\": [\"1 rpm\", \"600 rpm\"] }");
        Machine machine = file.machine();
        List<Refusal> refusals =
                Judgement.of(machine, JudgedPoints.of(machine).points()).refusals();
        assertTrue(
                refusals.stream().anyMatch(r -> r.sentence().endsWith(" (at \"normal · 1 rpm\")")),
                refusals.toString());
    }
}
