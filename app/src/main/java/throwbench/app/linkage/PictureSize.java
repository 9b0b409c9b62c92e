package throwbench.app.linkage;

import throwbench.app.linkage.force.LabelPlacer.Box;

/**
 * Size of a picture and what follows from it.
 *
 * @param width points
 * @param height points
 * @param weight of type and lines, 1 in an ordinary window
 */
public record PictureSize(double width, double height, double weight) {

    /** The area at which type and lines have their usual size, square points. */
    private static final double USUAL_AREA = 1080 * 480;

    /** Steps of the weight: each makes a font of its own. */
    private static final double STEP = 0.08;

    static PictureSize of(double width, double height, double typeScale) {
        double natural = Math.max(0.72, Math.min(2, Math.sqrt(width * height / USUAL_AREA)));
        return new PictureSize(width, height, Math.round(natural * typeScale / STEP) * STEP);
    }

    /** Length of the greatest force, points. */
    double longestArrow() {
        return 0.16 * Math.min(width, 1.9 * height);
    }

    /** Free border on each side. */
    double border() {
        return 14 * weight;
    }

    /** Where the machine may stand: below the headline, above the foot line. */
    Box room() {
        double top = 50 * weight;
        double bottom = 34 * weight;
        double side = border();
        return new Box(side, top, Math.max(20, width - 2 * side), Math.max(20, height - top - bottom));
    }

    /** Everything inside the border. */
    Box inside() {
        double b = 6 * weight;
        return new Box(b, b, Math.max(1, width - 2 * b), Math.max(1, height - 2 * b));
    }
}
