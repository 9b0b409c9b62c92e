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
import throwbench.solver.revolution.Reversal;
import throwbench.solver.revolution.Traces;

/** A map point: the reversal duration at another speed or pressure, sign changes exact, geometry kept. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
public class ReversalBenchmark {

    private static final double CHANGE = 1e-6;

    @Param({"inline", "offset"})
    public String mechanism = "inline";

    private Machine machine;
    private Traces earlier;
    private int call;

    @Setup
    public void prepare() {
        machine = Booster.machine(mechanism);
        earlier = Traces.of(Booster.running(machine, Booster.SPEED, Booster.SUCTION), 0, Optional.empty());
    }

    @Benchmark
    public double idealPoint() {
        call = (call + 1) & 1023;
        Traces traces = Traces.of(
                Booster.running(machine, Booster.SPEED * (1 + CHANGE * call), Booster.SUCTION),
                0,
                Optional.of(earlier.revolution()));
        return Reversal.of(Traces.rodLoad(traces.revolution())).duration();
    }
}
