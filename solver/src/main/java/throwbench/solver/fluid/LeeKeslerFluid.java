package throwbench.solver.fluid;

import java.util.OptionalDouble;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * One of the two fluids between which Lee and Kesler interpolate, in reduced quantities t = T/T_c, P = p/p_c,
 * ρ = R T_c/(p_c v):
 *
 * <p>Z = 1 + B ρ + C ρ² + D ρ⁵ + c4/t³ ρ² (β + γ ρ²) exp(−γ ρ²), B = b1 − b2/t − b3/t² − b4/t³, C = c1 − c2/t + c3/t³,
 * D = d1 + d2/t.
 *
 * <p>Source of form and constants: B. I. Lee and M. G. Kesler, AIChE Journal 21 (1975) 510, from memory; the check values
 * of the tables made from them confirm the digits. The departures follow from the residual Helmholtz energy
 * a = B ρ + C ρ²/2 + D ρ⁵/5 + c4/t³ G, G = (β + 1 − (β + 1 + γ ρ²) exp(−γ ρ²))/(2 γ).
 */
record LeeKeslerFluid(Virial virial, Dense dense) {

    /** ω = 0. */
    static final LeeKeslerFluid SIMPLE = new LeeKeslerFluid(
            new Virial(0.1181193, 0.265728, 0.154790, 0.030323, 0.0236744, 0.0186984, 0),
            new Dense(0.155488e-4, 0.623689e-4, 0.042724, 0.65392, 0.060167));

    /** n-octane, ω = {@link #REFERENCE_ACENTRIC_FACTOR}. */
    static final LeeKeslerFluid REFERENCE = new LeeKeslerFluid(
            new Virial(0.2026579, 0.331511, 0.027655, 0.203488, 0.0313385, 0.0503618, 0.016901),
            new Dense(0.48736e-4, 0.0740336e-4, 0.041577, 1.226, 0.03754));

    static final double REFERENCE_ACENTRIC_FACTOR = 0.3978;

    /** Steps of ρ in which an isotherm is climbed: fine against the width of its wave below the critical point. */
    private static final double STEP = 0.05;

    /** ρ of a liquid under high pressure; no gas of the equation's range is denser. */
    private static final double DENSEST = 12;

    /** Constants of B and C. */
    record Virial(double b1, double b2, double b3, double b4, double c1, double c2, double c3) {}

    /** Constants of D and of the last term. */
    record Dense(double d1, double d2, double c4, double beta, double gamma) {}

    /**
     * The density of the gas: the first crossing of the pressure on the isotherm from ρ = 0 upwards. Empty where the isotherm
     * falls again before it gets there: there is a liquid only.
     */
    OptionalDouble gasDensity(double t, double pressure) {
        double from = 0;
        while (from < DENSEST) {
            double to = from + STEP;
            if (pressure(t, to) >= pressure) {
                BrentSolver solver = new BrentSolver(1e-14, 1e-16);
                return OptionalDouble.of(solver.solve(200, rho -> pressure(t, rho) - pressure, from, to));
            }
            if (stiffness(t, to) <= 0) {
                return OptionalDouble.empty();
            }
            from = to;
        }
        return OptionalDouble.empty();
    }

    private double pressure(double t, double rho) {
        return rho * t * compressibility(t, rho);
    }

    private double compressibility(double t, double rho) {
        double rho2 = rho * rho;
        return 1 + b(t) * rho + c(t) * rho2 + d(t) * rho2 * rho2 * rho + tail(t, rho2);
    }

    private double tail(double t, double rho2) {
        return dense.c4 / (t * t * t) * rho2 * (dense.beta + dense.gamma * rho2) * Math.exp(-dense.gamma * rho2);
    }

    /** ∂(ρ Z)/∂ρ at constant t, which is (∂p/∂ρ)/t: at 0 and below the fluid is not stable. */
    private double stiffness(double t, double rho) {
        double rho2 = rho * rho;
        double beta = dense.beta;
        double bend = 3 * beta + 5 * dense.gamma * rho2 - 2 * dense.gamma * rho2 * (beta + dense.gamma * rho2);
        return 1
                + 2 * b(t) * rho
                + 3 * c(t) * rho2
                + 6 * d(t) * rho2 * rho2 * rho
                + dense.c4 / (t * t * t) * rho2 * bend * Math.exp(-dense.gamma * rho2);
    }

    Departures departures(double t, double rho) {
        double rho2 = rho * rho;
        double rho5 = rho2 * rho2 * rho;
        double gammaRho2 = dense.gamma * rho2;
        double g = (dense.beta + 1 - (dense.beta + 1 + gammaRho2) * Math.exp(-gammaRho2)) / (2 * dense.gamma);
        double e = dense.c4 / (t * t * t) * g;
        // a, t ∂a/∂t and t² ∂²a/∂t² at constant ρ
        double a = b(t) * rho + c(t) * rho2 / 2 + d(t) * rho5 / 5 + e;
        double at = tbt(t) * rho + tct(t) * rho2 / 2 - dense.d2 / t * rho5 / 5 - 3 * e;
        double att = ttbtt(t) * rho + ttctt(t) * rho2 / 2 + 2 * dense.d2 / t * rho5 / 5 + 12 * e;

        double z = compressibility(t, rho);
        double q = stiffness(t, rho);
        // Z + t ∂Z/∂t at constant ρ, which is (∂p/∂t)/ρ
        double w = z + tbt(t) * rho + tct(t) * rho2 - dense.d2 / t * rho5 - 3 * tail(t, rho2);
        return new Departures(
                z, z * (w / q - 1), z * (1 - z / q), z - 1 - at, Math.log(z) - a - at, w * w / q - 1 - 2 * at - att);
    }

    private double b(double t) {
        return virial.b1 - (virial.b2 + (virial.b3 + virial.b4 / t) / t) / t;
    }

    private double tbt(double t) {
        return (virial.b2 + (2 * virial.b3 + 3 * virial.b4 / t) / t) / t;
    }

    private double ttbtt(double t) {
        return -(2 * virial.b2 + (6 * virial.b3 + 12 * virial.b4 / t) / t) / t;
    }

    private double c(double t) {
        return virial.c1 - virial.c2 / t + virial.c3 / (t * t * t);
    }

    private double tct(double t) {
        return virial.c2 / t - 3 * virial.c3 / (t * t * t);
    }

    private double ttctt(double t) {
        return -2 * virial.c2 / t + 12 * virial.c3 / (t * t * t);
    }

    private double d(double t) {
        return dense.d1 + dense.d2 / t;
    }
}
