package throwbench.solver.machine;

/**
 * A noted crank angle.
 *
 * @param throwName the throw whose angle it is
 * @param angle φ, rad
 */
public record Bookmark(String throwName, double angle, String note) {}
