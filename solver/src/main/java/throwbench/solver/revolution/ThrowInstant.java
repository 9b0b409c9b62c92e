package throwbench.solver.revolution;

import java.util.List;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Sweep;

/** One throw of a running machine at any of its own crank angles, without the other throws. */
final class ThrowInstant {

    private final RunningMachine running;
    private final int throwIndex;
    private final ThrowStations stations;
    private final double[] speed;
    private final double[] alpha = new double[1];

    ThrowInstant(RunningMachine running, int throwIndex) {
        this.running = running;
        this.throwIndex = throwIndex;
        RunningThrow t = running.throwsInOrder().get(throwIndex);
        Sweep sweep = Sweep.single(t.body().linkage(), running.rotation());
        stations = new ThrowStations(t, sweep, running.machine().site().framePressure(), List.of());
        speed = new double[] {running.meanSpeed()};
    }

    ThrowInstant turnTo(double crankAngle, Approach approach) {
        stations.sweep().turnTo(crankAngle, approach);
        running.fillSpeed(throwIndex, stations.sweep().crankAngle(), approach, speed, alpha);
        stations.solve(speed, alpha);
        return this;
    }

    double at(Column column) {
        return stations.column(column)[0];
    }

    /** ω there, rad/s. */
    double speed() {
        return speed[0];
    }

    double pressure(int chamber) {
        return stations.pressure(chamber)[0];
    }
}
