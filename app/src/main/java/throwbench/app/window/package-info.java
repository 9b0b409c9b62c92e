/**
 * The frame of the window: its bars, its panels, its keys, its clock. Puts the views together; computes and draws nothing
 * itself.
 */
@NullMarked
package throwbench.app.window;

import org.jspecify.annotations.NullMarked;
