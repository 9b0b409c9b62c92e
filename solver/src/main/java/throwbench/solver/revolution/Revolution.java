package throwbench.solver.revolution;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import throwbench.solver.chamber.ChamberSweep;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Sweep;

/**
 * A solved revolution: every quantity of every throw at equally spaced stations. Station i stands at the crank angle
 * 2π i/N of the shown throw; 2π is not repeated. Immutable once solved, and may be read by any thread, until its owner
 * gives it up to {@link #solveOver}.
 */
public final class Revolution {

    private final MachineStations stations;
    private final int shown;

    private Revolution(MachineStations stations, int shown) {
        this.stations = stations;
        this.shown = shown;
    }

    /**
     * Solves a revolution.
     *
     * @param shown index of the throw whose crank angle counts the stations
     * @param count number of stations, at least 1
     */
    public static Revolution solve(RunningMachine running, int shown, int count) {
        return solve(running, shown, count, Optional.empty());
    }

    /**
     * Solves a revolution, keeping the geometry of an earlier one where it still holds (a dragged speed, pressure or mass).
     * The earlier revolution stays as it was; only one thread may pass it on.
     */
    public static Revolution solve(RunningMachine running, int shown, int count, Optional<Revolution> earlier) {
        List<ThrowStations> throwStations = new ArrayList<>();
        for (int i = 0; i < running.throwsInOrder().size(); i++) {
            RunningThrow t = running.throwsInOrder().get(i);
            Sweep sweep = sweep(running, shown, i, count, earlier);
            List<ChamberSweep> chambers =
                    i < throwCount(earlier) ? earlier.get().stations.of(i).chambers() : List.of();
            throwStations.add(
                    new ThrowStations(t, sweep, running.machine().site().framePressure(), chambers));
        }
        return new Revolution(new MachineStations(running, throwStations), shown).solved();
    }

    /**
     * Solves into the arrays of a revolution that nobody reads any more, keeping its geometry where it still holds: for one
     * thread that reads many machines one after another, as a study does. The spent revolution's values are given up.
     */
    public static Revolution solveOver(RunningMachine running, Revolution spent) {
        List<ThrowStations> throwStations = new ArrayList<>();
        double framePressure = running.machine().site().framePressure();
        for (int i = 0; i < running.throwsInOrder().size(); i++) {
            RunningThrow t = running.throwsInOrder().get(i);
            Sweep sweep = sweep(running, spent.shown, i, spent.count(), Optional.of(spent));
            throwStations.add(
                    i < throwCount(Optional.of(spent))
                            ? spent.stations.of(i).over(t, sweep, framePressure)
                            : new ThrowStations(t, sweep, framePressure, List.of()));
        }
        return new Revolution(spent.stations.over(running, throwStations), spent.shown).solved();
    }

    private Revolution solved() {
        stations.solve(Approach.JUST_AFTER);
        return this;
    }

    private static int throwCount(Optional<Revolution> earlier) {
        return earlier.map(e -> e.running().throwsInOrder().size()).orElse(0);
    }

    private static Sweep sweep(RunningMachine running, int shown, int index, int count, Optional<Revolution> earlier) {
        double start = Angles.wrap(running.angleBetween(shown, index));
        if (earlier.isPresent() && earlier.get().keeps(running, index, start, count)) {
            return earlier.get().stations.of(index).sweep();
        }
        Linkage linkage = running.throwsInOrder().get(index).body().linkage();
        return Sweep.wholeTurn(linkage, running.rotation(), start, count);
    }

    private boolean keeps(RunningMachine next, int index, double start, int count) {
        if (index >= stations.running().throwsInOrder().size() || count != stations.count()) {
            return false;
        }
        Sweep sweep = stations.of(index).sweep();
        return sweep.linkage().equals(next.throwsInOrder().get(index).body().linkage())
                && sweep.rotation() == next.rotation()
                && sweep.crankAngle()[0] == start;
    }

    public RunningMachine running() {
        return stations.running();
    }

    /** Index of the throw whose crank angle counts the stations. */
    public int shownThrow() {
        return shown;
    }

    /** Number of stations. */
    public int count() {
        return stations.count();
    }

    /** A value of the shown throw or of the machine, SI. */
    public double at(Column column, int station) {
        return stations.column(shown, column)[station];
    }

    /** A value of any throw at the instant of a station. */
    public double at(int throwIndex, Column column, int station) {
        return stations.column(throwIndex, column)[station];
    }

    /** Pressure in a chamber of the shown throw, Pa absolute. */
    public double pressure(int chamber, int station) {
        return stations.of(shown).pressure(chamber)[station];
    }

    /** Pressure in a chamber of any throw, Pa absolute. */
    public double pressure(int throwIndex, int chamber, int station) {
        return stations.of(throwIndex).pressure(chamber)[station];
    }

    /** Copies a column of the shown throw into the caller's array and returns it. */
    public double[] read(Column column, double[] into) {
        System.arraycopy(stations.column(shown, column), 0, into, 0, count());
        return into;
    }

    /** Copies a chamber's pressures into the caller's array and returns it. */
    public double[] readPressure(int chamber, double[] into) {
        System.arraycopy(stations.of(shown).pressure(chamber), 0, into, 0, count());
        return into;
    }
}
