/**
 * What a pump adds to a solved machine: the flow in a stage's lines over the revolution, acceleration head, suction head and
 * volumetric efficiency. SI units; flow positive in the sense in which a pump is meant to pump, at the constant mean speed
 * that cycles are run at. Uses {@code revolution} and what that uses.
 */
@NullMarked
package throwbench.solver.pump;

import org.jspecify.annotations.NullMarked;
