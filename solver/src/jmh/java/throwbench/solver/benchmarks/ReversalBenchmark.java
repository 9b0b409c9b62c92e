package throwbench.solver.benchmarks;

import java.util.List;
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
import throwbench.solver.revolution.Refinement;
import throwbench.solver.revolution.Reversal;
import throwbench.solver.revolution.ReversalStudy;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.SignChange;
import throwbench.solver.revolution.Traces;

/** A map point: the reversal duration at another speed or pressure, sign changes exact, geometry kept; and its parts. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
public class ReversalBenchmark {

    private static final double CHANGE = 1e-6;

    private static final int SIDE = 200;

    @Param({"inline", "offset"})
    public String mechanism = "inline";

    private Machine machine;
    private ReversalStudy study;
    private Optional<Refinement> refinement = Optional.empty();
    private int call;

    @Setup
    public void prepare() {
        machine = Booster.machine(mechanism);
        study = new ReversalStudy(0);
        RunningMachine running = Booster.running(machine, Booster.SPEED, Booster.SUCTION);
        Traces traces = Traces.of(running, 0, Optional.empty());
        List<SignChange> full = Reversal.of(Traces.rodLoad(traces.revolution())).signChanges();
        List<SignChange> quick = study.signChanges(running);
        if (full.size() != quick.size()
                || Math.abs(full.get(0).crankAngle() - quick.get(0).crankAngle()) > 1e-9) {
            throw new IllegalStateException("the study finds " + quick + ", the full trace " + full);
        }
        refinement = Optional.of(new Refinement(running, 0));
    }

    @Benchmark
    public double signChange() {
        return refinement.orElseThrow().signChange();
    }

    @Benchmark
    public double extreme() {
        return refinement.orElseThrow().extreme();
    }

    @Benchmark
    public double idealPoint() {
        call = (call + 1) & 1023;
        return study.duration(Booster.running(machine, Booster.SPEED * (1 + CHANGE * call), Booster.SUCTION));
    }

    /** 300 to 1500 rpm, suction 2 to 8 bar gauge, one thread. */
    @Benchmark
    public double idealMap() {
        double sum = 0;
        for (int i = 0; i < SIDE; i++) {
            double speed = (300 + 1200.0 * i / (SIDE - 1)) * Math.PI / 30;
            for (int k = 0; k < SIDE; k++) {
                double suction = Booster.AMBIENT + 2e5 + 6e5 * k / (SIDE - 1);
                sum += study.duration(Booster.running(machine, speed, suction));
            }
        }
        return sum;
    }
}
