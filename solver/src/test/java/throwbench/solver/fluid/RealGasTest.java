package throwbench.solver.fluid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static throwbench.solver.fluid.FluidCheckValuesTest.alone;
import static throwbench.solver.fluid.FluidCheckValuesTest.known;

import java.io.IOException;
import java.util.Collections;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.apache.commons.math3.analysis.integration.SimpsonIntegrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RealGasTest {

    private static final double R = PerfectGas.MOLAR_GAS_CONSTANT;

    private static final GasMixture BIOGAS = new GasMixture(Map.of("methane", 0.62, "carbon dioxide", 0.38), true);

    // second methods

    /** At constant entropy dh = v dp: the enthalpy gained must be the area under the volumes on the way. */
    @ParameterizedTest
    @CsvSource({
        "propane, 300, 4e5, 14e5",
        "carbon dioxide, 305, 20e5, 70e5",
        "nitrogen, 300, 100e5, 300e5",
        "ammonia, 290, 4e5, 14e5"
    })
    void workOfIsentropicCompressionIsTheEnthalpyGained(String name, double ts, double ps, double pd) {
        RealGas gas = RealGas.of(alone(name));
        IdealHeatCapacity ideal = GasTable.find(name).orElseThrow().heatCapacity();
        double td = known(gas.isentropic(ps, ts, pd)).dischargeTemperature();
        double gained = R * new SimpsonIntegrator().integrate(10_000, ideal::at, ts, td)
                + known(gas.at(td, pd)).enthalpyDeparture()
                - known(gas.at(ts, ps)).enthalpyDeparture();
        double work = new SimpsonIntegrator(1e-9, 1e-9, 4, 60)
                .integrate(
                        10_000,
                        logP -> {
                            double p = Math.exp(logP);
                            double t = p <= ps
                                    ? ts
                                    : known(gas.isentropic(ps, ts, p)).dischargeTemperature();
                            return known(gas.compressibility(t, p)) * R * t;
                        },
                        Math.log(ps),
                        Math.log(pd));
        assertEquals(work, gained, 1e-7 * gained);
    }

    /** A monatomic gas has c_p = 5/2 R: thin argon follows 5/3 over any ratio. */
    @Test
    void thinArgonFollowsFiveThirds() {
        IsentropicCompression found = known(RealGas.of(alone("argon")).isentropic(1, 300, 8));
        assertEquals(5.0 / 3, found.temperatureExponent(), 1e-7);
        assertEquals(5.0 / 3, found.volumeExponent(), 1e-7);
        assertEquals(300 * Math.pow(8, 0.4), found.dischargeTemperature(), 1e-4);
    }

    @Test
    void exponentsReproduceTheDischargeState() {
        RealGas gas = RealGas.of(BIOGAS);
        IsentropicCompression found = known(gas.isentropic(20e5, 305, 60e5));
        double n = found.temperatureExponent();
        assertEquals(found.dischargeTemperature(), 305 * Math.pow(3, (n - 1) / n), 1e-9);
        double density = known(gas.density(305, 20e5)) * Math.pow(3, 1 / found.volumeExponent());
        assertEquals(known(gas.density(found.dischargeTemperature(), 60e5)), density, 1e-10 * density);
    }

    @Test
    void densityIsThatOfTheGasLawWithZ() {
        RealGas gas = RealGas.of(BIOGAS);
        double z = known(gas.compressibility(305, 20e5));
        double molarMass = 0.62 * 16.04246e-3 + 0.38 * 44.0095e-3;
        assertEquals(20e5 * molarMass / (z * R * 305), known(gas.density(305, 20e5)), 1e-12 * 25);
    }

    @Test
    void sameGasUnderTwoNamesIsOneGas() {
        GasMixture twice = new GasMixture(Map.of("methane", 0.3, "CH4", 0.7), true);
        assertEquals(
                known(RealGas.of(alone("methane")).compressibility(300, 80e5)),
                known(RealGas.of(twice).compressibility(300, 80e5)),
                1e-14);
    }

    @Test
    void threadsMayShareOneGas() {
        RealGas gas = RealGas.of(BIOGAS);
        double once = known(gas.isentropic(5e5, 305, 12e5)).volumeExponent();
        assertEquals(
                Collections.nCopies(400, once),
                IntStream.range(0, 400)
                        .parallel()
                        .mapToObj(i -> known(gas.isentropic(5e5, 305, 12e5)).volumeExponent())
                        .toList());
    }

    // the dew point

    /** Suction from an evaporator is saturated vapour; the vapour pressures are those of reference equations. */
    @Test
    void saturatedVapourIsTakenAndAboveItsPressureIsNot() throws IOException {
        for (CheckRow row : CheckRow.all()) {
            if (row.quantity().equals("Lee-Kesler vapour pressure")) {
                RealGas gas = RealGas.of(alone(row.text("gas")));
                assertEquals(
                        "", gas.compressibility(row.number("T_K"), row.value()).reason(), row::toString);
                assertEquals(
                        Optional.empty(),
                        gas.compressibility(row.number("T_K"), 1.15 * row.value())
                                .value(),
                        row::toString);
            }
        }
    }

    /** Biogas from a wet scrubber: its water is at the vapour pressure of water at 40 degC by the table of liquids. */
    @Test
    void gasSaturatedWithWaterIsTakenAndTwiceItsPressureIsNot() {
        double pressure = 1.1e5;
        double water = LiquidTable.find("water 40 degC").orElseThrow().liquid().vapourPressure() / pressure;
        GasMixture saturated = new GasMixture(
                Map.of("methane", 0.62 * (1 - water), "carbon dioxide", 0.38 * (1 - water), "water", water), true);
        assertEquals("", RealGas.of(saturated).density(313.15, pressure).reason());
        assertEquals(
                "the state 313.2 K, 2.200 bar a is beyond the dew point: water vapour condenses",
                RealGas.of(saturated).density(313.15, 2 * pressure).reason());
    }

    // refusals

    @Test
    void temperatureOutsideAPolynomialIsSaid() {
        assertEquals(
                "the heat capacity of R134a is known from 230 K to 480 K, not at 500.0 K",
                RealGas.of(new GasMixture(Map.of("nitrogen", 0.5, "R134a", 0.5), true))
                        .at(500, 1e5)
                        .reason());
    }

    @Test
    void pressureBeyondTheEquationIsSaid() {
        assertEquals(
                "the state 300.0 K, 500.0 bar a is beyond the equation of state, which reaches 293 bar a for this gas at this"
                        + " temperature",
                RealGas.of(alone("hydrogen")).density(300, 500e5).reason());
    }

    @Test
    void liquidIsSaid() {
        assertEquals(
                "the state 300.0 K, 15.00 bar a is beyond the dew point, not all gas",
                RealGas.of(alone("propane")).compressibility(300, 15e5).reason());
    }

    @Test
    void condensingPartIsNamed() {
        assertEquals(
                "the state 300.0 K, 40.00 bar a is beyond the dew point: n-pentane condenses",
                RealGas.of(new GasMixture(Map.of("methane", 0.95, "n-pentane", 0.05), true))
                        .compressibility(300, 40e5)
                        .reason());
    }

    @Test
    void wetSuctionIsSaid() {
        assertEquals(
                "suction: the state 300.0 K, 12.00 bar a is beyond the dew point, not all gas",
                RealGas.of(alone("propane")).isentropic(12e5, 300, 30e5).reason());
    }

    @Test
    void dischargeTooHotIsSaid() {
        assertEquals(
                "the discharge would be hotter than 1000 K, up to where the heat capacities are known",
                RealGas.of(alone("argon")).isentropic(1e5, 300, 25e5).reason());
    }

    /** Heavy vapours, unlike light ones, get wet when they are compressed (the slope of their dew line is the reverse). */
    @Test
    void heavyVapourThatCompressionWetsIsSaid() {
        RealGas heptane = RealGas.of(alone("n-heptane"));
        assertEquals(
                "discharge: the state 437.6 K, 9.000 bar a is beyond the dew point, not all gas",
                heptane.isentropic(1.9e5, 400, 9e5).reason());
        assertEquals(
                "compressed from 400.0 K, 1.900 bar a to 26.00 bar a the gas would end beyond its dew point",
                heptane.isentropic(1.9e5, 400, 26e5).reason());
    }

    @Test
    void dischargePressureBelowSuctionIsAMistakeOfTheCaller() {
        RealGas gas = RealGas.of(BIOGAS);
        assertThrows(IllegalArgumentException.class, () -> gas.isentropic(5e5, 305, 5e5));
        assertThrows(IllegalArgumentException.class, () -> gas.compressibility(Double.NaN, 5e5));
    }
}
