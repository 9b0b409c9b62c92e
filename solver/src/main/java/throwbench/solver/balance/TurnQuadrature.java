package throwbench.solver.balance;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import throwbench.solver.mechanism.Angles;

/** Gauss–Legendre quadrature over a whole turn, split at break angles, so that no kink or step spoils it. */
public final class TurnQuadrature {

    /** Points a piece; on a twelfth of a turn a smooth quantity is met to rounding. */
    private static final int POINTS = 12;

    /** On pieces much shorter, between the many rows of a recorded pressure, fewer are as exact. */
    private static final int SHORT_POINTS = 6;

    private static final double SHORT_PIECE = Angles.TURN / 72;

    /** Takes what is read at one point. */
    @FunctionalInterface
    public interface Point {

        /**
         * Takes a point.
         *
         * @param angle rad
         * @param weight of the value there in the integral over the turn, rad
         */
        void read(double angle, double weight);
    }

    private TurnQuadrature() {}

    /**
     * Visits every point.
     *
     * @param breaks rad, rising, in [0, 2π), at least one
     * @param longestPiece rad: short enough for the highest order that is asked for
     */
    public static void over(double[] breaks, double longestPiece, Point point) {
        GaussIntegratorFactory rules = new GaussIntegratorFactory();
        GaussIntegrator many = rules.legendre(POINTS, -1, 1);
        GaussIntegrator few = rules.legendre(SHORT_POINTS, -1, 1);
        for (int i = 0; i < breaks.length; i++) {
            double to = i + 1 < breaks.length ? breaks[i + 1] : breaks[0] + Angles.TURN;
            int pieces = (int) Math.ceil((to - breaks[i]) / longestPiece);
            double half = (to - breaks[i]) / pieces / 2;
            GaussIntegrator rule = 2 * half > SHORT_PIECE ? many : few;
            for (int k = 0; k < pieces; k++) {
                double middle = breaks[i] + (2 * k + 1) * half;
                for (int p = 0; p < rule.getNumberOfPoints(); p++) {
                    point.read(middle + half * rule.getPoint(p), half * rule.getWeight(p));
                }
            }
        }
    }
}
