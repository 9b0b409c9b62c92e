package throwbench.solver.revolution;

import java.util.Optional;

/** Makes traces of the quantities of a running machine. */
public final class Traces {

    private final Revolution grid;
    private final Instant instant;
    private final double[] breaks;
    private final double[] values = new double[Trace.STATIONS];

    /** @param grid a revolution of {@link Trace#STATIONS} stations */
    private Traces(Revolution grid) {
        this.grid = grid;
        this.instant = new Instant(grid.running(), grid.shownThrow());
        this.breaks = BreakAngles.ofMachine(grid.running(), grid.shownThrow());
    }

    /** Traces over the crank angle of one throw; an earlier revolution lends its geometry. */
    public static Traces of(RunningMachine running, int shown, Optional<Revolution> earlier) {
        return new Traces(Revolution.solve(running, shown, Trace.STATIONS, earlier));
    }

    /** The solved stations that the traces are sampled on. */
    public Revolution revolution() {
        return grid;
    }

    /** A column of the shown throw or of the machine. */
    public Trace column(Column column) {
        return new Trace((angle, side) -> instant.turnTo(angle, side).at(column), grid.read(column, values), breaks);
    }

    /** The size of a force of the shown throw that two columns hold the components of, without its direction. */
    public Trace size(Column x, Column y) {
        grid.read(x, values);
        for (int i = 0; i < values.length; i++) {
            values[i] = Math.hypot(values[i], grid.at(y, i));
        }
        return new Trace(
                (angle, side) -> {
                    instant.turnTo(angle, side);
                    return Math.hypot(instant.at(x), instant.at(y));
                },
                values,
                breaks);
    }

    /** The pressure in a chamber of the shown throw. */
    public Trace pressure(int chamber) {
        int shown = grid.shownThrow();
        return new Trace(
                (angle, side) -> instant.turnTo(angle, side).pressure(shown, chamber),
                grid.readPressure(chamber, values),
                breaks);
    }

    /** The rod load of one throw, without the other throws and the forces that it does not need. */
    public static Trace rodLoad(Revolution grid) {
        RunningMachine running = grid.running();
        int shown = grid.shownThrow();
        return new Trace(
                new RodLoadCurve(running, shown),
                grid.read(Column.ROD_LOAD, new double[grid.count()]),
                BreakAngles.ofRodLoad(running, shown));
    }
}
