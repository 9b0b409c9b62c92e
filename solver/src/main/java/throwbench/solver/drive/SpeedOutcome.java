package throwbench.solver.drive;

import java.util.Optional;

/** A speed over the revolution, or the sentence that says why there is none. */
public record SpeedOutcome(Optional<SpeedCurve> curve, String refusal) {

    static SpeedOutcome solved(SpeedCurve curve) {
        return new SpeedOutcome(Optional.of(curve), "");
    }

    static SpeedOutcome refused(String sentence) {
        return new SpeedOutcome(Optional.empty(), sentence);
    }
}
