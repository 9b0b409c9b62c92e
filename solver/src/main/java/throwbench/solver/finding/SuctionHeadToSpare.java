package throwbench.solver.finding;

import java.util.Optional;
import throwbench.solver.fluid.Answer;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.pump.SuctionHead;

/**
 * The head that a pump's stage has left above the vapour pressure when the liquid in its suction line is accelerated, m of liquid:
 * (p_source − p_vapour)/(ρ g) + static head − friction loss − acceleration head. Default limit 0 m. Stages of gas are passed over.
 */
public final class SuctionHeadToSpare implements StageCriterion {

    private static final Statement STATEMENT = Statement.atLeast(LimitKey.SUCTION_HEAD, "m", "suction head")
            .is("(source pressure − vapour pressure)/(ρ g) + static head − friction loss − acceleration head")
            .from("acceleration head: Hydraulic Institute standards; GPSA Engineering Data Book, section on pumps (both"
                    + " from memory)")
            .usually(0);

    @Override
    public Statement statement() {
        return STATEMENT;
    }

    @Override
    public Optional<Found> find(JudgedDuty duty, String stage) {
        if (duty.running().machine().fluidOf(stage).isGas()) {
            return Optional.empty();
        }
        Answer<SuctionHead> head = SuctionHead.of(duty.running(), stage);
        return Optional.of(head.value()
                .map(h -> Found.of(h.available()).noting(h.note()))
                .orElseGet(() -> Found.none(head.reason())));
    }
}
