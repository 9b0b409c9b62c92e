package throwbench.solver.fluid;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * The cubic equation of state of Peng and Robinson, here for one question only: whether a gas mixture would rather drop a
 * liquid. Its densities are up to 4 % off, its phase boundaries good; no binary corrections.
 *
 * <p>Z³ − (1 − B) Z² + (A − 3 B² − 2 B) Z − (A B − B² − B³) = 0, A_i = 0.45724 α_i P/t², B_i = 0.07780 P/t, reduced P and t of
 * each gas; √A = Σ x_i √A_i, B = Σ x_i B_i; √α = 1 + (0.37464 + 1.54226 ω − 0.26992 ω²)(1 − √t).
 *
 * <p>Source: D.-Y. Peng and D. B. Robinson, Ind. Eng. Chem. Fundam. 15 (1976) 59, from memory, held against worked examples;
 * the test for a second phase: M. L. Michelsen, Fluid Phase Equilibria 9 (1982) 1, from memory.
 */
final class PengRobinson {

    private static final double SQRT2 = Math.sqrt(2);
    private static final int MOST_ITERATIONS = 500;

    /** Sum of squared changes of ln W at which the trial phase stands still. */
    private static final double STILL = 1e-14;

    /** |ln(W/x)| below which the trial phase is the gas itself. */
    private static final double SAME = 1e-3;

    private final List<Gas> gases;
    private final double[] fractions;

    PengRobinson(Composition composition) {
        gases = composition.gases();
        fractions = composition.fractions().stream()
                .mapToDouble(Double::doubleValue)
                .toArray();
    }

    /** Z of the gas, or of the liquid where there are two. */
    double compressibility(double temperature, double pressure, boolean gas) {
        return new State(temperature, pressure).compressibility(fractions, gas);
    }

    /** ln φ of each gas in the mixture, as a gas. */
    double[] fugacities(double temperature, double pressure) {
        double[] into = new double[fractions.length];
        new State(temperature, pressure).fugacities(fractions, true, into);
        return into;
    }

    /**
     * The gas that makes up most of the liquid that would drop out, if one would: a trial liquid is followed by successive
     * substitution from Wilson's estimate until its chemical potentials differ from the gas's by one amount for all.
     *
     * @param margin how far beyond its dew point the gas may be, as a share of what dissolves in the liquid; 0 is the dew point
     */
    Optional<Gas> condensing(double temperature, double pressure, double margin) {
        State state = new State(temperature, pressure);
        int n = fractions.length;
        double[] wanted = new double[n];
        state.fugacities(fractions, true, wanted);
        double[] amounts = new double[n];
        for (int i = 0; i < n; i++) {
            wanted[i] += Math.log(fractions[i]);
            amounts[i] = fractions[i] / wilson(gases.get(i).critical(), temperature, pressure);
        }
        double[] shares = new double[n];
        double[] potentials = new double[n];
        for (int k = 0; k < MOST_ITERATIONS; k++) {
            double sum = Arrays.stream(amounts).sum();
            Arrays.setAll(shares, i -> amounts[i] / sum);
            state.fugacities(shares, false, potentials);
            double moved = 0;
            double apart = 0;
            for (int i = 0; i < n; i++) {
                double next = wanted[i] - potentials[i];
                double step = next - Math.log(amounts[i]);
                moved += step * step;
                apart = Math.max(apart, Math.abs(next - Math.log(fractions[i])));
                amounts[i] = Math.exp(next);
            }
            if (apart < SAME) {
                return Optional.empty();
            }
            if (moved < STILL) {
                break;
            }
        }
        return Arrays.stream(amounts).sum() > 1 + margin ? Optional.of(greatest(amounts)) : Optional.empty();
    }

    private Gas greatest(double[] amounts) {
        int best = 0;
        for (int i = 1; i < amounts.length; i++) {
            best = amounts[i] > amounts[best] ? i : best;
        }
        return gases.get(best);
    }

    /** Estimate of y/x at equilibrium: exp(5.373 (1 + ω)(1 − T_c/T)) p_c/p. */
    private static double wilson(CriticalPoint critical, double temperature, double pressure) {
        return critical.pressure()
                / pressure
                * Math.exp(5.373 * (1 + critical.acentricFactor()) * (1 - critical.temperature() / temperature));
    }

    /** Temperature and pressure, with what each gas brings to A and B there. */
    private final class State {

        private final double[] sqrtA;
        private final double[] b;

        State(double temperature, double pressure) {
            sqrtA = new double[fractions.length];
            b = new double[fractions.length];
            for (int i = 0; i < b.length; i++) {
                CriticalPoint critical = gases.get(i).critical();
                double omega = critical.acentricFactor();
                double t = temperature / critical.temperature();
                double p = pressure / critical.pressure();
                double slope = 0.37464 + (1.54226 - 0.26992 * omega) * omega;
                sqrtA[i] = Math.sqrt(0.45724 * p) / t * Math.abs(1 + slope * (1 - Math.sqrt(t)));
                b[i] = 0.07780 * p / t;
            }
        }

        double compressibility(double[] x, boolean gas) {
            double s = dot(x, sqrtA);
            return root(s * s, dot(x, b), gas);
        }

        void fugacities(double[] x, boolean gas, double[] into) {
            double s = dot(x, sqrtA);
            double sumB = dot(x, b);
            double z = root(s * s, sumB, gas);
            double log = Math.log((z + (1 + SQRT2) * sumB) / (z + (1 - SQRT2) * sumB));
            double factor = s * s / (2 * SQRT2 * sumB) * log;
            for (int i = 0; i < x.length; i++) {
                double share = b[i] / sumB;
                into[i] = share * (z - 1) - Math.log(z - sumB) - factor * (2 * sqrtA[i] / s - share);
            }
        }
    }

    private static double dot(double[] x, double[] y) {
        double sum = 0;
        for (int i = 0; i < x.length; i++) {
            sum += x[i] * y[i];
        }
        return sum;
    }

    /** The greatest root of the cubic, or the least one above B. */
    private static double root(double a, double b, boolean gas) {
        double c2 = b - 1;
        double c1 = a - 3 * b * b - 2 * b;
        double c0 = -(a * b - b * b - b * b * b);
        double q = (c2 * c2 - 3 * c1) / 9;
        double r = (2 * c2 * c2 * c2 - 9 * c2 * c1 + 27 * c0) / 54;
        double z;
        if (r * r < q * q * q) {
            double angle = Math.acos(r / Math.sqrt(q * q * q));
            double size = -2 * Math.sqrt(q);
            double greatest = size * Math.cos((angle + 2 * Math.PI) / 3) - c2 / 3;
            double least = size * Math.cos(angle / 3) - c2 / 3;
            z = gas || !(least > b) ? greatest : least;
        } else {
            double u = -Math.signum(r) * Math.cbrt(Math.abs(r) + Math.sqrt(r * r - q * q * q));
            z = (u == 0 ? 0 : u + q / u) - c2 / 3;
        }
        // one Newton step takes out what the closed form loses to cancellation
        double slope = (3 * z + 2 * c2) * z + c1;
        return slope == 0 ? z : z - (((z + c2) * z + c1) * z + c0) / slope;
    }
}
