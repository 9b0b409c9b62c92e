/**
 * Force arrows of the linkage view: where they act, how long they are, how their kinds differ, and where their labels stand
 * for the whole revolution. Forces in N in throw axes, as the force on the named part; places in m in throw axes until
 * {@link throwbench.app.linkage.parts.ThrowAxes} turns them into points.
 */
@NullMarked
package throwbench.app.linkage.force;

import org.jspecify.annotations.NullMarked;
