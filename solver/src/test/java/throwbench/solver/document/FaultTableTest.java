package throwbench.solver.document;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** Every kind of fault, each made by an edit of a file without any, with its very words. */
class FaultTableTest {

    private static MachineDocument edited(String edits) {
        MachineDocument document = Samples.document(Samples.everyKey());
        for (String edit : edits.split(" ; ", -1)) {
            if (edit.startsWith("- ")) {
                document = document.without(document.path(edit.substring(2).strip()));
            } else {
                int sign = edit.indexOf(" = ");
                KeyPath path = document.path(edit.substring(0, sign).strip());
                document = document.withJson(path, edit.substring(sign + 3).strip());
            }
        }
        return document;
    }

    @TestFactory
    Stream<DynamicTest> saysWhatIsWrongAndNothingElse() {
        List<DynamicTest> tests = new ArrayList<>();
        for (String row : Samples.rows("faults.txt")) {
            String[] cells = row.split(" \\| ", -1);
            assertEquals(4, cells.length, row);
            Fault expected = new Fault(cells[1], cells[2].strip(), cells[3].strip());
            tests.add(DynamicTest.dynamicTest(
                    cells[0],
                    () -> assertEquals(
                            List.of(expected), Samples.read(edited(cells[0])).faults())));
        }
        return tests.stream();
    }

    @Test
    void fileBeforeAnyEditHasNoFault() {
        assertEquals(List.of(), Samples.read(Samples.everyKey()).faults());
    }

    @Test
    void allFaultsAreReportedTogetherInTheOrderOfTheFile() {
        MachineDocument document =
                edited("site.gravity = 1 ; drive.speed = \"1 kg\" ; fluids.sour gas.mixture.methane = 0.7"
                        + " ; throws[0].rodLength = \"10 mm\" ; throws[1].name = \"A\" ; - dutyPoints[0].stages.lift"
                        + " ; bookmarks[0].throw = \"C\" ; colour = \"red\"");
        List<String> paths =
                Samples.read(document).faults().stream().map(Fault::path).toList();
        assertEquals(
                List.of(
                        "site.gravity",
                        "drive.speed",
                        "fluids.sour gas.mixture",
                        "throws[0].rodLength",
                        "throws[0].connectingRod.massCentreFromCrankPin",
                        "throws[1].name",
                        "dutyPoints[0].stages.lift",
                        "bookmarks[0].throw",
                        "colour"),
                paths);
    }

    // 1.03 bar · 1.05 = 1.0815 bar above 1.1 bar · 0.97 = 1.067 bar; 1.0 bar · 1.05 = 1.05 bar below it
    @Test
    void dischargePressureIsComparedInsideTheGasChamberWithItsLosses() {
        String edit = "dutyPoints[0].stages.high.suctionPressure = \"2 bar a\""
                + " ; dutyPoints[0].stages.low.dischargePressure = ";
        assertEquals(List.of(), Samples.read(edited(edit + "\"1.03 bar a\"")).faults());
        assertEquals(
                List.of("dutyPoints[0].stages.low.dischargePressure"),
                Samples.read(edited(edit + "\"1.0 bar a\"")).faults().stream()
                        .map(Fault::path)
                        .toList());
    }

    // -0.35 bar + 0.4 bar = 0.05 bar above 0.2 bar - 0.2 bar = 0; -0.41 bar + 0.4 bar below it
    @Test
    void dischargePressureIsComparedInsideTheLiquidChamberWithItsLosses() {
        String edit = "dutyPoints[0].stages.lift.dischargePressure = ";
        assertEquals(List.of(), Samples.read(edited(edit + "\"-0.35 bar g\"")).faults());
        assertEquals(
                List.of("dutyPoints[0].stages.lift.dischargePressure"),
                Samples.read(edited(edit + "\"-0.41 bar g\"")).faults().stream()
                        .map(Fault::path)
                        .toList());
    }

    @Test
    void repeatedKeyIsAFaultAtItsPathAndTheFirstOneCounts() {
        String text = Samples.pageExample()
                .replace("\"crankRadius\": \"75 mm\"", "\"crankRadius\": \"75 mm\", \"crankRadius\": 5");
        assertEquals(
                List.of(new Fault("throws[0].crankRadius", "the key a second time", "each key once in an object")),
                Samples.read(text).faults());
    }

    @Test
    void emptyObjectMissesAllThatIsRequired() {
        List<String> lines =
                Samples.read("{}").faults().stream().map(Fault::line).toList();
        assertEquals(
                List.of(
                        "throwbench: missing, wanted 1, the version of this form of file",
                        "name: missing, wanted a name",
                        "drive.speed: missing, wanted a speed of rotation, as \"740 rpm\", above 0",
                        "fluids: missing, wanted an object { … } by name",
                        "stages: missing, wanted an object { … } by name",
                        "throws: missing, wanted a list [ … ]",
                        "dutyPoints: missing, wanted a list [ … ]"),
                lines);
    }

    @Test
    void controlCharactersOfAFileStayInTheLine() {
        String line = Samples.read("{\"a\\n\\u001b[2J\": 1}").faults().stream()
                .map(Fault::line)
                .filter(said -> said.contains("unknown key"))
                .findFirst()
                .orElseThrow();
        assertTrue(line.startsWith("a\\u000a\\u001b[2J: an unknown key, wanted one of throwbench, "), line);
    }

    @Test
    void longTextIsCutInTheMessage() {
        String name = "\"" + "x".repeat(100_000) + "\"";
        Fault fault = Samples.read("{\"drive\": {\"speed\": " + name + "}}").faults().stream()
                .filter(f -> f.path().equals("drive.speed"))
                .findFirst()
                .orElseThrow();
        assertTrue(fault.line().length() < 200, fault.line());
    }
}
