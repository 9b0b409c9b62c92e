package throwbench.solver.map;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;

/** A result over two variables, as far as it is known. Immutable; cells are counted from 0 along both axes. */
public final class DutyMap {

    private final Axis across;
    private final Axis up;
    private final Result result;
    private final @Nullable Outcome[] cells;
    private final int known;

    /** @param cells row by row, each along the axis across; null where not known; given up to the map */
    DutyMap(Axis across, Axis up, Result result, @Nullable Outcome[] cells) {
        this.across = across;
        this.up = up;
        this.result = result;
        this.cells = cells;
        int count = 0;
        for (Outcome cell : cells) {
            count += cell == null ? 0 : 1;
        }
        this.known = count;
    }

    public Axis across() {
        return across;
    }

    public Axis up() {
        return up;
    }

    public Result result() {
        return result;
    }

    /** A cell; empty while it is not known. */
    public Optional<Outcome> at(int column, int row) {
        return Optional.ofNullable(cells[row * across.points() + column]);
    }

    /** A cell or, while it is not known, the nearest one of a coarser net that is; empty where there is none yet. */
    public Optional<Outcome> nearest(int column, int row) {
        for (int stride = 1; stride < 2 * Math.max(across.points(), up.points()); stride *= 2) {
            Optional<Outcome> cell = at(column - column % stride, row - row % stride);
            if (cell.isPresent()) {
                return cell;
            }
        }
        return Optional.empty();
    }

    /** Number of cells that are known. */
    public int known() {
        return known;
    }

    /** Whether every cell is known. */
    public boolean isComplete() {
        return known == cells.length;
    }

    /** The least value known; empty where no cell has one. */
    public OptionalDouble least() {
        return values().min();
    }

    /** The greatest value known; empty where no cell has one. */
    public OptionalDouble greatest() {
        return values().max();
    }

    private DoubleStream values() {
        return IntStream.range(0, cells.length)
                .mapToObj(i -> Optional.ofNullable(cells[i]))
                .flatMapToDouble(cell -> cell.map(Outcome::value).orElse(OptionalDouble.empty()).stream());
    }
}
