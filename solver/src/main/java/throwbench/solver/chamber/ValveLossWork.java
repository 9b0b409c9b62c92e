package throwbench.solver.chamber;

/**
 * Work that a chamber's valves cost in a turn: the p–V area beyond the line pressures. What a leak or a valve held open
 * costs between the two line pressures is not in it.
 *
 * @param suction ∮ max(p_suction − p, 0) dV, J
 * @param discharge ∮ max(p − p_discharge, 0) (−dV), J
 */
public record ValveLossWork(double suction, double discharge) {}
