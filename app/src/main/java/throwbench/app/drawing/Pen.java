package throwbench.app.drawing;

/**
 * The only way anything is drawn, on the screen, in a picture or on a page. Lengths in points of the drawing, y downwards;
 * colours as 0xRRGGBB. Text stands on its baseline.
 */
public interface Pen {

    /** Where a text stands relative to its point. */
    enum Align {
        LEFT,
        CENTRE,
        RIGHT
    }

    /** Colour and width of lines from now on; solid. */
    void stroke(int rgb, double width);

    /** Lengths of dashes and gaps of lines from now on; none: solid. {@link #stroke} makes lines solid again. */
    void dash(double... lengths);

    /** Colour of areas and text from now on. */
    void fill(int rgb);

    /** Colour of areas and text from now on, from 0 (nothing) to 1 (opaque). */
    void fill(int rgb, double opacity);

    /** Size and weight of text from now on. */
    void font(double size, boolean bold);

    void line(double x1, double y1, double x2, double y2);

    /** Strokes the first n points. The arrays are read at once and not kept. */
    void polyline(double[] x, double[] y, int n);

    /** Fills and strokes the closed shape of the first n points. */
    void polygon(double[] x, double[] y, int n, boolean filled, boolean outlined);

    /** Fills and strokes a rectangle; a radius of 0 makes sharp corners. */
    void rect(double x, double y, double width, double height, double radius, boolean filled, boolean outlined);

    void circle(double x, double y, double radius, boolean filled, boolean outlined);

    /** Strokes a part of a circle, from an angle over an extent in degrees, counter-clockwise from the right. */
    void arc(double x, double y, double radius, double fromDeg, double extentDeg);

    void text(String text, double x, double y, Align align);

    /** Width of a text in the font in use. */
    double width(String text);

    /** Draws only inside a rectangle until {@link #unclip}; not nested. */
    void clip(double x, double y, double width, double height);

    void unclip();
}
