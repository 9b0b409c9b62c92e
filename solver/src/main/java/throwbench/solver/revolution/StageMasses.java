package throwbench.solver.revolution;

import java.util.OptionalDouble;
import throwbench.solver.chamber.CycleOutcome;
import throwbench.solver.chamber.LineConditions;
import throwbench.solver.chamber.PressureCurve;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.StageConditions;
import throwbench.solver.machine.Throw;

/** What the stages of a machine pass at a duty point, at any pressures of their lines. */
final class StageMasses {

    private final Machine machine;
    private final DutyPoint duty;
    private String trouble = "";

    StageMasses(Machine machine, DutyPoint duty) {
        this.machine = machine;
        this.duty = duty;
    }

    /** What a stage says of its lines; empty where it is not at the duty point. */
    StageConditions conditions(String stage) {
        return duty.stages()
                .getOrDefault(
                        stage,
                        new StageConditions(OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty()));
    }

    /** The sentence of the last chamber that could not be solved or whose mass is not known; else empty. */
    String trouble() {
        return trouble;
    }

    /** Mass in a turn of all chambers of a stage between two pressures (Pa absolute), kg; 0 for those in trouble. */
    double at(String stage, double suction, double discharge) {
        LineConditions lines =
                new LineConditions(suction, discharge, conditions(stage).suctionTemperature());
        trouble = "";
        double mass = 0;
        for (Throw t : machine.throwsInOrder()) {
            for (Chamber chamber : t.chambers()) {
                if (chamber.stage().filter(stage::equals).isPresent()) {
                    mass += mass(t, chamber, lines);
                }
            }
        }
        return mass;
    }

    private double mass(Throw t, Chamber chamber, LineConditions lines) {
        CycleOutcome outcome = ThrowSettler.cycle(machine, duty, t, chamber, lines);
        OptionalDouble known = outcome.curve().map(PressureCurve::massPerTurn).orElse(OptionalDouble.empty());
        if (known.isEmpty()) {
            String why = outcome.curve().isEmpty()
                    ? outcome.refusal()
                    : "the mass that it passes is not known; a gas needs a suctionTemperature at the duty point";
            trouble = chamber.name() + ": " + why;
        }
        return known.orElse(0);
    }
}
