package throwbench.solver.document.json;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Objects;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Spans of good texts, places of bad ones, and limits. */
class JsonTextTest {

    private static Flaw onlyFlaw(String text) {
        Parsed parsed = JsonText.parse(text);
        assertEquals(1, parsed.flaws().size(), parsed.flaws().toString());
        return parsed.flaws().get(0);
    }

    private static String said(String text) {
        Flaw flaw = onlyFlaw(text);
        assertTrue(JsonText.parse(text).root().isEmpty(), "followed all the same");
        return flaw.path() + ": " + flaw.found() + ", wanted " + flaw.wanted();
    }

    private static void assertSpans(String text, Node node) {
        String own = text.substring(node.start(), node.end());
        switch (node.type()) {
            case OBJECT -> assertTrue(own.startsWith("{") && own.endsWith("}"), own);
            case LIST -> assertTrue(own.startsWith("[") && own.endsWith("]"), own);
            case TEXT -> assertTrue(own.startsWith("\"") && own.endsWith("\"") && own.length() >= 2, own);
            default -> assertEquals(node.text(), own);
        }
        Node parent = node.parent();
        if (parent != null && parent.type() == Node.Type.OBJECT) {
            assertEquals('"', text.charAt(node.memberStart()));
        }
        node.members().forEach(member -> assertSpans(text, member));
    }

    @Test
    void everySpanHoldsItsValue() {
        String text =
                "{ \"a\\\"b\\\\\" : [1,-2.50e+3 , true,false,null,\"x\\\\\\\"\", [], {} ],\r\n\t\"\\u00e9\":{\"é😀\":\"ü😀\"},"
                        + "\"\":0}\n";
        Node root = JsonText.parse(text).root().orElseThrow();
        assertSpans(text, root);
        Node list = Objects.requireNonNull(root.member("a\"b\\"));
        assertEquals("-2.50e+3", list.members().get(1).text());
        assertEquals("x\\\"", list.members().get(5).text());
        assertEquals("ü😀", Objects.requireNonNull(root.member("é")).text("é😀"));
        assertEquals("0", Objects.requireNonNull(root.member("")).text());
    }

    @Test
    void spansHoldInTextsLongerThanAnyBuffer() {
        StringBuilder text = new StringBuilder("{\"l\":[");
        for (int i = 0; i < 20_000; i++) {
            text.append("\"value number ").append(i).append("\", ").append(i).append(".5,\n ");
        }
        text.append("\"").append("y".repeat(190_000)).append("\"]}");
        Node root = JsonText.parse(text.toString()).root().orElseThrow();
        assertSpans(text.toString(), root);
        assertEquals(40_001, Objects.requireNonNull(root.member("l")).members().size());
    }

    @Test
    void byteOrderMarkIsKeptAndCountsNothing() {
        String text = "\ufeff{ \"name\": \"x\" }";
        Parsed parsed = JsonText.parse(text);
        assertEquals(List.of(), parsed.flaws());
        assertSpans(text, parsed.root().orElseThrow());
    }

    @Test
    void brokenTextIsPlacedByLineAndColumn() {
        assertEquals("line 1, column 1: an empty text, wanted a JSON object { … }", said(""));
        assertEquals("line 1, column 1: an empty text, wanted a JSON object { … }", said(" \n "));
        assertEquals("line 2, column 2: no object, wanted a JSON object { … }", said("\n []"));
        assertEquals("line 1, column 1: no object, wanted a JSON object { … }", said("12"));
        assertEquals("line 3, column 1: something behind the object, wanted the end of the text", said("{}\r\n\r\n{}"));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "{¶  'a': 1¶}        | line 2, column 3: ''', wanted a key in double quotes",
                "{¶  \"a\": 1,¶}    | line 3, column 1: '}', wanted a key in double quotes",
                "{ \"a\" 1 }        | line 1, column 7: '1', wanted a colon behind the key",
                "{ \"a\": 1 \"b\" }  | line 1, column 10: '\"', wanted a comma or a closing bracket",
                "{ \"a\": 1 ]       | line 1, column 10: ']', wanted the bracket that closes what was opened last",
                "{ \"a\": 1         | line 1, column 9: the end of the text, wanted closing quotes and brackets first",
                "{ \"a\": \"b       | line 1, column 10: the end of the text, wanted closing quotes and brackets first",
                "{ \"a\": .5 }      | line 1, column 8: '.', wanted a text in double quotes, a number, true or false",
                "{ // no¶ }         | line 1, column 3: a comment, wanted JSON, which has none",
                "{} x               | line 1, column 4: something behind the object, wanted the end of the text"
            })
    void wrongSignsAreNamedWhereTheyStand(String text, String said) {
        assertEquals(said, said(text.replace('¶', '\n')));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "{¶ \"a\": 01 }       | a number that JSON does not know, wanted a number as 12.5, -3 or 1e6",
                "{¶ \"a\": +1 }       | a number that JSON does not know, wanted a number as 12.5, -3 or 1e6",
                "{¶ \"a\": 1. }       | a number that JSON does not know, wanted a number as 12.5, -3 or 1e6",
                "{¶ \"a\": tru }      | a word without quotes, wanted a text in double quotes, a number, true or false",
                "{¶ \"a\": NaN }      | a word without quotes, wanted a text in double quotes, a number, true or false",
                "{¶ \"a\": \"x\ty\" }  | a line break or control character in a text, wanted \\n, \\t or the like",
                "{¶ \"a\": \"\\q\" }   | an escape that JSON does not know, wanted \\n, \\\", \\\\, \\u00e9 or the like",
                "{¶ \"x\\udc00\": 1 }   | half a character, wanted whole Unicode characters"
            })
    void wrongValuesAreNamedInTheirLine(String text, String said) {
        String line = said(text.replace('¶', '\r'));
        assertTrue(line.startsWith("line 2, column "), line);
        assertEquals(said, line.substring(line.indexOf(':') + 2));
    }

    @Test
    void limitsRefuseWhatNoMachineNeeds() {
        String deep = "objects and lists nested too deep, wanted at most 32 levels";
        assertTrue(said("{\"a\":" + "[".repeat(100_000)).endsWith(deep));
        assertTrue(said("{\"a\":".repeat(33) + "1" + "}".repeat(33)).endsWith(deep));
        assertEquals(
                List.of(),
                JsonText.parse("{\"a\":".repeat(32) + "1" + "}".repeat(32)).flaws());
        assertTrue(said("{\"a\": \"" + "x".repeat(200_001) + "\"}")
                .endsWith("too long a text, wanted at most 200000 characters"));
        assertTrue(
                said("{\"a\": " + "1".repeat(101) + "}").endsWith("too long a number, wanted at most 100 characters"));
        assertTrue(
                said("{\"" + "k".repeat(60_000) + "\": 1}").endsWith("too long a key, wanted at most 1000 characters"));
        assertEquals(": 4194305 characters, wanted at most 4194304", said(" ".repeat(JsonText.LARGEST + 1)));
    }

    @Test
    void manyMembersAndManyElementsAreReadInTime() {
        StringBuilder text = new StringBuilder("{");
        for (int i = 0; i < 100_000; i++) {
            text.append("\"k").append(i).append("\":").append(i).append(',');
        }
        text.append("\"l\":[").append("0,".repeat(500_000)).append("0]}");
        Node root = JsonText.parse(text.toString()).root().orElseThrow();
        assertEquals("99999", Objects.requireNonNull(root.member("k99999")).text());
        assertEquals(500_001, Objects.requireNonNull(root.member("l")).members().size());
    }

    @Test
    void repeatedKeyIsAFlawAndTheFirstIsKept() {
        String text = "{ \"a\": 1, \"b\": { \"x\": 1, \"x\": 2 }, \"\\u0061\": 3 }";
        Parsed parsed = JsonText.parse(text);
        assertEquals(
                List.of("b.x", "a"), parsed.flaws().stream().map(Flaw::path).toList());
        assertEquals(
                "1",
                Objects.requireNonNull(parsed.root().orElseThrow().member("a")).text());
    }

    @Test
    void halfACharacterIsAFlawRawOrEscaped() {
        assertEquals(
                "line 1, column 8: half a character, wanted whole Unicode characters", said("{\"a\": \"\ud800\"}"));
        Flaw value = onlyFlaw("{\"a\": \"\\ud800\"}");
        assertEquals(
                "a: half a character, wanted whole Unicode characters",
                value.path() + ": " + value.found() + ", wanted " + value.wanted());
        assertEquals(List.of(), JsonText.parse("{\"a\": \"\\ud83d\\ude00\"}").flaws());
    }
}
