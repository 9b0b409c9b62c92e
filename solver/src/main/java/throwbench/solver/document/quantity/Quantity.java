package throwbench.solver.document.quantity;

/**
 * A value as it was written, and what it means.
 *
 * @param value SI; pressures that say a or g in Pa absolute
 * @param tolerance half the width of the band about the value, SI, ≥ 0; 0 where none is written
 * @param text as the machine file has it
 * @param unit in which it is written; {@link Unit#ONE} for a plain number
 * @param mark what stands behind a pressure's unit
 */
public record Quantity(double value, double tolerance, String text, Unit unit, PressureMark mark)
        implements QuantityReading {

    /**
     * Another value written the way this one is: same unit, same mark, no tolerance.
     *
     * @param si value, SI
     * @param ambientPressure of the site, Pa absolute
     * @param digits significant digits, 1 to 17
     */
    public String rewritten(double si, double ambientPressure, int digits) {
        return QuantityText.write(si, unit, mark, ambientPressure, digits);
    }
}
