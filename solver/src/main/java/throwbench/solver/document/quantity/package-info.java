/**
 * Quantities as text: dimensions, units with exact factors, the strict reading of a machine file's values and the
 * lenient one of a typed field. Inside, values are SI (Pa absolute, K, rad). Uses no other package of the solver.
 */
@NullMarked
package throwbench.solver.document.quantity;

import org.jspecify.annotations.NullMarked;
