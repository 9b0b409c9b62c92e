package throwbench.solver.fluid;

/** The fluid of a stage: a gas given by its constants, a gas mixture, or a liquid. */
public sealed interface Fluid permits PerfectGas, GasMixture, Liquid {

    /** Whether the fluid is a gas; a cycle of valves for gas needs one, a liquid cycle needs the other. */
    boolean isGas();
}
