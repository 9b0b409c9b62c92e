package throwbench.solver.document.schema;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.schema.Schema.Entry;
import throwbench.solver.machine.LimitKey;

class SchemaTest {

    private static Entry entry(String pattern, String variant) {
        return Schema.entries().stream()
                .filter(e ->
                        e.pattern().equals(pattern) && e.variant().orElse("").equals(variant))
                .findFirst()
                .orElseThrow(() -> new AssertionError("no key " + pattern));
    }

    @Test
    void holdsEveryKeyOfThePageAndNoOther() throws IOException {
        Set<String> page = new TreeSet<>();
        try (InputStream in = SchemaTest.class.getResourceAsStream("../keys-of-the-page.txt")) {
            String text = new String(Objects.requireNonNull(in).readAllBytes(), StandardCharsets.UTF_8);
            text.lines().filter(line -> !line.startsWith("#")).forEach(page::add);
        }
        Set<String> schema = new TreeSet<>();
        for (Entry entry : Schema.entries()) {
            schema.add(entry.pattern()
                    + entry.variant().map(word -> " {" + word + "}").orElse(""));
        }
        assertEquals(page, schema);
    }

    @Test
    void noKeyIsListedTwice() {
        Set<String> seen = new HashSet<>();
        for (Entry entry : Schema.entries()) {
            assertTrue(seen.add(entry.pattern() + entry.variant()), entry.pattern());
        }
    }

    @Test
    void everyKeyHasAMeaningOfOneSentence() {
        for (Entry entry : Schema.entries()) {
            String meaning = entry.key().meaning();
            assertTrue(meaning.endsWith(".") && meaning.indexOf(". ") < 0, entry.pattern() + ": " + meaning);
        }
    }

    @Test
    void everyLimitIsAKeyOfTheMachine() {
        Set<String> limits = new HashSet<>();
        for (Entry entry : Schema.entries()) {
            if (entry.pattern().startsWith("limits.")) {
                limits.add(entry.key().name());
            }
        }
        for (LimitKey key : LimitKey.values()) {
            assertTrue(limits.remove(key.text()), key.text());
        }
        assertEquals(Set.of(), limits);
    }

    @Test
    void limitsHaveTheDimensionsOfTheirFindings() {
        assertEquals(
                Optional.of(Dimension.FORCE),
                entry("limits.rodTension", "").key().dimension());
        assertEquals(
                Optional.of(Dimension.ANGLE),
                entry("limits.reversalDuration", "").key().dimension());
        assertEquals(
                Optional.of(Dimension.SHARE),
                entry("limits.reversalRatio", "").key().dimension());
        assertEquals(
                Optional.of(Dimension.TEMPERATURE),
                entry("limits.dischargeTemperature", "").key().dimension());
        assertEquals(
                Optional.of(Dimension.SPEED),
                entry("limits.meanPistonSpeed", "").key().dimension());
        assertEquals(
                Optional.of(Dimension.STRESS),
                entry("limits.guidePressure", "").key().dimension());
        assertEquals(
                Optional.of(Dimension.HEAD),
                entry("limits.suctionHead", "").key().dimension());
        assertEquals(
                Optional.of(Dimension.MASS_FLOW),
                entry("limits.capacity", "").key().dimension());
        assertEquals(
                Optional.of(Dimension.POWER),
                entry("limits.shaftPower", "").key().dimension());
        assertEquals(
                Optional.of(Dimension.TORQUE),
                entry("limits.shakingCouplePrimary", "").key().dimension());
        assertEquals(
                Optional.of(Dimension.NUMBER),
                entry("limits.pistonRodFatigue", "").key().dimension());
    }

    @Test
    void oneKeyMayDifferByTheKindOfItsObject() {
        String loss = "throws[].chambers[].cycle.suctionLoss";
        assertEquals(
                Optional.of(Dimension.SHARE), entry(loss, "ideal-valves").key().dimension());
        assertEquals(
                Optional.of(Dimension.PRESSURE_DIFFERENCE),
                entry(loss, "liquid").key().dimension());
    }

    @Test
    void defaultsAreThoseOfThePage() {
        assertEquals(
                101_325, entry("site.ambientPressure", "").key().defaultValue().orElseThrow());
        assertEquals(
                1, entry("drive.mechanicalEfficiency", "").key().defaultValue().orElseThrow());
        assertEquals("counter-clockwise", entry("drive.rotation", "").key().otherwise());
        List<String> zero = List.of(
                "throws[].crankPhase",
                "throws[].axisDirection",
                "throws[].shaftPosition",
                "throws[].guideOffset",
                "throws[].masses.pistonRod",
                "throws[].masses.crosshead",
                "throws[].crank.unbalance",
                "throws[].crank.counterweight",
                "throws[].friction.packing",
                "throws[].friction.guideCoefficient",
                "throws[].chambers[].innerDiameter",
                "throws[].chambers[].flowAllowance");
        for (String pattern : zero) {
            assertEquals(0, entry(pattern, "").key().defaultValue().orElseThrow(), pattern);
        }
    }
}
