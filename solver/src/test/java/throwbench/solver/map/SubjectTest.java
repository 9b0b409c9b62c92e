package throwbench.solver.map;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import throwbench.solver.document.KeyPath;

class SubjectTest {

    /** Values of the duty points' own numbers, and of others, on both sides of what the rules allow. */
    private static final Map<String, List<Double>> VALUES = Map.of(
            "drive.speed", List.of(60.0, 0.0, -5.0),
            "dutyPoints[0].speed", List.of(50.0, 0.0),
            "dutyPoints[1].speed", List.of(40.0),
            "dutyPoints[0].stages.first.suctionPressure", List.of(4e5, 1.2e6, 1.3e6, 0.0, -1.0),
            "dutyPoints[0].stages.first.dischargePressure", List.of(9e5, 5.0e5, 4.9e5),
            "dutyPoints[0].stages.first.suctionTemperature", List.of(280.0, 0.0),
            "throws[0].crankRadius", List.of(0.08),
            "throws[0].chambers[1].clearance", List.of(0.002),
            "dutyPoints[0].chambers.A head.addedClearance", List.of(0.1));

    /** Identity: a number changed in the described machine, against the same number written into the file. */
    @Test
    void everyNumberDoesWhatItDoesInTheFile() {
        for (int duty = 0; duty < 2; duty++) {
            Subject subject = Boosters.subject(Boosters.text(), duty, 0);
            for (Map.Entry<String, List<Double>> entry : VALUES.entrySet()) {
                Variable variable = Boosters.variable(subject, entry.getKey());
                for (double value : entry.getValue()) {
                    assertSame(subject, List.of(new Setting(variable, value)));
                }
            }
        }
    }

    @Test
    void severalNumbersAtOnceDoWhatTheyDoInTheFile() {
        Subject subject = Boosters.subject();
        assertSame(
                subject,
                List.of(
                        new Setting(Boosters.variable(subject, Boosters.SUCTION), 6e5),
                        new Setting(Boosters.variable(subject, "dutyPoints[0].stages.first.dischargePressure"), 1.5e6),
                        new Setting(Boosters.variable(subject, Boosters.SPEED), 70)));
        assertSame(
                subject,
                List.of(
                        new Setting(Boosters.variable(subject, Boosters.SUCTION), 6e5),
                        new Setting(Boosters.variable(subject, "throws[0].friction.packing"), 800),
                        new Setting(Boosters.variable(subject, "throws[0].masses.piston"), 30)));
    }

    private static void assertSame(Subject subject, List<Setting> settings) {
        Map<KeyPath, Double> numbers = new LinkedHashMap<>();
        settings.forEach(s -> numbers.put(s.variable().path(), s.value()));
        for (String text : List.of("rod_load_N.max", "reversal-ratio", "capacity", "discharge-temperature")) {
            Result result = Boosters.result(subject, text);
            Outcome read =
                    subject.settle(subject.document().withNumbers(numbers)).ask(result.probe(0));
            assertEquals(read, subject.with(settings).ask(result.probe(0)), () -> text + " with " + settings);
        }
    }

    @Test
    void whatBelongsElsewhereHasNoBearing() {
        Subject normal = Boosters.subject();
        Subject slow = Boosters.subject(Boosters.text(), 1, 0);

        assertTrue(normal.bears(Boosters.variable(normal, Boosters.SPEED)));
        assertFalse(slow.bears(Boosters.variable(slow, Boosters.SPEED)));
        assertTrue(normal.bears(Boosters.variable(normal, Boosters.SUCTION)));
        assertFalse(slow.bears(Boosters.variable(slow, Boosters.SUCTION)));
        assertFalse(normal.bears(Boosters.variable(normal, "ranges.speed[0]")));
        assertTrue(normal.bears(Boosters.variable(normal, "limits.rodTension")));
    }

    @Test
    void severalFaultsAreOneSentence() {
        Subject subject = Boosters.subject();
        Subject.Attempt attempt = subject.with(List.of(
                new Setting(Boosters.variable(subject, "throws[0].masses.piston"), -1),
                new Setting(Boosters.variable(subject, "throws[1].masses.piston"), -2)));

        assertEquals(
                "throws[0].masses.piston: \"-1 kg\", wanted a mass, as \"38 kg\", 0 or more; and 1 more",
                attempt.reason());
    }
}
