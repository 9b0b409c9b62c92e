package throwbench.solver.chamber;

/**
 * What a duty point says of one chamber.
 *
 * @param state how its valves work
 * @param leakArea effective area of a failed valve's leak, m²; 0 where no valve has failed
 * @param addedClearance clearance of open pockets, beside the chamber's own
 */
public record ChamberCondition(ChamberState state, double leakArea, Clearance addedClearance) {

    /** All valves work, no pocket is open. */
    public static final ChamberCondition WORKING = new ChamberCondition(ChamberState.WORKING, 0, Clearance.NONE);
}
