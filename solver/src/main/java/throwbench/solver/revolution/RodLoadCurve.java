package throwbench.solver.revolution;

import java.util.List;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Sweep;

/** The rod load of one throw at any angle, by the loops of the columns but without the forces that it does not need. */
public final class RodLoadCurve implements Curve {

    private final RunningMachine running;
    private final int throwIndex;
    private final ThrowStations stations;
    private final double[] speed;
    private final double[] alpha = new double[1];

    public RodLoadCurve(RunningMachine running, int throwIndex) {
        this(running, throwIndex, single(running, throwIndex));
    }

    private RodLoadCurve(RunningMachine running, int throwIndex, ThrowStations stations) {
        this.running = running;
        this.throwIndex = throwIndex;
        this.stations = stations;
        speed = new double[] {running.meanSpeed()};
    }

    private static ThrowStations single(RunningMachine running, int throwIndex) {
        RunningThrow t = running.throwsInOrder().get(throwIndex);
        Sweep sweep = Sweep.single(t.body().linkage(), running.rotation());
        return new ThrowStations(t, sweep, running.machine().site().framePressure(), List.of());
    }

    /** The rod load of the same throw of another machine, in this curve's arrays: this one is given up. */
    RodLoadCurve over(RunningMachine next) {
        return new RodLoadCurve(next, throwIndex, stations.over(next, throwIndex));
    }

    @Override
    public double at(double crankAngle, Approach approach) {
        stations.sweep().turnTo(crankAngle, approach);
        running.fillSpeed(throwIndex, stations.sweep().crankAngle(), approach, speed, alpha);
        stations.solveRodLoad(speed, alpha);
        return stations.forces().rodLoad()[0];
    }
}
