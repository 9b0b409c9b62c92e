package throwbench.solver.chamber;

import java.util.List;

/**
 * Pressure measured on a machine, over the crank angle of the chamber's own throw.
 *
 * @param file path as the machine file has it, relative to it
 * @param crankAngles φ, rad, strictly rising in [0, 2π), at least 8
 * @param pressures Pa absolute, one an angle
 */
public record RecordedPressure(String file, List<Double> crankAngles, List<Double> pressures) implements Cycle {

    public RecordedPressure {
        crankAngles = List.copyOf(crankAngles);
        pressures = List.copyOf(pressures);
    }

    @Override
    public String kind() {
        return "recorded";
    }

    @Override
    public CycleOutcome solve(ChamberDuty duty) {
        return CycleOutcome.refused("recorded cycles are not solved by this version; use ideal-valves");
    }
}
