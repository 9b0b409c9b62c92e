package throwbench.solver.map;

/**
 * A number put in place of the file's.
 *
 * @param value SI; Pa absolute for a pressure in a line
 */
public record Setting(Variable variable, double value) {}
