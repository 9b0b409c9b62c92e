package throwbench.app.linkage.parts;

import throwbench.app.drawing.Pen;

/** A pen that takes lengths in throw axes. Holds the points of one shape at a time, so one owner draws with it. */
public final class ThrowPen {

    /** Enough for the longest outline. */
    private static final int MOST_POINTS = 512;

    private final double[] x = new double[MOST_POINTS];
    private final double[] y = new double[MOST_POINTS];
    private Pen pen;
    private ThrowAxes axes;

    public ThrowPen(Pen pen, ThrowAxes axes) {
        this.pen = pen;
        this.axes = axes;
    }

    /** Draws with another pen or in other axes from now on. */
    public ThrowPen on(Pen nextPen, ThrowAxes nextAxes) {
        pen = nextPen;
        axes = nextAxes;
        return this;
    }

    public Pen pen() {
        return pen;
    }

    public ThrowAxes axes() {
        return axes;
    }

    /** A length in points. */
    public double points(double metres) {
        return metres * axes.scale();
    }

    /** A length in m of so many points. */
    public double metres(double points) {
        return points / axes.scale();
    }

    public void line(double x1, double y1, double x2, double y2) {
        pen.line(axes.px(x1, y1), axes.py(x1, y1), axes.px(x2, y2), axes.py(x2, y2));
    }

    public void circle(double atX, double atY, double radius, boolean filled, boolean outlined) {
        pen.circle(axes.px(atX, atY), axes.py(atX, atY), points(radius), filled, outlined);
    }

    /** A rectangle along the axes. */
    public void box(double x1, double y1, double x2, double y2, boolean filled, boolean outlined) {
        set(0, x1, y1);
        set(1, x2, y1);
        set(2, x2, y2);
        set(3, x1, y2);
        pen.polygon(x, y, 4, filled, outlined);
    }

    /** A rectangle along the axes with its corners cut. */
    public void chamfered(double x1, double y1, double x2, double y2, double cut, boolean filled, boolean outlined) {
        set(0, x1 + cut, y1);
        set(1, x2 - cut, y1);
        set(2, x2, y1 + cut);
        set(3, x2, y2 - cut);
        set(4, x2 - cut, y2);
        set(5, x1 + cut, y2);
        set(6, x1, y2 - cut);
        set(7, x1, y1 + cut);
        pen.polygon(x, y, 8, filled, outlined);
    }

    /** A rectangle, filled and outlined, along axes that stand at a point and are turned by this cosine and sine. */
    public void turnedBox(double atX, double atY, double cos, double sin, double x1, double y1, double x2, double y2) {
        set(0, atX + cos * x1 - sin * y1, atY + sin * x1 + cos * y1);
        set(1, atX + cos * x2 - sin * y1, atY + sin * x2 + cos * y1);
        set(2, atX + cos * x2 - sin * y2, atY + sin * x2 + cos * y2);
        set(3, atX + cos * x1 - sin * y2, atY + sin * x1 + cos * y2);
        pen.polygon(x, y, 4, true, true);
    }

    /** A triangle. */
    public void triangle(double x1, double y1, double x2, double y2, double x3, double y3, boolean filled) {
        set(0, x1, y1);
        set(1, x2, y2);
        set(2, x3, y3);
        pen.polygon(x, y, 3, filled, !filled);
    }

    /** An outline whose own axes stand at a point and are turned by an angle of this cosine and sine. */
    public void outline(Outline o, double atX, double atY, double cos, double sin, boolean filled, boolean outlined) {
        for (int i = 0; i < o.size(); i++) {
            set(i, atX + cos * o.x[i] - sin * o.y[i], atY + sin * o.x[i] + cos * o.y[i]);
        }
        pen.polygon(x, y, o.size(), filled, outlined);
    }

    /** Lines at 45° across a rectangle along the axes, so many metres apart: a wall that is cut. */
    public void hatch(double x1, double y1, double x2, double y2, double spacing) {
        double width = x2 - x1;
        double height = y2 - y1;
        // a line starts where it meets the left or the lower edge and ends at the right or the upper one
        for (double c = spacing / 2 - height; c < width; c += spacing) {
            double fromX = Math.max(c, 0);
            double toX = Math.min(c + height, width);
            line(x1 + fromX, y1 + fromX - c, x1 + toX, y1 + toX - c);
        }
    }

    private void set(int i, double atX, double atY) {
        x[i] = axes.px(atX, atY);
        y[i] = axes.py(atX, atY);
    }
}
