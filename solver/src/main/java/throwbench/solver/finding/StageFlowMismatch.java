package throwbench.solver.finding;

import java.util.Locale;
import java.util.Optional;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.revolution.InterstageBalance;
import throwbench.solver.revolution.StageMismatch;

/**
 * How far a stage is from taking in what the stage passes that it follows, as a share of the latter, 1; where several follow one,
 * all of them together. 0 with balanced interstage pressures. No default limit.
 */
public final class StageFlowMismatch implements StageCriterion {

    private static final Statement STATEMENT = Statement.atMost(
                    LimitKey.STAGE_FLOW_MISMATCH, "1", "stage flow mismatch")
            .is("|mass taken in by the stages that follow − mass passed| / mass passed")
            .from("conservation of mass between stages in series");

    @Override
    public Statement statement() {
        return STATEMENT;
    }

    @Override
    public Optional<Found> find(JudgedDuty duty, String stage) {
        return InterstageBalance.mismatches(duty.running()).stream()
                .filter(mismatch -> mismatch.followers().contains(stage))
                .findFirst()
                .map(StageFlowMismatch::found);
    }

    private static Found found(StageMismatch mismatch) {
        if (mismatch.relative().isPresent()) {
            return Found.of(mismatch.relative().getAsDouble())
                    .noting(String.format(
                            Locale.ROOT,
                            "stage %s passes %.4g kg/s, stage %s takes in %.4g kg/s",
                            mismatch.stage(),
                            mismatch.passed().orElseThrow(),
                            String.join(" and stage ", mismatch.followers()),
                            mismatch.taken().orElseThrow()));
        }
        boolean known = mismatch.passed().isPresent() && mismatch.taken().isPresent();
        return Found.none(
                known
                        ? "stage " + mismatch.stage() + " passes nothing"
                        : "the mass that stage " + mismatch.stage()
                                + " passes or that those behind it take in is not known");
    }
}
