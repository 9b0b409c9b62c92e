/**
 * The linkage view: the machine seen along its shaft, to scale, with the loads of one instant. Draws what
 * {@link throwbench.app.linkage.parts} lays out and {@link throwbench.app.linkage.force} measures; turns the crank through
 * the playhead and changes nothing else.
 */
@NullMarked
package throwbench.app.linkage;

import org.jspecify.annotations.NullMarked;
