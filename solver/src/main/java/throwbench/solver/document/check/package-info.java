/**
 * From a parsed text to a machine: every value judged by itself, all of them together, and the machine made of what has no
 * flaw. Uses {@code document.schema}, {@code document.json}, {@code document.attached}, {@code document.quantity},
 * {@code machine} and what that uses (the gas table of {@code fluid} among it).
 */
@NullMarked
package throwbench.solver.document.check;

import org.jspecify.annotations.NullMarked;
