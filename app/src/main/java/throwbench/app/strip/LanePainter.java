package throwbench.app.strip;

import java.util.List;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;
import throwbench.app.drawing.Readout;

/** The traces of the lanes with their zero lines, and the least and greatest value of each lane at its right. */
final class LanePainter {

    private static final double STRONG = 2.6;
    private static final double PLAIN = 1.7;
    private static final double AREA = 0.17;
    private static final double LABEL = 11;

    private double[] areaX = {};
    private double[] areaY = {};

    void paint(Pen pen, StripPlot plot, Palette palette) {
        for (int l = 0; l < plot.lanes().size(); l++) {
            List<StripTrace> traces = plot.lanes().get(l).traces();
            for (int t = 0; t < traces.size(); t++) {
                if (traces.get(t).strong()) {
                    areas(pen, plot, l, t, palette);
                }
            }
            frame(pen, plot, l, palette);
            for (int t = 0; t < traces.size(); t++) {
                StripTrace trace = traces.get(t);
                pen.stroke(trace.signal().colour(palette), trace.strong() ? STRONG : PLAIN);
                trace.dash().on(pen);
                pen.polyline(plot.x(), plot.y(l, t), plot.points());
            }
            labels(pen, plot, l, palette);
        }
    }

    private static void frame(Pen pen, StripPlot plot, int lane, Palette palette) {
        StripLayout layout = plot.layout();
        LaneScale scale = plot.scale(lane);
        if (lane > 0) {
            double y = Math.rint(scale.top() - 3) + 0.5;
            pen.stroke(palette.ground().grid(), 1);
            pen.line(8, y, layout.width() - 8, y);
        }
        if (scale.hasZero()) {
            double zero = scale.y(0);
            pen.stroke(palette.ground().soft(), 1);
            pen.line(layout.left(), zero, layout.right(), zero);
        }
    }

    /** The area between a trace and zero, by sign. */
    private void areas(Pen pen, StripPlot plot, int lane, int trace, Palette palette) {
        double zero = plot.scale(lane).y(0);
        int n = plot.points();
        if (areaX.length != n + 2) {
            areaX = new double[n + 2];
            areaY = new double[n + 2];
            areaX[0] = 0;
        }
        double[] x = plot.x();
        double[] y = plot.y(lane, trace);
        System.arraycopy(x, 0, areaX, 1, n);
        areaX[0] = x[0];
        areaX[n + 1] = x[n - 1];
        areaY[0] = zero;
        areaY[n + 1] = zero;
        for (int sign = -1; sign <= 1; sign += 2) {
            for (int i = 0; i < n; i++) {
                areaY[i + 1] = sign > 0 ? Math.min(y[i], zero) : Math.max(y[i], zero);
            }
            pen.fill(palette.rodLoad(sign), AREA);
            pen.polygon(areaX, areaY, n + 2, true, false);
        }
    }

    private static void labels(Pen pen, StripPlot plot, int lane, Palette palette) {
        LaneScale scale = plot.scale(lane);
        Readout readout = plot.readout(lane, 0);
        double x = plot.layout().width() - 8;
        pen.font(LABEL, false);
        pen.fill(palette.ground().soft());
        double high = Math.max(scale.top() + 8, scale.y(scale.greatest()) + 4);
        double low = Math.min(scale.bottom(), scale.y(scale.least()) + 4);
        boolean flat = readout.number(scale.greatest()).equals(readout.number(scale.least()));
        pen.text(readout.number(scale.greatest()), x, flat ? (high + low) / 2 : high, Pen.Align.RIGHT);
        boolean bothFit = low - high >= LABEL;
        if (bothFit && !flat) {
            pen.text(readout.number(scale.least()), x, low, Pen.Align.RIGHT);
        }
        double zero = scale.y(0) + 4;
        if (scale.hasZero() && zero - high >= LABEL && low - zero >= LABEL) {
            pen.text("0", x, zero, Pen.Align.RIGHT);
        }
    }
}
