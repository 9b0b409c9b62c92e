package throwbench.solver.revolution;

/**
 * A greatest or least value of a curve.
 *
 * @param crankAngle where it stands, rad, in [0, 2π)
 */
public record Extreme(double value, double crankAngle) {}
