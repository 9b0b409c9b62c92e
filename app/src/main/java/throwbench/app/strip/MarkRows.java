package throwbench.app.strip;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import throwbench.app.drawing.Pen;

/**
 * Names of marks placed in rows so that none overlaps another: the most telling ones first, each in the first row with room
 * for its name at the right of its mark, else at the left, else for its short name; what finds no room is left out: its mark
 * still stands on its trace.
 */
final class MarkRows {

    private static final double GAP = 8;

    /**
     * A placed name.
     *
     * @param row index of the row
     * @param from left end of the text
     * @param to right end of it
     */
    record Placed(StripEvent event, double x, int row, String text, double from, double to) {}

    private final List<Placed> placed = new ArrayList<>();
    private final int rows;
    private final double left;
    private final double right;

    private MarkRows(int rows, double left, double right) {
        this.rows = rows;
        this.left = left;
        this.right = right;
    }

    /** Places the events that are no valve's and no dead centre's; the pen has the font of the names. */
    static List<Placed> place(Pen pen, StripLayout layout, List<StripEvent> events) {
        MarkRows marks = new MarkRows(layout.markRows().size(), layout.left() - 4, layout.width() - 6);
        events.stream()
                .filter(e -> !e.kind().ofValve() && e.kind() != StripEvent.Kind.DEAD_CENTRE)
                .sorted(Comparator.comparing(StripEvent::kind))
                .forEach(e -> marks.put(pen, e, layout.x(e.angle())));
        return List.copyOf(marks.placed);
    }

    private void put(Pen pen, StripEvent event, double x) {
        for (String text : List.of(event.name(), event.shortName())) {
            double width = pen.width(text);
            for (int row = 0; row < rows; row++) {
                for (double from : new double[] {x + 7, x - 7 - width}) {
                    if (free(row, from, from + width, x)) {
                        placed.add(new Placed(event, x, row, text, from, from + width));
                        return;
                    }
                }
            }
        }
    }

    private boolean free(int row, double from, double to, double x) {
        if (from < left || to > right) {
            return false;
        }
        double start = Math.min(from, x - 5);
        double end = Math.max(to, x + 5);
        for (Placed other : placed) {
            boolean apart =
                    Math.max(other.to, other.x + 5) + GAP <= start || Math.min(other.from, other.x - 5) - GAP >= end;
            if (other.row == row && !apart) {
                return false;
            }
        }
        return true;
    }
}
