/**
 * JSON text with the place of every value: parsed within limits, edited by replacing characters only. Knows nothing of
 * machines and uses no other package of the solver.
 */
@NullMarked
package throwbench.solver.document.json;

import org.jspecify.annotations.NullMarked;
