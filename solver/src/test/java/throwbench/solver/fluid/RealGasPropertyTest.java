package throwbench.solver.fluid;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.function.DoubleUnaryOperator;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Assume;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;

/** Identities of thermodynamics that any equation of state must obey; derivatives by differences of fourth order. */
class RealGasPropertyTest {

    private static final double R = PerfectGas.MOLAR_GAS_CONSTANT;

    /** Relative step: rounding costs 1e-10; near the critical point, where quantities bend within 1 %, the order 1e-8. */
    private static final double STEP = 1e-4;

    @Provide
    Arbitrary<GasMixture> mixtures() {
        Arbitrary<List<String>> names = Arbitraries.of(
                        "methane",
                        "ethane",
                        "propane",
                        "nitrogen",
                        "carbon dioxide",
                        "hydrogen",
                        "carbon monoxide",
                        "oxygen",
                        "hydrogen sulfide",
                        "argon",
                        "ethylene",
                        "helium",
                        "n-butane")
                .list()
                .uniqueElements()
                .ofMinSize(1)
                .ofMaxSize(5);
        Arbitrary<List<Double>> weights =
                Arbitraries.doubles().between(0.02, 1).list().ofSize(5);
        return Combinators.combine(names, weights).as(RealGasPropertyTest::mixture);
    }

    private static GasMixture mixture(List<String> names, List<Double> weights) {
        double sum = weights.subList(0, names.size()).stream()
                .mapToDouble(Double::doubleValue)
                .sum();
        Map<String, Double> fractions = new LinkedHashMap<>();
        for (int i = 0; i < names.size(); i++) {
            fractions.put(names.get(i), weights.get(i) / sum);
        }
        return new GasMixture(fractions, true);
    }

    private static double slope(DoubleUnaryOperator f, double x) {
        double h = STEP * x;
        double near = f.applyAsDouble(x + h) - f.applyAsDouble(x - h);
        double far = f.applyAsDouble(x + 2 * h) - f.applyAsDouble(x - 2 * h);
        return (8 * near - far) / (12 * h);
    }

    /**
     * The state, or an abandoned try where it is not gas all around, or so near the critical point that the heat capacity is
     * many times the ideal one and a difference quotient says nothing.
     */
    private static GasState state(RealGas gas, double temperature, double pressure) {
        for (double t : new double[] {1 - 3 * STEP, 1 + 3 * STEP}) {
            for (double p : new double[] {1 - 3 * STEP, 1 + 3 * STEP}) {
                Assume.that(gas.at(temperature * t, pressure * p).value().isPresent());
            }
        }
        GasState state = gas.at(temperature, pressure).value().orElseThrow();
        Assume.that(state.heatCapacityRatio() < 3);
        return state;
    }

    private static double compressibility(RealGas gas, double temperature, double pressure) {
        return gas.compressibility(temperature, pressure).value().orElseThrow();
    }

    /** (g − g°)/(R T). */
    private static double gibbs(RealGas gas, double temperature, double pressure) {
        GasState state = gas.at(temperature, pressure).value().orElseThrow();
        return (state.enthalpyDeparture() / temperature - state.entropyDeparture()) / R;
    }

    @Property
    void gibbsAndHelmholtzAgree(
            @ForAll("mixtures") GasMixture mixture,
            @ForAll @DoubleRange(min = 300, max = 480) double temperature,
            @ForAll @DoubleRange(min = 0.5e5, max = 120e5) double pressure) {
        RealGas gas = RealGas.of(mixture);
        GasState state = state(gas, temperature, pressure);
        double slope = temperature * slope(t -> gibbs(gas, t, pressure), temperature);
        assertEquals(-state.enthalpyDeparture() / (R * temperature), slope, 1e-6, "T d(g/RT)/dT = -h/RT");
    }

    @Property
    void freeEnthalpyRisesWithPressureByTheVolume(
            @ForAll("mixtures") GasMixture mixture,
            @ForAll @DoubleRange(min = 300, max = 480) double temperature,
            @ForAll @DoubleRange(min = 0.5e5, max = 120e5) double pressure) {
        RealGas gas = RealGas.of(mixture);
        GasState state = state(gas, temperature, pressure);
        double slope = pressure * slope(p -> gibbs(gas, temperature, p), pressure);
        assertEquals(state.compressibility() - 1, slope, 1e-6, "p d(g/RT)/dp = Z - 1");
    }

    @Property
    void entropyFallsWithPressureAsVolumeGrowsWithTemperature(
            @ForAll("mixtures") GasMixture mixture,
            @ForAll @DoubleRange(min = 300, max = 480) double temperature,
            @ForAll @DoubleRange(min = 0.5e5, max = 120e5) double pressure) {
        RealGas gas = RealGas.of(mixture);
        GasState state = state(gas, temperature, pressure);
        double entropy = pressure
                / R
                * slope(p -> gas.at(temperature, p).value().orElseThrow().entropyDeparture(), pressure);
        double volume = temperature * slope(t -> compressibility(gas, t, pressure), temperature);
        assertEquals(1 - state.compressibility() - volume, entropy, 1e-5, "Maxwell: ds/dp = -dv/dT");
    }

    @Property
    void heatCapacityIsTheSlopeOfTheEnthalpy(
            @ForAll("mixtures") GasMixture mixture,
            @ForAll @DoubleRange(min = 300, max = 480) double temperature,
            @ForAll @DoubleRange(min = 0.5e5, max = 120e5) double pressure) {
        RealGas gas = RealGas.of(mixture);
        GasState state = state(gas, temperature, pressure);
        double slope = slope(t -> gas.at(t, pressure).value().orElseThrow().enthalpyDeparture(), temperature);
        double ideal = R * Composition.of(mixture).heatCapacity(temperature);
        assertEquals(state.heatCapacity() - ideal, slope, 1e-5 * state.heatCapacity());
    }

    @Property
    void heatCapacitiesDifferByWhatTheVolumeDoes(
            @ForAll("mixtures") GasMixture mixture,
            @ForAll @DoubleRange(min = 300, max = 480) double temperature,
            @ForAll @DoubleRange(min = 0.5e5, max = 120e5) double pressure) {
        RealGas gas = RealGas.of(mixture);
        GasState state = state(gas, temperature, pressure);
        double z = state.compressibility();
        double byT = z + temperature * slope(t -> compressibility(gas, t, pressure), temperature);
        double byP = z - pressure * slope(p -> compressibility(gas, temperature, p), pressure);
        double constantVolume = state.heatCapacity() / state.heatCapacityRatio();
        assertEquals(R * byT * byT / byP, state.heatCapacity() - constantVolume, 1e-5 * state.heatCapacity());
    }

    @Property
    void thinGasIsPerfect(
            @ForAll("mixtures") GasMixture mixture, @ForAll @DoubleRange(min = 300, max = 480) double temperature) {
        RealGas gas = RealGas.of(mixture);
        // second virial coefficients stay below 1e-3 m3/mol here, so that B p/(R T) is below 1e-5 at 10 Pa
        assertEquals(1, compressibility(gas, temperature, 10), 1e-5);
        IsentropicCompression step =
                gas.isentropic(10, temperature, 10.001).value().orElseThrow();
        double k = mixture.perfectAt(temperature).value().orElseThrow().isentropicExponent();
        assertEquals(k, step.temperatureExponent(), 1e-4);
        assertEquals(k, step.volumeExponent(), 1e-4);
    }

    @Property
    void orderOfTheFractionsDoesNotMatter(@ForAll("mixtures") GasMixture mixture, @ForAll long seed) {
        List<String> names = new ArrayList<>(mixture.moleFractions().keySet());
        Collections.shuffle(names, new Random(seed));
        Map<String, Double> other = new LinkedHashMap<>();
        names.forEach(name -> other.put(name, mixture.moleFractions().get(name)));
        GasState here = state(RealGas.of(mixture), 380, 30e5);
        GasState there = state(RealGas.of(new GasMixture(other, true)), 380, 30e5);
        assertEquals(here.compressibility(), there.compressibility(), 1e-13);
        assertEquals(here.heatCapacityRatio(), there.heatCapacityRatio(), 1e-12);
        assertEquals(here.entropyDeparture(), there.entropyDeparture(), 1e-12);
    }

    @Property
    void mixtureOfOneGasIsThatGas(@ForAll("mixtures") GasMixture mixture) {
        String name = mixture.moleFractions().keySet().iterator().next();
        Gas gas = GasTable.find(name).orElseThrow();
        Composition alone = Composition.of(new GasMixture(Map.of(name, 1.0), true));
        CriticalPoint point = LeeKesler.of(alone).critical();
        assertEquals(gas.critical().temperature(), point.temperature(), 1e-12 * point.temperature());
        assertEquals(gas.critical().pressure(), point.pressure(), 1e-12 * point.pressure());
        assertEquals(gas.critical().acentricFactor(), point.acentricFactor(), 1e-15);
        assertEquals(gas.molarMass(), alone.molarMass(), 1e-15);
    }
}
