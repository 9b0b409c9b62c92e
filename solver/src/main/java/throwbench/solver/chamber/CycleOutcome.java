package throwbench.solver.chamber;

import java.util.Optional;

/** A cycle solved, or the sentence that says why it cannot be. */
public record CycleOutcome(Optional<PressureCurve> curve, String refusal) {

    public static CycleOutcome solved(PressureCurve curve) {
        return new CycleOutcome(Optional.of(curve), "");
    }

    public static CycleOutcome refused(String sentence) {
        return new CycleOutcome(Optional.empty(), sentence);
    }
}
