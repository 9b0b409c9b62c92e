package throwbench.app.strip;

import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;
import throwbench.app.drawing.Readout;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.revolution.Instant;

/** The cursor at the present crank angle: a line with a dot on every trace and the angle in a box, and the present values. */
final class CursorPainter {

    /** Half the width that the cursor needs at either side of its line. */
    static final double REACH = 70;

    private static final double BOX_WIDTH = 58;
    private static final double BOX_HEIGHT = 21;

    private final double[] px = new double[3];
    private final double[] py = new double[3];

    /** Draws the cursor. */
    void paint(Pen pen, StripPlot plot, Palette palette, Instant instant) {
        StripLayout layout = plot.layout();
        double angle = Angles.wrap(instant.crankAngle());
        double x = layout.x(angle);
        pen.stroke(palette.ground().ink(), 2);
        pen.line(x, layout.band().top(), x, layout.axis().top() + 4);
        pen.fill(palette.ground().ink());
        px[0] = x - 7;
        px[1] = x + 7;
        px[2] = x;
        py[0] = layout.band().top() - 6;
        py[1] = py[0];
        py[2] = layout.band().top() + 5;
        pen.polygon(px, py, 3, true, false);
        dots(pen, plot, palette, instant, x);
        double top = layout.axis().top() + 3;
        hideCutDegrees(pen, layout, palette, x);
        pen.fill(palette.ground().ink());
        pen.rect(x - BOX_WIDTH / 2, top, BOX_WIDTH, BOX_HEIGHT, 4, true, false);
        pen.font(13.5, true);
        pen.fill(palette.ground().onAccent());
        pen.text(Readout.angle().text(angle), x, top + 15.5, Pen.Align.CENTRE);
    }

    /** A degree that the box would cover in part is covered whole. */
    private static void hideCutDegrees(Pen pen, StripLayout layout, Palette palette, double x) {
        pen.fill(palette.ground().surface());
        double reach = BOX_WIDTH / 2 + AxisPainter.LABEL_REACH;
        for (int degrees = 0; degrees <= 360; degrees += AxisPainter.labelStep(layout)) {
            double at = layout.x(Math.toRadians(degrees));
            if (Math.abs(at - x) < reach) {
                pen.rect(
                        at - AxisPainter.LABEL_REACH,
                        layout.axis().top() + 7,
                        2 * AxisPainter.LABEL_REACH,
                        BOX_HEIGHT - 6,
                        0,
                        true,
                        false);
            }
        }
    }

    private static void dots(Pen pen, StripPlot plot, Palette palette, Instant instant, double x) {
        for (int l = 0; l < plot.lanes().size(); l++) {
            Lane lane = plot.lanes().get(l);
            for (int t = 0; t < lane.traces().size(); t++) {
                StripTrace trace = lane.traces().get(t);
                double y = plot.scale(l).y(trace.signal().at(instant));
                pen.fill(palette.ground().surface());
                pen.stroke(trace.signal().colour(palette), trace.strong() ? 2.6 : 2);
                pen.circle(x, y, trace.strong() ? 5 : 4, true, true);
            }
        }
    }

    /** Draws the present value of every trace behind its name in the legend. */
    void values(Pen pen, StripPlot plot, Palette palette, Instant instant) {
        double x = plot.layout().left() - 10;
        for (int l = 0; l < plot.lanes().size(); l++) {
            Lane lane = plot.lanes().get(l);
            LegendPainter.Lines lines = LegendPainter.Lines.of(
                    plot.layout().lanes().get(l), lane.traces().size());
            for (int t = 0; t < lines.shown(); t++) {
                StripTrace trace = lane.traces().get(t);
                double value = trace.signal().at(instant);
                pen.font(lines.step() > 0 ? Math.min(12, lines.step() + 0.5) : 12, true);
                pen.fill(
                        trace.strong() ? palette.rodLoad(value) : trace.signal().colour(palette));
                pen.text(plot.readout(l, t).number(value), x, lines.baseline(t), Pen.Align.RIGHT);
            }
        }
    }
}
