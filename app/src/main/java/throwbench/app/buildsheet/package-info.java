/** The panel with the machine's inputs: fields over key paths of the machine file. Edits go through the bench. */
@NullMarked
package throwbench.app.buildsheet;

import org.jspecify.annotations.NullMarked;
