package throwbench.solver.chamber;

import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.mechanism.Angles;

/**
 * A chamber behind flowing valves by brute force, to hold the solver against: pressure, mass and what passes the valves as
 * one system of differential equations, as the method page writes it, under an explicit Runge–Kutta method of a
 * general-purpose library that knows nothing of valves and finds their kinks by its own control of the step.
 */
final class ReferenceFlow implements FirstOrderDifferentialEquations {

    private static final int P = 0;
    private static final int MASS = 1;
    private static final int IN = 2;
    private static final int OUT = 3;
    private static final int OUT_ENERGY = 4;
    private static final int WORK = 5;
    private static final int SUCTION_LOSS = 6;
    private static final int DISCHARGE_LOSS = 7;
    private static final int LEFT = 8;
    private static final int STATES = 9;

    private final ChamberDuty duty;
    private final double suctionIn;
    private final double suctionOut;
    private final double dischargeOut;
    private final double dischargeIn;
    private final double k;
    private final double r;
    private final double suctionTemperature;
    private final double dischargeTemperature;
    private final double tolerance;
    private final double[] start = new double[STATES];

    ReferenceFlow(FlowValves valves, ChamberDuty duty, double tolerance) {
        this.duty = duty;
        this.tolerance = tolerance;
        PerfectGas gas = (PerfectGas) duty.fluid();
        k = gas.isentropicExponent();
        r = PerfectGas.MOLAR_GAS_CONSTANT / gas.molarMass();
        LineConditions lines = duty.lines();
        suctionTemperature = lines.suctionTemperature().orElseThrow();
        dischargeTemperature =
                suctionTemperature * Math.pow(lines.dischargePressure() / lines.suctionPressure(), (k - 1) / k);
        ChamberState state = duty.condition().state();
        double leak = duty.condition().leakArea();
        suctionIn = valves.suctionFlowArea();
        suctionOut = state == ChamberState.HELD_OPEN
                ? valves.suctionFlowArea()
                : state == ChamberState.FAILED_SUCTION ? leak : 0;
        dischargeOut = valves.dischargeFlowArea();
        dischargeIn = state == ChamberState.FAILED_DISCHARGE ? leak : 0;
        start[P] = lines.suctionPressure();
        start[MASS] = start[P] * duty.volume().greatest() / (r * suctionTemperature);
    }

    /** Turns until pressure and mass at the greatest volume repeat within the tolerance asked for. */
    int settle(double repeat) {
        for (int turn = 1; turn < 200; turn++) {
            double[] end = start.clone();
            integrate(0, Angles.TURN, end);
            double change = Math.max(Math.abs(end[P] / start[P] - 1), Math.abs(end[MASS] / start[MASS] - 1));
            start[P] = end[P];
            start[MASS] = end[MASS];
            if (change < repeat) {
                return turn;
            }
        }
        throw new IllegalStateException("the reference does not repeat");
    }

    /** Pressures at equally spaced crank angles from 0, and what the turn came to. */
    Turn turn(int stations) {
        double from = duty.greatestVolumeAngle();
        double[] pressures = new double[stations];
        double[] state = start.clone();
        double step = Angles.TURN / stations;
        double at = 0;
        int first = (int) Math.ceil(from / step);
        for (int i = 0; i < stations; i++) {
            double next = (first + i) * step - from;
            at = integrate(at, next, state);
            pressures[(first + i) % stations] = state[P];
        }
        integrate(at, Angles.TURN, state);
        return new Turn(
                pressures,
                state[IN],
                state[OUT],
                state[OUT_ENERGY] / state[LEFT],
                state[WORK],
                new ValveLossWork(state[SUCTION_LOSS], state[DISCHARGE_LOSS]));
    }

    /**
     * @param drawn net suction flow, kg
     * @param delivered net discharge flow, kg
     * @param temperature mean by mass of what leaves through the discharge valve, K
     * @param work −∮ p dV, J
     */
    @SuppressWarnings("ArrayRecordComponent") // a handful of numbers read once, never compared
    record Turn(
            double[] pressures, double drawn, double delivered, double temperature, double work, ValveLossWork loss) {}

    private double integrate(double from, double to, double[] state) {
        if (to - from > 1e-12) {
            double[] absolute = new double[STATES];
            double[] relative = new double[STATES];
            double p = start[P];
            double m = start[MASS];
            double energy = p * duty.volume().greatest();
            double[] scale = {p, m, m, m, m * suctionTemperature, energy, energy, energy, m};
            for (int i = 0; i < STATES; i++) {
                absolute[i] = tolerance * scale[i];
            }
            DormandPrince853Integrator integrator =
                    new DormandPrince853Integrator(1e-13, Math.toRadians(1), absolute, relative);
            integrator.setInitialStepSize(1e-6);
            integrator.integrate(this, from, state, to, state);
        }
        return Math.max(from, to);
    }

    @Override
    public int getDimension() {
        return STATES;
    }

    @Override
    public void computeDerivatives(double turned, double[] y, double[] rate) {
        double angle = duty.greatestVolumeAngle() + turned;
        double dx = 1e-6;
        double volume = volume(angle);
        double volumeRate = (volume(angle + dx) - volume(angle - dx)) / (2 * dx);
        double p = y[P];
        double temperature = p * volume / (y[MASS] * r);
        double low = duty.lines().suctionPressure();
        double high = duty.lines().dischargePressure();
        double suction = mass(suctionIn, low, p, suctionTemperature);
        double back = mass(suctionOut, p, low, temperature);
        double delivery = mass(dischargeOut, p, high, temperature);
        double leak = mass(dischargeIn, high, p, dischargeTemperature);
        double energy = suction * suctionTemperature + leak * dischargeTemperature - (back + delivery) * temperature;
        rate[P] = k * (r * energy - p * volumeRate) / volume;
        rate[MASS] = suction + leak - back - delivery;
        rate[IN] = suction - back;
        rate[OUT] = delivery - leak;
        rate[LEFT] = delivery;
        rate[OUT_ENERGY] = delivery * temperature;
        rate[WORK] = -p * volumeRate;
        rate[SUCTION_LOSS] = Math.max(low - p, 0) * volumeRate;
        rate[DISCHARGE_LOSS] = -Math.max(p - high, 0) * volumeRate;
    }

    /** kg/rad. */
    private double mass(double area, double upstream, double downstream, double temperature) {
        if (area == 0 || upstream <= downstream) {
            return 0;
        }
        double ratio = Math.max(downstream / upstream, Math.pow(2 / (k + 1), k / (k - 1)));
        double psi = Math.sqrt(2 * k / (k - 1) * (Math.pow(ratio, 2 / k) - Math.pow(ratio, (k + 1) / k)));
        return area * upstream / Math.sqrt(r * temperature) * psi / duty.meanSpeed();
    }

    private double volume(double angle) {
        return duty.volume().at(duty.linkage().travel(angle, duty.rotation()));
    }
}
