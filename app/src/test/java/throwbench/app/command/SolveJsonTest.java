package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import throwbench.solver.chamber.ValveEvent;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extreme;
import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.Reversal;
import throwbench.solver.revolution.Revolution;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Summary;

class SolveJsonTest {

    @TempDir
    Path folder;

    private static JsonNode solve(Path file, String... more) throws IOException {
        List<String> words = new ArrayList<>(List.of("solve", file.toString(), "--format", "json"));
        words.addAll(List.of(more));
        Run run = Run.of(words.toArray(String[]::new));
        assertEquals("", run.err());
        assertEquals(ExitCode.DONE, run.code());
        return new ObjectMapper().readTree(run.out());
    }

    private static List<String> keys(JsonNode object) {
        List<String> keys = new ArrayList<>();
        object.fieldNames().forEachRemaining(keys::add);
        return keys;
    }

    @Test
    void everyPartCarriesTheKeysOfTheDesign() throws IOException {
        JsonNode root = solve(Run.machine(folder), "--stations", "16");
        JsonNode summary = root.get("summary");

        assertEquals(List.of("machine", "duty", "throw", "stations", "columns", "summary"), keys(root));
        assertEquals(
                List.of(
                        "stroke_m",
                        "crankEndDeadCentre_deg",
                        "timeRatio",
                        "extremes",
                        "reversal",
                        "valveEvents",
                        "indicatedPower_W",
                        "capacity_kg_s",
                        "inletVolume_m3_s",
                        "meanThrowTorque_N_m",
                        "meanShaftTorque_N_m",
                        "speedFluctuation",
                        "harmonics",
                        "machine",
                        "notes"),
                keys(summary));
        assertEquals(
                List.of(
                        "signChanges_deg",
                        "tensionSpan_deg",
                        "compressionSpan_deg",
                        "tensionPeak_N",
                        "compressionPeak_N",
                        "tensionPeakAt_deg",
                        "compressionPeakAt_deg",
                        "duration_deg",
                        "ratio"),
                keys(summary.get("reversal")));
        assertEquals(keys(root.get("columns")), keys(summary.get("extremes")));
    }

    @Test
    void columnsAreThoseOfTheCsv() throws IOException {
        Path file = Run.machine(folder);
        JsonNode columns = solve(file, "--stations", "24").get("columns");
        List<String> lines = Run.of("solve", file.toString(), "--stations", "24")
                .out()
                .lines()
                .toList();

        assertEquals(List.of(lines.get(0).split(",", -1)), keys(columns));
        for (int i = 0; i < 24; i++) {
            String[] cells = lines.get(i + 1).split(",", -1);
            int c = 0;
            for (JsonNode column : columns) {
                assertEquals(24, column.size());
                assertEquals(Double.parseDouble(cells[c++]), column.get(i).doubleValue(), 0);
            }
        }
    }

    @Test
    void summaryHasTheSolversValues() throws IOException {
        Path file = Run.machine(folder);
        RunningMachine running = SampleMachine.running(file, 0);
        Summary expected = Summary.of(running, 0, Optional.empty());
        JsonNode root = solve(file, "--stations", "8");
        JsonNode summary = root.get("summary");

        assertEquals("Saltmarsh biogas booster", root.get("machine").textValue());
        assertEquals("normal", root.get("duty").textValue());
        assertEquals("A", root.get("throw").textValue());
        assertEquals(8, root.get("stations").intValue());
        assertEquals(
                expected.shownThrow().linkage().stroke(),
                summary.get("stroke_m").doubleValue(),
                0);
        assertEquals(180, summary.get("crankEndDeadCentre_deg").doubleValue(), 1e-12);
        assertEquals(1, summary.get("timeRatio").doubleValue(), 1e-12);
        assertEquals(
                expected.meanThrowTorque(), summary.get("meanThrowTorque_N_m").doubleValue(), 0);
        assertEquals(
                expected.meanShaftTorque(), summary.get("meanShaftTorque_N_m").doubleValue(), 0);
        assertEquals(
                expected.speedFluctuation(), summary.get("speedFluctuation").doubleValue(), 0);
        double power = summary.get("indicatedPower_W").get("first").doubleValue();
        assertEquals(first(expected.throwFlow().indicatedPower()), power, 0);
        assertEquals(
                first(expected.throwFlow().capacity()).orElseThrow(),
                summary.get("capacity_kg_s").get("first").doubleValue(),
                0);
        assertEquals(
                first(expected.throwFlow().inletVolume()).orElseThrow(),
                summary.get("inletVolume_m3_s").get("first").doubleValue(),
                0);
        assertEquals(
                expected.machineFlow().totalPower(),
                summary.get("machine").get("indicatedPower_W").doubleValue(),
                0);
        assertEquals(0, summary.get("notes").size());
    }

    @Test
    void extremesHaveTheSolversValuesAndTheirAnglesInDegrees() throws IOException {
        Path file = Run.machine(folder);
        Summary expected = Summary.of(SampleMachine.running(file, 0), 0, Optional.empty());
        JsonNode extremes = solve(file).get("summary").get("extremes");

        for (Column column : Column.values()) {
            if (column != Column.CRANK_ANGLE) {
                assertExtremes(expected.extremes(column), column, extremes.get(column.fileName()));
            }
        }
        assertExtremes(expected.pressures().get(0), Column.TRAVEL, extremes.get("pressure_Pa[A head]"));
        assertExtremes(expected.pressures().get(1), Column.TRAVEL, extremes.get("pressure_Pa[A crank]"));
        assertEquals(359.5, extremes.get("crank_angle_deg").get("max").doubleValue(), 0);
    }

    private static <T> T first(Map<String, T> byStage) {
        return Objects.requireNonNull(byStage.get("first"));
    }

    private static void assertExtremes(Extremes expected, Column column, JsonNode written) {
        assertEquals(List.of("min", "minAt_deg", "max", "maxAt_deg"), keys(written));
        assertExtreme(expected.least(), column, written.get("min"), written.get("minAt_deg"));
        assertExtreme(expected.greatest(), column, written.get("max"), written.get("maxAt_deg"));
    }

    private static void assertExtreme(Extreme expected, Column column, JsonNode value, JsonNode angle) {
        assertEquals(column.inFile(expected.value()) + 0.0, value.doubleValue(), 0, column.fileName());
        assertEquals(Math.toDegrees(expected.crankAngle()), angle.doubleValue(), 0, column.fileName());
    }

    @Test
    void reversalIsTheSolversInDegrees() throws IOException {
        Path file = Run.machine(folder);
        RunningMachine running = SampleMachine.running(file, 1);
        Reversal expected = Summary.of(running, 0, Optional.empty()).reversal();
        JsonNode reversal =
                solve(file, "--duty", "crank end unloaded").get("summary").get("reversal");

        assertEquals(2, reversal.get("signChanges_deg").size());
        for (int i = 0; i < 2; i++) {
            assertEquals(
                    Math.toDegrees(expected.signChanges().get(i).crankAngle()),
                    reversal.get("signChanges_deg").get(i).doubleValue(),
                    0);
        }
        // with two changes the spans are the two parts of the turn
        double tension = reversal.get("tensionSpan_deg").doubleValue();
        double compression = reversal.get("compressionSpan_deg").doubleValue();
        assertEquals(360, tension + compression, 1e-9);
        assertEquals(
                Math.min(tension, compression), reversal.get("duration_deg").doubleValue(), 0);
        double pull = reversal.get("tensionPeak_N").doubleValue();
        double push = reversal.get("compressionPeak_N").doubleValue();
        assertEquals(expected.tension().orElseThrow().value(), pull, 0);
        assertEquals(expected.compression().orElseThrow().value(), push, 0);
        assertEquals(
                Math.min(pull, push) / Math.max(pull, push),
                reversal.get("ratio").doubleValue(),
                1e-15);
        assertEquals(
                Math.toDegrees(expected.tension().orElseThrow().crankAngle()),
                reversal.get("tensionPeakAt_deg").doubleValue(),
                0);
        assertEquals(
                Math.toDegrees(expected.compression().orElseThrow().crankAngle()),
                reversal.get("compressionPeakAt_deg").doubleValue(),
                0);
    }

    @Test
    void aLoadThatNeverPullsHasNoAngleOfItsPeakAndANoteSaysSo() throws IOException {
        // a small head end alone against a high pressure, at a crawl: the gas always pushes
        Path file = Run.machine(folder, "\"speed\": \"740 rpm\"", "\"speed\": \"1 rpm\"");
        Path pushed = Run.machineWith(file, text -> text.replaceFirst("(?s)\\{ \"name\": \"A head\".*?\\} \\},\\s*", "")
                .replace("\"side\": \"crank\"", "\"side\": \"head\"")
                .replace(", \"A head\": { \"addedClearance\": \"20 %\" }", ""));
        JsonNode summary = solve(pushed).get("summary");
        JsonNode reversal = summary.get("reversal");

        assertEquals(0, reversal.get("signChanges_deg").size());
        assertEquals(0, reversal.get("tensionPeak_N").doubleValue());
        assertTrue(reversal.get("tensionPeakAt_deg").isNull());
        assertEquals(0, reversal.get("tensionSpan_deg").doubleValue());
        assertEquals(360, reversal.get("compressionSpan_deg").doubleValue());
        assertEquals(0, reversal.get("duration_deg").doubleValue());
        assertEquals(
                "reversal: the rod load is never in tension; its peak there is 0 and has no angle",
                summary.get("notes").get(0).textValue());
    }

    @Test
    void capacityByMassIsNullWithoutASuctionTemperatureAndANoteSaysSo() throws IOException {
        Path file = Run.machine(folder, "\"suctionTemperature\": \"32 degC\", ", "");
        JsonNode summary = solve(file).get("summary");

        assertTrue(summary.get("capacity_kg_s").get("first").isNull());
        assertTrue(summary.get("machine").get("capacity_kg_s").get("first").isNull());
        List<String> notes = new ArrayList<>();
        summary.get("notes").forEach(note -> notes.add(note.textValue()));
        assertTrue(
                notes.contains("stage first: capacity by mass needs a suctionTemperature at the duty point"),
                notes.toString());
    }

    @Test
    void valveEventsStandByChamberInTheOrderOfTheirAngles() throws IOException {
        Path file = Run.machine(folder);
        RunningMachine running = SampleMachine.running(file, 0);
        JsonNode events = solve(file).get("summary").get("valveEvents");

        assertEquals(List.of("A head", "A crank"), keys(events));
        for (int c = 0; c < 2; c++) {
            List<ValveEvent> expected =
                    running.throwsInOrder().get(0).curves().get(c).events();
            JsonNode written = events.get(keys(events).get(c));
            assertEquals(4, written.size());
            for (int i = 0; i < 4; i++) {
                assertEquals(List.of("valve", "event", "at_deg"), keys(written.get(i)));
                assertEquals(
                        expected.get(i).valve().text(),
                        written.get(i).get("valve").textValue());
                assertEquals(
                        expected.get(i).opens() ? "opens" : "closes",
                        written.get(i).get("event").textValue());
                assertEquals(
                        Math.toDegrees(expected.get(i).crankAngle()),
                        written.get(i).get("at_deg").doubleValue(),
                        0);
            }
        }
    }

    @Test
    void stationsDoNotMoveTheSummary() throws IOException {
        Path file = Run.machine(folder);
        JsonNode coarse = solve(file, "--stations", "8").get("summary");
        JsonNode fine = solve(file, "--stations", "720").get("summary");

        assertEquals(fine.get("reversal"), coarse.get("reversal"));
        assertEquals(
                fine.get("extremes").get("rod_load_N"), coarse.get("extremes").get("rod_load_N"));
    }

    @Test
    void columnsAreThoseOfTheRevolutionAtTheStationsAskedFor() throws IOException {
        Path file = Run.machine(folder);
        Revolution solved = Revolution.solve(SampleMachine.running(file, 0), 0, 12);
        JsonNode load = solve(file, "--stations", "12").get("columns").get("rod_load_N");

        for (int i = 0; i < 12; i++) {
            assertEquals(solved.at(Column.ROD_LOAD, i), load.get(i).doubleValue(), 0);
        }
    }
}
