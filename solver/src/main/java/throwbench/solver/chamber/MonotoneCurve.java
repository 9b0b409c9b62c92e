package throwbench.solver.chamber;

import java.util.Arrays;
import throwbench.solver.mechanism.Angles;

/**
 * A periodic piecewise cubic Hermite curve through points over a turn, smooth in value and slope, that never leaves the range
 * of two neighbouring points. Slopes after F. N. Fritsch and J. Butland, SIAM J. Sci. Stat. Comput. 5 (1984) 300, with the
 * weighted harmonic mean for uneven steps; from memory.
 */
final class MonotoneCurve {

    private final double[] angles;
    private final double[] values;
    private final double[] slopes;
    /** Coefficients of t² and t³ of each piece, t counted from its first point. */
    private final double[] square;

    private final double[] cube;

    /**
     * @param angles rad, strictly rising in [0, 2π), at least 2
     * @param values one an angle
     */
    MonotoneCurve(double[] angles, double[] values) {
        int n = angles.length;
        this.angles = angles.clone();
        this.values = values.clone();
        slopes = new double[n];
        square = new double[n];
        cube = new double[n];
        double[] steps = new double[n];
        double[] secants = new double[n];
        for (int k = 0; k < n; k++) {
            int next = (k + 1) % n;
            steps[k] = angles[next] - angles[k] + (next == 0 ? Angles.TURN : 0);
            secants[k] = (values[next] - values[k]) / steps[k];
        }
        for (int k = 0; k < n; k++) {
            int before = (k + n - 1) % n;
            slopes[k] = slope(steps[before], secants[before], steps[k], secants[k]);
        }
        for (int k = 0; k < n; k++) {
            double next = slopes[(k + 1) % n];
            square[k] = (3 * secants[k] - 2 * slopes[k] - next) / steps[k];
            cube[k] = (slopes[k] + next - 2 * secants[k]) / (steps[k] * steps[k]);
        }
    }

    /** (w₁ + w₂)/(w₁/d₁ + w₂/d₂), w₁ = 2h₂ + h₁, w₂ = h₂ + 2h₁; 0 at a top, a bottom or beside a level piece. */
    private static double slope(double h1, double d1, double h2, double d2) {
        if (!(Math.signum(d1) * Math.signum(d2) > 0)) {
            return 0;
        }
        double w1 = 2 * h2 + h1;
        double w2 = h2 + 2 * h1;
        return (w1 + w2) / (w1 / d1 + w2 / d2);
    }

    /** The piece in which a crank angle (rad, in [0, 2π)) lies; that before the first point is the last one. */
    private int pieceAt(double angle) {
        int found = Arrays.binarySearch(angles, angle);
        int piece = found >= 0 ? found : -found - 2;
        return piece < 0 ? angles.length - 1 : piece;
    }

    /** The value at a crank angle, rad, in [0, 2π). */
    double at(double angle) {
        int k = pieceAt(angle);
        double turned = angle - angles[k];
        double t = turned < 0 ? turned + Angles.TURN : turned;
        return Math.fma(t, Math.fma(t, Math.fma(t, cube[k], square[k]), slopes[k]), values[k]);
    }

    /** The points' angles, rad. */
    double[] angles() {
        return angles.clone();
    }
}
