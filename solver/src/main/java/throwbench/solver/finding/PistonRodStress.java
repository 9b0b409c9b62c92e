package throwbench.solver.finding;

import java.util.Optional;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.machine.PistonRodPart;
import throwbench.solver.revolution.Extreme;
import throwbench.solver.revolution.Extremes;

/**
 * The greater of two mean stresses of the piston rod, Pa: peak tension over the area of the thread root, peak compression over
 * the area of the rod. The load is that at its crosshead end. Preload and stress concentration are not in it. Limited by the yield
 * strength where no limit is set.
 */
public final class PistonRodStress implements ThrowCriterion {

    private static final Statement STATEMENT = Statement.atMost(LimitKey.PISTON_ROD_STRESS, "Pa", "piston rod stress")
            .is("the greater of peak tension / thread root area and peak compression / rod area")
            .from(
                    "force over area; limited by the material's yield strength, a rating of the manufacturer goes before it");

    @Override
    public Statement statement() {
        return STATEMENT;
    }

    @Override
    public Found find(JudgedDuty duty, int throwIndex) {
        PistonRodPart part = PistonRod.part(duty.described(throwIndex));
        Optional<String> missing = PistonRod.needs()
                .value("diameter", part.diameter())
                .value("threadRootDiameter", part.threadRootDiameter())
                .missing();
        if (missing.isPresent()) {
            return Found.none(missing.get()).usually(part.yieldStrength());
        }
        Extremes load = PistonRod.load(duty, throwIndex);
        double tension = load.greatest().value()
                / PistonRod.area(part.threadRootDiameter().orElseThrow());
        double compression =
                -load.least().value() / PistonRod.area(part.diameter().orElseThrow());
        boolean pulled = tension >= compression;
        Extreme peak = pulled ? load.greatest() : load.least();
        String note = pulled ? "tension at the thread root governs" : "compression of the rod governs";
        return Found.at(peak, Math.max(tension, compression))
                .noting(note + needed(part, duty.limit(this, throwIndex).isPresent()))
                .usually(part.yieldStrength());
    }

    private static String needed(PistonRodPart part, boolean limited) {
        return limited
                ? ""
                : PistonRod.withoutYieldStrength(part).map(m -> "; " + m).orElse("");
    }
}
