package throwbench.solver.revolution;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import throwbench.solver.chamber.ChamberSweep;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Sweep;

/**
 * A solved revolution: every quantity of every throw at equally spaced stations. Station i stands at the crank angle
 * 2π i/N of the shown throw; 2π is not repeated. Immutable once solved, and may be read by any thread.
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
            double start = Angles.wrap(running.angleBetween(shown, i));
            int index = i;
            Optional<ThrowStations> kept =
                    earlier.filter(e -> e.keeps(running, index, start, count)).map(e -> e.stations.of(index));
            Sweep sweep = kept.map(ThrowStations::sweep)
                    .orElseGet(() -> Sweep.wholeTurn(t.body().linkage(), running.rotation(), start, count));
            List<ChamberSweep> chambers = kept.map(ThrowStations::chambers).orElse(List.of());
            throwStations.add(
                    new ThrowStations(t, sweep, running.machine().site().framePressure(), chambers));
        }
        MachineStations all = new MachineStations(running, throwStations);
        all.solve(Approach.JUST_AFTER);
        return new Revolution(all, shown);
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
