package throwbench.app.strip;

import java.util.List;
import java.util.Optional;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;
import throwbench.app.drawing.TextFit;

/** At the left of each lane its title, unit and traces; the present values stand behind the names. */
final class LegendPainter {

    private static final double EDGE = 10;

    /** Room kept for the present value, the widest being six figures with a sign. */
    static final double VALUE = 52;

    private static final double TITLE = 12.5;
    private static final double LEAST_STEP = 10.5;

    /** Room for the sign that takes an added trace off. */
    private static final double REMOVE = 12;

    private static final double NAME = 11.5;

    /**
     * Where the lines of a lane's legend stand.
     *
     * @param title baseline of the title
     * @param first baseline of the first trace
     * @param step from trace to trace
     * @param shown how many traces find room
     */
    record Lines(double title, double first, double step, int shown) {

        static Lines of(StripLayout.Row row, int traces) {
            double title = row.top() + Math.min(10, row.height() * 0.3 + 1);
            if (traces == 1) {
                return new Lines(title, title, 0, 1);
            }
            double room = row.bottom() + 1 - title;
            double step = Math.max(LEAST_STEP, Math.min(16, room / traces));
            int shown = (int) Math.min(traces, Math.max(1, Math.floor(room / step + 1e-9)));
            return new Lines(title, title + step, step, shown);
        }

        double baseline(int trace) {
            return first + trace * step;
        }
    }

    /** Height below which the legend of a lane with so many traces is not whole. */
    static double need(int traces) {
        return traces == 1 ? 20 : TITLE - 3 + traces * LEAST_STEP;
    }

    void paint(Pen pen, StripPlot plot, Palette palette) {
        for (int l = 0; l < plot.lanes().size(); l++) {
            paint(pen, plot, l, palette);
        }
    }

    private static void paint(Pen pen, StripPlot plot, int index, Palette palette) {
        Lane lane = plot.lanes().get(index);
        List<StripTrace> traces = lane.traces();
        Lines lines = Lines.of(plot.layout().lanes().get(index), traces.size());
        pen.font(TITLE, true);
        pen.fill(palette.ground().ink());
        pen.text(title(lane), EDGE, lines.title(), Pen.Align.LEFT);
        double titleEnd = EDGE + pen.width(title(lane));
        pen.font(NAME - 0.5, false);
        pen.fill(palette.ground().soft());
        pen.text(plot.readout(index, 0).unit(), titleEnd + 6, lines.title(), Pen.Align.LEFT);
        if (traces.size() == 1) {
            if (traces.get(0).added()) {
                double unitEnd = titleEnd + 6 + pen.width(plot.readout(index, 0).unit());
                pen.text("×", unitEnd + 5, lines.title(), Pen.Align.LEFT);
            }
            return;
        }
        double sample = plot.layout().left() >= 170 ? 24 : 16;
        double nameAt = EDGE + sample + 5;
        double room = plot.layout().left() - VALUE - nameAt + 2;
        for (int t = 0; t < lines.shown(); t++) {
            StripTrace trace = traces.get(t);
            double base = lines.baseline(t);
            pen.stroke(trace.signal().colour(palette), trace.strong() ? 2.6 : 1.8);
            trace.dash().on(pen);
            pen.line(EDGE, base - 4, EDGE + sample, base - 4);
            pen.font(Math.min(NAME, lines.step()), trace.strong());
            pen.fill(trace.strong() ? palette.ground().ink() : palette.ground().soft());
            String name = TextFit.name(pen, trace.name(), trace.shortName(), room - (trace.added() ? REMOVE : 0));
            pen.text(name, nameAt, base, Pen.Align.LEFT);
            if (trace.added()) {
                pen.text("×", nameAt + pen.width(name) + 4, base, Pen.Align.LEFT);
            }
        }
    }

    /** The added trace whose name stands at a point, if any. */
    static Optional<StripTrace> removable(StripPlot plot, double x, double y) {
        if (x > plot.layout().left() - VALUE) {
            return Optional.empty();
        }
        for (int l = 0; l < plot.lanes().size(); l++) {
            List<StripTrace> traces = plot.lanes().get(l).traces();
            Lines lines = Lines.of(plot.layout().lanes().get(l), traces.size());
            for (int t = 0; t < lines.shown(); t++) {
                double base = lines.baseline(t);
                if (traces.get(t).added() && y > base - 11 && y < base + 3) {
                    return Optional.of(traces.get(t));
                }
            }
        }
        return Optional.empty();
    }

    /** A lane of one added trace carries that trace's name. */
    private static String title(Lane lane) {
        boolean lone = lane.traces().size() == 1 && lane.traces().get(0).added();
        return lone ? lane.traces().get(0).name() : lane.kind().title();
    }
}
