/**
 * Results as files: a revolution as CSV and JSON, findings as JSON, duty maps as CSV. Angles in degrees, everything else in
 * SI, decimal point, line feeds, UTF-8. Uses {@code map}, {@code finding}, {@code revolution} and what those use.
 */
@NullMarked
package throwbench.solver.document.result;

import org.jspecify.annotations.NullMarked;
