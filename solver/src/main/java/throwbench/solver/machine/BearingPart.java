package throwbench.solver.machine;

import java.util.OptionalDouble;

/** A journal: diameter and bearing length, m; each may be missing. */
public record BearingPart(OptionalDouble diameter, OptionalDouble length) {}
