package throwbench.solver.map;

import java.util.List;
import java.util.concurrent.atomic.AtomicReferenceArray;
import java.util.function.IntConsumer;
import org.jspecify.annotations.Nullable;

/** A duty map in the making: cells of a coarse net first, then those between. Any thread may take a snapshot meanwhile. */
public final class MapRun {

    private final Subject subject;
    private final Axis across;
    private final Axis up;
    private final Result result;
    private final int[] order;
    private final AtomicReferenceArray<@Nullable Outcome> cells;

    public MapRun(Subject subject, Axis across, Axis up, Result result) {
        this.subject = subject;
        this.across = across;
        this.up = up;
        this.result = result;
        this.order = order(across.points(), up.points());
        this.cells = new AtomicReferenceArray<>(order.length);
    }

    /** Cells by the net they belong to: every 2ᵏth along both axes, k falling. */
    private static int[] order(int columns, int rows) {
        int[] order = new int[columns * rows];
        int at = 0;
        int coarsest = Integer.highestOneBit(Math.max(columns, rows) - 1);
        for (int stride = coarsest; stride >= 1; stride /= 2) {
            for (int row = 0; row < rows; row += stride) {
                for (int column = 0; column < columns; column += stride) {
                    boolean before = stride < coarsest && row % (2 * stride) == 0 && column % (2 * stride) == 0;
                    if (!before) {
                        order[at++] = row * columns + column;
                    }
                }
            }
        }
        return order;
    }

    /** Computes every cell, once; what is known when the watch ends it stays known. The cells do not depend on the threads. */
    public DutyMap fill(int threads, Watch watch) {
        Workers.each(order.length, threads, watch, this::worker);
        return snapshot();
    }

    private IntConsumer worker() {
        Probe probe = result.probe(subject.shownThrow());
        return part -> {
            int cell = order[part];
            List<Setting> settings = List.of(
                    new Setting(across.variable(), across.at(cell % across.points())),
                    new Setting(up.variable(), up.at(cell / across.points())));
            cells.set(cell, subject.with(settings).ask(probe));
        };
    }

    /** The map as far as it is known by now. */
    public DutyMap snapshot() {
        @Nullable Outcome[] copy = new Outcome[cells.length()];
        for (int i = 0; i < copy.length; i++) {
            copy[i] = cells.get(i);
        }
        return new DutyMap(across, up, result, copy);
    }
}
