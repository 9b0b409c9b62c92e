package throwbench.app.strip;

import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;

/** Paints all of the strip that does not move with the crank. */
final class StripPainter {

    private final BandPainter band = new BandPainter();
    private final AxisPainter axis = new AxisPainter();
    private final LanePainter lanes = new LanePainter();
    private final LegendPainter legend = new LegendPainter();
    private final MarksPainter marks = new MarksPainter();
    private final ValvePainter valves = new ValvePainter();

    void paint(Pen pen, StripPlot plot, Palette palette) {
        axis.grid(pen, plot, palette);
        band.paint(pen, plot, palette);
        axis.paint(pen, plot, palette);
        lanes.paint(pen, plot, palette);
        valves.paint(pen, plot, palette);
        marks.paint(pen, plot, palette);
        legend.paint(pen, plot, palette);
    }
}
