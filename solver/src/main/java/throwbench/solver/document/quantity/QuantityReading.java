package throwbench.solver.document.quantity;

/** What became of a text: a quantity, or the reason why it is none. */
public sealed interface QuantityReading permits Quantity, Refusal {}
