package throwbench.app.strip;

import java.util.List;
import java.util.Optional;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;

/**
 * The reversal band: filled spans whose chevrons point apart in tension and together in compression, with words and degrees;
 * and the spans' faint shade through the lanes.
 */
final class BandPainter {

    private static final double CHEVRON_STEP = 46;
    private static final double SHADE = 0.07;

    /** What a neighbour keeps for its own words beside a call-out. */
    private static final double LEAST_BESIDE = 70;

    private final double[] px = new double[3];
    private final double[] py = new double[3];

    void paint(Pen pen, StripPlot plot, Palette palette) {
        StripLayout layout = plot.layout();
        Optional<CallOut> callOut = callOut(pen, plot);
        for (BandSpan span : plot.band()) {
            double from = layout.x(span.from());
            double to = layout.x(span.to());
            int colour = span.inTension()
                    ? palette.loads().tension()
                    : palette.loads().compression();
            pen.fill(colour, SHADE);
            pen.rect(from, layout.plotTop(), to - from, layout.plotBottom() - layout.plotTop(), 0, true, false);
            pen.fill(colour);
            pen.rect(from, layout.band().top(), to - from, layout.band().height(), 0, true, false);
            Optional<CallOut> taken = callOut.filter(c -> c.neighbour().equals(span));
            double start = taken.filter(CallOut::after).map(CallOut::end).orElse(from);
            double end = taken.filter(c -> !c.after()).map(CallOut::start).orElse(to);
            words(pen, layout.band(), span, start, end, palette);
        }
        callOut.ifPresent(c -> paint(pen, plot, c, palette));
        edges(pen, plot, palette);
    }

    /** Words of a narrow span that stand in the neighbouring one, from start to end. */
    private record CallOut(BandSpan neighbour, boolean after, double start, double end, double size, String words) {}

    /** The span that counts always carries its degrees and what is asked: beside it where it is too narrow itself. */
    private static Optional<CallOut> callOut(Pen pen, StripPlot plot) {
        StripLayout layout = plot.layout();
        List<BandSpan> band = plot.band();
        double height = layout.band().height();
        for (int i = 0; i < band.size(); i++) {
            BandSpan span = band.get(i);
            double from = layout.x(span.from());
            double to = layout.x(span.to());
            if (span.asked().isEmpty()
                    || caption(pen, span, height, to - from - 10).saysAll()) {
                continue;
            }
            double left = i > 0 ? from - layout.x(band.get(i - 1).from()) : 0;
            double right = i + 1 < band.size() ? layout.x(band.get(i + 1).to()) - to : 0;
            boolean after = right >= left;
            double size = Math.min(13, height * 0.48);
            pen.font(size, true);
            String words = span.words().get(span.words().size() - 1) + " (" + span.asked() + ")";
            double width = pen.width(words) + 2.4 * size;
            if (width + LEAST_BESIDE <= Math.max(left, right)) {
                double start = after ? to : from - width;
                return Optional.of(
                        new CallOut(band.get(after ? i + 1 : i - 1), after, start, start + width, size, words));
            }
        }
        return Optional.empty();
    }

    private void paint(Pen pen, StripPlot plot, CallOut callOut, Palette palette) {
        StripLayout.Row band = plot.layout().band();
        double size = callOut.size();
        boolean after = callOut.after();
        double tip = after ? callOut.start() + 0.5 * size : callOut.end() - 0.5 * size;
        pen.fill(palette.ground().onAccent());
        arrowHead(pen, tip, band.middle(), after ? size * 0.6 : -size * 0.6);
        pen.font(size, true);
        double base = band.middle() + size * 0.36;
        pen.text(callOut.words(), after ? tip + size : tip - size, base, after ? Pen.Align.LEFT : Pen.Align.RIGHT);
    }

    private void arrowHead(Pen pen, double tip, double y, double length) {
        px[0] = tip;
        py[0] = y;
        px[1] = tip + length;
        py[1] = y - Math.abs(length) * 0.6;
        px[2] = px[1];
        py[2] = y + Math.abs(length) * 0.6;
        pen.polygon(px, py, 3, true, false);
    }

    /** Lines where the sign changes, down through everything, with a light gap between the spans of the band. */
    private static void edges(Pen pen, StripPlot plot, Palette palette) {
        StripLayout layout = plot.layout();
        for (StripEvent event : plot.events().all()) {
            if (event.kind() == StripEvent.Kind.SIGN_CHANGE) {
                double x = layout.x(event.angle());
                pen.stroke(palette.ground().surface(), 2);
                pen.line(x, layout.band().top(), x, layout.band().bottom());
                pen.stroke(palette.ground().soft(), 1);
                pen.dash(3, 3);
                pen.line(x, layout.band().bottom(), x, layout.plotBottom());
            }
        }
    }

    /** How a span's words stand: on one line, or what is asked on a second one. */
    private record Caption(String first, String second, double size, double width) {

        /** Whether what is asked is among the words. */
        boolean saysAll() {
            return !second.isEmpty() || first.endsWith(")");
        }
    }

    private static Caption caption(Pen pen, BandSpan span, double height, double room) {
        double full = Math.min(14, height * 0.52);
        boolean twoLines = height >= 26 && !span.asked().isEmpty();
        for (String words : span.words()) {
            if (!span.asked().isEmpty()) {
                Caption one = measured(pen, words + " (" + span.asked() + ")", "", full);
                Caption two = measured(pen, words, span.asked(), height * 0.4);
                if (one.width <= room || (twoLines && two.width <= room)) {
                    return one.width <= room ? one : two;
                }
            }
        }
        for (String words : span.words()) {
            Caption alone = measured(pen, words, "", full);
            if (alone.width <= room) {
                return alone;
            }
        }
        return new Caption("", "", full, room >= full ? 2 * full : 0);
    }

    private static Caption measured(Pen pen, String first, String second, double size) {
        pen.font(size, true);
        return new Caption(first, second, size, Math.max(pen.width(first), pen.width(second)) + 2 * size);
    }

    private void words(Pen pen, StripLayout.Row band, BandSpan span, double from, double to, Palette palette) {
        double middle = (from + to) / 2;
        Caption caption = caption(pen, span, band.height(), to - from - 10);
        int ink = palette.ground().onAccent();
        pen.fill(ink, 0.34);
        chevronsAround(pen, band, span.inTension(), from, to, middle, caption.width + 14);
        pen.fill(ink);
        if (caption.first.isEmpty()) {
            if (caption.width > 0) {
                chevrons(pen, middle, band.middle(), caption.size * 0.5, span.inTension());
            }
            return;
        }
        double start = middle - caption.width / 2;
        double size = caption.size;
        pen.font(size, true);
        chevrons(pen, start + size * 0.7, band.middle(), size * 0.5, span.inTension());
        double base = band.middle() + size * 0.36;
        double lift = caption.second.isEmpty() ? 0 : size * 0.55;
        pen.text(caption.first, start + 2 * size, base - lift, Pen.Align.LEFT);
        if (lift > 0) {
            pen.text(caption.second, start + 2 * size, base + lift, Pen.Align.LEFT);
        }
    }

    /** The pattern of the rod, so that the span says its sign without words and colour. */
    private void chevronsAround(
            Pen pen, StripLayout.Row band, boolean inTension, double from, double to, double middle, double taken) {
        double size = Math.min(5, band.height() * 0.2);
        double reach = 2.4 * size;
        for (int side = -1; side <= 1; side += 2) {
            double at = middle + side * (taken / 2 + CHEVRON_STEP / 2);
            while (at - reach > from && at + reach < to) {
                chevrons(pen, at, band.middle(), size, inTension);
                at += side * CHEVRON_STEP;
            }
        }
    }

    /** Two solid arrow heads, pointing apart (tension) or together (compression). */
    private void chevrons(Pen pen, double x, double y, double size, boolean apart) {
        for (int side = -1; side <= 1; side += 2) {
            double near = x + side * 0.25 * size;
            double far = x + side * 1.35 * size;
            px[0] = apart ? far : near;
            py[0] = y;
            px[1] = apart ? near : far;
            py[1] = y - 0.8 * size;
            px[2] = px[1];
            py[2] = y + 0.8 * size;
            pen.polygon(px, py, 3, true, false);
        }
    }
}
