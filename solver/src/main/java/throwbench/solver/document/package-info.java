/**
 * The machine file: its text, its quantities with their units, its faults, and the way from it to a machine. The only
 * package that knows units. Uses its inner rooms ({@code quantity}, {@code schema}, {@code json}, {@code attached},
 * {@code check}), {@code machine} and what that uses.
 */
@NullMarked
package throwbench.solver.document;

import org.jspecify.annotations.NullMarked;
