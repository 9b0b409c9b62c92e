package throwbench.app.linkage.force;

import throwbench.app.drawing.Readout;

/**
 * Length of arrows, one for the whole revolution.
 *
 * @param pointsPerNewton length of a force
 * @param radPerNewtonMetre arc of a torque
 * @param bar force of the scale bar, N; 0 where there is nothing to measure
 */
public record ForceScale(double pointsPerNewton, double radPerNewtonMetre, double bar) {

    /** The arc of the greatest torque, rad, at factor 1. */
    private static final double GREATEST_ARC = Math.toRadians(80);

    private static final double MOST_ARC = Math.toRadians(320);

    /**
     * A scale at which the greatest force is so long.
     *
     * @param longest points
     * @param factor the user's, above 0
     * @param readout how forces are shown: the bar is round in its unit
     */
    public static ForceScale of(ForcePeaks peaks, double longest, double factor, Readout readout) {
        double force = peaks.greatestForce();
        double torque = peaks.greatestTorque();
        double perNewton = force > 0 ? longest * factor / force : 0;
        double perTorque = torque > 0 ? Math.min(GREATEST_ARC * factor, MOST_ARC) / torque : 0;
        if (force == 0) {
            return new ForceScale(0, perTorque, 0);
        }
        double unit = readout.inUnit(1) - readout.inUnit(0);
        double wanted = 0.8 * longest / perNewton * unit;
        return new ForceScale(perNewton, perTorque, round(wanted) / unit);
    }

    /** The greatest of 1, 2 or 5 times a power of ten that is not above a value. */
    static double round(double value) {
        double power = Math.pow(10, Math.floor(Math.log10(value)));
        double lead = value / power;
        return (lead >= 5 ? 5 : lead >= 2 ? 2 : 1) * power;
    }

    /** Length of the scale bar, points. */
    public double barLength() {
        return bar * pointsPerNewton;
    }
}
