package throwbench.solver.chamber.flow;

/**
 * The flow through a valve as a function of u = √|1 − p/p_line|, ψ(u) = u · (polynomial in u²), which has neither Ψ's
 * infinite slope at u = 0 nor a power to compute. Beyond the critical ratio ψ is the choked flow. Error below 1e-7 of ψ.
 */
final class FlowFit {

    private static final int TERMS = 10;

    /** Values at the Chebyshev points of [0, 1] → coefficients of the polynomial through them. */
    private static final double[][] THROUGH_POINTS = throughPoints();

    private final double[] value;
    private final double[] slope;
    private final double choked;
    private final double greatest;
    private final double exponent;

    private interface Law {
        /** ψ/u at w = u². */
        double at(double w);
    }

    private FlowFit(double choked, double greatest, double exponent, Law law) {
        this.choked = choked;
        this.greatest = greatest;
        this.exponent = exponent;
        this.value = new double[TERMS];
        this.slope = new double[TERMS];
        double scale = 1;
        double[] points = new double[TERMS];
        for (int j = 0; j < TERMS; j++) {
            points[j] = law.at(choked * point(j));
        }
        for (int i = 0; i < TERMS; i++) {
            double sum = 0;
            for (int j = 0; j < TERMS; j++) {
                sum += THROUGH_POINTS[i][j] * points[j];
            }
            value[i] = sum * scale;
            slope[i] = (2 * i + 1) * value[i];
            scale /= choked;
        }
    }

    /** Ψ(y) of what enters from a line, y = p/p_line = 1 − u². */
    static FlowFit inward(FlowFunction law) {
        return new FlowFit(1 - law.criticalRatio(), law.greatest(), 0, w -> law.subcritical(1 - w) / Math.sqrt(w));
    }

    /** y Ψ(1/y) of what leaves towards a line, y = 1 + u²: proportional to T ṁ at a given temperature. */
    static FlowFit outward(FlowFunction law) {
        return outward(law, 1);
    }

    /** y^((3k−1)/2k) Ψ(1/y): the same when the temperature inside follows the pressure on an isentrope. */
    static FlowFit outwardOnIsentrope(FlowFunction law) {
        return outward(law, (3 * law.k() - 1) / (2 * law.k()));
    }

    private static FlowFit outward(FlowFunction law, double exponent) {
        return new FlowFit(
                1 / law.criticalRatio() - 1,
                law.greatest(),
                exponent,
                w -> Math.pow(1 + w, exponent) * law.subcritical(1 / (1 + w)) / Math.sqrt(w));
    }

    /** ψ(u), u ≥ 0. */
    double at(double u) {
        double w = u * u;
        if (w <= choked) {
            return u * sum(value, w);
        }
        return exponent == 0 ? greatest : greatest * Math.pow(1 + w, exponent);
    }

    /** dψ/du. */
    double slopeAt(double u) {
        double w = u * u;
        if (w <= choked) {
            return sum(slope, w);
        }
        return exponent == 0 ? 0 : greatest * exponent * 2 * u * Math.pow(1 + w, exponent - 1);
    }

    /** Σ c_i w^i, in pairs: half the length of Horner's chain of operations that wait for each other. */
    private static double sum(double[] c, double w) {
        double w2 = w * w;
        double w4 = w2 * w2;
        double low = Math.fma(Math.fma(c[3], w, c[2]), w2, Math.fma(c[1], w, c[0]));
        double high = Math.fma(Math.fma(c[7], w, c[6]), w2, Math.fma(c[5], w, c[4]));
        return Math.fma(Math.fma(Math.fma(c[9], w, c[8]), w4, high), w4, low);
    }

    private static double point(int j) {
        return (1 + Math.cos(Math.PI * (j + 0.5) / TERMS)) / 2;
    }

    private static double[][] throughPoints() {
        double[][] through = new double[TERMS][TERMS];
        double[] before = new double[TERMS];
        double[] chebyshev = new double[TERMS];
        chebyshev[0] = 1;
        for (int n = 0; n < TERMS; n++) {
            for (int j = 0; j < TERMS; j++) {
                double weight = (n == 0 ? 1.0 : 2.0) / TERMS * Math.cos(n * Math.PI * (j + 0.5) / TERMS);
                for (int i = 0; i <= n; i++) {
                    through[i][j] += weight * chebyshev[i];
                }
            }
            double[] next = n == 0 ? new double[] {-1, 2, 0, 0, 0, 0, 0, 0, 0, 0} : following(chebyshev, before);
            before = chebyshev;
            chebyshev = next;
        }
        return through;
    }

    /** T*_n+1 = 2 (2x − 1) T*_n − T*_n−1, the Chebyshev polynomials of [0, 1]. */
    private static double[] following(double[] now, double[] before) {
        double[] next = new double[TERMS];
        for (int i = 0; i < TERMS; i++) {
            next[i] = -2 * now[i] - before[i] + (i > 0 ? 4 * now[i - 1] : 0);
        }
        return next;
    }
}
