/**
 * Harmonics over the turn and the balance of the moving parts: orders count turns of the shaft, phases from head-end dead centre
 * of the first throw; forces and couples on the frame, in machine axes, N and N·m. Uses {@code machine} and what that uses.
 */
@NullMarked
package throwbench.solver.balance;

import org.jspecify.annotations.NullMarked;
