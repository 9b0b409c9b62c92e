package throwbench.solver.fluid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.function.DoublePredicate;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every value that the fluids are held against from outside. */
class FluidCheckValuesTest {

    private static final double R = PerfectGas.MOLAR_GAS_CONSTANT;

    /** How each quantity of the rows is computed here. */
    private static final Map<String, ToDoubleFunction<CheckRow>> COMPUTED = Map.ofEntries(
            Map.entry("molar mass", row -> gas(row).molarMass() * 1000),
            Map.entry("critical temperature", row -> gas(row).critical().temperature()),
            Map.entry("critical pressure", row -> gas(row).critical().pressure()),
            Map.entry("acentric factor", row -> gas(row).critical().acentricFactor()),
            Map.entry("ideal-gas heat capacity", row -> gas(row).heatCapacity().at(row.number("T_K")) * R),
            Map.entry("ideal-gas k", FluidCheckValuesTest::perfectExponent),
            Map.entry("real-gas c_p/c_v", row -> known(
                            RealGas.of(alone(row.text("gas"))).at(row.number("T_K"), row.number("p_Pa")))
                    .heatCapacityRatio()),
            Map.entry("Lee-Kesler Z0", row -> reduced(LeeKeslerFluid.SIMPLE, row)),
            Map.entry("Lee-Kesler Z1", FluidCheckValuesTest::slope),
            Map.entry("Lee-Kesler molar volume", row -> leeKesler(row).compressibility() * molarVolume(row)),
            Map.entry("Lee-Kesler enthalpy departure", row -> leeKesler(row).enthalpy() * R * row.number("T_K")),
            Map.entry("Lee-Kesler entropy departure", row -> leeKesler(row).entropy() * R),
            Map.entry(
                    "Peng-Robinson molar volume",
                    row -> cubic(row)
                                    .compressibility(
                                            row.number("T_K"),
                                            row.number("p_Pa"),
                                            row.text("phase").equals("gas"))
                            * molarVolume(row)),
            Map.entry("Peng-Robinson compressibility", row -> new PengRobinson(Composition.of(row.mixture()))
                    .compressibility(row.number("T_K"), row.number("p_Pa"), true)),
            Map.entry(
                    "compressibility",
                    row -> known(RealGas.of(row.mixture()).compressibility(row.number("T_K"), row.number("p_Pa")))),
            Map.entry("isentropic discharge temperature", row -> isentropic(row).dischargeTemperature()),
            Map.entry("temperature exponent", row -> isentropic(row).temperatureExponent()),
            Map.entry("volume exponent", row -> isentropic(row).volumeExponent()),
            Map.entry("dew pressure", FluidCheckValuesTest::dewPressure),
            Map.entry("Lee-Kesler vapour pressure", FluidCheckValuesTest::vapourPressure),
            Map.entry("liquid bulk modulus", row -> liquid(row).bulkModulus()),
            Map.entry("liquid density", row -> liquid(row).density()),
            Map.entry("liquid vapour pressure", row -> liquid(row).vapourPressure()));

    static List<CheckRow> rows() throws IOException {
        return CheckRow.all();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void everyRowIsMet(CheckRow row) {
        double computed = computed(row);
        assertTrue(
                Math.abs(row.error(computed)) <= row.tolerance(),
                () -> row + ": computed " + computed + ", off by " + row.error(computed) + ", allowed "
                        + row.tolerance() + " because: " + row.why());
    }

    @Test
    void everyQuantityHasRowsAndEveryRowAQuantity() throws IOException {
        Set<String> inRows = rows().stream().map(CheckRow::quantity).collect(Collectors.toSet());
        assertEquals(COMPUTED.keySet(), inRows);
    }

    @Test
    void everyRowHasItsOwnIdASourceAStatusAndAReasonForItsTolerance() throws IOException {
        List<CheckRow> rows = rows();
        assertEquals(rows.size(), rows.stream().map(CheckRow::id).distinct().count(), "ids are unique");
        for (CheckRow row : rows) {
            assertTrue(
                    row.source().length() > 10
                            && row.status().length() > 3
                            && row.why().length() > 5,
                    row::toString);
        }
    }

    static double computed(CheckRow row) {
        return Objects.requireNonNull(COMPUTED.get(row.quantity()), row::quantity)
                .applyAsDouble(row);
    }

    static <T> T known(Answer<T> answer) {
        return answer.value().orElseThrow(() -> new AssertionError(answer.reason()));
    }

    static GasMixture alone(String gas) {
        return new GasMixture(Map.of(gas, 1.0), true);
    }

    private static Gas gas(CheckRow row) {
        return GasTable.find(row.text("gas")).orElseThrow();
    }

    private static Liquid liquid(CheckRow row) {
        return LiquidTable.find(row.text("liquid")).orElseThrow().liquid();
    }

    private static double perfectExponent(CheckRow row) {
        return known(alone(row.text("gas")).perfectAt(row.number("T_K"))).isentropicExponent();
    }

    private static double reduced(LeeKeslerFluid fluid, CheckRow row) {
        double t = row.number("Tr");
        return fluid.departures(t, fluid.gasDensity(t, row.number("Pr")).orElseThrow())
                .compressibility();
    }

    private static double slope(CheckRow row) {
        return (reduced(LeeKeslerFluid.REFERENCE, row) - reduced(LeeKeslerFluid.SIMPLE, row))
                / LeeKeslerFluid.REFERENCE_ACENTRIC_FACTOR;
    }

    private static CriticalPoint critical(CheckRow row) {
        return new CriticalPoint(row.number("Tc_K"), row.number("pc_Pa"), row.number("omega"));
    }

    private static Departures leeKesler(CheckRow row) {
        return new LeeKesler(critical(row))
                .gas(row.number("T_K"), row.number("p_Pa"))
                .orElseThrow();
    }

    /** With the source's own R. */
    private static double molarVolume(CheckRow row) {
        return row.number("R") * row.number("T_K") / row.number("p_Pa");
    }

    private static PengRobinson cubic(CheckRow row) {
        Gas methane = GasTable.find("methane").orElseThrow();
        Gas gas = new Gas("of the row", List.of(), 0.05, critical(row), methane.heatCapacity(), row.source());
        return new PengRobinson(new Composition(List.of(gas), List.of(1.0)));
    }

    private static IsentropicCompression isentropic(CheckRow row) {
        return known(RealGas.of(row.mixture()).isentropic(row.number("p_Pa"), row.number("T_K"), row.number("pd_Pa")));
    }

    private static double dewPressure(CheckRow row) {
        PengRobinson phases = new PengRobinson(Composition.of(row.mixture()));
        double temperature = row.number("T_K");
        return climb(row, p -> phases.condensing(temperature, p, 0).isPresent());
    }

    private static double vapourPressure(CheckRow row) {
        LeeKesler gas = new LeeKesler(gas(row).critical());
        return climb(row, p -> gas.isLiquid(row.number("T_K"), p));
    }

    /** The first pressure at which something happens, in steps of 0.05 % from 80 % of the row's value. */
    private static double climb(CheckRow row, DoublePredicate happens) {
        return DoubleStream.iterate(0.8 * row.value(), p -> p < 1.3 * row.value(), p -> p + 5e-4 * row.value())
                .filter(happens)
                .findFirst()
                .orElseThrow(() -> new AssertionError(row + ": nothing happens"));
    }
}
