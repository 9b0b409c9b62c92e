package throwbench.app.linkage;

import throwbench.app.drawing.Pen;

/** Draws nothing: what is left is the painters' own cost. */
final class NoPen implements Pen {

    @Override
    public void stroke(int rgb, double width) {}

    @Override
    public void dash(double... lengths) {}

    @Override
    public void fill(int rgb) {}

    @Override
    public void fill(int rgb, double opacity) {}

    @Override
    public void font(double size, boolean bold) {}

    @Override
    public void line(double x1, double y1, double x2, double y2) {}

    @Override
    public void polyline(double[] x, double[] y, int n) {}

    @Override
    public void polygon(double[] x, double[] y, int n, boolean filled, boolean outlined) {}

    @Override
    public void rect(
            double x, double y, double width, double height, double radius, boolean filled, boolean outlined) {}

    @Override
    public void circle(double x, double y, double radius, boolean filled, boolean outlined) {}

    @Override
    public void arc(double x, double y, double radius, double fromDeg, double extentDeg) {}

    @Override
    public void text(String text, double x, double y, Align align) {}

    @Override
    public double width(String text) {
        return 7 * text.length();
    }

    @Override
    public void clip(double x, double y, double width, double height) {}

    @Override
    public void unclip() {}
}
