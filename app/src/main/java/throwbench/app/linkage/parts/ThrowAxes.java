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
