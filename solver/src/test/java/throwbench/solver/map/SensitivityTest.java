package throwbench.solver.map;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import throwbench.solver.map.Sensitivity.Influence;

class SensitivityTest {

    private static double margin(Subject subject, String id) {
        return Boosters.alone(subject.document(), Boosters.margin(id)).value().getAsDouble();
    }

    private static Sensitivity study(Subject subject, String id) {
        return Sensitivity.of(subject, Boosters.margin(id), margin(subject, id), 2, Watch.NONE)
                .orElseThrow();
    }

    private static Optional<Influence> find(Sensitivity sensitivity, String path) {
        return sensitivity.influences().stream()
                .filter(i -> i.number().path().toString().equals(path))
                .findFirst();
    }

    private static Influence influence(Sensitivity sensitivity, String path) {
        return find(sensitivity, path).orElseThrow(() -> new AssertionError(path));
    }

    private static void assertChanges(double raised, double lowered, Influence influence) {
        assertEquals(raised, influence.raised().value().getAsDouble(), 1e-12);
        assertEquals(lowered, influence.lowered().value().getAsDouble(), 1e-12);
    }

    /** Closed form: margin of l/r against 4 is l/(4 r) − 1. */
    @Test
    void ratioOfRodToCrankChangesInClosedForm() {
        Sensitivity sensitivity = study(Boosters.subject(), "rod-to-crank-ratio");
        double quarter = 400.0 / 75 / 4;

        assertChanges(0.01 * quarter, -0.01 * quarter, influence(sensitivity, "throws[0].rodLength"));
        assertChanges(
                quarter / 1.01 - quarter, quarter / 0.99 - quarter, influence(sensitivity, "throws[0].crankRadius"));
        assertEquals(0, influence(sensitivity, "throws[1].rodLength").size());
        // the limit weighs as much as the crank: 1/(4 · 0.99) and 1/(r · 0.99)
        List<String> ranked = sensitivity.influences().stream()
                .map(i -> i.number().path().toString())
                .toList();
        assertEquals(Set.of("throws[0].crankRadius", "limits.rodToCrankRatio"), Set.copyOf(ranked.subList(0, 2)));
        assertEquals("throws[0].rodLength", ranked.get(2));
    }

    /** Closed form: discharge temperature is in proportion to the suction temperature, both absolute. */
    @Test
    void temperaturesChangeByTheirAbsoluteValue() {
        Subject subject = Boosters.subject();
        Sensitivity sensitivity = study(subject, "discharge-temperature");
        double share = 1 - margin(subject, "discharge-temperature");

        assertChanges(
                -0.01 * share, 0.01 * share, influence(sensitivity, "dutyPoints[0].stages.first.suctionTemperature"));
    }

    /** Closed form: margin (v − limit)/limit with a limit of 14, 15 and 16 degrees. */
    @Test
    void anglesChangeByOneDegree() {
        Subject subject = Boosters.subject();
        Sensitivity sensitivity = study(subject, "reversal-duration");
        double value = 15 * (1 + margin(subject, "reversal-duration"));

        Influence limit = influence(sensitivity, "limits.reversalDuration");
        assertEquals(value / 16 - value / 15, limit.raised().value().getAsDouble(), 1e-9);
        assertEquals(value / 14 - value / 15, limit.lowered().value().getAsDouble(), 1e-9);
    }

    /** Second method: the file edited by hand, gauge pressures counted from absolute zero. */
    @Test
    void pressuresAndLengthsChangeAsTheEditedFileDoes() {
        Subject subject = Boosters.subject();
        double before = margin(subject, "rod-load-compression");
        Sensitivity sensitivity = study(subject, "rod-load-compression");
        // 511325 Pa and 1 % of it
        String raised = Boosters.with("\"4.1 bar g\"", "\"516438.25 Pa a\"");
        String lowered = Boosters.with("\"4.1 bar g\"", "\"506211.75 Pa a\"");
        Influence suction = influence(sensitivity, Boosters.SUCTION);
        assertEquals(
                margin(Boosters.subject(raised, 0, 0), "rod-load-compression") - before,
                suction.raised().value().getAsDouble(),
                1e-9);
        assertEquals(
                margin(Boosters.subject(lowered, 0, 0), "rod-load-compression") - before,
                suction.lowered().value().getAsDouble(),
                1e-9);
        Subject longer =
                Boosters.subject(Boosters.with("\"rodLength\": \"400 mm\"", "\"rodLength\": \"404 mm\""), 0, 0);
        assertEquals(
                margin(longer, "rod-load-compression") - before,
                influence(sensitivity, "throws[0].rodLength").raised().value().getAsDouble(),
                1e-9);
    }

    /** Second method: the mean of both changes is the central difference, whose error falls with the square of the step. */
    @Test
    void bothChangesMakeTheCentralDifference() {
        Subject subject = Boosters.subject();
        Influence speed = influence(study(subject, "rod-load-compression"), Boosters.SPEED);
        double central =
                (speed.raised().value().getAsDouble() - speed.lowered().value().getAsDouble()) / 2;
        double value = 740 * Boosters.RPM;
        Outcome more = Boosters.alone(
                subject.document().withNumber(subject.document().path(Boosters.SPEED), value * 1.001),
                Boosters.margin("rod-load-compression"));
        Outcome less = Boosters.alone(
                subject.document().withNumber(subject.document().path(Boosters.SPEED), value * 0.999),
                Boosters.margin("rod-load-compression"));

        double fine = (more.value().getAsDouble() - less.value().getAsDouble()) / 2 * 10;
        assertEquals(fine, central, 1e-3 * Math.abs(fine));
    }

    @Test
    void zerosAndWhatHasNoBearingAreLeftOut() {
        Sensitivity sensitivity = study(Boosters.subject(), "rod-load-tension");

        assertEquals(Optional.empty(), find(sensitivity, "throws[0].axisDirection"));
        assertEquals(Optional.empty(), find(sensitivity, "dutyPoints[1].speed"));
        assertEquals(Optional.empty(), find(sensitivity, "ranges.speed[0]"));
        assertTrue(find(sensitivity, "throws[1].axisDirection").isPresent());
    }

    @Test
    void influencesAreRankedAndTheImpossibleSayWhy() {
        Sensitivity sensitivity = study(Boosters.subject(), "rod-load-tension");
        List<Influence> ranked = sensitivity.influences();

        for (int i = 0; i + 1 < ranked.size(); i++) {
            assertTrue(ranked.get(i).size() >= ranked.get(i + 1).size());
        }
        Influence efficiency = influence(sensitivity, "drive.mechanicalEfficiency");
        assertEquals(
                "drive.mechanicalEfficiency: 1.01, wanted a share, as 14 %, above 0 and at most 1",
                efficiency.raised().reason());
        assertEquals(0, efficiency.lowered().value().getAsDouble());
    }

    @Test
    void anyNumberOfThreadsGivesTheSame() {
        Subject subject = Boosters.subject();
        double margin = margin(subject, "reversal-duration");
        FindingResult finding = Boosters.margin("reversal-duration");

        assertEquals(
                Sensitivity.of(subject, finding, margin, 1, Watch.NONE),
                Sensitivity.of(subject, finding, margin, 4, Watch.NONE));
    }
}
