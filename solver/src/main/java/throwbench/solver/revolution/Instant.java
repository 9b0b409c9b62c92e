package throwbench.solver.revolution;

import java.util.ArrayList;
import java.util.List;
import throwbench.solver.chamber.ChamberVolume;
import throwbench.solver.chamber.Side;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Sweep;

/**
 * A running machine at exactly one crank angle, by the same loops that fill a revolution's columns. Turned from angle to
 * angle by its one owner without garbage.
 */
public final class Instant {

    private final MachineStations stations;
    private final int shown;
    private double angle;

    /** @param shown index of the throw whose crank angle is meant */
    public Instant(RunningMachine running, int shown) {
        List<ThrowStations> throwStations = new ArrayList<>();
        for (RunningThrow t : running.throwsInOrder()) {
            Sweep sweep = Sweep.single(t.body().linkage(), running.rotation());
            throwStations.add(
                    new ThrowStations(t, sweep, running.machine().site().framePressure(), List.of()));
        }
        this.stations = new MachineStations(running, throwStations);
        this.shown = shown;
        turnTo(0);
    }

    /** Turns the machine to a crank angle of the shown throw (rad, any number of turns), just after any step there. */
    public Instant turnTo(double crankAngle) {
        return turnTo(crankAngle, Approach.JUST_AFTER);
    }

    /** Turns the machine to a crank angle, read from one side of a step. */
    public Instant turnTo(double crankAngle, Approach approach) {
        angle = crankAngle;
        RunningMachine running = stations.running();
        for (int i = 0; i < running.throwsInOrder().size(); i++) {
            stations.of(i).sweep().turnTo(crankAngle + running.angleBetween(shown, i), approach);
        }
        stations.solve(approach);
        return this;
    }

    public RunningMachine running() {
        return stations.running();
    }

    public int shownThrow() {
        return shown;
    }

    /** The angle it was turned to, rad, as given. */
    public double crankAngle() {
        return angle;
    }

    /** A value of the shown throw or of the machine, SI. */
    public double at(Column column) {
        return stations.column(shown, column)[0];
    }

    /** A value of any throw at this instant. */
    public double at(int throwIndex, Column column) {
        return stations.column(throwIndex, column)[0];
    }

    /** α of the shaft, rad/s², positive when it gains speed. */
    public double shaftAcceleration() {
        return stations.alpha()[0];
    }

    /** Pressure in a chamber of a throw, Pa absolute. */
    public double pressure(int throwIndex, int chamber) {
        return stations.of(throwIndex).pressure(chamber)[0];
    }

    /** Load of one chamber's pressure on its piston face along the rod, N, tension positive (p A, no frame pressure). */
    public double chamberLoad(int throwIndex, int chamber) {
        ChamberVolume volume =
                running().throwsInOrder().get(throwIndex).volumes().get(chamber);
        double force = volume.area() * pressure(throwIndex, chamber);
        return volume.side() == Side.HEAD ? -force : force;
    }

    /** Sine of the pin's angle θ from the throw's x. */
    public double sinPin(int throwIndex) {
        return stations.of(throwIndex).sweep().sinPin()[0];
    }

    /** Cosine of the pin's angle θ. */
    public double cosPin(int throwIndex) {
        return stations.of(throwIndex).sweep().cosPin()[0];
    }

    /** Inertia of the connecting rod at its mass centre, −m_c a_G, along the throw's x, N. */
    public double rodInertiaX(int throwIndex) {
        ThrowStations t = stations.of(throwIndex);
        return -t.forces().body().rodMass() * t.forces().rodCentreAccelerationX()[0];
    }

    /** The same along y, N. */
    public double rodInertiaY(int throwIndex) {
        ThrowStations t = stations.of(throwIndex);
        return -t.forces().body().rodMass() * t.forces().rodCentreAccelerationY()[0];
    }
}
