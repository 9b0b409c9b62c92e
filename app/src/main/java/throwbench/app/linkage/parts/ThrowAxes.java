package throwbench.app.linkage.parts;

/**
 * From throw axes (m) to points of the drawing (y downwards).
 *
 * @param originX crank centre in points
 * @param originY crank centre in points
 * @param scale points a metre
 * @param cos of the axis direction γ
 * @param sin of the axis direction γ
 */
public record ThrowAxes(double originX, double originY, double scale, double cos, double sin) {

    /** Axes of a throw whose line of stroke points in a direction, rad counter-clockwise from the right. */
    public static ThrowAxes of(double originX, double originY, double scale, double axisDirection) {
        return new ThrowAxes(originX, originY, scale, Math.cos(axisDirection), Math.sin(axisDirection));
    }

    /** +1 where the throw's y points up in the drawing or to its left, −1 where it points down: the side called upper. */
    public static int upper(double axisDirection) {
        return Math.cos(axisDirection) < -1e-9 ? -1 : 1;
    }

    /** The upper side of this throw. */
    public int upper() {
        return cos < -1e-9 ? -1 : 1;
    }

    public double px(double x, double y) {
        return originX + scale * (cos * x - sin * y);
    }

    public double py(double x, double y) {
        return originY - scale * (sin * x + cos * y);
    }

    /** x in throw axes of a point of the drawing, m. */
    public double x(double px, double py) {
        return ((px - originX) * cos - (py - originY) * sin) / scale;
    }

    /** y in throw axes of a point of the drawing, m. */
    public double y(double px, double py) {
        return (-(px - originX) * sin - (py - originY) * cos) / scale;
    }
}
