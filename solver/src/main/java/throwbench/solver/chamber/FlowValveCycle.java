package throwbench.solver.chamber;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.fluid.Answer;
import throwbench.solver.fluid.Fluid;
import throwbench.solver.fluid.GasMixture;
import throwbench.solver.fluid.PerfectGas;

/** Solves the cycle of a chamber behind flowing valves: which scheme it needs, and what cannot be solved. */
final class FlowValveCycle {

    /** Turns after which a state that still changes counts as one that never repeats. */
    static final int MOST_TURNS = 4000;

    /** In a map the state's own error stays far below that of the steps; the masses are put right for it in closed form. */
    private static final double MAP_TOLERANCE = 1e-4;

    /** Where they are summed up instead, what enters and leaves differs by as much. */
    private static final double LEAKY_MAP_TOLERANCE = 1e-6;

    private static final double SOLVE_TOLERANCE = 1e-8;

    private FlowValveCycle() {}

    static CycleOutcome solve(FlowValves valves, ChamberDuty duty) {
        if (!duty.fluid().isGas()) {
            return CycleOutcome.refused("valves of a flow area pass gas, and the stage's fluid is a liquid");
        }
        OptionalDouble temperature = duty.lines().suctionTemperature();
        if (temperature.isEmpty()) {
            return CycleOutcome.refused("valve flow needs the stage's suctionTemperature at the duty point");
        }
        Answer<PerfectGas> gas = gas(duty.fluid(), temperature.getAsDouble());
        return gas.value().isPresent()
                ? solve(valves, duty, gas.value().get(), temperature.getAsDouble(), MOST_TURNS)
                : CycleOutcome.refused(gas.reason());
    }

    private static Answer<PerfectGas> gas(Fluid fluid, double suctionTemperature) {
        if (fluid instanceof GasMixture mixture) {
            return mixture.perfectAt(suctionTemperature);
        }
        return fluid instanceof PerfectGas gas ? Answer.of(gas) : Answer.none("valve flow needs a gas");
    }

    static CycleOutcome solve(
            FlowValves valves, ChamberDuty duty, PerfectGas gas, double suctionTemperature, int mostTurns) {
        double k = gas.isentropicExponent();
        double r = gas.gasConstant();
        List<String> notes = notes(duty);
        boolean map = duty.accuracy() == CycleAccuracy.MAP;
        ChamberState state = duty.condition().state();
        boolean failed = state == ChamberState.FAILED_SUCTION || state == ChamberState.FAILED_DISCHARGE;
        if (failed && !(duty.condition().leakArea() > 0)) {
            return CycleOutcome.refused("a failed valve needs a leakArea above 0");
        }
        if (state == ChamberState.WORKING
                && duty.lines().dischargePressure() > duty.lines().suctionPressure()) {
            WorkingFlow flow = new WorkingFlow(valves, duty, r, k, suctionTemperature);
            if (!flow.reaches()) {
                return CycleOutcome.solved(breathing(duty, k, notes));
            }
            return flow.search(map ? MAP_TOLERANCE : SOLVE_TOLERANCE, mostTurns)
                    ? CycleOutcome.solved(flow.curve(notes))
                    : notPeriodic(mostTurns);
        }
        LeakyFlow flow = new LeakyFlow(valves, duty, r, k, suctionTemperature);
        return flow.search(map ? LEAKY_MAP_TOLERANCE : SOLVE_TOLERANCE, mostTurns)
                ? CycleOutcome.solved(flow.curve(notes))
                : notPeriodic(mostTurns);
    }

    private static CycleOutcome notPeriodic(int turns) {
        return CycleOutcome.failed("pressure and mass do not repeat after " + turns + " turns");
    }

    private static List<String> notes(ChamberDuty duty) {
        List<String> notes = new ArrayList<>();
        if (duty.flowAllowance() > 0) {
            notes.add("the flowAllowance is not taken off: the capacity of valve flow is its net suction flow");
        }
        if (duty.fluid() instanceof GasMixture mixture && mixture.real()) {
            notes.add("valve flow stays on the perfect gas; the real model changes nothing here");
        }
        return notes;
    }

    /** A turn in which no valve passes anything: one isentrope from the suction pressure at the greatest volume. */
    private static FlowCurve breathing(ChamberDuty duty, double k, List<String> notes) {
        double low = duty.lines().suctionPressure();
        double compression = duty.volume().greatest() / duty.volume().least();
        FlowCurve.ShutLegs legs = new FlowCurve.ShutLegs(k, low, low * Math.pow(compression, k));
        FlowCurve.Totals nothing = new FlowCurve.Totals(0, 0, OptionalDouble.empty(), new ValveLossWork(0, 0));
        notes.add(
                "no valve opens: the gas trapped in the clearance is compressed and expands again, nothing is delivered");
        return new FlowCurve(Optional.of(legs), List.of(), List.of(), nothing, notes);
    }
}
