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
        this.running = running;
        this.throwIndex = throwIndex;
        RunningThrow t = running.throwsInOrder().get(throwIndex);
        Sweep sweep = Sweep.single(t.body().linkage(), running.rotation());
        stations = new ThrowStations(t, sweep, running.machine().site().framePressure(), List.of());
        speed = new double[] {running.meanSpeed()};
    }

    @Override
    public double at(double crankAngle, Approach approach) {
        stations.sweep().turnTo(crankAngle, approach);
        running.fillSpeed(throwIndex, stations.sweep().crankAngle(), approach, speed, alpha);
        stations.solveRodLoad(speed, alpha);
        return stations.forces().rodLoad()[0];
    }
}
