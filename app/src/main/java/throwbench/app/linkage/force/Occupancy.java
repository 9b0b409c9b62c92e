package throwbench.app.linkage.force;

/** What of a drawing is taken at some angle of the revolution, on a grid; tells how crowded a rectangle is. */
public final class Occupancy {

    private final double cell;
    private final int columns;
    private final int rows;
    private final float[] taken;
    private final double[] sums;

    /** @param cell side of a cell, points */
    public Occupancy(double width, double height, double cell) {
        this.cell = cell;
        columns = Math.max(1, (int) Math.ceil(width / cell));
        rows = Math.max(1, (int) Math.ceil(height / cell));
        taken = new float[columns * rows];
        sums = new double[(columns + 1) * (rows + 1)];
    }

    /** Takes the cell of a point; a cell keeps its greatest weight. */
    public void mark(double x, double y, double weight) {
        int c = (int) Math.floor(x / cell);
        int r = (int) Math.floor(y / cell);
        if (c >= 0 && r >= 0 && c < columns && r < rows) {
            int i = r * columns + c;
            taken[i] = Math.max(taken[i], (float) weight);
        }
    }

    public void line(double x1, double y1, double x2, double y2, double weight) {
        int steps = steps(Math.hypot(x2 - x1, y2 - y1));
        for (int i = 0; i <= steps; i++) {
            double at = (double) i / steps;
            mark(x1 + at * (x2 - x1), y1 + at * (y2 - y1), weight);
        }
    }

    /** Takes a parallelogram given by a corner and two sides. */
    public void area(double x, double y, double ax, double ay, double bx, double by, double weight) {
        int steps = steps(Math.hypot(bx, by));
        for (int i = 0; i <= steps; i++) {
            double at = (double) i / steps;
            line(x + at * bx, y + at * by, x + at * bx + ax, y + at * by + ay, weight);
        }
    }

    public void disc(double x, double y, double radius, double weight) {
        int steps = steps(2 * radius);
        for (int i = 0; i <= steps; i++) {
            double dy = radius * (2.0 * i / steps - 1);
            double half = Math.sqrt(Math.max(0, (radius - dy) * (radius + dy)));
            line(x - half, y + dy, x + half, y + dy, weight);
        }
    }

    // a drawing zoomed far in runs far out of the view: the grid is all that counts
    private int steps(double length) {
        return (int) Math.max(1, Math.min(4000, Math.ceil(length / (0.7 * cell))));
    }

    /** Sums up; to be called after the last mark. */
    public void sum() {
        int w = columns + 1;
        for (int r = 0; r < rows; r++) {
            double row = 0;
            for (int c = 0; c < columns; c++) {
                row += taken[r * columns + c];
                sums[(r + 1) * w + c + 1] = sums[r * w + c + 1] + row;
            }
        }
    }

    /** Mean weight in a rectangle. */
    public double share(double x, double y, double width, double height) {
        int c1 = clamp((int) Math.floor(x / cell), columns);
        int r1 = clamp((int) Math.floor(y / cell), rows);
        int c2 = clamp((int) Math.ceil((x + width) / cell), columns);
        int r2 = clamp((int) Math.ceil((y + height) / cell), rows);
        int cells = (c2 - c1) * (r2 - r1);
        if (cells == 0) {
            return 0;
        }
        int w = columns + 1;
        return (sums[r2 * w + c2] - sums[r1 * w + c2] - sums[r2 * w + c1] + sums[r1 * w + c1]) / cells;
    }

    private static int clamp(int i, int most) {
        return Math.max(0, Math.min(most, i));
    }
}
