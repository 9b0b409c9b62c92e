/**
 * Tables that a machine file names: recorded pressures over the crank angle, found inside the file's folder only. Uses
 * {@code document.quantity} and {@code chamber}.
 */
@NullMarked
package throwbench.solver.document.attached;

import org.jspecify.annotations.NullMarked;
