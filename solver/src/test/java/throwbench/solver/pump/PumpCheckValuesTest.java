package throwbench.solver.pump;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.Side;
import throwbench.solver.fluid.Liquid;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Site;
import throwbench.solver.machine.SuctionLine;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.trial.CheckRows;
import throwbench.solver.trial.CheckRows.Row;
import throwbench.solver.trial.Pumps;

/** Every value that the pumps are held against from outside. */
class PumpCheckValuesTest {

    private static final double INCH = 0.0254;
    private static final double FOOT = 12 * INCH;
    private static final double US_GALLON = 231 * INCH * INCH * INCH;
    private static final double PSI = 0.45359237 * 9.80665 / (INCH * INCH);
    private static final double RPM = Math.PI / 30;

    /** Long enough for a pure sine to 1e-5, short enough to keep eleven digits of the travel. */
    private static final double LONG_ROD = 1e5;

    private static final Map<String, ToDoubleFunction<Row>> COMPUTED = Map.ofEntries(
            Map.entry("flow above the mean", row -> 100 * variation(row).above()),
            Map.entry("flow below the mean", row -> 100 * variation(row).below()),
            Map.entry("acceleration head constant", PumpCheckValuesTest::constant),
            Map.entry("acceleration head by the handbook", PumpCheckValuesTest::byHandbook),
            Map.entry("theoretical flow", row -> theoreticalFlow(row, 0)),
            Map.entry("slip", PumpCheckValuesTest::slip),
            Map.entry("head below the atmosphere at the start of the stroke", PumpCheckValuesTest::atStart),
            Map.entry("head below the atmosphere at mid-stroke", PumpCheckValuesTest::atMidStroke),
            Map.entry("greatest speed without separation", PumpCheckValuesTest::separationSpeed),
            Map.entry("volumetric efficiency", PumpCheckValuesTest::efficiency),
            Map.entry("volumetric efficiency less slip", row -> efficiency(row) - row.number("slip")));

    static List<Row> rows() throws IOException {
        return CheckRows.of("/throwbench/solver/published/pump-check-values.json");
    }

    @ParameterizedTest
    @MethodSource("rows")
    void everyRowIsMet(Row row) {
        double computed = Objects.requireNonNull(COMPUTED.get(row.quantity()), row::quantity)
                .applyAsDouble(row);
        assertTrue(
                row.error(computed) <= row.tolerance(),
                () -> row + ": computed " + computed + ", off by " + row.error(computed) + ", allowed "
                        + row.tolerance() + " because: " + row.why());
    }

    @Test
    void everyQuantityHasRowsAndEveryRowASourceAndItsOwnId() throws IOException {
        List<Row> rows = rows();
        assertEquals(COMPUTED.keySet(), rows.stream().map(Row::quantity).collect(Collectors.toSet()));
        assertEquals(rows.size(), rows.stream().map(Row::id).distinct().count(), "ids are unique");
        for (Row row : rows) {
            assertTrue(
                    row.source().length() > 10
                            && row.status().length() > 3
                            && row.why().length() > 5,
                    row::toString);
        }
    }

    @Test
    void handbookConstantsAreThoseOfTheRows() throws IOException {
        Set<String> met = rows().stream()
                .filter(row -> row.quantity().equals("acceleration head constant"))
                .filter(row -> !row.id().endsWith("-exact"))
                .filter(row ->
                        PumpArrangement.constantOf(pump(row), Pumps.STAGE).equals(OptionalDouble.of(row.value())))
                .map(row -> row.text("pump"))
                .collect(Collectors.toSet());
        assertEquals(
                Set.of(
                        "simplex single-acting",
                        "simplex double-acting",
                        "duplex single-acting",
                        "duplex double-acting",
                        "triplex",
                        "quintuplex",
                        "septuplex",
                        "nonuplex"),
                met);
        assertEquals(PumpArrangement.values().length, met.size());
    }

    /** The pump of a row, with ideal valves and a liquid that does not give. */
    private static RunningMachine pump(Row row) {
        double ratio = row.number("rodToCrank");
        List<Throw> throwsInOrder =
                switch (row.text("pump")) {
                    case "simplex single-acting" -> Pumps.plungers(ratio, Pumps.IDEAL, 0);
                    case "simplex double-acting" -> Pumps.pistons(ratio, Pumps.IDEAL, 0);
                    case "duplex single-acting" -> Pumps.plungers(ratio, Pumps.IDEAL, 0, 180);
                    case "duplex double-acting" -> Pumps.pistons(ratio, Pumps.IDEAL, 0, 90);
                    case "triplex" -> equally(ratio, 3);
                    case "quadruplex" -> equally(ratio, 4);
                    case "quintuplex" -> equally(ratio, 5);
                    case "sextuplex" -> equally(ratio, 6);
                    case "septuplex" -> equally(ratio, 7);
                    case "nonuplex" -> equally(ratio, 9);
                    default -> throw new AssertionError(row.text("pump"));
                };
        return Pumps.running(throwsInOrder, Pumps.duty(Pumps.RIGID));
    }

    private static List<Throw> equally(double ratio, int count) {
        return Pumps.plungers(ratio, Pumps.IDEAL, Pumps.equallySpaced(count));
    }

    private static FlowVariation variation(Row row) {
        return FlowVariation.ofDelivery(pump(row), Pumps.STAGE).value().orElseThrow();
    }

    /**
     * C of a rigid column: max |dQ/dt| = C (60 s/2π) ω mean. An in-line linkage runs alike both ways round, so the steepest fall
     * of the suction flow is the steepest rise of the delivery.
     */
    private static double constant(Row row) {
        RunningMachine running = pump(row);
        ManifoldFlow drawn = ManifoldFlow.suction(running, Pumps.STAGE).value().orElseThrow();
        ManifoldFlow delivered =
                ManifoldFlow.discharge(running, Pumps.STAGE).value().orElseThrow();
        double steepest =
                Math.max(drawn.greatestRise().value(), delivered.greatestRise().value());
        return Math.PI / 30 * steepest / (running.meanSpeed() * drawn.mean());
    }

    private static double byHandbook(Row row) {
        double bore = row.number("bore_in") * INCH;
        double velocity = row.number("flow_galUS_min") * US_GALLON / 60 / (Math.PI / 4 * bore * bore);
        double head = AccelerationHead.byHandbook(
                row.number("length_ft") * FOOT,
                velocity,
                row.number("speed_rpm") * RPM,
                row.number("C"),
                row.number("K"));
        return head / FOOT * Site.STANDARD_GRAVITY / (row.number("g_ft_s2") * FOOT);
    }

    private static Throw plunger(double diameter, double stroke, double rodToCrank, Clearance clearance, double slip) {
        Chamber barrel = new Chamber(
                "barrel", Side.HEAD, Optional.of(Pumps.STAGE), diameter, 0, clearance, Pumps.IDEAL, slip, Limits.NONE);
        return Pumps.throwOf("P", 0, new Linkage(stroke / 2, stroke / 2 * rodToCrank, 0), List.of(barrel));
    }

    private static RunningMachine sarkar(Row row, double allowance) {
        Throw plunger = plunger(
                row.number("plunger_mm") / 1000,
                row.number("stroke_mm") / 1000,
                5,
                new Clearance(0.2, true),
                allowance);
        return Pumps.running(List.of(plunger), Pumps.duty(Pumps.RIGID).at(row.number("speed_rpm") * RPM));
    }

    private static double theoreticalFlow(Row row, double allowance) {
        return ManifoldFlow.discharge(sarkar(row, allowance), Pumps.STAGE)
                .value()
                .orElseThrow()
                .mean();
    }

    /** The flow allowance with which the pump passes the measured flow. */
    private static double slip(Row row) {
        double measured = row.number("flow_L_s") / 1000;
        double swept = theoreticalFlow(row, 0);
        return 100
                * new BrentSolver(1e-14)
                        .solve(
                                100,
                                allowance -> VolumetricEfficiency.ofStage(sarkar(row, allowance), Pumps.STAGE)
                                                        .orElseThrow()
                                                * swept
                                        - measured,
                                0,
                                0.5);
    }

    /** A pump on a suction line, whose liquid parts at a pressure this far below the atmosphere. */
    private static RunningMachine onLine(Row row, double speed) {
        double bore = row.number("pipe_mm") / 1000;
        double diameter = row.inputs().containsKey("plunger_mm")
                ? row.number("plunger_mm") / 1000
                : bore * Math.sqrt(row.number("pistonToPipeArea"));
        double parting = row.inputs().containsKey("separation_kPa") ? row.number("separation_kPa") * 1000 : 1e5;
        SuctionLine line = new SuctionLine(
                OptionalDouble.of(row.number("length_m")),
                OptionalDouble.of(bore),
                -row.number("lift_m"),
                0,
                OptionalDouble.of(101_325),
                OptionalDouble.empty());
        Throw plunger = plunger(diameter, row.number("stroke_mm") / 1000, LONG_ROD, new Clearance(0.2, true), 0);
        Pumps.Duty duty =
                new Pumps.Duty(new Liquid(1000, 1e30, 101_325 - parting), speed, 101_325, 5e5, line, Map.of());
        return Pumps.running(List.of(plunger), duty);
    }

    private static SuctionHead head(RunningMachine running) {
        return SuctionHead.of(running, Pumps.STAGE).value().orElseThrow();
    }

    private static double atStart(Row row) {
        double solved = head(onLine(row, row.number("speed_rpm") * RPM)).solved();
        return row.number("lift_m") + solved * Site.STANDARD_GRAVITY / row.number("g_m_s2");
    }

    private static double atMidStroke(Row row) {
        RunningMachine running = onLine(row, row.number("speed_rpm") * RPM);
        double bore = row.number("pipe_mm") / 1000;
        double flow =
                ManifoldFlow.suction(running, Pumps.STAGE).value().orElseThrow().at(Math.PI / 2, Approach.JUST_AFTER);
        double velocity = flow / (Math.PI / 4 * bore * bore);
        // Fanning's friction head 4 f L v²/(2 g d)
        double friction = 4
                * row.number("fanningFactor")
                * row.number("length_m")
                * velocity
                * velocity
                / (2 * row.number("g_m_s2") * bore);
        return row.number("lift_m") + friction;
    }

    private static double separationSpeed(Row row) {
        double g = row.number("g_m_s2") / Site.STANDARD_GRAVITY;
        double lift = row.number("lift_m");
        // with another g every head but the lift changes by the ratio
        return new BrentSolver(1e-12)
                        .solve(100, speed -> (head(onLine(row, speed)).available() + lift) / g - lift, 0.1, 20)
                / RPM;
    }

    private static double efficiency(Row row) {
        double cubicInch = INCH * INCH * INCH;
        double displacement = Math.PI / 4 * 9 * 5;
        assertEquals(row.number("displacement_in3"), displacement, 5e-4, "3 in x 5 in, as the source rounds it");
        Throw plunger = plunger(
                row.number("plunger_in") * INCH,
                row.number("stroke_in") * INCH,
                5,
                new Clearance(row.number("clearance_in3") * cubicInch, false),
                0);
        Pumps.Duty duty = new Pumps.Duty(
                new Liquid(983, PSI / row.number("compressibility_per_psi"), 2e4),
                31,
                2e5,
                2e5 + row.number("rise_psi") * PSI,
                Pumps.NO_LINE,
                Map.of());
        return VolumetricEfficiency.ofStage(Pumps.running(List.of(plunger), duty), Pumps.STAGE)
                .orElseThrow();
    }
}
