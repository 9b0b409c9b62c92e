package throwbench.solver.finding;

import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.machine.PistonRodPart;
import throwbench.solver.machine.Throw;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extremes;

/** The piston rod of a throw as a stressed part, with the load at its crosshead end. */
final class PistonRod {

    private static final OptionalDouble NONE = OptionalDouble.empty();
    private static final PistonRodPart NOTHING =
            new PistonRodPart(NONE, NONE, NONE, NONE, NONE, NONE, NONE, NONE, NONE);

    private PistonRod() {}

    /** Its part in the machine file; one that says nothing where there is none. */
    static PistonRodPart part(Throw t) {
        return t.parts().pistonRod().orElse(NOTHING);
    }

    /** Names what is missing. */
    static Needs needs() {
        return new Needs("pistonRodPart");
    }

    /** T_pr, N, tension positive. */
    static Extremes load(JudgedDuty duty, int throwIndex) {
        return duty.extremes(throwIndex, Column.PISTON_ROD_LOAD);
    }

    /** Area of a round section, m². */
    static double area(double diameter) {
        return Math.PI / 4 * diameter * diameter;
    }

    /** Yield strength that stands for a limit, Pa. */
    static Optional<String> withoutYieldStrength(PistonRodPart part) {
        return needs().value("yieldStrength", part.yieldStrength()).missing();
    }
}
