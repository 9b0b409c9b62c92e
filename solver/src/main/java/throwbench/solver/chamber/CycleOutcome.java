package throwbench.solver.chamber;

import java.util.Optional;

/**
 * A cycle solved, or the sentence that says why it is not.
 *
 * @param refusal empty when solved
 * @param failed true when the description is in order but the solver found no periodic state: the program's failure, not
 *     the user's
 */
public record CycleOutcome(Optional<PressureCurve> curve, String refusal, boolean failed) {

    public static CycleOutcome solved(PressureCurve curve) {
        return new CycleOutcome(Optional.of(curve), "", false);
    }

    /** What is asked for is not possible, or not described completely. */
    public static CycleOutcome refused(String sentence) {
        return new CycleOutcome(Optional.empty(), sentence, false);
    }

    /** The solver did not get there. */
    public static CycleOutcome failed(String sentence) {
        return new CycleOutcome(Optional.empty(), sentence, true);
    }
}
