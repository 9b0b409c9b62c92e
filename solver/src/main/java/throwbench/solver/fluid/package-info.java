/** What the chambers hold: gases and liquids in SI units (K, Pa absolute, kg/mol). Uses no other package of the solver. */
@NullMarked
package throwbench.solver.fluid;

import org.jspecify.annotations.NullMarked;
