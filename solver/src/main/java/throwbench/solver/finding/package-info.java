/**
 * Judgement of a solved machine against its limits: one class a criterion, with its formula, its source and its default
 * limit; where it is judged. SI units, angles of reversal in degrees. Uses {@code revolution}, {@code pump} and what those use.
 */
@NullMarked
package throwbench.solver.finding;

import org.jspecify.annotations.NullMarked;
