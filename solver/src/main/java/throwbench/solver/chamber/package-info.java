/**
 * Working volumes and their pressure cycles over the crank angle of their own throw. Pressures in Pa absolute. Uses
 * {@code mechanism} and {@code fluid}.
 */
@NullMarked
package throwbench.solver.chamber;

import org.jspecify.annotations.NullMarked;
