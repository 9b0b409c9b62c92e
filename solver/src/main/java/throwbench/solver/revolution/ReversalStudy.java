package throwbench.solver.revolution;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Sweep;

/**
 * The reversal duration of one throw for one running machine after another, as a map asks for it. Geometry and arrays are
 * kept from machine to machine; fewer stations than a table has bracket the sign changes, which are found on the same curve
 * to the same digits. For one thread.
 */
public final class ReversalStudy {

    /** Enough that a bracket holds one sign change, or comes near enough to zero for its turning to be looked at. */
    private static final int STATIONS = 180;

    private final int throwIndex;
    private final double[] speed = new double[STATIONS];
    private final double[] alpha = new double[STATIONS];
    private Optional<ThrowStations> kept = Optional.empty();
    private Optional<RodLoadCurve> curve = Optional.empty();

    /** @param throwIndex of the throw in each machine */
    public ReversalStudy(int throwIndex) {
        this.throwIndex = throwIndex;
    }

    /** Reversal duration of a running machine, rad: the shorter of the longest unbroken spans; 0 without a sign change. */
    public double duration(RunningMachine running) {
        return Reversal.duration(signChanges(running));
    }

    /** Every sign change of the rod load, by crank angle. */
    public List<SignChange> signChanges(RunningMachine running) {
        ThrowStations stations = kept.map(k -> k.over(running, throwIndex)).orElseGet(() -> fresh(running));
        RodLoadCurve exact = curve.map(c -> c.over(running)).orElseGet(() -> new RodLoadCurve(running, throwIndex));
        kept = Optional.of(stations);
        curve = Optional.of(exact);
        if (running.speedCurve().constant()) {
            Arrays.fill(speed, running.meanSpeed());
            Arrays.fill(alpha, 0);
        } else {
            running.fillSpeed(throwIndex, stations.sweep().crankAngle(), Approach.JUST_AFTER, speed, alpha);
        }
        stations.solveRodLoad(speed, alpha);
        double[] breaks = BreakAngles.ofRodLoad(running, throwIndex);
        return SignChanges.of(Trace.ofSigns(exact, stations.column(Column.ROD_LOAD), breaks));
    }

    private ThrowStations fresh(RunningMachine running) {
        RunningThrow t = running.throwsInOrder().get(throwIndex);
        Sweep sweep = Sweep.wholeTurn(t.body().linkage(), running.rotation(), 0, STATIONS);
        return new ThrowStations(t, sweep, running.machine().site().framePressure(), List.of());
    }
}
