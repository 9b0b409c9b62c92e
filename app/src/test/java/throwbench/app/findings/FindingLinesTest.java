package throwbench.app.findings;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.List;
import org.junit.jupiter.api.Test;
import throwbench.app.bench.Shown;
import throwbench.app.bench.ShownMachines;
import throwbench.solver.finding.Finding;

class FindingLinesTest {

    private final Shown shown = ShownMachines.shown(ShownMachines.booster(), 0);

    private static String criterion(FindingLine line) {
        return line.finding().criterion().id();
    }

    @Test
    void everyCriterionShowsItsWorstDutyPointFirst() {
        List<FindingLine> lines = new FindingLines().of(shown.findings());
        assertEquals(
                lines.size(),
                new HashSet<>(lines.stream().map(FindingLinesTest::criterion).toList()).size());
        for (FindingLine line : lines) {
            assertTrue(line.head());
            long all = shown.findings().stream()
                    .filter(f -> f.criterion().id().equals(criterion(line)))
                    .count();
            assertEquals(all - 1, line.others());
            double margin = line.finding().margin().orElse(Double.POSITIVE_INFINITY);
            for (Finding other : shown.findings()) {
                if (other.criterion().id().equals(criterion(line))) {
                    assertTrue(margin <= other.margin().orElse(Double.POSITIVE_INFINITY));
                }
            }
        }
        for (int i = 1; i < lines.size(); i++) {
            assertTrue(lines.get(i - 1).finding().margin().orElse(Double.POSITIVE_INFINITY)
                    <= lines.get(i).finding().margin().orElse(Double.POSITIVE_INFINITY));
        }
    }

    @Test
    void spreadingListsEveryFindingOfThatCriterionUnderIt() {
        FindingLines lines = new FindingLines();
        int before = lines.of(shown.findings()).size();
        lines.toggleSpread("reversal-duration");
        List<FindingLine> spread = lines.of(shown.findings());
        assertEquals(before + 1, spread.size());
        int head = spread.stream().map(FindingLinesTest::criterion).toList().indexOf("reversal-duration");
        assertTrue(spread.get(head).spread());
        assertFalse(spread.get(head + 1).head());
        assertEquals("reversal-duration", criterion(spread.get(head + 1)));
        lines.toggleSpread("reversal-duration");
        assertEquals(before, lines.of(shown.findings()).size());
    }

    @Test
    void whatIsOpenStaysOpenInTheNextState() {
        FindingLines lines = new FindingLines();
        Finding worst = shown.findings().get(0);
        lines.toggleOpen(worst);
        Shown next = ShownMachines.shown(ShownMachines.booster(), 1);
        assertTrue(lines.of(next.findings()).get(0).open());
        lines.toggleOpen(worst);
        assertFalse(lines.of(next.findings()).get(0).open());
    }

    @Test
    void inputsNameSpeedLinkageMassesAndPressuresInTheUnitsShown() {
        Finding finding = shown.findings().stream()
                .filter(f -> f.where().duty().equals("normal"))
                .findFirst()
                .orElseThrow();
        assertEquals(
                List.of(
                        "speed 740 rpm",
                        "crank radius 75 mm, rod length 400 mm",
                        "piston and rod 62 kg, crosshead 42 kg",
                        "A head: bore 320 mm, 5.113 bar a to 12.51 bar a, working",
                        "A crank: bore 320 mm, 5.113 bar a to 12.51 bar a, working"),
                new FindingInputs(shown.machine(), shown.units()).of(finding));
    }
}
