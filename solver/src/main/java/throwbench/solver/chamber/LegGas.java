package throwbench.solver.chamber;

import java.util.OptionalDouble;
import throwbench.solver.fluid.Answer;
import throwbench.solver.fluid.Fluid;
import throwbench.solver.fluid.GasMixture;
import throwbench.solver.fluid.GasState;
import throwbench.solver.fluid.IsentropicCompression;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.fluid.RealGas;

/**
 * What the polytropic legs behind ideal valves need of a gas.
 *
 * @param gasConstant R, J/(kg K)
 * @param volumeExponent n of p V^n at constant entropy
 * @param temperatureExponent n of T_d/T_s = (p_d/p_s)^((n−1)/n) at constant entropy; the same for a perfect gas
 * @param compressibility Z at suction line conditions; 1 for a perfect gas
 */
record LegGas(double gasConstant, double volumeExponent, double temperatureExponent, double compressibility) {

    /**
     * The gas of a chamber.
     *
     * @param low pressure in the chamber while it draws in, Pa absolute
     * @param high pressure in the chamber while it discharges, Pa absolute
     */
    static Answer<LegGas> of(Fluid fluid, LineConditions lines, double low, double high) {
        if (fluid instanceof PerfectGas gas) {
            return Answer.of(perfect(gas));
        }
        if (!(fluid instanceof GasMixture mixture)) {
            return Answer.none("ideal valves pass gas, and the stage's fluid is a liquid");
        }
        OptionalDouble temperature = lines.suctionTemperature();
        if (temperature.isEmpty()) {
            return Answer.none("a gas mixture needs a suctionTemperature at the duty point");
        }
        Answer<PerfectGas> perfect = mixture.perfectAt(temperature.getAsDouble());
        if (!mixture.real() || perfect.value().isEmpty()) {
            return perfect.map(LegGas::perfect);
        }
        return real(RealGas.of(mixture), perfect.value().get(), lines, temperature.getAsDouble(), low, high);
    }

    private static LegGas perfect(PerfectGas gas) {
        return new LegGas(gas.gasConstant(), gas.isentropicExponent(), gas.isentropicExponent(), 1);
    }

    private static Answer<LegGas> real(
            RealGas gas, PerfectGas ideal, LineConditions lines, double temperature, double low, double high) {
        Answer<GasState> suction = gas.at(temperature, lines.suctionPressure());
        if (suction.value().isEmpty()) {
            return Answer.none(suction.reason());
        }
        double compressibility = suction.value().get().compressibility();
        Answer<IsentropicCompression> legs = gas.isentropic(low, temperature, high);
        return legs.map(
                l -> new LegGas(ideal.gasConstant(), l.volumeExponent(), l.temperatureExponent(), compressibility));
    }
}
