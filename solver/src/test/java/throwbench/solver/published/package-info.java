/**
 * Figures printed outside this project, held against the solver: worked examples of textbooks and handbook values as rows of
 * data, each with its source. {@code published} is what the source prints, {@code exact} the same computed apart from this
 * project with exact geometry and a rigid rod, {@code tol_published} what rounding or a drawing in the source accounts for.
 *
 * <p>Signs: the engines of the examples are driven by their gas, so their turning moment is minus our driver's torque, and
 * their thrusts push where our rod load pulls.
 */
package throwbench.solver.published;
