/**
 * A machine solved at a duty point: columns of every quantity over the crank angle, the instant at one angle, sign changes,
 * extremes and means. Loads in N, tension positive; angles in rad until they are written. Uses {@code machine} and what that
 * uses.
 */
@NullMarked
package throwbench.solver.revolution;

import org.jspecify.annotations.NullMarked;
