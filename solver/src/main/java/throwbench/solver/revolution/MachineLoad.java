package throwbench.solver.revolution;

import java.util.List;
import throwbench.solver.drive.ShaftLoad;
import throwbench.solver.load.TurningInertia;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Sweep;

/**
 * The throws of a machine as the shaft feels them. The torque comes from the same loops as the columns, with the inertia of
 * the moving parts taken off: T_load = Σ throw_torque − (I − J) α − ½ dI/dφ₁ ω².
 */
final class MachineLoad implements ShaftLoad {

    private final RunningMachine running;
    private final ThrowStations[] stations;
    private final TurningInertia[] inertias;
    private final double[] speed = new double[1];
    private final double[] alpha = new double[1];
    private double torque;
    private double inertia;
    private double slope;

    MachineLoad(RunningMachine running) {
        this.running = running;
        int count = running.throwsInOrder().size();
        stations = new ThrowStations[count];
        inertias = new TurningInertia[count];
        for (int i = 0; i < count; i++) {
            RunningThrow t = running.throwsInOrder().get(i);
            Sweep sweep = Sweep.single(t.body().linkage(), running.rotation());
            stations[i] = new ThrowStations(t, sweep, running.machine().site().framePressure(), List.of());
            inertias[i] = new TurningInertia(t.body());
        }
    }

    @Override
    public void turnTo(double crankAngle, Approach approach, double shaftSpeed, double acceleration) {
        speed[0] = shaftSpeed;
        alpha[0] = acceleration;
        double all = 0;
        inertia = 0;
        slope = 0;
        for (int i = 0; i < stations.length; i++) {
            Sweep sweep = stations[i].sweep();
            sweep.turnTo(crankAngle + running.angleBetween(0, i), approach);
            stations[i].solve(speed, alpha);
            inertias[i].turnTo(sweep);
            all += stations[i].forces().torque()[0];
            inertia += inertias[i].inertia();
            slope += inertias[i].slope();
        }
        torque = all - inertia * acceleration - slope * shaftSpeed * shaftSpeed / 2;
    }

    @Override
    public double torque() {
        return torque;
    }

    @Override
    public double inertia() {
        return inertia;
    }

    @Override
    public double inertiaSlope() {
        return slope;
    }
}
