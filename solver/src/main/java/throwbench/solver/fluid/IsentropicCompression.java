package throwbench.solver.fluid;

/**
 * From a suction state to the discharge state of the same entropy, told by the two mean exponents a perfect gas would have
 * for it. They are equal and equal to k for a perfect gas alone.
 *
 * @param dischargeTemperature T_d, K
 * @param temperatureExponent n_T of T_d/T_s = (p_d/p_s)^((n_T − 1)/n_T)
 * @param volumeExponent n_v of p_s v_s^n_v = p_d v_d^n_v
 */
public record IsentropicCompression(double dischargeTemperature, double temperatureExponent, double volumeExponent) {}
