package throwbench.solver.document.quantity;

/**
 * Why a text is not the quantity asked for.
 *
 * @param found what stands there, the text quoted
 * @param wanted what should
 */
public record Refusal(String found, String wanted) implements QuantityReading {

    /** One sentence for a field. */
    public String sentence() {
        return found + "; wanted " + wanted + ".";
    }
}
