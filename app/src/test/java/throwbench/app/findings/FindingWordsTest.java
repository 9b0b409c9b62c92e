package throwbench.app.findings;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import throwbench.solver.document.quantity.UnitSystem;
import throwbench.solver.finding.Criterion;
import throwbench.solver.finding.Finding;
import throwbench.solver.finding.JudgedDuty;
import throwbench.solver.finding.Judgement;
import throwbench.solver.finding.PeakLoad;
import throwbench.solver.finding.ReversalDuration;
import throwbench.solver.finding.ReversalRatio;
import throwbench.solver.finding.Verdict;
import throwbench.solver.machine.LimitKey;

/** Findings in words: met, not met and not judged, in SI and US units. */
class FindingWordsTest {

    private static final Finding.Place PLACE = Finding.Place.ofThrow("normal", "A");

    private final FindingWords si = new FindingWords(UnitSystem.SI);
    private final FindingWords us = new FindingWords(UnitSystem.US);

    private static Finding finding(Criterion criterion, double value, OptionalDouble limit) {
        return Finding.judged(criterion, PLACE, value, limit, OptionalDouble.empty(), "");
    }

    @Test
    void aSpanMetSaysLeastAndHowMuchMore() {
        Finding met = finding(new ReversalDuration(), 75.8, OptionalDouble.of(15));
        assertEquals("met", FindingWords.verdict(met.verdict()));
        assertEquals("75.8°", si.value(met));
        assertEquals("least 15° · margin +405 %", si.held(met));
        assertEquals("least 15° · margin +405 %", us.held(met));
    }

    @Test
    void aShareNotMetSaysPercent() {
        Finding missed = finding(new ReversalRatio(), 0.021, OptionalDouble.of(0.03));
        assertEquals("not met", FindingWords.verdict(missed.verdict()));
        assertEquals("2.10 %", si.value(missed));
        assertEquals("least 3 % · margin –30 %", si.held(missed));
    }

    @Test
    void aLoadSaysMostInTheUnitsShown() {
        Finding met = finding(PeakLoad.ROD_COMPRESSION, 96_200, OptionalDouble.of(120_000));
        assertEquals("96.2 kN", si.value(met));
        assertEquals("most 120 kN · margin +20 %", si.held(met));
        // 1 lbf = 4.4482216152605 N exactly: 96.2 kN = 21 627 lbf, 120 kN = 26 980 lbf to four figures
        assertEquals("21627 lbf", us.value(met));
        assertEquals("most 26980 lbf · margin +20 %", us.held(met));
    }

    @Test
    void aLoadWithoutLimitIsNotJudgedAndSaysWhy() {
        Finding open = finding(PeakLoad.GAS_TENSION, 60_900, OptionalDouble.empty());
        assertEquals("not judged", FindingWords.verdict(open.verdict()));
        assertEquals("60.9 kN", si.value(open));
        assertEquals("no limit given", si.held(open));
    }

    @Test
    void aValueThatIsMissingIsADash() {
        Finding missing = new Finding(
                PeakLoad.ROD_TENSION,
                PLACE,
                OptionalDouble.empty(),
                OptionalDouble.of(1e5),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                Verdict.NOT_JUDGED,
                "free length missing");
        assertEquals("–", si.value(missing));
        assertEquals("free length missing", si.held(missing));
    }

    @Test
    void nothingIsWrittenInTheUnitOfItsLimit() {
        Finding none = finding(PeakLoad.ROD_TENSION, 0, OptionalDouble.of(120_000));
        assertEquals("0 kN", si.value(none));
        Finding never = finding(new ReversalRatio(), 0, OptionalDouble.of(0.03));
        assertEquals("0.00 %", si.value(never));
        assertEquals("least 3 % · margin –100 %", si.held(never));
    }

    @Test
    void smallMarginsKeepATenth() {
        Finding close = finding(PeakLoad.ROD_TENSION, 118_000, OptionalDouble.of(120_000));
        assertEquals("most 120 kN · margin +1.7 %", si.held(close));
        Finding exact = finding(PeakLoad.ROD_TENSION, 120_000, OptionalDouble.of(120_000));
        assertEquals("most 120 kN · margin 0.0 %", si.held(exact));
    }

    @Test
    void aLimitOfZeroGivesTheDifferenceItself() {
        Finding head = finding(new Stub("suction-head", "m", false), 1.2, OptionalDouble.of(0));
        assertEquals("least 0 m · margin +1.20 m", si.held(head));
        // 1 ft = 0.3048 m exactly
        assertEquals("least 0 ft · margin +3.94 ft", us.held(head));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "discharge-temperature  | K    | 425.55 | 152 °C     | 306 °F",
                "crank-pin-pressure     | Pa   | 7.9e6  | 7.90 MPa   | 1146 psi",
                "rod-to-crank-ratio     | 1    | 5.333  | 5.33       | 5.33",
                "speed-fluctuation      | 1    | 0.012  | 1.20 %     | 1.20 %",
                "mean-piston-speed      | m/s  | 3.7    | 3.70 m/s   | 728 ft/min",
                "shaft-power            | W    | 81000  | 81.0 kW    | 109 hp",
                "capacity               | kg/s | 0.42   | 0.420 kg/s | 3333 lb/h",
                "shaking-couple-primary | N m  | 2400   | 2.40 kN·m  | 1770 lbf·ft"
            })
    void everyUnitOfACriterionIsWrittenAsPeopleReadIt(String id, String unit, double value, String inSi, String inUs) {
        Finding finding = finding(new Stub(id, unit, true), value, OptionalDouble.empty());
        assertEquals(inSi, si.value(finding));
        assertEquals(inUs, us.value(finding));
    }

    @Test
    void everyCriterionOfTheSolverHasWords() {
        for (Criterion criterion : Judgement.CRITERIA) {
            Finding judged = finding(criterion, 1.25, OptionalDouble.of(2));
            assertFalse(si.value(judged).isEmpty() || us.value(judged).isEmpty(), criterion.id());
            String least = criterion.limitIsGreatest() ? "most " : "least ";
            assertTrue(si.held(judged).startsWith(least) && us.held(judged).startsWith(least), criterion.id());
        }
    }

    /** A criterion with an id and a unit alone. */
    private record Stub(String id, String unit, boolean limitIsGreatest) implements Criterion {

        @Override
        public String title() {
            return id;
        }

        @Override
        public String formula() {
            return id;
        }

        @Override
        public String source() {
            return "a test";
        }

        @Override
        public LimitKey limitKey() {
            return LimitKey.SUCTION_HEAD;
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
