package throwbench.solver.finding;

import java.util.Locale;
import java.util.Optional;
import throwbench.solver.fluid.Answer;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.pump.FlowVariation;

/**
 * How far a pump's delivery swings, (max − min)/mean over the revolution, 1. No default limit. Stages of gas are passed over: what
 * their valves pass goes into a line that gives.
 */
public final class DeliveryVariation implements StageCriterion {

    private static final Statement STATEMENT = Statement.atMost(LimitKey.FLOW_VARIATION, "1", "flow variation")
            .is("(greatest delivery − least delivery) / mean delivery")
            .from(
                    "definition: Karassik and others, Pump Handbook, section on power pumps (from memory); the limit is the"
                            + " pipework's");

    @Override
    public Statement statement() {
        return STATEMENT;
    }

    @Override
    public Optional<Found> find(JudgedDuty duty, String stage) {
        if (duty.running().machine().fluidOf(stage).isGas()) {
            return Optional.empty();
        }
        Answer<FlowVariation> variation = FlowVariation.ofDelivery(duty.running(), stage);
        return Optional.of(variation
                .value()
                .map(v -> Found.at(v.greatest(), v.total()).noting(note(v)))
                .orElseGet(() -> Found.none(variation.reason())));
    }

    private static String note(FlowVariation v) {
        return String.format(Locale.ROOT, "%.4g %% above the mean, %.4g %% below it", 100 * v.above(), 100 * v.below());
    }
}
