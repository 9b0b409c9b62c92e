/**
 * The gauge column: large present values of the shown throw with their extremes over the revolution and the machine's limits.
 * Uses {@code bench}, {@code drawing} and the solver.
 */
@NullMarked
package throwbench.app.gauge;

import org.jspecify.annotations.NullMarked;
