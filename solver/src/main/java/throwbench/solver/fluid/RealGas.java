package throwbench.solver.fluid;

import java.util.Locale;
import java.util.Optional;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * A gas mixture by the equation of state of Lee and Kesler with ideal heat capacities from the gas table. States that are
 * not all gas, or beyond the tables of the equation, are answered by a sentence. Immutable: threads may share it.
 *
 * <p>Temperatures in K, pressures in Pa absolute.
 */
public final class RealGas {

    private static final double R = PerfectGas.MOLAR_GAS_CONSTANT;

    /** Steps in which the coldest gas at the discharge pressure is sought: well below the width of the two-phase zone. */
    private static final double WARMING = 1.005;

    /**
     * How far beyond the computed dew point a mixture is still taken: gas from a separator is at its dew point and must not be
     * refused. Peng and Robinson are 7 % low for hydrocarbons, 22 % for water at 5 °C.
     */
    private static final double DEW_MARGIN = 0.25;

    /** The same for the vapour pressure of a single gas, which Lee and Kesler miss by 5 % at most. */
    private static final double VAPOUR_PRESSURE_MARGIN = 0.08;

    private final Composition composition;
    private final LeeKesler equation;
    private final PengRobinson phases;

    private RealGas(Composition composition) {
        this.composition = composition;
        this.equation = LeeKesler.of(composition);
        this.phases = new PengRobinson(composition);
    }

    /** The mixture as a real gas, whatever its {@link GasMixture#real} says. */
    public static RealGas of(GasMixture mixture) {
        return new RealGas(Composition.of(mixture));
    }

    /** Z at a temperature and a pressure. */
    public Answer<Double> compressibility(double temperature, double pressure) {
        return departures(temperature, pressure).map(Departures::compressibility);
    }

    /** ρ = p M/(Z R T), kg/m³. */
    public Answer<Double> density(double temperature, double pressure) {
        return departures(temperature, pressure).map(found -> density(temperature, pressure, found));
    }

    /** All that is known of the gas at a temperature and a pressure. */
    public Answer<GasState> at(double temperature, double pressure) {
        if (!composition.isKnownAt(temperature)) {
            return Answer.none(composition.outOfRange(temperature));
        }
        return departures(temperature, pressure).map(found -> state(temperature, pressure, found));
    }

    private double density(double temperature, double pressure, Departures found) {
        return pressure * composition.molarMass() / (found.compressibility() * R * temperature);
    }

    private GasState state(double temperature, double pressure, Departures found) {
        double heatCapacity = composition.heatCapacity(temperature) + found.heatCapacity();
        return new GasState(
                temperature,
                pressure,
                found.compressibility(),
                density(temperature, pressure, found),
                found.enthalpy() * R * temperature,
                found.entropy() * R,
                heatCapacity * R,
                heatCapacity / (heatCapacity - found.heatCapacityDifference()));
    }

    private Answer<Departures> departures(double temperature, double pressure) {
        if (!(temperature > 0 && pressure > 0)) {
            throw new IllegalArgumentException("no state: " + temperature + " K, " + pressure + " Pa");
        }
        double highest = equation.highestPressure(temperature);
        if (pressure > highest) {
            return Answer.none(String.format(
                    Locale.ROOT,
                    "%s is beyond the equation of state, which reaches %.0f bar a for this gas at this temperature",
                    words(temperature, pressure),
                    highest / 1e5));
        }
        Optional<Departures> found = equation.gas(temperature, pressure);
        if (found.isEmpty() || equation.isLiquid(temperature, pressure / (1 + VAPOUR_PRESSURE_MARGIN))) {
            return Answer.none(words(temperature, pressure) + " is beyond the dew point, not all gas");
        }
        return phases.condensing(temperature, pressure, DEW_MARGIN)
                .map(gas -> Answer.<Departures>none(
                        words(temperature, pressure) + " is beyond the dew point: " + gas.name() + " condenses"))
                .orElseGet(() -> Answer.of(found.get()));
    }

    private static String words(double temperature, double pressure) {
        return String.format(Locale.ROOT, "the state %.1f K, %.4g bar a", temperature, pressure / 1e5);
    }

    /**
     * Compression at constant entropy.
     *
     * @param suctionPressure p_s
     * @param suctionTemperature T_s
     * @param dischargePressure p_d, above p_s
     * @return nothing, with a sentence, where suction or discharge is no gas or out of range
     * @throws IllegalArgumentException when the pressure does not rise
     */
    public Answer<IsentropicCompression> isentropic(
            double suctionPressure, double suctionTemperature, double dischargePressure) {
        if (!(dischargePressure > suctionPressure)) {
            throw new IllegalArgumentException(
                    "no compression: from " + suctionPressure + " Pa to " + dischargePressure + " Pa");
        }
        Answer<GasState> suction = at(suctionTemperature, suctionPressure);
        if (suction.value().isEmpty()) {
            return Answer.none("suction: " + suction.reason());
        }
        Isobar discharge = new Isobar(suction.value().get(), dischargePressure);
        Answer<Double> found = discharge.temperature();
        if (found.value().isEmpty()) {
            return Answer.none(found.reason());
        }
        Answer<GasState> end = at(found.value().get(), dischargePressure);
        if (end.value().isEmpty()) {
            return Answer.none("discharge: " + end.reason());
        }
        return Answer.of(between(suction.value().get(), end.value().get()));
    }

    private static IsentropicCompression between(GasState suction, GasState discharge) {
        double pressures = Math.log(discharge.pressure() / suction.pressure());
        double temperatures = Math.log(discharge.temperature() / suction.temperature());
        double volumes = Math.log(discharge.density() / suction.density());
        return new IsentropicCompression(
                discharge.temperature(), 1 / (1 - temperatures / pressures), pressures / volumes);
    }

    /** The states at the discharge pressure, of which one has the entropy of the suction state. */
    private final class Isobar {

        private final GasState suction;
        private final double pressure;

        Isobar(GasState suction, double pressure) {
            this.suction = suction;
            this.pressure = pressure;
        }

        /** (s(T, p_d) − s(T_s, p_s))/R; rises with T, for its slope is c_p/(R T). Asked where there is a gas. */
        private double entropyGain(double temperature) {
            return composition.entropyRise(suction.temperature(), temperature)
                    - Math.log(pressure / suction.pressure())
                    + equation.gas(temperature, pressure).orElseThrow().entropy()
                    - suction.entropyDeparture() / R;
        }

        Answer<Double> temperature() {
            double hottest = composition.hottest();
            double coldest = suction.temperature();
            while (coldest < hottest && equation.gas(coldest, pressure).isEmpty()) {
                coldest *= WARMING;
            }
            if (coldest < hottest && entropyGain(coldest) > 0) {
                return Answer.none(String.format(
                        Locale.ROOT,
                        "compressed from %.1f K, %.4g bar a to %.4g bar a the gas would end beyond its dew point",
                        suction.temperature(),
                        suction.pressure() / 1e5,
                        pressure / 1e5));
            }
            if (coldest >= hottest || entropyGain(hottest) < 0) {
                return Answer.none(String.format(
                        Locale.ROOT,
                        "the discharge would be hotter than %.0f K, up to where the heat capacities are known",
                        hottest));
            }
            return Answer.of(new BrentSolver(1e-14, 1e-10).solve(200, this::entropyGain, coldest, hottest));
        }
    }
}
