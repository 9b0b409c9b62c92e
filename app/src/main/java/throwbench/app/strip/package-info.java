/**
 * The revolution strip: every chosen quantity over the crank angle φ of the shown throw, 0 to 360° from left to right, with
 * the reversal of its rod load on top. Turns the crank when scrubbed. Uses {@code bench}, {@code drawing} and the solver.
 */
@NullMarked
package throwbench.app.strip;

import org.jspecify.annotations.NullMarked;
