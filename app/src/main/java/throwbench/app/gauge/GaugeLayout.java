package throwbench.app.gauge;

/**
 * Where a column of gauges stands, y downwards: rows shrink to what the column's height allows, down to the least that can be
 * read; then the column scrolls.
 *
 * @param left end of the scales
 * @param right end of the scales
 * @param top of the first row
 * @param row height of a row
 * @param count number of rows
 */
record GaugeLayout(double left, double right, double top, double row, int count) {

    private static final double EDGE = 14;
    private static final double TITLE = 34;
    private static final double LEAST_ROW = 41;
    private static final double MOST_ROW = 70;

    static GaugeLayout of(double width, double available, int count) {
        double room = (available - TITLE - 6) / Math.max(1, count);
        double row = Math.floor(Math.max(LEAST_ROW, Math.min(MOST_ROW, room)));
        return new GaugeLayout(EDGE, Math.max(EDGE + 40, width - EDGE), TITLE, row, count);
    }

    /** Height of everything. */
    double height() {
        return top + row * count + 6;
    }

    double rowTop(int gauge) {
        return top + row * gauge;
    }

    /** Size of the present value's figures. */
    double valueSize() {
        return Math.min(25, row * 0.43);
    }

    double nameSize() {
        return Math.min(13, row * 0.29);
    }

    /** Baseline of name, value and unit. */
    double baseline(int gauge) {
        return rowTop(gauge) + valueSize() * 0.86;
    }

    double barTop(int gauge) {
        return rowTop(gauge) + valueSize() + 5;
    }

    double barHeight() {
        return Math.max(8, Math.min(11, row * 0.17));
    }

    /** Whether the extremes have room to be written under the scale. */
    boolean saysExtremes() {
        return row >= valueSize() + 5 + barHeight() + 20;
    }

    /** x of a share of the scale. */
    double x(double share) {
        return left + share * (right - left);
    }
}
