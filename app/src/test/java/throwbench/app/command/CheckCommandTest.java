package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import throwbench.solver.finding.Finding;
import throwbench.solver.finding.Judgement;
import throwbench.solver.machine.Machine;

class CheckCommandTest {

    /** Rod tension held to less than it is, so that the sample is not met at both of its duty points. */
    private static final String GENEROUS = "\"rodTension\": \"120 kN\"";

    private static final String RANGES = """
            "loadSteps": [ { "name": "crank end open", "chambers": { "A crank": { "state": "held-open" } } } ],
            "ranges": { "stages": { "first": { "suctionPressure": ["3.5 bar g", "4.6 bar g"],
              "dischargePressure": ["10 bar g", "11.5 bar g"], "reliefPressure": "13.5 bar g" } } },
            """;

    private static final String TIGHT = "\"rodTension\": \"46 kN\"";

    @TempDir
    Path folder;

    private static List<String> keys(JsonNode object) {
        List<String> keys = new ArrayList<>();
        object.fieldNames().forEachRemaining(keys::add);
        return keys;
    }

    private static void assertNumber(OptionalDouble expected, JsonNode written) {
        assertEquals(expected.isEmpty(), written.isNull());
        if (expected.isPresent()) {
            assertEquals(expected.getAsDouble(), written.doubleValue(), 0);
        }
    }

    private static void assertText(String expected, JsonNode written) {
        assertEquals(expected, written.textValue());
    }

    @Test
    void jsonHasEveryFindingWithEveryKeyWorstFirst() throws IOException {
        Path file = Run.machine(folder, GENEROUS, TIGHT);
        Machine machine = SampleMachine.read(file);
        List<Finding> expected = Judgement.of(machine, machine.dutyPoints()).findings();
        Run run = Run.of("check", file.toString(), "--format", "json");
        JsonNode root = new ObjectMapper().readTree(run.out());

        assertEquals(ExitCode.NOT_MET, run.code());
        assertEquals("", run.err());
        assertEquals(List.of("machine", "findings"), keys(root));
        assertText("Saltmarsh biogas booster", root.get("machine"));
        assertEquals(expected.size(), root.get("findings").size());
        for (int i = 0; i < expected.size(); i++) {
            assertFinding(expected.get(i), root.get("findings").get(i));
        }
        assertText("not-met", root.get("findings").get(0).get("verdict"));
    }

    private static void assertFinding(Finding expected, JsonNode written) {
        assertEquals(
                List.of(
                        "id",
                        "duty",
                        "stage",
                        "throw",
                        "chamber",
                        "value",
                        "unit",
                        "limit",
                        "margin",
                        "angle_deg",
                        "verdict",
                        "source",
                        "note"),
                keys(written));
        assertText(expected.criterion().id(), written.get("id"));
        assertText(expected.where().duty(), written.get("duty"));
        assertEquals(expected.where().stage().orElse(null), written.get("stage").textValue());
        assertEquals(
                expected.where().throwName().orElse(null), written.get("throw").textValue());
        assertEquals(
                expected.where().chamber().orElse(null), written.get("chamber").textValue());
        assertNumber(expected.value(), written.get("value"));
        assertText(expected.criterion().unit(), written.get("unit"));
        assertNumber(expected.limit(), written.get("limit"));
        assertNumber(expected.margin(), written.get("margin"));
        assertEquals(expected.angle().isEmpty(), written.get("angle_deg").isNull());
        if (expected.angle().isPresent()) {
            double degrees = Math.toDegrees(expected.angle().getAsDouble());
            assertEquals(degrees, written.get("angle_deg").doubleValue(), 0);
        }
        assertText(expected.verdict().text(), written.get("verdict"));
        assertText(expected.criterion().source(), written.get("source"));
        assertText(expected.note(), written.get("note"));
    }

    @Test
    void oneDutyPointIsJudgedAloneAndItsVerdictIsTheExitCode() throws IOException {
        String file = Run.machine(folder, GENEROUS, TIGHT).toString();
        Run normal = Run.of("check", file, "--duty", "normal", "--format=json");
        Run unloaded = Run.of("check", "--duty=crank end unloaded", "--format", "json", file);

        assertEquals(ExitCode.NOT_MET, normal.code());
        assertEquals(ExitCode.DONE, unloaded.code());
        for (JsonNode finding : new ObjectMapper().readTree(unloaded.out()).get("findings")) {
            assertText("crank end unloaded", finding.get("duty"));
        }
    }

    @Test
    void textGathersDutyPointsUnderTheirWorstAndEndsInAnAnswerAndTheCaution() throws IOException {
        Run run = Run.of("check", Run.machine(folder, GENEROUS, TIGHT).toString());

        // an own run guards the layout; the values are held against the solver's through the JSON
        String text = run.out();
        assertTrue(text.startsWith("""
                Saltmarsh biogas booster at 2 duty points

                NOT MET     rod load, tension          throw A            46.25 kN  at most      46 kN    -0.5 %
                            worst at "normal", crank angle 97.4 deg
                            not met at 1 of 2 duty points: "normal"
                met         discharge temperature      chamber A head   105.9 degC  at most   150 degC   +10.4 %
                            worst at "normal"
                            met at all 2 duty points
                met         discharge temperature      chamber A crank  105.9 degC  at most   150 degC   +10.4 %
                            worst at "normal"
                            not judged at 1 of 2 duty points: "crank end unloaded"
                met         rod load, compression      throw A            60.01 kN  at most     120 kN   +50.0 %
                            worst at "normal", crank angle 286.7 deg
                            met at all 2 duty points
                met         reversal, span             throw A           38.02 deg  at least    15 deg  +153.5 %
                            worst at "crank end unloaded", crank angle 62.5 deg; the span in tension governs
                            met at all 2 duty points
                """), text);
        assertTrue(text.contains("""
                not judged  gas load, tension          throw A            60.91 kN
                            greatest at "normal", crank angle 180.0 deg; no limit given
                            least of 2 duty points: 1.099 kN at "crank end unloaded"
                """), text);
        assertTrue(text.contains("""
                not judged  crank pin pressure         throw A                   -
                            crankPinPart.diameter and crankPinPart.length are missing
                """), text);
        assertTrue(text.endsWith("""

                1 of 11 judged findings is not met; worst: rod load, tension of throw A at "normal", -0.5 %.
                Results support, and do not replace, the manufacturer's limits, local codes and the judgement of a
                licensed engineer.
                """), text);
        assertEquals("", run.err());
        assertEquals(ExitCode.NOT_MET, run.code());
    }

    @Test
    void textOfOneDutyPointNamesItOnce() throws IOException {
        Run run = Run.of("check", Run.machine(folder).toString(), "--duty", "normal");
        List<String> lines = run.out().lines().toList();

        assertEquals(ExitCode.DONE, run.code());
        assertEquals("Saltmarsh biogas booster at \"normal\"", lines.get(0));
        assertEquals(1, lines.stream().filter(line -> line.contains("normal")).count());
        assertTrue(run.out()
                .contains("All 6 judged findings are met; closest: discharge temperature of chamber A head, +10.4 %."));
    }

    @Test
    void loadStepsAreJudgedAtTheCornersAndEachOfThemMayBeAskedForByItsName() throws IOException {
        String file = Run.machine(folder, "\"limits\":", RANGES + "\"limits\":").toString();
        Run all = Run.of("check", file, "--format", "json");
        List<String> duties = new ArrayList<>();
        for (JsonNode finding : new ObjectMapper().readTree(all.out()).get("findings")) {
            if (finding.get("id").textValue().equals("reversal-duration")) {
                duties.add(finding.get("duty").textValue());
            }
        }
        assertEquals(2 + 2 * 3, duties.size());
        String relief = "crank end open · suction 3.5 bar g · discharge at relief 13.5 bar g";
        assertTrue(duties.contains(relief), duties.toString());

        Run one = Run.of("check", file, "--duty", relief, "--format", "json");
        for (JsonNode finding : new ObjectMapper().readTree(one.out()).get("findings")) {
            assertText(relief, finding.get("duty"));
        }
        Run solved = Run.of("solve", file, "--duty", relief, "--stations", "8");
        assertEquals(ExitCode.DONE, solved.code(), solved.err());
    }

    @Test
    void aRangeThatMakesNoSenseIsRefusedAtItsPlace() throws IOException {
        // the discharge pressure is then that of the duty point, 11.5 bar g
        String tooHigh = RANGES.replace("4.6 bar g", "11.6 bar g")
                .replace("\"dischargePressure\": [\"10 bar g\", \"11.5 bar g\"], ", "");
        String file =
                Run.machine(folder, "\"limits\":", tooHigh + "\"limits\":").toString();
        Run run = Run.of("check", file);
        assertEquals(ExitCode.REFUSED, run.code());
        assertTrue(run.err().startsWith(file + ": ranges.stages.first"), run.err());
        assertEquals("", run.out());
    }
}
