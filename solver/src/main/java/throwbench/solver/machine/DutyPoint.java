package throwbench.solver.machine;

import java.util.Map;
import throwbench.solver.chamber.ChamberCondition;

/**
 * One set of operating conditions.
 *
 * @param speed mean speed, rad/s, above 0 (the drive's where the file names none)
 * @param stages stage name → line conditions
 * @param chambers chamber name → condition; a chamber not named works with no pocket open
 */
public record DutyPoint(
        String name, double speed, Map<String, StageConditions> stages, Map<String, ChamberCondition> chambers) {

    public DutyPoint {
        stages = Map.copyOf(stages);
        chambers = Map.copyOf(chambers);
    }

    /** What this duty point says of a chamber. */
    public ChamberCondition condition(String chamber) {
        return chambers.getOrDefault(chamber, ChamberCondition.WORKING);
    }
}
