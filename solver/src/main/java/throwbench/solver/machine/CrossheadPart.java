package throwbench.solver.machine;

import java.util.OptionalDouble;

/** Crosshead pin (m) and shoe area (m²); each may be missing. */
public record CrossheadPart(OptionalDouble pinDiameter, OptionalDouble pinLength, OptionalDouble shoeArea) {}
