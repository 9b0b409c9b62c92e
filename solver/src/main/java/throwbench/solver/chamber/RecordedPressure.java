package throwbench.solver.chamber;

import java.util.List;
import java.util.Optional;
import throwbench.solver.mechanism.Angles;

/**
 * Pressure measured on a machine, over the crank angle of the chamber's own throw.
 *
 * @param file path as the machine file has it, relative to it
 * @param crankAngles φ, rad, strictly rising in [0, 2π), at least 8
 * @param pressures Pa absolute, above 0, one an angle
 */
public record RecordedPressure(String file, List<Double> crankAngles, List<Double> pressures) implements Cycle {

    private static final int FEWEST = 8;

    public RecordedPressure {
        crankAngles = List.copyOf(crankAngles);
        pressures = List.copyOf(pressures);
        if (crankAngles.size() < FEWEST || crankAngles.size() != pressures.size()) {
            throw new IllegalArgumentException(
                    crankAngles.size() + " crank angles and " + pressures.size() + " pressures");
        }
        double before = -Double.MIN_VALUE;
        for (int i = 0; i < crankAngles.size(); i++) {
            double angle = crankAngles.get(i);
            double pressure = pressures.get(i);
            if (!(angle > before && angle < Angles.TURN && pressure > 0 && pressure <= Double.MAX_VALUE)) {
                throw new IllegalArgumentException("row " + i + ": " + angle + " rad, " + pressure + " Pa");
            }
            before = angle;
        }
    }

    @Override
    public String kind() {
        return "recorded";
    }

    @Override
    public CycleOutcome solve(ChamberDuty duty) {
        return alone(duty.condition());
    }

    @Override
    public Optional<CycleOutcome> solveAlone(ChamberCondition condition) {
        return Optional.of(alone(condition));
    }

    private CycleOutcome alone(ChamberCondition condition) {
        if (condition.state() != ChamberState.WORKING) {
            return CycleOutcome.refused(
                    "a recorded pressure cannot be had " + condition.state().text() + ": it is what was measured");
        }
        if (condition.addedClearance().value() > 0) {
            return CycleOutcome.refused(
                    "a recorded pressure does not follow an addedClearance: it is what was measured");
        }
        return CycleOutcome.solved(new RecordedCurve(this));
    }
}
