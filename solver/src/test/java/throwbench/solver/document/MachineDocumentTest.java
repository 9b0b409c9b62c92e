package throwbench.solver.document;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.machine.Machine;

class MachineDocumentTest {

    private static MachineDocument page() {
        return Samples.document(Samples.pageExample());
    }

    private static String afterEdit(String text, String path, String value) {
        MachineDocument document = Samples.document(text);
        return document.with(document.path(path), value).text();
    }

    // values

    @Test
    void valueTextIsTheUsersOwn() {
        MachineDocument page = page();
        assertEquals(Optional.of("75 mm"), page.valueText(page.path("throws[0].crankRadius")));
        assertEquals(Optional.of("1.29"), page.valueText(page.path("fluids.biogas.isentropicExponent")));
        assertEquals(Optional.of("false"), page.valueText(page.path("site.gravity")));
        assertEquals(Optional.of("held-open"), page.valueText(page.path("dutyPoints[1].chambers.A crank.state")));
        assertEquals(Optional.empty(), page.valueText(page.path("throws[0].chambers[2].bore")));
        assertEquals(Optional.empty(), page.valueText(page.path("throws[0]")));
    }

    @Test
    void editChangesTheCharactersOfOneValueOnly() {
        String text = Samples.pageExample();
        assertEquals(text.replace("\"75 mm\"", "\"80.5 mm\""), afterEdit(text, "throws[0].crankRadius", "80.5 mm"));
        assertEquals(text.replace("1.29", "1.3"), afterEdit(text, "fluids.biogas.isentropicExponent", "1.3"));
        assertEquals(text.replace("\"gravity\": false", "\"gravity\": true"), afterEdit(text, "site.gravity", "true"));
        assertEquals(text.replace("\"16 %\"", "0.16"), afterEdit(text, "throws[0].chambers[1].clearance", "0.16"));
        assertEquals(text.replace("1.29", "\"129 %\""), afterEdit(text, "fluids.biogas.isentropicExponent", "129 %"));
        assertEquals(
                text.replace("Saltmarsh biogas booster", "5 \\\"x\\\" \\\\ \\n \\u0001 é"),
                afterEdit(text, "name", "5 \"x\" \\ \n \u0001 é"));
    }

    @Test
    void sameValueGivesTheSameDocumentEvenWhenItIsEscaped() {
        String text = "{\"name\": \"\\u0041 \\/ B\"}";
        MachineDocument document = Samples.document(text);
        assertEquals(Optional.of("A / B"), document.valueText(document.path("name")));
        assertSame(document, document.with(document.path("name"), "A / B"));
    }

    // inserting and removing

    @Test
    void missingKeyIsInsertedInTheFilesOwnStyle() {
        String text = Samples.pageExample();
        assertEquals(
                text.replace("\"gravity\": false }", "\"gravity\": false, \"framePressure\": \"1 bar a\" }"),
                afterEdit(text, "site.framePressure", "1 bar a"));
        assertEquals(
                text.replace(
                        "{ \"kind\": \"constant-speed\" }\n",
                        "{ \"kind\": \"constant-speed\" },\n    \"mechanicalEfficiency\": \"94 %\"\n"),
                afterEdit(text, "drive.mechanicalEfficiency", "94 %"));
        assertEquals(
                text.replace(
                        "\"150 degC\" }\n}",
                        "\"150 degC\" },\n  \"ranges\": { \"stages\": { \"first\": { \"reliefPressure\": \"13 bar g\" } } }\n}"),
                afterEdit(text, "ranges.stages.first.reliefPressure", "13 bar g"));
        assertEquals("{\n  \"name\": \"x\"\n}", afterEdit("{}", "name", "x"));
        assertEquals(
                "{\"site\":{\"gravity\":true, \"framePressure\": \"1 bar a\"}}",
                afterEdit("{\"site\":{\"gravity\":true}}", "site.framePressure", "1 bar a"));
    }

    @Test
    void listGrowsByOneAtItsEnd() {
        MachineDocument page = page();
        MachineDocument more = page.with(page.path("loadSteps[0].name"), "all open");
        assertEquals(Optional.of("all open"), more.valueText(more.path("loadSteps[0].name")));
        assertThrows(IllegalArgumentException.class, () -> page.with(page.path("throws[2].name"), "C"));
        assertThrows(IllegalArgumentException.class, () -> page.with(page.path("name.first"), "C"));
    }

    @Test
    void removingTakesTheCommaAlong() {
        MachineDocument document = Samples.document("{ \"a\": 1, \"b\": [ 1, 2, 3 ], \"c\": { \"x\": 1 } }");
        assertEquals(
                "{ \"b\": [ 1, 2, 3 ], \"c\": { \"x\": 1 } }",
                document.without(document.path("a")).text());
        assertEquals(
                "{ \"a\": 1, \"b\": [ 1, 2, 3 ] }",
                document.without(document.path("c")).text());
        assertEquals(
                "{ \"a\": 1, \"b\": [ 1, 3 ], \"c\": { \"x\": 1 } }",
                document.without(document.path("b[1]")).text());
        assertEquals(
                "{ \"a\": 1, \"b\": [ 1, 2 ], \"c\": { \"x\": 1 } }",
                document.without(document.path("b[2]")).text());
        assertEquals(
                "{ \"a\": 1, \"b\": [ 1, 2, 3 ], \"c\": {} }",
                document.without(document.path("c.x")).text());
        assertSame(document, document.without(document.path("d")));
    }

    @Test
    void copiedElementStandsIndentedBesideItsOriginal() {
        String text = "{\n  \"throws\": [\n    {\n      \"name\": \"A\"\n    }\n  ]\n}\n";
        MachineDocument document = Samples.document(text);
        KeyPath list = document.path("throws");
        String json = document.json(list.item(0)).orElseThrow();
        assertEquals("{\n  \"name\": \"A\"\n}", json);
        MachineDocument two = document.insertItem(list, 1, json);
        assertEquals(
                "{\n  \"throws\": [\n    {\n      \"name\": \"A\"\n    },\n    {\n      \"name\": \"A\"\n    }\n  ]\n}\n",
                two.text());
        MachineDocument before = document.insertItem(list, 0, "{\n  \"name\": \"Z\"\n}");
        assertEquals(Optional.of("Z"), before.valueText(before.path("throws[0].name")));
        assertEquals(text, two.without(list.item(1)).text());
    }

    @Test
    void insertedTextTakesTheLineEndsOfTheFile() {
        String text = "{\r\n\t\"stages\": {\r\n\t\t\"low\": {}\r\n\t}\r\n}\r\n";
        MachineDocument document = Samples.document(text);
        MachineDocument more = document.insertMember(document.path("stages"), 1, "high", "{\n\t\"fluid\": \"air\"\n}");
        assertEquals(
                "{\r\n\t\"stages\": {\r\n\t\t\"low\": {},\r\n\t\t\"high\": {\r\n\t\t\t\"fluid\": \"air\"\r\n\t\t}\r\n\t}\r\n}\r\n",
                more.text());
    }

    @Test
    void movedElementsKeepTheGapsBetweenThem() {
        MachineDocument document = Samples.document("{ \"l\": [ 1,2,  3 , 4 ], \"m\": { \"a\": 1, \"b\" : 2 } }");
        assertEquals(
                "[ 2,3,  1 , 4 ]",
                document.move(document.path("l[0]"), 2).json(document.path("l")).orElseThrow());
        assertEquals(
                "[ 1,4,  2 , 3 ]",
                document.move(document.path("l[3]"), 1).json(document.path("l")).orElseThrow());
        assertEquals(
                "{ \"b\" : 2, \"a\": 1 }",
                document.move(document.path("m.b"), 0).json(document.path("m")).orElseThrow());
        assertThrows(IndexOutOfBoundsException.class, () -> document.move(document.path("l[0]"), 4));
    }

    @Test
    void renamingChangesTheKeyOnly() {
        MachineDocument document = Samples.document("{ \"fluids\": { \"a\\u0062\" : { \"kind\": \"gas\" } } }");
        MachineDocument renamed = document.rename(document.path("fluids.ab"), "x \"y\"");
        assertEquals("{ \"fluids\": { \"x \\\"y\\\"\" : { \"kind\": \"gas\" } } }", renamed.text());
        assertEquals(List.of("x \"y\""), renamed.names(renamed.path("fluids")));
        assertEquals(1, Samples.document("{\"throws\": [1]}").size(KeyPath.ROOT.key("throws")));
    }

    @Test
    void foreignLineEndsAndAByteOrderMarkReadTheSameAndStay() {
        String text = "\ufeff" + Samples.pageExample().replace("\n", "\r\n");
        Reading reading = Samples.read(text);
        assertEquals(
                Optional.of(Samples.machine(Samples.pageExample()).dutyPoints()),
                reading.machine().map(Machine::dutyPoints));
        MachineDocument document = reading.document().orElseThrow();
        MachineDocument changed = document.with(document.path("drive.mechanicalEfficiency"), "94 %");
        assertEquals(
                text.replace(
                        "{ \"kind\": \"constant-speed\" }\r\n",
                        "{ \"kind\": \"constant-speed\" },\r\n    \"mechanicalEfficiency\": \"94 %\"\r\n"),
                changed.text());
    }

    // places

    @Test
    void namesInPathsMayHoldDotsSpacesAndBrackets() {
        MachineDocument document = Samples.document(Samples.everyKey());
        KeyPath density = KeyPath.ROOT.key("fluids").key("brine 1.0").key("density");
        assertEquals(density, document.path("fluids.brine 1.0.density"));
        assertEquals("fluids.brine 1.0.density", density.toString());
        assertEquals(
                KeyPath.ROOT
                        .key("dutyPoints")
                        .item(0)
                        .key("chambers")
                        .key("B.2")
                        .key("state"),
                Samples.document("{}").path("dutyPoints[0].chambers.B.2.state"),
                "a name that the file does not have yet");
        assertEquals(
                KeyPath.ROOT.key("fluids").key("mix [2].1").key("mixture").key("iso.butane"),
                document.path("fluids.mix [2].1.mixture.iso.butane"));
        assertEquals(
                KeyPath.ROOT.key("stages").key("low").key("unheard").key("of"), document.path("stages.low.unheard.of"));
        assertEquals(KeyPath.ROOT, document.path(""));
    }

    @Test
    void everySpelledPathOfAFileComesBackToItsPlace() {
        MachineDocument document = Samples.document(Samples.everyKey());
        for (NumericKey key : document.numericKeys()) {
            assertEquals(key.path(), document.path(key.path().toString()));
            assertEquals(Optional.of(key.quantity().text()), document.valueText(key.path()));
        }
    }

    @Test
    void schemaIsKnownAtEveryPlaceWrittenOrNot() {
        MachineDocument page = page();
        assertEquals(
                Optional.of(Dimension.SHARE),
                page.key(page.path("throws[0].chambers[0].cycle.suctionLoss"))
                        .orElseThrow()
                        .dimension());
        assertEquals(
                Optional.of(Dimension.LENGTH),
                page.key(page.path("stages.first.suctionLine.bore"))
                        .orElseThrow()
                        .dimension());
        assertEquals(
                Optional.empty(),
                page.key(page.path("throws[0].chambers[1].cycle.suctionLoss")),
                "valve-flow has none");
        assertEquals(Optional.empty(), page.key(page.path("colour")));
    }

    @Test
    void ambientPressureIsTheSitesOrTheDefault() {
        assertEquals(98_500, Samples.document(Samples.everyKey()).ambientPressure());
        assertEquals(101_325, Samples.document("{}").ambientPressure());
        assertEquals(
                101_325,
                Samples.document("{\"site\": {\"ambientPressure\": \"1 bar g\"}}")
                        .ambientPressure());
    }

    @Test
    void numberIsRefusedWhereThePageHasNone() {
        MachineDocument page = page();
        assertThrows(IllegalArgumentException.class, () -> page.withNumber(page.path("name"), 1));
        MachineDocument changed = page.withNumber(page.path("drive.mechanicalEfficiency"), 0.9);
        assertEquals(0.9, Samples.read(changed).machine().orElseThrow().drive().mechanicalEfficiency());
    }
}
