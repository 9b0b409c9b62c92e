package throwbench.solver.chamber.flow;

/** Finds the flow that balances a stage of an implicit step, b u² + c ψ(u) = free, and keeps it. */
final class StageFlow {

    private static final int MOST = 30;

    private final FlowFit fit;
    private final double near;
    private double u;
    private double psi;

    /** @param near the last step of Newton's method, as a share of u; the error left is about its square */
    StageFlow(FlowFit fit, double near) {
        this.fit = fit;
        this.near = near;
    }

    /**
     * Newton's method with the quadratic kept: ψ alone is put straight.
     *
     * @param b above 0
     * @param c above 0
     * @param free above 0
     * @param guess ≥ 0
     */
    void solve(double b, double c, double free, double guess) {
        double now = guess;
        for (int i = 0; i < MOST; i++) {
            double value = fit.at(now);
            double rise = fit.slopeAt(now);
            double left = free - c * (value - rise * now);
            double q = c * rise;
            if (left <= 0) {
                left = free;
                q = c * value / now;
            }
            u = 2 * left / (q + Math.sqrt(Math.fma(q, q, 4 * b * left)));
            double moved = u - now;
            psi = Math.fma(rise, moved, value);
            if (Math.abs(moved) <= near * u) {
                return;
            }
            now = u;
        }
    }

    /** The u found. */
    double u() {
        return u;
    }

    /** ψ there. */
    double psi() {
        return psi;
    }
}
