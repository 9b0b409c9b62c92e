package throwbench.solver.chamber;

import throwbench.solver.mechanism.Strokes;
import throwbench.solver.mechanism.Sweep;

/**
 * A chamber's volumes at the stations of a sweep, and the powers of them that its legs need. Kept as long as the geometry
 * stands; not shared between threads while it is used for a new exponent.
 */
public final class ChamberSweep {

    /** Below this relative change of volume a step, eight terms of the binomial series are exact to 1e-16. */
    private static final double SMALL_STEP = 0.012;

    private final Sweep sweep;
    private final ChamberVolume chamber;
    private final double[] volume;
    private final double[] power;
    private double compressionExponent;
    private double expansionExponent;
    private int volumeTurn;
    private int powerTurn;

    public ChamberSweep(Sweep sweep, ChamberVolume chamber) {
        this.sweep = sweep;
        this.chamber = chamber;
        this.volume = new double[sweep.count()];
        this.power = new double[sweep.count()];
    }

    public Sweep sweep() {
        return sweep;
    }

    public ChamberVolume chamber() {
        return chamber;
    }

    /** V at every station, m³; its own array, to be read only. */
    public double[] volume() {
        if (volumeTurn != sweep.turns()) {
            double[] travel = sweep.travel();
            double area = chamber.side() == Side.HEAD ? chamber.area() : -chamber.area();
            double atHeadEnd = chamber.at(0);
            for (int i = 0; i < volume.length; i++) {
                volume[i] = Math.fma(area, travel[i], atHeadEnd);
            }
            volumeTurn = sweep.turns();
        }
        return volume;
    }

    /**
     * What the pressure at the start of a leg is multiplied by: (V_max/V)^n_c while the volume falls, (V_min/V)^n_e while
     * it grows; its own array, to be read only.
     */
    public double[] legs(double nCompression, double nExpansion) {
        double[] v = volume();
        if (powerTurn != sweep.turns() || compressionExponent != nCompression || expansionExponent != nExpansion) {
            Strokes strokes = sweep.strokes();
            for (int k = 0; k < strokes.count(); k++) {
                boolean grows = chamber.growsOn(strokes.inward(k));
                double n = grows ? nExpansion : nCompression;
                double reference = grows ? chamber.least() : chamber.greatest();
                leg(v, strokes.from(k), strokes.to(k), reference, n);
            }
            compressionExponent = nCompression;
            expansionExponent = nExpansion;
            powerTurn = sweep.turns();
        }
        return power;
    }

    private void leg(double[] v, int from, int to, double reference, double n) {
        power[from] = Math.pow(reference / v[from], n);
        stepFactors(v, from + 1, to, n);
        for (int i = from + 1; i < to; i++) {
            power[i] *= power[i - 1];
        }
    }

    private void stepFactors(double[] v, int from, int to, double n) {
        double c2 = (n - 1) / 2;
        double c3 = (n - 2) / 3;
        double c4 = (n - 3) / 4;
        double c5 = (n - 4) / 5;
        double c6 = (n - 5) / 6;
        double c7 = (n - 6) / 7;
        double greatest = 0;
        for (int i = from; i < to; i++) {
            double d = v[i - 1] / v[i] - 1;
            double sum = 1 + c7 * d;
            sum = Math.fma(c6 * d, sum, 1);
            sum = Math.fma(c5 * d, sum, 1);
            sum = Math.fma(c4 * d, sum, 1);
            sum = Math.fma(c3 * d, sum, 1);
            sum = Math.fma(c2 * d, sum, 1);
            power[i] = Math.fma(n * d, sum, 1);
            greatest = Math.max(greatest, Math.abs(d));
        }
        if (greatest > SMALL_STEP) {
            for (int i = from; i < to; i++) {
                power[i] = Math.pow(v[i - 1] / v[i], n);
            }
        }
    }
}
