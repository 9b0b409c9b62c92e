package throwbench.solver.chamber;

import throwbench.solver.mechanism.Strokes;
import throwbench.solver.mechanism.Sweep;

/**
 * A chamber's volumes at the stations of a sweep, and the powers of them that its legs need. Kept as long as the geometry
 * stands; not shared between threads while it is used for a new exponent.
 */
public final class ChamberSweep {

    /** Below this relative change of volume a step, the eleven terms of the binomial series are exact to 1e-17. */
    private static final double SMALL_STEP = 0.04;

    private final Sweep sweep;
    private final ChamberVolume chamber;
    private final double[] volume;
    private final double[] power;
    private double compressionExponent;
    private double expansionExponent;
    private final boolean smallSteps;
    private int volumeTurn;
    private int powerTurn;

    public ChamberSweep(Sweep sweep, ChamberVolume chamber) {
        this.sweep = sweep;
        this.chamber = chamber;
        this.volume = new double[sweep.count()];
        this.power = new double[sweep.count()];
        this.smallSteps = greatestStep() < SMALL_STEP;
    }

    /**
     * A bound of |ΔV|/V from station to station. Where |d²s/dθ²| ≤ a and s ≥ 0, |ds/dθ| ≤ √(2 a s); with the clearance's
     * length c the share √(2 a s)/(c + s) is greatest at s = c.
     */
    private double greatestStep() {
        double clearanceLength = chamber.clearance() / chamber.area();
        double bend = sweep.linkage().greatestBend();
        return sweep.step() * Math.sqrt(bend / (2 * clearanceLength));
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
        // the volume one station before, in place of the power: loops over one index alone become vector code
        System.arraycopy(v, from, power, from + 1, to - from - 1);
        if (smallSteps) {
            stepFactors(v, from + 1, to, n);
        } else {
            for (int i = from + 1; i < to; i++) {
                power[i] = Math.pow(power[i] / v[i], n);
            }
        }
        power[from] = Math.pow(reference / v[from], n);
        for (int i = from + 1; i < to; i++) {
            power[i] *= power[i - 1];
        }
    }

    /** (1 + d)^n of the small change d from station to station, by Newton's series. */
    private void stepFactors(double[] v, int from, int to, double n) {
        double c2 = (n - 1) / 2;
        double c3 = (n - 2) / 3;
        double c4 = (n - 3) / 4;
        double c5 = (n - 4) / 5;
        double c6 = (n - 5) / 6;
        double c7 = (n - 6) / 7;
        double c8 = (n - 7) / 8;
        double c9 = (n - 8) / 9;
        double c10 = (n - 9) / 10;
        for (int i = from; i < to; i++) {
            double d = power[i] / v[i] - 1;
            double sum = 1 + c10 * d;
            sum = Math.fma(c9 * d, sum, 1);
            sum = Math.fma(c8 * d, sum, 1);
            sum = Math.fma(c7 * d, sum, 1);
            sum = Math.fma(c6 * d, sum, 1);
            sum = Math.fma(c5 * d, sum, 1);
            sum = Math.fma(c4 * d, sum, 1);
            sum = Math.fma(c3 * d, sum, 1);
            sum = Math.fma(c2 * d, sum, 1);
            power[i] = Math.fma(n * d, sum, 1);
        }
    }
}
