/**
 * The machine as it is described: immutable records in SI units (Pa absolute, K, rad). Uses {@code mechanism},
 * {@code fluid}, {@code chamber} and {@code load}; computes nothing.
 */
@NullMarked
package throwbench.solver.machine;

import org.jspecify.annotations.NullMarked;
