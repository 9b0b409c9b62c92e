package throwbench.solver.benchmarks;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import throwbench.solver.chamber.ChamberCondition;
import throwbench.solver.chamber.ChamberDuty;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.chamber.ChamberVolume;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.CycleAccuracy;
import throwbench.solver.chamber.FlowValves;
import throwbench.solver.chamber.LineConditions;
import throwbench.solver.chamber.PressureCurve;
import throwbench.solver.chamber.Side;
import throwbench.solver.drive.SpeedCurve;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Machine;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.revolution.Reversal;
import throwbench.solver.revolution.Revolution;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.RunningThrow;
import throwbench.solver.revolution.Traces;

/**
 * Flow through the valves of the booster's two chambers to a state that repeats. A: 740 rev/min, 26 and 22 cm²; B: four
 * times the areas; C: the same at 200 rev/min; D: 1200 rev/min, 0.7 times the areas, 1 to 6 bar g, clearances 10 and 12 %.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
public class ValveFlowBenchmark {

    private static final double CHANGE = 1e-6;

    @Param({"A", "B", "C", "D"})
    public String valves = "A";

    private final Linkage linkage = new Linkage(0.075, 0.4, 0);
    private final PerfectGas gas = new PerfectGas(0.0272, 1.29);
    private FlowValves areas = new FlowValves(1, 1);
    private LineConditions lines = new LineConditions(1, 1, OptionalDouble.empty());
    private double speed;
    private ChamberVolume head = volume(Side.HEAD, 1);
    private ChamberVolume crank = volume(Side.CRANK, 1);
    private final Machine machine = Booster.machine("inline");
    private final RunningThrow one = Booster.running(machine, Booster.SPEED, Booster.SUCTION)
            .throwsInOrder()
            .get(0);
    private Optional<Revolution> earlier = Optional.empty();
    private int call;

    @Setup
    public void prepare() {
        double times =
                switch (valves) {
                    case "B", "C" -> 4;
                    case "D" -> 0.7;
                    default -> 1;
                };
        boolean fast = valves.equals("D");
        areas = new FlowValves(26e-4 * times, 22e-4 * times);
        double revolutionsPerMinute = fast ? 1200 : valves.equals("C") ? 200 : 740;
        speed = revolutionsPerMinute * Math.PI / 30;
        double suction = Booster.AMBIENT + (fast ? 1e5 : 4.1e5);
        double discharge = Booster.AMBIENT + (fast ? 6e5 : 11.5e5);
        lines = new LineConditions(suction, discharge, OptionalDouble.of(305.15));
        head = volume(Side.HEAD, fast ? 0.10 : 0.14);
        crank = volume(Side.CRANK, fast ? 0.12 : 0.16);
        earlier = Optional.of(revolution());
    }

    private ChamberVolume volume(Side side, double clearance) {
        double inner = side == Side.HEAD ? 0 : 0.064;
        double area = Math.PI / 4 * (0.32 * 0.32 - inner * inner);
        return new ChamberVolume(side, area, linkage.stroke(), clearance * area * linkage.stroke());
    }

    private PressureCurve solve(ChamberVolume volume, ChamberCondition condition, CycleAccuracy accuracy) {
        ChamberDuty duty = new ChamberDuty(
                linkage,
                Rotation.COUNTER_CLOCKWISE,
                volume,
                gas,
                lines,
                condition,
                speed * (1 + CHANGE * call),
                0,
                accuracy);
        return areas.solve(duty).curve().orElseThrow();
    }

    private double both(CycleAccuracy accuracy) {
        call = (call + 1) & 1023;
        return solve(head, ChamberCondition.WORKING, accuracy).inletVolumePerTurn()
                + solve(crank, ChamberCondition.WORKING, accuracy).inletVolumePerTurn();
    }

    private Revolution revolution() {
        List<PressureCurve> curves = List.of(
                solve(head, ChamberCondition.WORKING, CycleAccuracy.MAP),
                solve(crank, ChamberCondition.WORKING, CycleAccuracy.MAP));
        RunningThrow running = new RunningThrow(
                one.described(), one.body(), one.phase(), List.of(head, crank), curves, one.uncoveredArea());
        double now = speed * (1 + CHANGE * call);
        DutyPoint duty = Booster.duty(now, Booster.SUCTION);
        return Traces.of(new RunningMachine(machine, duty, List.of(running), SpeedCurve.constant(now)), 0, earlier)
                .revolution();
    }

    /** Both chambers, the rod load at the stations, the reversal duration. */
    @Benchmark
    public double mapPoint() {
        call = (call + 1) & 1023;
        return Reversal.of(Traces.rodLoad(revolution())).duration();
    }

    /** As a map needs them. */
    @Benchmark
    public double bothChambers() {
        return both(CycleAccuracy.MAP);
    }

    /** As a solution needs them. */
    @Benchmark
    public double bothChambersExact() {
        return both(CycleAccuracy.SOLVE);
    }

    /** The head end, its suction valve leaking through 3 cm². */
    @Benchmark
    public double leakingChamber() {
        call = (call + 1) & 1023;
        ChamberCondition leaking = new ChamberCondition(ChamberState.FAILED_SUCTION, 3e-4, Clearance.NONE);
        return solve(head, leaking, CycleAccuracy.SOLVE).inletVolumePerTurn();
    }
}
