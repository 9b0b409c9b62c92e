package throwbench.solver.document;

import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.Quantity;

/**
 * A number that a machine file holds.
 *
 * @param path where
 * @param dimension what it measures; of a clearance, the share or volume as which it is written
 * @param quantity its SI value, tolerance, unit and text
 */
public record NumericKey(KeyPath path, Dimension dimension, Quantity quantity) {}
