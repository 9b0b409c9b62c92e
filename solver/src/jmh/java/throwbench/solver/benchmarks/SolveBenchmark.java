package throwbench.solver.benchmarks;

import java.util.Optional;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import throwbench.solver.machine.Machine;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Revolution;

/** One revolution: all columns of one throw at 720 stations. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
public class SolveBenchmark {

    private static final int STATIONS = 720;

    /** Changes from call to call, so that nothing is hoisted. */
    private static final double CHANGE = 1e-6;

    @Param({"inline", "offset"})
    public String mechanism = "inline";

    private Machine machine;
    private Machine[] lengthened = {};
    private Revolution earlier;
    private Revolution spent;
    private PlainLoop plain;
    private int call;

    @Setup
    public void prepare() {
        machine = Booster.machine(mechanism);
        earlier = Revolution.solve(Booster.running(machine, Booster.SPEED, Booster.SUCTION), 0, STATIONS);
        spent = Revolution.solve(Booster.running(machine, Booster.SPEED, Booster.SUCTION), 0, STATIONS);
        lengthened = new Machine[] {Booster.machine(mechanism, 0.4), Booster.machine(mechanism, 0.4 + 1e-9)};
        plain = new PlainLoop(machine, STATIONS);
        plain.solve(Booster.SPEED, Booster.SUCTION, Booster.DISCHARGE);
        for (int i = 0; i < STATIONS; i++) {
            double ours = earlier.at(Column.MAIN_BEARING_Y, i);
            if (!(Math.abs(ours - plain.columns[19][i]) < 1e-6)) {
                throw new IllegalStateException("the yardstick solves another throw: " + ours + " N, "
                        + plain.columns[19][i] + " N at station " + i);
            }
        }
    }

    private double speed() {
        call = (call + 1) & 1023;
        return Booster.SPEED * (1 + CHANGE * call);
    }

    /** From the described machine, no geometry kept: the rod's length changes from call to call. */
    @Benchmark
    public Revolution allColumns() {
        double speed = speed();
        spent = Revolution.solveOver(Booster.running(lengthened[call & 1], speed, Booster.SUCTION), spent);
        return spent;
    }

    /** As a dragged speed. */
    @Benchmark
    public Revolution allColumnsKeptGeometry() {
        spent = Revolution.solveOver(Booster.running(machine, speed(), Booster.SUCTION), spent);
        return spent;
    }

    /** The same as the window does it: a revolution of its own for each state. */
    @Benchmark
    public Revolution freshColumnsKeptGeometry() {
        return Revolution.solve(Booster.running(machine, speed(), Booster.SUCTION), 0, STATIONS, Optional.of(earlier));
    }

    /** The yardstick. */
    @Benchmark
    public double[][] plainLoop() {
        plain.solve(speed(), Booster.SUCTION, Booster.DISCHARGE);
        return plain.columns;
    }
}
