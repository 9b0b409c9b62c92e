package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import throwbench.solver.finding.BearingPressure;
import throwbench.solver.finding.Criterion;
import throwbench.solver.finding.Finding;
import throwbench.solver.finding.JudgedDuty;
import throwbench.solver.finding.Judgement;
import throwbench.solver.finding.PeakLoad;
import throwbench.solver.finding.ReversalDuration;
import throwbench.solver.finding.Verdict;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.LimitKey;

class FindingsTextTest {

    private static final String LONG = "spring tide, both pockets open, second stage unloaded by a third of its flow";

    private static List<DutyPoint> duties(int count, String name) {
        List<DutyPoint> duties = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            duties.add(new DutyPoint(name + " " + i, 70, Map.of(), Map.of()));
        }
        return duties;
    }

    private static String text(String machine, List<DutyPoint> duties, List<Finding> findings) throws IOException {
        List<Finding> sorted = new ArrayList<>(findings);
        sorted.sort(Comparator.comparingDouble(f -> f.margin().orElse(Double.POSITIVE_INFINITY)));
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        new FindingsText(machine, duties, new Judgement(sorted, List.of())).writeTo(out);
        return out.toString(StandardCharsets.UTF_8);
    }

    private static Finding onThrow(Criterion criterion, String duty, String name, double value, double limit) {
        return Finding.judged(
                criterion,
                Finding.Place.ofThrow(duty, name),
                value,
                OptionalDouble.of(limit),
                OptionalDouble.of(1.25),
                "the span in compression governs");
    }

    @Test
    void twoHundredDutyPointsWithLongNamesStayOnePageOfAHundredColumns() throws IOException {
        List<DutyPoint> duties = duties(200, LONG);
        List<Finding> findings = new ArrayList<>();
        for (int i = 0; i < duties.size(); i++) {
            for (String name : List.of("A", "B, the one at the far end of the shaft", "C".repeat(150))) {
                String duty = duties.get(i).name();
                findings.add(onThrow(PeakLoad.ROD_TENSION, duty, name, 100e3 + 200 * i, 120e3));
                findings.add(onThrow(new ReversalDuration(), duty, name, 5 + i, 15));
            }
        }
        List<String> lines = text("M".repeat(230), duties, findings).lines().toList();

        assertTrue(lines.size() < 75, lines.size() + " lines");
        for (String line : lines) {
            assertTrue(line.length() <= 100, line);
        }
        assertTrue(lines.stream().anyMatch(line -> line.startsWith("            not met at 10 of 200 duty points: ")));
        assertTrue(lines.stream().anyMatch(line -> line.endsWith("and 5 more")), String.join("\n", lines));
        assertTrue(lines.stream()
                .anyMatch(line -> line.startsWith("327 of 1200 judged findings are not met; worst: reversal, span")));
    }

    @Test
    void columnsStandUnderEachOther() throws IOException {
        List<String> rows = text(
                        "m",
                        duties(1, "d"),
                        List.of(
                                onThrow(PeakLoad.ROD_TENSION, "d", "A", 98765, 120e3),
                                onThrow(PeakLoad.ROD_COMPRESSION, "d", "Bb", 1e6, 12e6),
                                onThrow(new ReversalDuration(), "d", "A", 15, 15)))
                .lines()
                .filter(line -> line.startsWith("met"))
                .toList();

        assertEquals(
                List.of(
                        "met         reversal, span         throw A     15 deg  at least    15 deg    0.0 %",
                        "met         rod load, tension      throw A   98.76 kN  at most     120 kN  +17.7 %",
                        "met         rod load, compression  throw Bb   1000 kN  at most   12000 kN  +91.7 %"),
                rows);
    }

    @Test
    void aMarginThatRoundsToNothingKeepsItsSign() throws IOException {
        String text = text(
                "m", duties(1, "d"), List.of(onThrow(PeakLoad.ROD_TENSION, "d", "A", 120e3 * (1 + 3.4e-5), 120e3)));

        assertTrue(text.contains("NOT MET     rod load, tension  throw A  120 kN  at most  120 kN  -0.003 %\n"), text);
        assertTrue(
                text.contains("1 of 1 judged findings is not met; worst: rod load, tension of throw A, -0.003 %.\n"),
                text);
    }

    @Test
    void againstALimitOfZeroTheMarginIsADifferenceInItsUnit() throws IOException {
        String text = text("m", duties(1, "d"), List.of(onThrow(new ReversalDuration(), "d", "A", 12.5, 0)));

        assertTrue(text.contains("met         reversal, span  throw A  12.5 deg  at least  0 deg  12.5 deg\n"), text);
        assertTrue(
                text.contains("crank angle 71.6 deg; the span in compression governs;"
                        + " margin is the difference, the\n            limit being 0\n"),
                text);
    }

    @Test
    void withoutAnyLimitNothingIsJudged() throws IOException {
        Finding open = Finding.judged(
                PeakLoad.GAS_TENSION,
                Finding.Place.ofThrow("d 0", "A"),
                5e3,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                "");

        assertTrue(text("m", duties(1, "d"), List.of(open))
                .contains("\nNothing is judged: no limit is given for what could be found.\nResults support, "));
    }

    @Test
    void whatStagesChambersAndTheMachineComeToIsNamedSo() throws IOException {
        List<Finding> findings = List.of(
                at(Optional.of("first"), Optional.empty()),
                at(Optional.empty(), Optional.of("A head")),
                at(Optional.empty(), Optional.empty()));
        List<String> rows = text("m", duties(1, "d"), findings)
                .lines()
                .filter(l -> l.startsWith("met "))
                .toList();

        assertEquals(
                List.of(
                        "met         temperature  stage first     146.9 degC  at most  149.9 degC  +0.7 %",
                        "met         temperature  chamber A head  146.9 degC  at most  149.9 degC  +0.7 %",
                        "met         temperature  machine         146.9 degC  at most  149.9 degC  +0.7 %"),
                rows);
    }

    private static Finding at(Optional<String> stage, Optional<String> chamber) {
        return new Finding(
                new Temperature(),
                new Finding.Place("d", stage, Optional.empty(), chamber),
                OptionalDouble.of(420),
                OptionalDouble.of(423),
                OptionalDouble.of(3.0 / 423),
                OptionalDouble.empty(),
                Verdict.MET,
                "");
    }

    @Test
    void aFindingWithoutAValueShowsADash() throws IOException {
        Finding unknown = new Finding(
                new Temperature(),
                new Finding.Place("d", Optional.empty(), Optional.empty(), Optional.of("A head")),
                OptionalDouble.empty(),
                OptionalDouble.of(423.15),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                Verdict.NOT_JUDGED,
                "needs a suctionTemperature");
        String text = text("m", duties(1, "d"), List.of(unknown));

        assertTrue(text.contains("""
                not judged  temperature  chamber A head  -  at most  150 degC
                            needs a suctionTemperature
                """), text);
    }

    @Test
    void throwsThatLackTheSameInputShareARowAndOthersDoNot() throws IOException {
        List<Finding> findings = new ArrayList<>();
        for (String name : List.of("A", "B", "C")) {
            for (String duty : List.of("d 0", "d 1")) {
                String reason = name.equals("C") ? "crossheadPart.pinDiameter is missing" : "both are missing";
                findings.add(Finding.unknown(
                        BearingPressure.CROSSHEAD_PIN,
                        Finding.Place.ofThrow(duty, name),
                        OptionalDouble.of(7e6),
                        reason));
            }
        }
        String text = text("m", duties(2, "d"), findings);
        assertTrue(text.contains("""
                not judged  crosshead pin pressure  throw A, B  -  at most  7 MPa
                            both are missing
                not judged  crosshead pin pressure  throw C     -  at most  7 MPa
                            crossheadPart.pinDiameter is missing

                """), text);
    }

    @Test
    void lineBreaksInNamesDoNotBreakTheTable() throws IOException {
        String text = text(
                "two\nlines", duties(2, "x\ny"), List.of(onThrow(PeakLoad.ROD_TENSION, "x\ny 0", "A\tB\nC", 1, 2)));

        assertTrue(
                text.startsWith("two lines at 2 duty points\n\nmet         rod load, tension  throw A B C  1 N"), text);
        assertTrue(text.contains("at \"x y 0\", crank angle 71.6 deg"), text);
    }

    /** A criterion in kelvin, which is shown in degrees Celsius. */
    private record Temperature() implements Criterion {
        @Override
        public String id() {
            return "discharge-temperature";
        }

        @Override
        public String title() {
            return "temperature";
        }

        @Override
        public String formula() {
            return "T";
        }

        @Override
        public String source() {
            return "API 618";
        }

        @Override
        public LimitKey limitKey() {
            return LimitKey.DISCHARGE_TEMPERATURE;
        }

        @Override
        public boolean limitIsGreatest() {
            return true;
        }

        @Override
        public String unit() {
            return "K";
        }

        @Override
        public OptionalDouble defaultLimit() {
            return OptionalDouble.empty();
        }

        @Override
        public List<Finding> judge(JudgedDuty duty) {
            return List.of();
        }
    }
}
