package throwbench.app.linkage;

import throwbench.app.drawing.Pen;
import throwbench.app.drawing.Pen.Align;
import throwbench.app.drawing.Readout;
import throwbench.app.linkage.force.LabelPlacer.Box;
import throwbench.app.linkage.force.RunningNumber;
import throwbench.app.linkage.parts.RodLoadPainter;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extreme;
import throwbench.solver.revolution.Instant;
import throwbench.solver.revolution.Reversal;

/** Crank angle and rod load in large letters; each stands in its own place whatever the numbers are. */
final class Headline {

    private static final double SIZE = 20;

    private static final String TENSION = "rod in tension";
    private static final String COMPRESSION = "rod in compression";
    private static final String UNLOADED = "rod unloaded";

    private final Scene scene;
    private final RunningNumber angle = new RunningNumber(Readout.angle());
    private final RunningNumber load;
    private final double peak;
    private final String unit;
    private final double size;
    private final double angleRight;
    private final double wordsLeft;
    private final double tensionWidth;
    private final double compressionWidth;
    private final double unloadedWidth;
    private final double numberWidth;
    private final double degreeWidth;
    private final double gap;
    private final Box box;

    /** @param end x before which it ends, points */
    Headline(Scene scene, Pen pen, double end) {
        this.scene = scene;
        this.peak = greatest(scene.shown().summary().reversal());
        Readout readout = Readout.of(scene.shown().units(), Column.Kind.FORCE, peak);
        this.load = new RunningNumber(readout);
        this.unit = readout.unit();
        double wanted = SIZE * scene.weight();
        double left = scene.size().border();
        double free = end - left;
        double full = total(pen, wanted, readout);
        // in a narrow view the headline shrinks rather than leave it
        this.size = full > free ? Math.floor(2 * wanted * free / full) / 2 : wanted;
        pen.font(size, true);
        gap = 0.3 * size;
        angleRight = left + pen.width("φ ") + pen.width("888.8°");
        wordsLeft = angleRight + size;
        tensionWidth = pen.width(TENSION);
        compressionWidth = pen.width(COMPRESSION);
        unloadedWidth = pen.width(UNLOADED);
        numberWidth = pen.width(readout.number(peak));
        degreeWidth = pen.width("°");
        double right = wordsLeft + compressionWidth + numberWidth + 2 * gap + pen.width(unit);
        // on whole points: the headline is a layer of its own, and letters between points blur
        box = new Box(
                Math.floor(left), Math.floor(10 * scene.weight()), Math.ceil(right - left) + 1, Math.ceil(1.5 * size));
    }

    private static double total(Pen pen, double size, Readout readout) {
        pen.font(size, true);
        return pen.width("φ 888.8° " + COMPRESSION + " −8888 ") + pen.width(readout.unit()) + 1.6 * size;
    }

    static double greatest(Reversal reversal) {
        return Math.max(
                reversal.tension().map(Extreme::value).orElse(0.0),
                reversal.compression().map(Extreme::value).orElse(0.0));
    }

    Box box() {
        return box;
    }

    void paint(Pen pen, Instant instant) {
        double value = instant.at(Column.ROD_LOAD);
        boolean unloaded = peak == 0 || Math.abs(value) < RodLoadPainter.NEUTRAL * peak;
        double y = box.y() + 1.1 * size;
        pen.font(size, true);
        pen.fill(scene.palette().ground().ink());
        pen.text("φ", box.x(), y, Align.LEFT);
        pen.text(angle.of(Angles.wrap(instant.crankAngle())), angleRight - degreeWidth, y, Align.RIGHT);
        pen.text("°", angleRight, y, Align.RIGHT);
        pen.fill(unloaded ? scene.palette().ground().soft() : scene.palette().rodLoad(value));
        pen.text(unloaded ? UNLOADED : value > 0 ? TENSION : COMPRESSION, wordsLeft, y, Align.LEFT);
        // the number's place follows the words, which change with the load's sign alone
        double words = unloaded ? unloadedWidth : value > 0 ? tensionWidth : compressionWidth;
        double numberRight = wordsLeft + words + gap + numberWidth;
        pen.text(load.of(Math.abs(value)), numberRight, y, Align.RIGHT);
        pen.text(unit, numberRight + gap, y, Align.LEFT);
    }

    String spoken(Instant instant) {
        double value = instant.at(Column.ROD_LOAD);
        String words = Math.abs(value) < RodLoadPainter.NEUTRAL * peak ? UNLOADED : value > 0 ? TENSION : COMPRESSION;
        return "Crank angle " + angle.of(Angles.wrap(instant.crankAngle())) + " degrees, " + words + ", "
                + load.of(Math.abs(value)) + " " + unit;
    }
}
