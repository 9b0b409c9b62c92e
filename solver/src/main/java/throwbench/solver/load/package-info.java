/**
 * Rigid-body forces of one throw in throw axes, N and N·m; loads along the rod positive in tension. Uses
 * {@code mechanism}.
 */
@NullMarked
package throwbench.solver.load;

import org.jspecify.annotations.NullMarked;
