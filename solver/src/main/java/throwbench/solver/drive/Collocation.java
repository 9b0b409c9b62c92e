package throwbench.solver.drive;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.RealMatrix;

/**
 * The numbers of one piece's scheme, on [0, 1]: Radau's nodes with the right end among them (Radau IIA; Hairer and Wanner,
 * Solving Ordinary Differential Equations II, IV.5). It damps what a stiff driver brings in, whatever the piece's length, and
 * its last node is the piece's end, read just before any step there.
 */
final class Collocation {

    /** Nodes a piece: on a twelfth of a turn smooth loads are met to 1e-12. */
    static final int NODES = 10;

    private static final Collocation RADAU = new Collocation();

    private final double[] nodes = new double[NODES];
    private final double[][] integrals = new double[NODES][NODES];
    private final double[][] throughNodes;
    private final double[][] throughStart;

    private Collocation() {
        findNodes();
        double[] withStart = new double[NODES + 1];
        System.arraycopy(nodes, 0, withStart, 1, NODES);
        throughNodes = chebyshev(nodes);
        throughStart = chebyshev(withStart);
        integrate();
    }

    static Collocation radau() {
        return RADAU;
    }

    /** c_i, rising in (0, 1]; the last is 1. */
    double node(int i) {
        return nodes[i];
    }

    /** A_ij = ∫ from 0 to c_i of the polynomial that is 1 at node j and 0 at the others. */
    double integral(int i, int j) {
        return integrals[i][j];
    }

    /** b_j: the weight of a node in the integral over the piece. */
    double weight(int j) {
        return integrals[NODES - 1][j];
    }

    /** Chebyshev coefficients of the polynomial through values at the nodes, or at the start and the nodes. */
    double[] coefficients(double[] values) {
        double[][] inverse = values.length == NODES ? throughNodes : throughStart;
        double[] terms = new double[values.length];
        for (int k = 0; k < terms.length; k++) {
            for (int j = 0; j < values.length; j++) {
                terms[k] = Math.fma(inverse[k][j], values[j], terms[k]);
            }
        }
        return terms;
    }

    /** The polynomial's value at a place of [0, 1], by Clenshaw's recurrence. */
    static double value(double[] terms, double place) {
        double twice = 4 * place - 2;
        double last = 0;
        double beforeLast = 0;
        for (int k = terms.length - 1; k > 0; k--) {
            double next = Math.fma(twice, last, terms[k] - beforeLast);
            beforeLast = last;
            last = next;
        }
        return Math.fma(twice / 2, last, terms[0] - beforeLast);
    }

    /** The roots of P_s − P_(s−1) of Legendre. */
    private void findNodes() {
        int found = 0;
        int steps = 1000;
        for (int i = 0; i < steps && found < NODES - 1; i++) {
            double from = -1 + 2.0 * i / steps;
            double to = -1 + 2.0 * (i + 1) / steps;
            if (difference(from) * difference(to) < 0) {
                double root = new BrentSolver(1e-16, 1e-16, 0).solve(100, Collocation::difference, from, to);
                nodes[found++] = (1 + root) / 2;
            }
        }
        nodes[found] = 1;
    }

    private static double difference(double x) {
        double before = 1;
        double p = x;
        for (int n = 1; n < NODES; n++) {
            double next = ((2 * n + 1) * x * p - n * before) / (n + 1);
            before = p;
            p = next;
        }
        return p - before;
    }

    private static double[][] chebyshev(double[] places) {
        int size = places.length;
        RealMatrix values = MatrixUtils.createRealMatrix(size, size);
        for (int i = 0; i < size; i++) {
            for (int k = 0; k < size; k++) {
                values.setEntry(i, k, Math.cos(k * Math.acos(2 * places[i] - 1)));
            }
        }
        return new LUDecomposition(values).getSolver().getInverse().getData();
    }

    private void integrate() {
        GaussIntegratorFactory rules = new GaussIntegratorFactory();
        double[] unit = new double[NODES];
        for (int j = 0; j < NODES; j++) {
            unit[j] = 1;
            double[] terms = coefficients(unit);
            unit[j] = 0;
            for (int i = 0; i < NODES; i++) {
                GaussIntegrator rule = rules.legendre(NODES, 0, nodes[i]);
                integrals[i][j] = rule.integrate(place -> value(terms, place));
            }
        }
    }
}
