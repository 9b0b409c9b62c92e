package throwbench.solver.chamber.flow;

/**
 * Ψ of the compressible flow of a perfect gas through an orifice: ṁ = A_e p_up/√(R T_up) Ψ(p_down/p_up), isentropic up to
 * the throat.
 *
 * @param k isentropic exponent, above 1
 */
public record FlowFunction(double k) {

    public FlowFunction {
        if (!(k > 1)) {
            throw new IllegalArgumentException("isentropic exponent " + k);
        }
    }

    /** Π*, the pressure ratio at and below which the flow is choked. */
    public double criticalRatio() {
        return Math.pow(2 / (k + 1), k / (k - 1));
    }

    /** Ψ at Π* and below. */
    public double greatest() {
        return Math.sqrt(k) * Math.pow(2 / (k + 1), (k + 1) / (2 * (k - 1)));
    }

    /** Ψ(Π); 0 for Π ≥ 1. */
    public double at(double ratio) {
        if (ratio >= 1) {
            return 0;
        }
        return ratio <= criticalRatio() ? greatest() : subcritical(ratio);
    }

    /** Ψ = √(2k/(k−1) (Π^(2/k) − Π^((k+1)/k))), written without the cancellation near Π = 1 and near k = 1. */
    double subcritical(double ratio) {
        double log = Math.log(ratio);
        double root = Math.exp(log / k);
        return root * Math.sqrt(-2 * k / (k - 1) * Math.expm1(log * (k - 1) / k));
    }
}
