package throwbench.solver.finding;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.Reversal;
import throwbench.solver.revolution.Traces;
import throwbench.solver.trial.Machines;

/** Findings against the quantities that they judge. */
class JudgementTest {

    private static final Set<String> UNITS = Set.of("N", "N m", "deg", "1", "K", "m/s", "Pa", "m", "kg/s", "W");

    private static Machine booster(Limits machineLimits, Limits throwLimits) {
        Throw t = Machines.boosterThrow(0);
        Throw limited = new Throw(
                t.name(),
                t.place(),
                t.linkage(),
                t.masses(),
                t.connectingRod(),
                t.crank(),
                t.friction(),
                t.chambers(),
                t.parts(),
                throwLimits);
        return Machines.of(
                List.of(limited),
                Rotation.COUNTER_CLOCKWISE,
                Machines.booster(0).site(),
                Machines.boosterDuty(Map.of()),
                machineLimits);
    }

    private static Finding only(Judgement judgement, String id) {
        List<Finding> found = judgement.findings().stream()
                .filter(f -> f.criterion().id().equals(id))
                .toList();
        assertEquals(1, found.size(), id);
        return found.get(0);
    }

    private static Judgement judge(Machine machine) {
        return Judgement.of(machine, machine.dutyPoints());
    }

    @Test
    void peakLoadsAreTheExtremesOfTheirColumns() {
        Machine machine = booster(Limits.NONE, Limits.NONE);
        Traces traces = Traces.of(Machines.running(machine), 0, Optional.empty());
        Judgement judgement = judge(machine);
        Extremes rod = Extremes.of(traces.column(Column.ROD_LOAD));
        Extremes gas = Extremes.of(traces.column(Column.GAS_LOAD));
        assertPeak(
                only(judgement, "rod-load-tension"),
                rod.greatest().value(),
                rod.greatest().crankAngle());
        assertPeak(
                only(judgement, "rod-load-compression"),
                -rod.least().value(),
                rod.least().crankAngle());
        assertPeak(
                only(judgement, "gas-load-tension"),
                gas.greatest().value(),
                gas.greatest().crankAngle());
        assertPeak(
                only(judgement, "gas-load-compression"),
                -gas.least().value(),
                gas.least().crankAngle());
    }

    private static void assertPeak(Finding finding, double value, double angle) {
        assertEquals(value, finding.value().orElseThrow(), 1e-9 * value);
        assertEquals(angle, finding.angle().orElseThrow(), 1e-9);
        assertEquals(Verdict.NOT_JUDGED, finding.verdict());
        assertEquals(OptionalDouble.empty(), finding.margin());
        assertTrue(finding.note().contains("no limit given"), finding.note());
    }

    @Test
    void reversalIsJudgedByDefaultInDegreesAndAsAShare() {
        Machine machine = booster(Limits.NONE, Limits.NONE);
        Traces traces = Traces.of(Machines.running(machine), 0, Optional.empty());
        Reversal reversal = Reversal.of(Traces.rodLoad(traces.revolution()));
        Judgement judgement = judge(machine);
        Finding duration = only(judgement, "reversal-duration");
        double degrees = Math.toDegrees(reversal.duration());
        assertEquals(degrees, duration.value().orElseThrow(), 1e-9);
        // API 618, 5th edition (2007), 6.6.4: 15 degrees and 3 %
        assertEquals(15, duration.limit().orElseThrow());
        assertEquals((degrees - 15) / 15, duration.margin().orElseThrow(), 1e-12);
        Finding ratio = only(judgement, "reversal-ratio");
        assertEquals(reversal.ratio(), ratio.value().orElseThrow(), 1e-12);
        assertEquals(0.03, ratio.limit().orElseThrow());
        assertEquals((reversal.ratio() - 0.03) / 0.03, ratio.margin().orElseThrow(), 1e-12);
        assertEquals(Verdict.MET, duration.verdict());
        assertTrue(judgement.allMet());
    }

    @Test
    void throwsOwnLimitGoesBeforeTheMachines() {
        Limits wide = new Limits(Map.of(LimitKey.ROD_TENSION, 120e3, LimitKey.REVERSAL_DURATION, Math.toRadians(20)));
        Limits own = new Limits(Map.of(LimitKey.ROD_TENSION, 10e3));
        Judgement judgement = judge(booster(wide, own));
        Finding tension = only(judgement, "rod-load-tension");
        double value = tension.value().orElseThrow();
        assertEquals(10e3, tension.limit().orElseThrow());
        assertEquals((10e3 - value) / 10e3, tension.margin().orElseThrow(), 1e-12);
        assertEquals(Verdict.NOT_MET, tension.verdict());
        assertFalse(judgement.allMet());
        assertEquals(
                20, only(judgement, "reversal-duration").limit().orElseThrow(), 1e-12, "limits of angles in degrees");
    }

    @Test
    void leastMarginComesFirstAndUnjudgedLast() {
        Limits limits = new Limits(Map.of(LimitKey.ROD_TENSION, 10e3, LimitKey.ROD_COMPRESSION, 1e6));
        List<Finding> findings = judge(booster(limits, Limits.NONE)).findings();
        List<Double> margins = new ArrayList<>();
        findings.forEach(f -> margins.add(f.margin().orElse(Double.POSITIVE_INFINITY)));
        List<Double> sorted = margins.stream().sorted(Comparator.naturalOrder()).toList();
        assertEquals(sorted, margins);
        assertEquals("rod-load-tension", findings.get(0).criterion().id());
    }

    @Test
    void valueMetExactlyIsMet() {
        Criterion greatest = PeakLoad.ROD_TENSION;
        Criterion least = new ReversalRatio();
        Finding.Place place = Finding.Place.ofThrow("normal", "A");
        OptionalDouble nowhere = OptionalDouble.empty();
        assertEquals(
                Verdict.MET,
                Finding.judged(greatest, place, 5, OptionalDouble.of(5), nowhere, "")
                        .verdict());
        assertEquals(
                Verdict.MET,
                Finding.judged(least, place, 5, OptionalDouble.of(5), nowhere, "")
                        .verdict());
        assertEquals(
                Verdict.NOT_MET,
                Finding.judged(greatest, place, Math.nextUp(5.0), OptionalDouble.of(5), nowhere, "")
                        .verdict());
        assertEquals(
                Verdict.NOT_MET,
                Finding.judged(least, place, Math.nextDown(5.0), OptionalDouble.of(5), nowhere, "")
                        .verdict());
    }

    @Test
    void marginAgainstZeroIsTheDifference() {
        Finding.Place place = Finding.Place.ofThrow("normal", "A");
        Finding finding =
                Finding.judged(PeakLoad.ROD_TENSION, place, 7, OptionalDouble.of(0), OptionalDouble.empty(), "why");
        assertEquals(-7, finding.margin().orElseThrow());
        assertEquals("why; margin is the difference, the limit being 0", finding.note());
    }

    /** Completeness: each criterion has its own id, words, source and key. */
    @Test
    void everyCriterionSaysWhatItIsAndWhereItComesFrom() {
        Set<String> ids = new HashSet<>();
        for (Criterion criterion : Judgement.CRITERIA) {
            assertTrue(ids.add(criterion.id()), () -> criterion.id() + " stands twice");
            assertTrue(criterion.id().matches("[a-z]+(-[a-z]+)*"), criterion.id());
            assertFalse(criterion.title().isBlank(), criterion.id());
            assertFalse(criterion.formula().isBlank(), criterion.id());
            assertFalse(criterion.source().isBlank(), criterion.id());
            assertTrue(UNITS.contains(criterion.unit()), criterion.id() + " in " + criterion.unit());
        }
    }

    @Test
    void everyLimitOfTheMachineFileLimitsOneCriterionInTheSameOrder() {
        assertEquals(
                List.of(LimitKey.values()),
                Judgement.CRITERIA.stream().map(Criterion::limitKey).toList());
        for (Criterion criterion : Judgement.CRITERIA) {
            boolean ofALoad = criterion instanceof PeakLoad;
            String key =
                    criterion.limitKey().text().replaceAll("([A-Z])", "-$1").toLowerCase(Locale.ROOT);
            assertEquals(ofALoad ? key.replace("-", "-load-") : key, criterion.id());
        }
    }

    /** Completeness: the id of each criterion stands in a test of the findings. */
    @Test
    void everyCriterionHasATest() throws IOException {
        Path here = Path.of(Optional.ofNullable(System.getProperty("basedir")).orElse(""))
                .resolve("src/test/java/throwbench/solver/finding");
        StringBuilder tests = new StringBuilder();
        try (Stream<Path> files = Files.list(here)) {
            for (Path file : files.sorted().toList()) {
                tests.append(Files.readString(file));
            }
        }
        for (Criterion criterion : Judgement.CRITERIA) {
            assertTrue(tests.indexOf('"' + criterion.id()) >= 0, criterion.id() + " is in no test");
        }
    }

    @Test
    void whatIsReportedWithoutALimitIsNotJudged() {
        for (String id : List.of("capacity", "indicated-power", "shaft-power", "shaking-force-primary")) {
            Finding finding = only(judge(booster(Limits.NONE, Limits.NONE)), id);
            assertEquals(Verdict.NOT_JUDGED, finding.verdict());
            assertTrue(finding.value().isPresent(), id);
            assertTrue(finding.note().endsWith("no limit given"), finding.note());
        }
    }
}
