package throwbench.app.linkage.force;

import throwbench.app.drawing.Pen;

/**
 * Draws arrows by kind. Gas: heavy shaft, full head. Inertia: hollow head. Connecting rod inertia: hollow head, dashed
 * shaft. Rod load: double line. Crank pin: a ring at its foot. Crosshead pin: a dot at its foot, dashed. Guide: broad head
 * on a plate. Torque: arc.
 */
public final class ArrowPainter {

    /** An arrow shorter than this is nothing to look at, points. */
    static final double SHORTEST = 1.5;

    private final double weight;
    private final double[] dashes;
    private final double[] x = new double[4];
    private final double[] y = new double[4];
    private Pen pen;
    private double tailX;
    private double tailY;
    private double ux;
    private double uy;
    private double length;

    /** @param weight of lines, 1 for an ordinary window */
    public ArrowPainter(Pen pen, double weight) {
        this.pen = pen;
        this.weight = weight;
        this.dashes = new double[] {6 * weight, 3.5 * weight};
    }

    public ArrowPainter on(Pen next) {
        pen = next;
        return this;
    }

    /** Draws an arrow between two points in a colour on a ground. */
    public void paint(ForceKind kind, double fromX, double fromY, double toX, double toY, int colour, int ground) {
        length = Math.hypot(toX - fromX, toY - fromY);
        if (length < SHORTEST) {
            return;
        }
        tailX = fromX;
        tailY = fromY;
        ux = (toX - fromX) / length;
        uy = (toY - fromY) / length;
        switch (kind) {
            case GAS -> {
                // it lies on a chamber filled in its own hue
                halo(6, 12, 6, ground);
                shaftAndHead(3.2, 12, 6, colour, ground, false);
            }
            case INERTIA -> shaftAndHead(2.4, 12, 5.5, colour, ground, true);
            case ROD_INERTIA -> {
                dashed(2, 11, colour);
                head(11, 5, colour, ground, true);
            }
            case ROD -> doubled(colour);
            case CROSSHEAD_PIN -> {
                dashed(2.2, 12, colour);
                head(12, 4.5, colour, ground, false);
                pen.fill(colour);
                pen.circle(tailX, tailY, 3.4 * weight, true, false);
            }
            case CRANK_PIN -> {
                shaftAndHead(2.8, 14, 5, colour, ground, false);
                pen.fill(ground);
                pen.stroke(colour, 2 * weight);
                pen.circle(tailX, tailY, 4 * weight, true, true);
            }
            case GUIDE -> plate(colour, ground);
            case TORQUE -> {}
        }
    }

    /** Draws a torque's arc, begun at an angle (rad, counter-clockwise from the right), over an extent (rad). */
    public void paintArc(double x0, double y0, double radius, double from, double extent, int colour) {
        pen.stroke(colour, 1.6 * weight);
        pen.line(
                x0 + (radius - 5 * weight) * Math.cos(from),
                y0 - (radius - 5 * weight) * Math.sin(from),
                x0 + (radius + 5 * weight) * Math.cos(from),
                y0 - (radius + 5 * weight) * Math.sin(from));
        double arcLength = Math.abs(extent) * radius;
        if (arcLength < SHORTEST) {
            return;
        }
        double head = Math.min(13 * weight, 0.8 * arcLength);
        double sense = Math.signum(extent);
        double shaft = Math.max(0, Math.abs(extent) - 0.8 * head / radius) * sense;
        pen.stroke(colour, 2.6 * weight);
        pen.arc(x0, y0, radius, Math.toDegrees(from), Math.toDegrees(shaft));
        double end = from + extent;
        double start = end - sense * head / radius;
        double half = 0.42 * head;
        set(0, x0 + radius * Math.cos(end), y0 - radius * Math.sin(end));
        set(1, x0 + (radius + half) * Math.cos(start), y0 - (radius + half) * Math.sin(start));
        set(2, x0 + (radius - half) * Math.cos(start), y0 - (radius - half) * Math.sin(start));
        pen.fill(colour);
        pen.polygon(x, y, 3, true, false);
    }

    private void shaftAndHead(double width, double head, double half, int colour, int ground, boolean hollow) {
        double h = headLength(head);
        pen.stroke(colour, width * weight);
        shaft(0, length - (hollow ? h : 0.8 * h), 0);
        head(head, half, colour, ground, hollow);
    }

    /** Ground colour under and round an arrow. */
    private void halo(double width, double head, double half, int ground) {
        double h = headLength(head);
        pen.stroke(ground, width * weight);
        shaft(0, length - 0.8 * h, 0);
        corners(head, half);
        pen.stroke(ground, 3 * weight);
        pen.polygon(x, y, 3, false, true);
    }

    private void dashed(double width, double head, int colour) {
        pen.stroke(colour, width * weight);
        pen.dash(dashes);
        shaft(0, length - headLength(head), 0);
        pen.dash();
    }

    private void doubled(int colour) {
        double h = headLength(13);
        pen.stroke(colour, 1.5 * weight);
        shaft(0, length - h, 2.4 * weight);
        shaft(0, length - h, -2.4 * weight);
        head(13, 6, colour, colour, false);
    }

    private void plate(int colour, int ground) {
        shaftAndHead(2.6, 9, 6.5, colour, ground, false);
        pen.stroke(colour, 2.2 * weight);
        double half = 8 * weight;
        double atX = tailX + length * ux;
        double atY = tailY + length * uy;
        pen.line(atX - half * uy, atY + half * ux, atX + half * uy, atY - half * ux);
    }

    /** A head never takes more than most of a short arrow. */
    private double headLength(double wanted) {
        return Math.min(wanted * weight, 0.75 * length);
    }

    private void shaft(double from, double to, double across) {
        if (to > from) {
            pen.line(
                    tailX + from * ux - across * uy,
                    tailY + from * uy + across * ux,
                    tailX + to * ux - across * uy,
                    tailY + to * uy + across * ux);
        }
    }

    private void head(double wanted, double half, int colour, int ground, boolean hollow) {
        corners(wanted, half);
        pen.fill(hollow ? ground : colour);
        pen.stroke(colour, (hollow ? 1.8 : 0.8) * weight);
        pen.polygon(x, y, 3, true, hollow);
    }

    private void corners(double wanted, double half) {
        double h = headLength(wanted);
        double w = half * weight * h / (wanted * weight);
        double baseX = tailX + (length - h) * ux;
        double baseY = tailY + (length - h) * uy;
        set(0, tailX + length * ux, tailY + length * uy);
        set(1, baseX - w * uy, baseY + w * ux);
        set(2, baseX + w * uy, baseY - w * ux);
    }

    private void set(int i, double atX, double atY) {
        x[i] = atX;
        y[i] = atY;
    }
}
