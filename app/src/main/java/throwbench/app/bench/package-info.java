/**
 * What is open: the machine, the duty point, the throw and the crank angle; play, undo and background work. Holds no
 * control and draws nothing; views get it by constructor.
 */
@NullMarked
package throwbench.app.bench;

import org.jspecify.annotations.NullMarked;
