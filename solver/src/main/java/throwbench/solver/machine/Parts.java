package throwbench.solver.machine;

import java.util.Optional;

/** Dimensions of a throw's parts, each present only where the file has it. */
public record Parts(
        Optional<PistonRodPart> pistonRod,
        Optional<CrossheadPart> crosshead,
        Optional<BearingPart> crankPin,
        Optional<BearingPart> mainBearing) {

    public static final Parts NONE = new Parts(Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty());
}
