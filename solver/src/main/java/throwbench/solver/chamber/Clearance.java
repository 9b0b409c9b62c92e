package throwbench.solver.chamber;

/**
 * Clearance of a chamber, or the clearance a pocket adds.
 *
 * @param value a share of area · stroke, or a volume in m³; ≥ 0
 * @param share which of the two
 */
public record Clearance(double value, boolean share) {

    public static final Clearance NONE = new Clearance(0, true);

    public Clearance {
        if (!(value >= 0)) {
            throw new IllegalArgumentException("clearance " + value);
        }
    }

    /** Its volume, m³, in a chamber that sweeps this volume (m³). */
    public double volume(double sweptVolume) {
        return share ? value * sweptVolume : value;
    }
}
