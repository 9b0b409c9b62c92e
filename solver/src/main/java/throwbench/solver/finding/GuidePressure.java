package throwbench.solver.finding;

import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.machine.CrossheadPart;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extreme;
import throwbench.solver.revolution.Extremes;

/**
 * The greatest guide force, to either side, over the area of one shoe, Pa. No default limit; 0.3 to 0.5 MPa is customary (from
 * memory).
 */
public final class GuidePressure implements ThrowCriterion {

    private static final Statement STATEMENT = Statement.atMost(LimitKey.GUIDE_PRESSURE, "Pa", "guide pressure")
            .is("greatest guide force to either side / shoe area")
            .from("the manufacturer's rating; 0.3 to 0.5 MPa is customary (from memory)");

    @Override
    public Statement statement() {
        return STATEMENT;
    }

    @Override
    public Found find(JudgedDuty duty, int throwIndex) {
        OptionalDouble area = duty.described(throwIndex)
                .parts()
                .crosshead()
                .map(CrossheadPart::shoeArea)
                .orElse(OptionalDouble.empty());
        Optional<String> missing =
                new Needs("crossheadPart").value("shoeArea", area).missing();
        if (missing.isPresent()) {
            return Found.none(missing.get());
        }
        Extremes force = duty.extremes(throwIndex, Column.GUIDE_FORCE);
        boolean upwards = force.greatest().value() >= -force.least().value();
        Extreme peak = upwards ? force.greatest() : force.least();
        return Found.at(peak, Math.abs(peak.value()) / area.orElseThrow())
                .noting("the guide pushes the crosshead towards " + (upwards ? "+y" : "−y"));
    }
}
