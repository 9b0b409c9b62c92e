/**
 * Studies that ask one machine many times: duty maps, limits found by root finding, sensitivities, the worst duty point,
 * tolerances. Numbers of the machine file in SI, as the file's key paths name them; results in the units of tables. Uses
 * {@code document}, {@code finding}, {@code revolution} and what those use.
 */
@NullMarked
package throwbench.solver.map;

import org.jspecify.annotations.NullMarked;
