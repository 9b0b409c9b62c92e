/**
 * The parts of a throw as they are drawn: lengths in m in throw axes (x along the stroke to the head end, y 90°
 * counter-clockwise of it, origin at the crank centre), turned into points only by {@link ThrowAxes}. What the machine file
 * does not give is chosen in proportion to what it gives. Knows pens and the solver's results, no window.
 */
@NullMarked
package throwbench.app.linkage.parts;

import org.jspecify.annotations.NullMarked;
