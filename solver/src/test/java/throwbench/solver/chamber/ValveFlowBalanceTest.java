package throwbench.solver.chamber;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import throwbench.solver.chamber.flow.FlowFunction;
import throwbench.solver.fluid.PerfectGas;

/**
 * Mass and energy of a turn, from nothing but the pressures that the curve gives: what flows through both valves by the
 * orifice law, and the work of the piston against the enthalpy that came and went.
 */
class ValveFlowBalanceTest {

    private static final int STATIONS = 72_000;

    @ParameterizedTest
    @CsvSource({"A,HEAD", "A,CRANK", "B,HEAD", "C,CRANK", "D,HEAD", "D,CRANK"})
    void bothValvesPassTheMassThatIsReported(FlowSample sample, Side side) {
        ChamberDuty duty = sample.duty(side);
        PressureCurve curve = FlowSample.solved(sample.valves(), duty);
        double[] p = FlowSample.pressures(curve, duty, STATIONS);
        PerfectGas gas = (PerfectGas) duty.fluid();
        double k = gas.isentropicExponent();
        double r = gas.gasConstant();
        FlowFunction law = new FlowFunction(k);
        double low = duty.lines().suctionPressure();
        double high = duty.lines().dischargePressure();
        double entered = 0;
        double left = 0;
        double leftEnergy = 0;
        for (double pressure : p) {
            entered += low * law.at(pressure / low);
            // on one isentrope: T = T_line (p/p_line)^((k−1)/k), with T_line left out here
            double temperature = Math.pow(pressure / high, (k - 1) / k);
            double flow = pressure / Math.sqrt(temperature) * law.at(high / pressure);
            left += flow;
            leftEnergy += flow * temperature;
        }
        double suctionTemperature = duty.lines().suctionTemperature().orElseThrow();
        double time = 2 * Math.PI / STATIONS / duty.meanSpeed();
        double in = entered * sample.valves().suctionFlowArea() * time / Math.sqrt(r * suctionTemperature);
        double mass = curve.massPerTurn().orElseThrow();
        assertEquals(mass, in, 1e-4 * mass);
        double lineTemperature = curve.dischargeTemperature().orElseThrow() * left / leftEnergy;
        double out = left * sample.valves().dischargeFlowArea() * time / Math.sqrt(r * lineTemperature);
        assertEquals(mass, out, 1e-4 * mass);
        assertEquals(mass * r * suctionTemperature / low, curve.inletVolumePerTurn(), 1e-12);
    }

    @ParameterizedTest
    @CsvSource({"A,HEAD", "A,CRANK", "B,CRANK", "C,HEAD", "D,HEAD", "D,CRANK"})
    void theWorkIsWhatTheGasCarriesAway(FlowSample sample, Side side) {
        // adiabatic: m c_p (T̄_discharge − T_suction) = −∮ p dV
        ChamberDuty duty = sample.duty(side);
        PressureCurve curve = FlowSample.solved(sample.valves(), duty);
        double work = FlowSample.work(FlowSample.pressures(curve, duty, STATIONS), duty);
        double carried = curve.massPerTurn().orElseThrow()
                * heatCapacity(duty)
                * (curve.dischargeTemperature().orElseThrow()
                        - duty.lines().suctionTemperature().orElseThrow());
        assertEquals(work, carried, 1e-4 * work);
    }

    private static double heatCapacity(ChamberDuty duty) {
        PerfectGas gas = (PerfectGas) duty.fluid();
        return gas.gasConstant() * gas.isentropicExponent() / (gas.isentropicExponent() - 1);
    }
}
