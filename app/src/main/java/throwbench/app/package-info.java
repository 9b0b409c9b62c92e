/** Throwbench's window and command line over the solver: {@link throwbench.app.Launcher} decides which. */
@NullMarked
package throwbench.app;

import org.jspecify.annotations.NullMarked;
