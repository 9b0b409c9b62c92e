package throwbench.solver.chamber;

/**
 * Pressure measured on a machine, over the crank angle of the chamber's own throw.
 *
 * @param file path as the machine file has it, relative to it
 * @param crankAngles φ, rad, strictly rising in [0, 2π), at least 8; not copied, not to be changed
 * @param pressures Pa absolute, one per angle; not copied, not to be changed
 */
public record RecordedPressure(String file, double[] crankAngles, double[] pressures) implements Cycle {

    @Override
    public String kind() {
        return "recorded";
    }

    @Override
    public CycleOutcome solve(ChamberDuty duty) {
        return CycleOutcome.refused("recorded cycles are not solved by this version; use ideal-valves");
    }
}
