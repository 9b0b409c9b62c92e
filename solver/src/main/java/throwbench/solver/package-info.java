/** The running gear of reciprocating machines, solved without a window: see the packages below. SI units throughout. */
@NullMarked
package throwbench.solver;

import org.jspecify.annotations.NullMarked;
