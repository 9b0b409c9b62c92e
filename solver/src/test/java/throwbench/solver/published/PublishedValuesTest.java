package throwbench.solver.published;

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

/** The solver against figures printed elsewhere; a failure names the row and its source. */
class PublishedValuesTest {

    /** What the solver makes of a row, SI, by file and quantity. */
    private static final Map<String, Map<String, ToDoubleFunction<PublishedRow>>> COMPUTED = Map.of(
            "kinematics.json", KinematicExamples.BY_QUANTITY,
            "forces.json", ForceExamples.BY_QUANTITY,
            "compressor.json", CompressorExamples.BY_QUANTITY,
            "flywheel.json", FlywheelExamples.BY_QUANTITY,
            "balancing.json", BalancingExamples.BY_QUANTITY);

    /** Closed forms agree to rounding; a compressor's work is a quadrature, some of its rows a search. */
    private static double exactTolerance(String file) {
        return file.equals("compressor.json") ? 1e-6 : 1e-9;
    }

    static Stream<PublishedRow> kinematics() throws IOException {
        return PublishedRow.read("kinematics.json").stream();
    }

    static Stream<PublishedRow> forces() throws IOException {
        return PublishedRow.read("forces.json").stream();
    }

    static Stream<PublishedRow> compressor() throws IOException {
        return PublishedRow.read("compressor.json").stream();
    }

    static Stream<PublishedRow> flywheel() throws IOException {
        return PublishedRow.read("flywheel.json").stream();
    }

    static Stream<PublishedRow> balancing() throws IOException {
        return PublishedRow.read("balancing.json").stream();
    }

    @ParameterizedTest
    @MethodSource
    void kinematics(PublishedRow row) {
        check("kinematics.json", row);
    }

    @ParameterizedTest
    @MethodSource
    void forces(PublishedRow row) {
        check("forces.json", row);
    }

    @ParameterizedTest
    @MethodSource
    void compressor(PublishedRow row) {
        check("compressor.json", row);
    }

    @ParameterizedTest
    @MethodSource
    void flywheel(PublishedRow row) {
        check("flywheel.json", row);
    }

    @ParameterizedTest
    @MethodSource
    void balancing(PublishedRow row) {
        check("balancing.json", row);
    }

    private static void check(String file, PublishedRow row) {
        ToDoubleFunction<PublishedRow> computed =
                COMPUTED.getOrDefault(file, Map.of()).get(row.quantity());
        double ours = PrintedQuantity.printed(computed.applyAsDouble(row), row.unit());
        // what vanishes is printed as a share: of rounding of what cancelled there is left 1e-9
        double size = row.exact() == 0 ? 1 : Math.abs(row.exact());
        assertEquals(row.exact(), ours, exactTolerance(file) * size, () -> "exact value of " + row);
        if (row.published().isPresent()) {
            double printed = row.published().getAsDouble();
            double reach = row.tolerance() * (printed == 0 ? 1 : Math.abs(printed));
            assertEquals(printed, ours, reach, () -> "printed value of " + row + ": " + row.note());
        }
    }

    static Stream<PublishedRow> twoTerm() throws IOException {
        return kinematics()
                .filter(row -> row.approx().isPresent() && KinematicExamples.TWO_TERM.containsKey(row.quantity()));
    }

    /** The second column of many examples: the handbook's short formula. */
    @ParameterizedTest
    @MethodSource
    void twoTerm(PublishedRow row) {
        double series = KinematicExamples.TWO_TERM
                .getOrDefault(row.quantity(), any -> 0)
                .applyAsDouble(row);
        double ours = PrintedQuantity.printed(series, row.unit());
        double approx = row.approx().orElseThrow();
        assertEquals(approx, ours, 1e-9 * approx, () -> "two-term value of " + row);
    }

    @Test
    void everyRowIsComputedAndHasItsSource() throws IOException {
        Set<String> ids = new HashSet<>();
        for (String file : COMPUTED.keySet()) {
            Map<String, ToDoubleFunction<PublishedRow>> byQuantity = COMPUTED.getOrDefault(file, Map.of());
            Set<String> asked = new HashSet<>();
            for (PublishedRow row : PublishedRow.read(file)) {
                assertTrue(ids.add(row.id()), () -> row.id() + " stands twice");
                assertTrue(byQuantity.containsKey(row.quantity()), () -> "nothing computes " + row);
                assertFalse(row.source().isBlank(), () -> row.id() + " has no source");
                assertFalse(row.status().isBlank(), () -> row.id() + " does not say whether it was seen");
                assertEquals(row.published().isPresent(), row.tolerance() > 0, () -> row.id() + " needs a tolerance");
                asked.add(row.quantity());
            }
            assertEquals(Set.of(), difference(byQuantity.keySet(), asked), () -> "computed for no row of " + file);
        }
        assertEquals(239, ids.size(), "rows");
    }

    private static Set<String> difference(Set<String> all, Set<String> some) {
        Set<String> left = new HashSet<>(all);
        left.removeAll(some);
        return left;
    }

    @Test
    void inputsAreReadWithTheirUnits() {
        assertEquals(0.2, PrintedQuantity.allIn("200 mm").get(0).si());
        assertEquals(
                List.of(120_000.0, 298.0),
                PrintedQuantity.allIn("120 kPa a, 298 K").stream()
                        .map(PrintedQuantity::si)
                        .toList());
        assertEquals(0.05, PrintedQuantity.allIn("1/20").get(0).si());
        assertEquals(6.894757293168361e3, PrintedQuantity.allIn("1 psi").get(0).si(), 1e-9);
    }
}
