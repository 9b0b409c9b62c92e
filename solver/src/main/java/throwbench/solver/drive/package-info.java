/**
 * The speed of the shaft over one revolution: ω above 0 in the sense of rotation, α positive when the shaft gains speed, torques
 * positive when the driver must deliver them; angles are crank angles of the first throw, rad. Uses {@code machine} and
 * {@code mechanism}.
 */
@NullMarked
package throwbench.solver.drive;

import org.jspecify.annotations.NullMarked;
