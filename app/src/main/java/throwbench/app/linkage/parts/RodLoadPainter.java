package throwbench.app.linkage.parts;

import throwbench.app.drawing.Pen;

/**
 * Shows what the rod carries along its whole length: colour, and signs that need no colour. A pulled rod bears pairs of
 * heads that point apart, joined by a stem; a pushed one pairs that point at each other, their stems outside.
 */
public final class RodLoadPainter {

    /** Below this share of the revolution's greatest load the rod counts as unloaded. */
    public static final double NEUTRAL = 0.005;

    /** Length of a sign and greatest half height of its heads, points at weight 1. */
    private static final double SIGN = 46;

    private static final double HEAD = 8;

    /** Distance of the signs' middles over their length. */
    private static final double PITCH = 1.45;

    private RodLoadPainter() {}

    /**
     * Fills a stretch of a bar.
     *
     * @param share load over the greatest magnitude of the revolution, tension positive
     * @param half half the thickness shown, m
     */
    public static void paint(ThrowPen p, Band band, double share, Look look, double half) {
        Pen pen = p.pen();
        boolean neutral = Math.abs(share) < NEUTRAL;
        int hue = look.palette().rodLoad(share);
        pen.stroke(look.edge(), look.strong());
        pen.fill(neutral ? look.palette().ground().surface() : hue);
        p.turnedBox(band.fromX, band.fromY, band.cos, band.sin, 0, -half, band.length, half);
        int mark = neutral
                ? look.palette().ground().soft()
                : look.palette().ground().onAccent();
        pen.fill(mark);
        pen.stroke(mark, Math.max(1, look.strong()));
        double sign = p.metres(SIGN * look.thin());
        double head = Math.min(0.62 * half, p.metres(HEAD * look.thin()));
        int signs = Math.max(1, (int) Math.floor(band.length / (PITCH * sign)));
        double step = band.length / signs;
        double reach = Math.min(sign, 0.8 * step) / 2;
        for (int i = 0; i < signs; i++) {
            double at = (i + 0.5) * step;
            if (neutral) {
                stem(p, band, at - 0.3 * reach, at + 0.3 * reach);
            } else if (share > 0) {
                pulled(p, band, at, reach, head);
            } else {
                pushed(p, band, at, reach, head);
            }
        }
    }

    private static void pulled(ThrowPen p, Band band, double at, double reach, double half) {
        double head = Math.min(1.7 * half, 0.7 * reach);
        stem(p, band, at - reach + head, at + reach - head);
        head(p, band, at - reach, at - reach + head, half);
        head(p, band, at + reach, at + reach - head, half);
    }

    private static void pushed(ThrowPen p, Band band, double at, double reach, double half) {
        double head = Math.min(1.7 * half, 0.7 * reach);
        double gap = 0.06 * reach;
        stem(p, band, at - reach, at - gap - head);
        stem(p, band, at + gap + head, at + reach);
        head(p, band, at - gap, at - gap - head, half);
        head(p, band, at + gap, at + gap + head, half);
    }

    private static void stem(ThrowPen p, Band b, double from, double to) {
        p.line(b.x(from, 0), b.y(from, 0), b.x(to, 0), b.y(to, 0));
    }

    private static void head(ThrowPen p, Band b, double tip, double base, double half) {
        p.triangle(
                b.x(tip, 0), b.y(tip, 0), b.x(base, half), b.y(base, half), b.x(base, -half), b.y(base, -half), true);
    }

    /** A loaded stretch in throw axes; kept by its owner and set anew for each instant. */
    public static final class Band {

        private double fromX;
        private double fromY;
        private double cos = 1;
        private double sin;
        private double length;

        /** A stretch from a point along a direction of this cosine and sine. */
        public Band set(double startX, double startY, double cosine, double sine, double stretch) {
            fromX = startX;
            fromY = startY;
            cos = cosine;
            sin = sine;
            length = stretch;
            return this;
        }

        double x(double along, double across) {
            return fromX + cos * along - sin * across;
        }

        double y(double along, double across) {
            return fromY + sin * along + cos * across;
        }
    }
}
