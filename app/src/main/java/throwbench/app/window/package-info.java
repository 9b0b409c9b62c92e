/** The window. */
@NullMarked
package throwbench.app.window;

import org.jspecify.annotations.NullMarked;
