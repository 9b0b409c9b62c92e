package throwbench.solver.pump;

/**
 * The customary factors K_h of the acceleration head: the more a liquid gives, the less of the rigid column's head is felt.
 *
 * <p>Source: Hydraulic Institute standards and GPSA Engineering Data Book, section on pumps; from memory.
 */
public enum LiquidFactor {
    HARDLY_COMPRESSIBLE(1.4, "almost incompressible, as hot or de-aerated water"),
    WATER(1.5, "water, amine, glycol"),
    HYDROCARBON(2.0, "most hydrocarbons"),
    COMPRESSIBLE(2.5, "relatively compressible, as hot oil or ethane");

    private final double factor;
    private final String liquids;

    LiquidFactor(double factor, String liquids) {
        this.factor = factor;
        this.liquids = liquids;
    }

    /** K_h. */
    public double factor() {
        return factor;
    }

    /** The liquids that it stands for, in words. */
    public String liquids() {
        return liquids;
    }
}
