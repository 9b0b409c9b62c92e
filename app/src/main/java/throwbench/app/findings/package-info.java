/**
 * The findings: every judged quantity with its value, limit and margin, worst first, each opening to formula, inputs and
 * source. Uses {@code bench}, {@code drawing} and the solver.
 */
@NullMarked
package throwbench.app.findings;

import org.jspecify.annotations.NullMarked;
