package throwbench.app.strip;

import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;
import throwbench.app.drawing.TextFit;

/** The degree axis with its grid, and the dead centres of the shown throw. */
final class AxisPainter {

    private static final double SIZE = 12.5;

    /** Half the width of the widest number. */
    static final double LABEL_REACH = 16;

    void paint(Pen pen, StripPlot plot, Palette palette) {
        StripLayout layout = plot.layout();
        double foot = layout.plotBottom();
        double perDegree = (layout.right() - layout.left()) / 360;
        int labelled = labelStep(layout);
        pen.font(SIZE, false);
        for (int degrees = 0; degrees <= 360; degrees += 5) {
            double x = layout.x(Math.toRadians(degrees));
            boolean main = degrees % 30 == 0;
            double tick = main ? 6 : degrees % 10 == 0 ? 4 : 2;
            if (main || degrees % 10 == 0 || perDegree > 1.6) {
                pen.stroke(main ? palette.ground().ink() : palette.ground().soft(), 1);
                pen.line(x, foot, x, foot + tick);
            }
            if (degrees % labelled == 0) {
                pen.fill(palette.ground().ink());
                pen.text(degrees + "°", x, foot + 18, Pen.Align.CENTRE);
            }
        }
        pen.stroke(palette.ground().ink(), 1.4);
        pen.line(layout.left(), foot, layout.right(), foot);
        pen.font(SIZE - 1, false);
        pen.fill(palette.ground().soft());
        String name = "crank angle, throw " + plot.shown().shownThrow().name();
        pen.text(TextFit.name(pen, name, "crank angle", layout.left() - 36), 10, foot + 18, Pen.Align.LEFT);
        deadCentres(pen, plot, palette);
    }

    /** Degrees from one number to the next. */
    static int labelStep(StripLayout layout) {
        double perDegree = (layout.right() - layout.left()) / 360;
        return 30 * perDegree >= 34 ? 30 : 60 * perDegree >= 34 ? 60 : 90;
    }

    /** Vertical lines under the traces every 30°. */
    void grid(Pen pen, StripPlot plot, Palette palette) {
        StripLayout layout = plot.layout();
        pen.stroke(palette.ground().grid(), 1);
        for (int degrees = 0; degrees <= 360; degrees += 30) {
            double x = Math.rint(layout.x(Math.toRadians(degrees))) + 0.5;
            pen.line(x, layout.plotTop(), x, layout.plotBottom());
        }
    }

    private static void deadCentres(Pen pen, StripPlot plot, Palette palette) {
        StripLayout layout = plot.layout();
        boolean named = layout.axis().height() >= 34;
        pen.font(SIZE - 1, true);
        for (StripEvent event : plot.events().all()) {
            if (event.kind() == StripEvent.Kind.DEAD_CENTRE) {
                double x = layout.x(event.angle());
                deadCentre(pen, layout, x, event.name(), named, palette);
                if (event.angle() == 0) {
                    deadCentre(pen, layout, layout.right(), event.name(), named, palette);
                }
            }
        }
    }

    private static void deadCentre(Pen pen, StripLayout layout, double x, String name, boolean named, Palette palette) {
        pen.stroke(palette.ground().soft(), 1);
        pen.dash(7, 3, 2, 3);
        pen.line(x, layout.plotTop(), x, layout.plotBottom());
        if (named) {
            pen.fill(palette.ground().soft());
            pen.text(name, x, layout.axis().bottom() - 2, Pen.Align.CENTRE);
        }
    }
}
