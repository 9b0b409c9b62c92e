package throwbench.app.drawing;

import java.util.HashMap;
import java.util.Map;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.shape.ArcType;
import javafx.scene.shape.StrokeLineCap;
import javafx.scene.shape.StrokeLineJoin;
import javafx.scene.text.Font;
import javafx.scene.text.TextAlignment;

/** Draws on a JavaFX canvas. Keep one pen a canvas: it sets a paint, width or font only where it changes. */
public final class FxPen implements Pen {

    private static final double[] SOLID = {};

    private final GraphicsContext g;
    private final Map<Integer, Color> colours = new HashMap<>();
    private int strokeColour = -1;
    private double strokeWidth = -1;
    private boolean dashed;
    private int fillColour = -1;
    private double fillOpacity = 1;
    private double fontSize = -1;
    private boolean fontBold;

    public FxPen(GraphicsContext g) {
        this.g = g;
        g.setLineCap(StrokeLineCap.ROUND);
        g.setLineJoin(StrokeLineJoin.ROUND);
    }

    /** Takes everything off a canvas of this size and lets the origin be its corner again. */
    public void clear(double width, double height) {
        g.setTransform(1, 0, 0, 1, 0, 0);
        g.clearRect(0, 0, width, height);
    }

    /** Moves the origin: a canvas may show only a part of a drawing. */
    public void from(double x, double y) {
        g.setTransform(1, 0, 0, 1, x, y);
    }

    private Color colour(int rgb) {
        return colours.computeIfAbsent(rgb, c -> Color.rgb(c >> 16 & 255, c >> 8 & 255, c & 255));
    }

    @Override
    public void stroke(int rgb, double width) {
        if (rgb != strokeColour) {
            g.setStroke(colour(rgb));
            strokeColour = rgb;
        }
        if (width != strokeWidth) {
            g.setLineWidth(width);
            strokeWidth = width;
        }
        if (dashed) {
            g.setLineDashes(SOLID);
            g.setLineCap(StrokeLineCap.ROUND);
            dashed = false;
        }
    }

    @Override
    public void dash(double... lengths) {
        g.setLineDashes(lengths);
        g.setLineCap(lengths.length > 0 ? StrokeLineCap.BUTT : StrokeLineCap.ROUND);
        dashed = lengths.length > 0;
    }

    @Override
    public void fill(int rgb) {
        fill(rgb, 1);
    }

    @Override
    public void fill(int rgb, double opacity) {
        if (rgb != fillColour || opacity != fillOpacity) {
            Color opaque = colour(rgb);
            g.setFill(opacity == 1 ? opaque : opaque.deriveColor(0, 1, 1, opacity));
            fillColour = rgb;
            fillOpacity = opacity;
        }
    }

    @Override
    public void font(double size, boolean bold) {
        if (size != fontSize || bold != fontBold) {
            g.setFont(Fonts.of(size, bold));
            fontSize = size;
            fontBold = bold;
        }
    }

    @Override
    public void line(double x1, double y1, double x2, double y2) {
        g.strokeLine(x1, y1, x2, y2);
    }

    @Override
    public void polyline(double[] x, double[] y, int n) {
        g.strokePolyline(x, y, n);
    }

    @Override
    public void polygon(double[] x, double[] y, int n, boolean filled, boolean outlined) {
        if (filled) {
            g.fillPolygon(x, y, n);
        }
        if (outlined) {
            g.strokePolygon(x, y, n);
        }
    }

    @Override
    public void rect(double x, double y, double width, double height, double radius, boolean filled, boolean outlined) {
        double d = 2 * radius;
        if (filled) {
            g.fillRoundRect(x, y, width, height, d, d);
        }
        if (outlined) {
            g.strokeRoundRect(x, y, width, height, d, d);
        }
    }

    @Override
    public void circle(double x, double y, double radius, boolean filled, boolean outlined) {
        if (filled) {
            g.fillOval(x - radius, y - radius, 2 * radius, 2 * radius);
        }
        if (outlined) {
            g.strokeOval(x - radius, y - radius, 2 * radius, 2 * radius);
        }
    }

    @Override
    public void arc(double x, double y, double radius, double fromDeg, double extentDeg) {
        g.strokeArc(x - radius, y - radius, 2 * radius, 2 * radius, fromDeg, extentDeg, ArcType.OPEN);
    }

    @Override
    public void text(String text, double x, double y, Align align) {
        g.setTextAlign(
                switch (align) {
                    case LEFT -> TextAlignment.LEFT;
                    case CENTRE -> TextAlignment.CENTER;
                    case RIGHT -> TextAlignment.RIGHT;
                });
        g.fillText(text, x, y);
    }

    @Override
    public double width(String text) {
        Font font = g.getFont();
        return Fonts.width(text, font);
    }

    @Override
    public void clip(double x, double y, double width, double height) {
        g.save();
        g.beginPath();
        g.rect(x, y, width, height);
        g.clip();
    }

    @Override
    public void unclip() {
        g.restore();
        // the context went back to what it held before; what is remembered here no longer holds
        strokeColour = -1;
        strokeWidth = -1;
        fillColour = -1;
        fontSize = -1;
        dashed = true;
    }
}
