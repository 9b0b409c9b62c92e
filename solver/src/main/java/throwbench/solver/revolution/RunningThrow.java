package throwbench.solver.revolution;

import java.util.List;
import throwbench.solver.chamber.ChamberVolume;
import throwbench.solver.chamber.PressureCurve;
import throwbench.solver.load.ThrowBody;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.Throw;

/**
 * One throw of a running machine: its bodies, and its chambers with their solved cycles.
 *
 * @param phase the throw's own crank angle φ when the first throw stands at head-end dead centre, rad
 * @param volumes one a chamber, open pockets included
 * @param curves one a chamber
 * @param uncoveredArea A_h − A_c, on which the frame pressure acts, m²
 */
public record RunningThrow(
        Throw described,
        ThrowBody body,
        double phase,
        List<ChamberVolume> volumes,
        List<PressureCurve> curves,
        double uncoveredArea) {

    public RunningThrow {
        volumes = List.copyOf(volumes);
        curves = List.copyOf(curves);
    }

    /** Its chambers, in file order. */
    public List<Chamber> chambers() {
        return described.chambers();
    }
}
