/**
 * Gas that flows through the valves of a chamber, step by step over the crank angle. Angles in rad, pressures in Pa absolute,
 * flows by crank angle. Knows no cycle and no duty point; uses {@code mechanism}.
 */
@NullMarked
package throwbench.solver.chamber.flow;

import org.jspecify.annotations.NullMarked;
