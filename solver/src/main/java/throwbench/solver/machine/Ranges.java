package throwbench.solver.machine;

import java.util.Map;
import java.util.Optional;

/** The box of duty variables whose corners are judged with every load step. */
public record Ranges(Optional<Range> speed, Map<String, StageRange> stages) {

    public static final Ranges NONE = new Ranges(Optional.empty(), Map.of());

    public Ranges {
        stages = Map.copyOf(stages);
    }

    /** Two ends in SI, least first. */
    public record Range(double least, double greatest) {}

    /**
     * Ranges of one stage, Pa absolute and K.
     *
     * @param reliefPressure the relief valve's setting, judged at every suction corner
     */
    public record StageRange(
            Optional<Range> suctionPressure,
            Optional<Range> suctionTemperature,
            Optional<Range> dischargePressure,
            Optional<Double> reliefPressure) {}
}
