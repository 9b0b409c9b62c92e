package throwbench.solver.balance;

import java.util.ArrayList;
import java.util.List;

/** Adds up the harmonics of several quantities at the points of one quadrature. */
public final class HarmonicSums {

    private final double[][] cos;
    private final double[][] sin;

    /** @param orders the highest order of each quantity */
    public HarmonicSums(int... orders) {
        cos = new double[orders.length][];
        sin = new double[orders.length][];
        for (int q = 0; q < orders.length; q++) {
            cos[q] = new double[orders[q] + 1];
            sin[q] = new double[orders[q] + 1];
        }
    }

    /**
     * Adds a point.
     *
     * @param angle crank angle of the first throw, rad
     * @param weight of the point, rad; all weights of a turn sum to 2π
     * @param values one a quantity
     */
    public void add(double angle, double weight, double[] values) {
        int highest = 0;
        for (double[] orders : cos) {
            highest = Math.max(highest, orders.length - 1);
        }
        double cos1 = Math.cos(angle);
        double sin1 = Math.sin(angle);
        double c = cos1 * weight / Math.PI;
        double s = sin1 * weight / Math.PI;
        for (int n = 1; n <= highest; n++) {
            for (int q = 0; q < cos.length; q++) {
                if (n < cos[q].length) {
                    cos[q][n] = Math.fma(c, values[q], cos[q][n]);
                    sin[q][n] = Math.fma(s, values[q], sin[q][n]);
                }
            }
            double turned = c * cos1 - s * sin1;
            s = s * cos1 + c * sin1;
            c = turned;
        }
    }

    /** The harmonics of a quantity, from order 1 on. */
    public List<Harmonic> of(int quantity) {
        List<Harmonic> harmonics = new ArrayList<>();
        for (int n = 1; n < cos[quantity].length; n++) {
            harmonics.add(new Harmonic(n, cos[quantity][n], sin[quantity][n]));
        }
        return List.copyOf(harmonics);
    }
}
