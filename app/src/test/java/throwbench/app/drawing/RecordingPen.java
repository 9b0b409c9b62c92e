package throwbench.app.drawing;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Keeps what is drawn, for tests of places and words. Letters are all of one width. */
public final class RecordingPen implements Pen {

    /** A poly-line with the line it was drawn in. */
    public record Polyline(int rgb, double width, List<Double> dashes, List<Double> x, List<Double> y) {}

    /** A written text with the place of its box. */
    public record Written(String text, double x, double y, double left, double right, double size, int rgb) {}

    /** A filled or outlined rectangle. */
    public record Rectangle(int rgb, double opacity, double x, double y, double width, double height) {}

    /** A circle. */
    public record Round(int rgb, double x, double y, double radius) {}

    /** A line. */
    public record Segment(int rgb, double x1, double y1, double x2, double y2) {}

    /** A polygon. */
    public record Shape(int rgb, List<Double> x, List<Double> y) {}

    public final List<Polyline> polylines = new ArrayList<>();
    public final List<Written> texts = new ArrayList<>();
    public final List<Rectangle> rectangles = new ArrayList<>();
    public final List<Round> circles = new ArrayList<>();
    public final List<Segment> lines = new ArrayList<>();
    public final List<Shape> polygons = new ArrayList<>();
    private int strokeRgb;
    private double strokeWidth;
    private List<Double> dashes = List.of();
    private int fillRgb;
    private double opacity = 1;
    private double size = 12;

    /** Pairs of texts that touch: their boxes overlap and their baselines are nearer than the height of capitals. */
    public List<String> touching() {
        List<String> pairs = new ArrayList<>();
        for (int i = 0; i < texts.size(); i++) {
            Written a = texts.get(i);
            for (Written b : texts.subList(0, i)) {
                boolean beside = a.right() <= b.left() || b.right() <= a.left();
                boolean below = Math.abs(a.y() - b.y()) >= 0.72 * Math.min(a.size(), b.size());
                if (!beside && !below) {
                    pairs.add(a + " touches " + b);
                }
            }
        }
        return pairs;
    }

    private static List<Double> first(double[] values, int n) {
        return Arrays.stream(values, 0, n).boxed().toList();
    }

    @Override
    public void stroke(int rgb, double width) {
        strokeRgb = rgb;
        strokeWidth = width;
        dashes = List.of();
    }

    @Override
    public void dash(double... lengths) {
        dashes = Arrays.stream(lengths).boxed().toList();
    }

    @Override
    public void fill(int rgb) {
        fill(rgb, 1);
    }

    @Override
    public void fill(int rgb, double share) {
        fillRgb = rgb;
        opacity = share;
    }

    @Override
    public void font(double points, boolean bold) {
        size = points;
    }

    @Override
    public void line(double x1, double y1, double x2, double y2) {
        lines.add(new Segment(strokeRgb, x1, y1, x2, y2));
    }

    @Override
    public void polyline(double[] x, double[] y, int n) {
        polylines.add(new Polyline(strokeRgb, strokeWidth, dashes, first(x, n), first(y, n)));
    }

    @Override
    public void polygon(double[] x, double[] y, int n, boolean filled, boolean outlined) {
        polygons.add(new Shape(filled ? fillRgb : strokeRgb, first(x, n), first(y, n)));
    }

    @Override
    public void rect(double x, double y, double width, double height, double radius, boolean filled, boolean outlined) {
        rectangles.add(new Rectangle(filled ? fillRgb : strokeRgb, opacity, x, y, width, height));
    }

    @Override
    public void circle(double x, double y, double radius, boolean filled, boolean outlined) {
        circles.add(new Round(outlined ? strokeRgb : fillRgb, x, y, radius));
    }

    @Override
    public void arc(double x, double y, double radius, double fromDeg, double extentDeg) {
        throw new UnsupportedOperationException("no arcs are drawn in these views");
    }

    @Override
    public void text(String text, double x, double y, Align align) {
        double width = width(text);
        double left =
                switch (align) {
                    case LEFT -> x;
                    case CENTRE -> x - width / 2;
                    case RIGHT -> x - width;
                };
        texts.add(new Written(text, x, y, left, left + width, size, fillRgb));
    }

    @Override
    public double width(String text) {
        return 0.58 * size * text.length();
    }

    @Override
    public void clip(double x, double y, double width, double height) {}

    @Override
    public void unclip() {}
}
