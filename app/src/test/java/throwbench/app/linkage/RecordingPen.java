package throwbench.app.linkage;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import throwbench.app.drawing.Pen;

/**
 * Keeps what is drawn, in order, with the colours in force. Letters are as wide as the widest figure of the bundled font
 * and a little more, so that what has room here has room on the screen.
 */
final class RecordingPen implements Pen {

    private static final double REGULAR = 0.585;
    private static final double BOLD = 0.63;

    /** What was drawn; points in order, x and y in turn. */
    record Mark(String kind, int stroke, double strokeWidth, int fill, double[] points, String text, double radius) {

        double x(int i) {
            return points[2 * i];
        }

        double y(int i) {
            return points[2 * i + 1];
        }

        int size() {
            return points.length / 2;
        }

        double least(int axis) {
            double least = Double.POSITIVE_INFINITY;
            for (int i = axis; i < points.length; i += 2) {
                least = Math.min(least, points[i]);
            }
            return least - radius;
        }

        double greatest(int axis) {
            double most = Double.NEGATIVE_INFINITY;
            for (int i = axis; i < points.length; i += 2) {
                most = Math.max(most, points[i]);
            }
            return most + radius;
        }
    }

    private final List<Mark> marks = new ArrayList<>();
    private int strokeColour;
    private double strokeWidth;
    private int fillColour;
    private double fontSize = 12;
    private boolean bold;

    List<Mark> marks() {
        return marks;
    }

    List<Mark> marks(String kind) {
        return marks.stream().filter(m -> m.kind().equals(kind)).toList();
    }

    private void keep(String kind, double radius, String text, double... points) {
        marks.add(new Mark(kind, strokeColour, strokeWidth, fillColour, points, text, radius));
    }

    @Override
    public void stroke(int rgb, double width) {
        strokeColour = rgb;
        strokeWidth = width;
    }

    @Override
    public void dash(double... lengths) {}

    @Override
    public void fill(int rgb) {
        fillColour = rgb;
    }

    @Override
    public void fill(int rgb, double opacity) {
        fillColour = rgb;
    }

    @Override
    public void font(double size, boolean isBold) {
        fontSize = size;
        bold = isBold;
    }

    @Override
    public void line(double x1, double y1, double x2, double y2) {
        keep("line", 0, "", x1, y1, x2, y2);
    }

    @Override
    public void polyline(double[] x, double[] y, int n) {
        keep("polyline", 0, "", interleaved(x, y, n));
    }

    @Override
    public void polygon(double[] x, double[] y, int n, boolean filled, boolean outlined) {
        keep(filled ? "area" : "outline", 0, "", interleaved(x, y, n));
    }

    private static double[] interleaved(double[] x, double[] y, int n) {
        double[] points = new double[2 * n];
        for (int i = 0; i < n; i++) {
            points[2 * i] = x[i];
            points[2 * i + 1] = y[i];
        }
        return points;
    }

    @Override
    public void rect(double x, double y, double width, double height, double radius, boolean filled, boolean outlined) {
        keep("rect", 0, "", x, y, x + width, y + height);
    }

    @Override
    public void circle(double x, double y, double radius, boolean filled, boolean outlined) {
        keep(filled ? "disc" : "circle", radius, "", x, y);
    }

    @Override
    public void arc(double x, double y, double radius, double fromDeg, double extentDeg) {
        int n = 1 + (int) Math.ceil(Math.abs(extentDeg) / 2);
        double[] points = new double[2 * n + 2];
        for (int i = 0; i <= n; i++) {
            double a = Math.toRadians(fromDeg + extentDeg * i / n);
            points[2 * i] = x + radius * Math.cos(a);
            points[2 * i + 1] = y - radius * Math.sin(a);
        }
        keep("arc", 0, "", points);
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
        keep("text", 0, text, left, y - 0.75 * fontSize, left + width, y + 0.22 * fontSize);
    }

    @Override
    public double width(String text) {
        return text.length() * fontSize * (bold ? BOLD : REGULAR);
    }

    @Override
    public void clip(double x, double y, double width, double height) {}

    @Override
    public void unclip() {}

    @Override
    public String toString() {
        return marks.stream()
                .map(m -> m.kind() + Arrays.toString(m.points()) + m.text())
                .toList()
                .toString();
    }
}
