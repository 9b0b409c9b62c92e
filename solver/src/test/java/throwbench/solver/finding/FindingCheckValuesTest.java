package throwbench.solver.finding;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import throwbench.solver.finding.PistonRodBuckling.Strut;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.trial.CheckRows;
import throwbench.solver.trial.CheckRows.Row;
import throwbench.solver.trial.DrivenMachines;
import throwbench.solver.trial.Machines;

/** Formulas and default limits of the criteria against values printed elsewhere; a failure names the row and its source. */
class FindingCheckValuesTest {

    private static final Map<String, ToDoubleFunction<Row>> COMPUTED = Map.ofEntries(
            Map.entry("slenderness of a round bar", row -> round(row).slenderness()),
            Map.entry("transition slenderness", row -> round(row).transition()),
            Map.entry("critical load of a round bar", row -> round(row).criticalLoad()),
            Map.entry("Euler load of a round bar", row -> round(row).euler()),
            Map.entry("allowable load of a column", FindingCheckValuesTest::allowable),
            // an axial load over a square: side² = safety × use at 1 m²
            Map.entry("square side by modified Goodman", row -> Math.sqrt(row.number("safety") * use(row, 1, 1))),
            // a bending moment over π d³/32
            Map.entry(
                    "diameter in bending by modified Goodman",
                    row -> Math.cbrt(row.number("safety") * use(row, 32 / Math.PI, 32 / Math.PI))),
            Map.entry("modified Goodman factor of a round bar", FindingCheckValuesTest::factor),
            Map.entry("mean piston speed", FindingCheckValuesTest::pistonSpeed),
            Map.entry(
                    "default limit of reversal-duration",
                    row -> new ReversalDuration().defaultLimit().orElseThrow()),
            Map.entry(
                    "default limit of reversal-ratio",
                    row -> new ReversalRatio().defaultLimit().orElseThrow()),
            Map.entry(
                    "default limit of discharge-temperature",
                    row -> new DischargeTemperature().defaultLimit().orElseThrow()),
            Map.entry("limit of discharge-temperature for a light gas", row -> DischargeTemperature.LIGHT_GAS_LIMIT));

    private static Strut round(Row row) {
        return PistonRodBuckling.roundRod(
                row.number("diameter"),
                row.number("length"),
                row.number("elasticModulus"),
                row.number("yieldStrength"));
    }

    private static double allowable(Row row) {
        double gyration = Math.sqrt(row.number("secondMoment") / row.number("area"));
        Strut strut = new Strut(
                row.number("area"),
                row.number("endFactor") * row.number("length") / gyration,
                row.number("elasticModulus"),
                row.number("yieldStrength"));
        return strut.criticalLoad() / row.number("safety");
    }

    /** @param perAmplitude stress per load */
    private static double use(Row row, double perAmplitude, double perMean) {
        return PistonRodFatigue.goodman(
                perAmplitude * row.number("amplitude"),
                perMean * row.number("mean"),
                row.number("enduranceLimit"),
                row.number("ultimateStrength"));
    }

    private static double factor(Row row) {
        double stress = row.number("stressConcentration") / PistonRod.area(row.number("bar"));
        return 1 / use(row, stress, stress);
    }

    private static double pistonSpeed(Row row) {
        Throw t = Machines.boosterThrow(0);
        double r = row.number("stroke") / 2;
        Throw geared = Machines.changed(t, "A", t.place(), new Linkage(r, 5 * r, 0), t.friction(), t.chambers());
        Machine m = Machines.booster(0);
        DutyPoint duty = DrivenMachines.at(m.dutyPoints().get(0), row.number("speed"));
        Machine machine = Machines.changed(m, List.of(geared), m.drive().rotation(), m.site(), duty);
        return new MeanPistonSpeed()
                .judge(new JudgedDuty(Machines.running(machine)))
                .get(0)
                .value()
                .orElseThrow();
    }

    static Stream<Row> rows() throws IOException {
        return CheckRows.of("/throwbench/solver/published/finding-check-values.json").stream();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void formulasAndLimitsAreThePublishedOnes(Row row) {
        double ours = COMPUTED.getOrDefault(row.quantity(), any -> Double.NaN).applyAsDouble(row);
        assertTrue(row.error(ours) <= row.tolerance(), () -> "we have " + ours + " for " + row);
    }

    @Test
    void everyRowIsComputedAndHasItsSource() throws IOException {
        Set<String> ids = new HashSet<>();
        Set<String> asked = new HashSet<>();
        rows().forEach(row -> {
            assertTrue(ids.add(row.id()), () -> row.id() + " stands twice");
            assertTrue(COMPUTED.containsKey(row.quantity()), () -> "nothing computes " + row);
            assertFalse(
                    row.source().isBlank()
                            || row.why().isBlank()
                            || row.status().isBlank(),
                    row::id);
            asked.add(row.quantity());
        });
        assertEquals(COMPUTED.keySet(), asked);
        assertEquals(20, ids.size(), "rows");
    }
}
