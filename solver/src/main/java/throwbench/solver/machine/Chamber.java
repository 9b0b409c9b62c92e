package throwbench.solver.machine;

import java.util.Optional;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.Cycle;
import throwbench.solver.chamber.Side;

/**
 * One working volume of a throw.
 *
 * @param stage name of its stage; empty only for a recorded pressure
 * @param bore m, above innerDiameter
 * @param innerDiameter of what passes through it (rod, tail rod, smaller piston), m, ≥ 0
 * @param flowAllowance share of the capacity lost to heating, leakage and slip, in [0, 1)
 */
public record Chamber(
        String name,
        Side side,
        Optional<String> stage,
        double bore,
        double innerDiameter,
        Clearance clearance,
        Cycle cycle,
        double flowAllowance,
        Limits limits) {

    public Chamber {
        if (!(bore > innerDiameter && innerDiameter >= 0)) {
            throw new IllegalArgumentException("bore " + bore + " m, inner diameter " + innerDiameter + " m");
        }
    }

    /** A: area on which its pressure acts, m². */
    public double area() {
        return Math.PI / 4 * (bore - innerDiameter) * (bore + innerDiameter);
    }
}
