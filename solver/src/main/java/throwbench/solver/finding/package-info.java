/**
 * Judgement of a solved machine against its limits: one class a criterion, with its formula, its source and its default
 * limit. Uses {@code revolution} and what that uses.
 */
@NullMarked
package throwbench.solver.finding;

import org.jspecify.annotations.NullMarked;
