package throwbench.solver.mechanism;

/**
 * Arcsine of many small numbers. Within |x| ≤ 1/2 the Taylor series, which a compiler turns into vector code, stands in
 * for {@link Math#asin}; a rod three times the crank's length stays within 1/3.
 */
final class ArcSine {

    /** (2n)! / (4^n (n!)² (2n+1)), n = 0 … 23: the remainder at 1/2 is below 3e-17. */
    private static final double[] C = coefficients(24);

    private ArcSine() {}

    private static double[] coefficients(int terms) {
        double[] c = new double[terms];
        double binomial = 1;
        for (int n = 0; n < terms; n++) {
            c[n] = binomial / (2 * n + 1);
            binomial *= (2 * n + 1.0) / (2 * n + 2);
        }
        return c;
    }

    static void fill(double[] sine, double[] angle, double greatest) {
        if (greatest > 0.5) {
            for (int i = 0; i < sine.length; i++) {
                angle[i] = Math.asin(sine[i]);
            }
            return;
        }
        int terms = terms(greatest);
        for (int i = 0; i < sine.length; i++) {
            angle[i] = C[terms - 1];
        }
        for (int n = terms - 2; n >= 0; n--) {
            horner(sine, angle, C[n]);
        }
        for (int i = 0; i < sine.length; i++) {
            angle[i] *= sine[i];
        }
    }

    private static void horner(double[] sine, double[] sum, double coefficient) {
        for (int i = 0; i < sine.length; i++) {
            sum[i] = Math.fma(sum[i], sine[i] * sine[i], coefficient);
        }
    }

    /** Terms after which the next one is below 1e-17 of the sum. */
    private static int terms(double greatest) {
        double square = greatest * greatest;
        double power = 1;
        int n = 0;
        while (n < C.length && C[n] * power > 1e-17) {
            power *= square;
            n++;
        }
        return Math.max(2, n);
    }
}
