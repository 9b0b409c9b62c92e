/**
 * Slider-crank geometry and kinematics of one throw, in throw axes (x along the line of stroke to the head end, y 90°
 * counter-clockwise). Knows no mass, pressure or speed law; uses no other package of the solver.
 */
@NullMarked
package throwbench.solver.mechanism;

import org.jspecify.annotations.NullMarked;
