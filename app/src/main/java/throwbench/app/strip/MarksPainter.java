package throwbench.app.strip;

import java.util.List;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;
import throwbench.solver.revolution.Extremes;

/** Named marks of sign changes, peaks and bookmarks under the band, and the same marks on the traces they belong to. */
final class MarksPainter {

    private static final double SIZE = 11.5;

    private final double[] px = new double[4];
    private final double[] py = new double[4];

    void paint(Pen pen, StripPlot plot, Palette palette) {
        StripLayout layout = plot.layout();
        onTrace(pen, plot, palette);
        pen.font(SIZE, true);
        List<MarkRows.Placed> placed = MarkRows.place(pen, layout, plot.events().all());
        for (MarkRows.Placed mark : placed) {
            StripLayout.Row row = layout.markRows().get(mark.row());
            pen.fill(palette.ground().surface(), 0.85);
            pen.rect(mark.from() - 2, row.top() + 1, mark.to() - mark.from() + 4, row.height() - 2, 2, true, false);
            pen.fill(palette.ground().ink());
            symbol(pen, mark.event().kind(), mark.x(), row.middle(), 4);
            pen.text(mark.text(), mark.from(), row.middle() + 4, Pen.Align.LEFT);
        }
    }

    /** The marks of the rod load on its trace. */
    private void onTrace(Pen pen, StripPlot plot, Palette palette) {
        for (int l = 0; l < plot.lanes().size(); l++) {
            List<StripTrace> traces = plot.lanes().get(l).traces();
            for (int t = 0; t < traces.size(); t++) {
                if (traces.get(t).strong()) {
                    onTrace(pen, plot, l, t, palette);
                }
            }
        }
    }

    private void onTrace(Pen pen, StripPlot plot, int lane, int trace, Palette palette) {
        LaneScale scale = plot.scale(lane);
        for (StripEvent event : plot.events().all()) {
            double x = plot.layout().x(event.angle());
            pen.fill(palette.ground().ink());
            if (event.kind() == StripEvent.Kind.SIGN_CHANGE) {
                symbol(pen, event.kind(), x, scale.y(0), 4);
            } else if (event.kind() == StripEvent.Kind.PEAK) {
                Extremes extremes = plot.extremes(lane, trace);
                boolean top = event.angle() == extremes.greatest().crankAngle();
                double peak =
                        top ? extremes.greatest().value() : extremes.least().value();
                pen.circle(x, scale.y(peak), 3.2, true, false);
            }
        }
    }

    /** A lozenge for a sign change, a triangle for a peak, a flag for a bookmark. */
    private void symbol(Pen pen, StripEvent.Kind kind, double x, double y, double size) {
        switch (kind) {
            case SIGN_CHANGE -> shape(pen, x, y - size, x + size, y, x, y + size, x - size, y);
            case PEAK -> shape(pen, x - size, y - size, x + size, y - size, x, y + size, x, y + size);
            default -> shape(pen, x, y - size, x + size, y - size / 2, x, y, x, y + size);
        }
    }

    private void shape(
            Pen pen, double x1, double y1, double x2, double y2, double x3, double y3, double x4, double y4) {
        px[0] = x1;
        py[0] = y1;
        px[1] = x2;
        py[1] = y2;
        px[2] = x3;
        py[2] = y3;
        px[3] = x4;
        py[3] = y4;
        pen.polygon(px, py, 4, true, false);
    }
}
