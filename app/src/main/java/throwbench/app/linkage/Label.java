package throwbench.app.linkage;

import throwbench.app.drawing.Pen;
import throwbench.app.drawing.Pen.Align;
import throwbench.app.drawing.Readout;
import throwbench.app.linkage.force.LabelPlacer.Box;
import throwbench.app.linkage.force.RunningNumber;

/**
 * A name with a running number, standing in one place: the name at the left, the number's last digit and the unit always at
 * the same points.
 *
 * @param name what stands before the number, may be empty
 * @param box its place, points
 * @param numberRight of the box's left edge, where the number ends
 * @param unitLeft of the box's left edge, where the unit begins
 */
record Label(String name, RunningNumber number, Box box, double numberRight, double unitLeft, double fontSize) {

    private static final double LEADING = 1.34;

    /** How much room a label needs; it stands at (0, 0) until it is placed. */
    static Label measured(Pen pen, String name, Readout readout, double peak, double fontSize) {
        pen.font(fontSize, true);
        double gap = 0.32 * fontSize;
        double nameWidth = name.isEmpty() ? 0 : pen.width(name) + gap;
        double numberRight = nameWidth + pen.width(readout.number(Math.abs(peak)));
        double unitLeft = numberRight + gap;
        double width = unitLeft + pen.width(readout.unit());
        return new Label(
                name,
                new RunningNumber(readout),
                new Box(0, 0, width, LEADING * fontSize),
                numberRight,
                unitLeft,
                fontSize);
    }

    Label at(Box place) {
        return new Label(name, number, place, numberRight, unitLeft, fontSize);
    }

    /** Draws it with a value, SI. */
    void paint(Pen pen, double value, int colour, boolean bold) {
        double y = box.y() + 1.02 * fontSize;
        pen.font(fontSize, bold);
        pen.fill(colour);
        if (!name.isEmpty()) {
            pen.text(name, box.x(), y, Align.LEFT);
        }
        pen.text(number.of(value), box.x() + numberRight, y, Align.RIGHT);
        pen.text(number.unit(), box.x() + unitLeft, y, Align.LEFT);
    }
}
