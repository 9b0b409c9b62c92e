package throwbench.solver.machine;

/**
 * Where a throw sits on the crankshaft.
 *
 * @param crankPhase δ: counter-clockwise angle of the pin from the shaft's zero mark, rad
 * @param axisDirection γ: angle of the line of stroke (crank to head end) from machine X, rad
 * @param shaftPosition Z along the shaft, m
 */
public record ShaftPlace(double crankPhase, double axisDirection, double shaftPosition) {}
