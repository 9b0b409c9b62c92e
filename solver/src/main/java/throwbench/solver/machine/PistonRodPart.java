package throwbench.solver.machine;

import java.util.OptionalDouble;

/** The piston rod as a stressed part: lengths in m, strengths and modulus in Pa, preload in N; each may be missing. */
public record PistonRodPart(
        OptionalDouble diameter,
        OptionalDouble threadRootDiameter,
        OptionalDouble freeLength,
        OptionalDouble elasticModulus,
        OptionalDouble yieldStrength,
        OptionalDouble ultimateStrength,
        OptionalDouble enduranceLimit,
        OptionalDouble stressConcentration,
        OptionalDouble preload) {}
