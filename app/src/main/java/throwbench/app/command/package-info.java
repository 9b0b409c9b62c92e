/**
 * The command line: reads the words, runs one command, says on standard error what is wrong with them. Values in SI until
 * they are written for people. Uses the solver; knows no JavaFX class, so that it starts quickly and without a display.
 */
@NullMarked
package throwbench.app.command;

import org.jspecify.annotations.NullMarked;
