package throwbench.solver.pump;

import java.util.ArrayList;
import java.util.List;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.chamber.PressureCurve;
import throwbench.solver.chamber.ValveEvent;
import throwbench.solver.fluid.Answer;
import throwbench.solver.machine.Chamber;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Sweep;
import throwbench.solver.revolution.BreakAngles;
import throwbench.solver.revolution.Curve;
import throwbench.solver.revolution.Extreme;
import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.RunningThrow;
import throwbench.solver.revolution.Trace;

/**
 * The flow that all chambers of a stage together send into the discharge line or draw from the suction line, m³/s, over the
 * crank angle of the machine's first throw: the sum of ∓dV/dt while the valves are open, negative where a valve that shuts late
 * lets liquid back. It steps where a valve opens late (a compressible liquid) or shuts late. Read by one thread at a time.
 */
public final class ManifoldFlow implements Curve {

    private final RunningMachine running;
    private final List<Sweep> sweeps = new ArrayList<>();
    private final List<ValveFlow> valves;
    private final double[] breaks;
    private final double mean;

    private ManifoldFlow(RunningMachine running, List<ValveFlow> valves) {
        this.running = running;
        this.valves = List.copyOf(valves);
        for (RunningThrow t : running.throwsInOrder()) {
            sweeps.add(Sweep.single(t.body().linkage(), running.rotation()));
        }
        this.breaks = BreakAngles.ofMachine(running, 0);
        double perTurn = 0;
        for (ValveFlow valve : valves) {
            perTurn += valve.perTurn(sweeps.get(valve.throwIndex()));
        }
        this.mean = perTurn * running.turnsPerSecond();
    }

    /** Into the discharge line of a stage of liquid; the reason where it cannot be told. */
    public static Answer<ManifoldFlow> discharge(RunningMachine running, String stage) {
        return of(running, stage, ValveEvent.Valve.DISCHARGE);
    }

    /** Out of its suction line; a suction valve that is held open draws and gives back. */
    public static Answer<ManifoldFlow> suction(RunningMachine running, String stage) {
        return of(running, stage, ValveEvent.Valve.SUCTION);
    }

    private static Answer<ManifoldFlow> of(RunningMachine running, String stage, ValveEvent.Valve valve) {
        if (running.machine().fluidOf(stage).isGas()) {
            return Answer.none(
                    "the flow over the revolution is told of liquids only, and stage " + stage + " holds a gas");
        }
        List<ValveFlow> valves = new ArrayList<>();
        for (int i = 0; i < running.throwsInOrder().size(); i++) {
            RunningThrow t = running.throwsInOrder().get(i);
            for (int c = 0; c < t.chambers().size(); c++) {
                Chamber chamber = t.chambers().get(c);
                PressureCurve curve = t.curves().get(c);
                if (!chamber.stage().filter(stage::equals).isPresent()) {
                    continue;
                }
                if (!curve.flowKnown()) {
                    return Answer.none(
                            "the pressure of " + chamber.name() + " is recorded, so what it passes is not known");
                }
                boolean held = running.dutyPoint().condition(chamber.name()).state() == ChamberState.HELD_OPEN;
                if (held && valve == ValveEvent.Valve.SUCTION) {
                    valves.add(ValveFlow.heldOpen(i, t.volumes().get(c)));
                } else {
                    valves.add(ValveFlow.of(i, t.volumes().get(c), curve, valve));
                }
            }
        }
        return valves.isEmpty()
                ? Answer.none("no chamber belongs to stage " + stage)
                : Answer.of(new ManifoldFlow(running, valves));
    }

    @Override
    public double at(double crankAngle, Approach approach) {
        return sum(crankAngle, approach, false) * running.meanSpeed();
    }

    /** dQ/dt between the steps, m³/s². */
    public double rateOfChange(double crankAngle, Approach approach) {
        return sum(crankAngle, approach, true) * running.meanSpeed() * running.meanSpeed();
    }

    private double sum(double crankAngle, Approach approach, boolean bend) {
        for (int i = 0; i < sweeps.size(); i++) {
            sweeps.get(i).turnTo(crankAngle + running.angleBetween(0, i), approach);
        }
        double sum = 0;
        for (ValveFlow valve : valves) {
            Sweep sweep = sweeps.get(valve.throwIndex());
            if (valve.isOpen(crankAngle + running.angleBetween(0, valve.throwIndex()), approach)) {
                sum += bend ? valve.bend(sweep) : valve.perRadian(sweep);
            }
        }
        return sum;
    }

    /** Mean flow, m³/s, by the volumes at which valves open and shut; no flow allowance is taken off. */
    public double mean() {
        return mean;
    }

    /** Least and greatest flow, m³/s, both sides of every step included. */
    public Extremes extremes() {
        return Extremes.of(Trace.of(this, breaks));
    }

    /** The greatest dQ/dt between the steps, m³/s²: what the liquid in the line must be accelerated by. */
    public Extreme greatestRise() {
        return Extremes.of(Trace.of(this::rateOfChange, breaks)).greatest();
    }

    /** The greatest step of the flow, m³/s, without its sign; 0 where it has none. */
    public double greatestStep() {
        double greatest = 0;
        for (double angle : breaks) {
            double step = at(angle, Approach.JUST_AFTER) - at(angle, Approach.JUST_BEFORE);
            greatest = Math.max(greatest, Math.abs(step));
        }
        return greatest;
    }
}
