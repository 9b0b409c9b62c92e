/**
 * Every key of the machine file, declared once: kind, dimension, range, whether it is required, default and meaning. Uses
 * {@code document.quantity} and the words of {@code machine}, {@code chamber} and {@code mechanism}.
 */
@NullMarked
package throwbench.solver.document.schema;

import org.jspecify.annotations.NullMarked;
