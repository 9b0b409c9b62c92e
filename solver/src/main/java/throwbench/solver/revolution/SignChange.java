package throwbench.solver.revolution;

/**
 * A curve goes through zero, or steps over it.
 *
 * @param crankAngle rad, in [0, 2π)
 * @param toTension whether it is positive afterwards
 */
public record SignChange(double crankAngle, boolean toTension) {}
