package throwbench.solver.finding;

import throwbench.solver.machine.LimitKey;
import throwbench.solver.mechanism.PistonSpeed;

/**
 * Mean of the piston's speed without its sign, 2 · stroke · n, m/s, with the true stroke of an offset linkage. No default limit:
 * API 618 fixes none.
 */
public final class MeanPistonSpeed implements ThrowCriterion {

    private static final Statement STATEMENT = Statement.atMost(LimitKey.MEAN_PISTON_SPEED, "m/s", "mean piston speed")
            .is("2 × stroke × turns a second")
            .from("the purchaser's or the manufacturer's figure, for API 618 (2007) fixes none (from memory); formula:"
                    + " Compression Machinery for Oil and Gas, p. 205");

    @Override
    public Statement statement() {
        return STATEMENT;
    }

    @Override
    public Found find(JudgedDuty duty, int throwIndex) {
        return Found.of(PistonSpeed.mean(
                duty.described(throwIndex).linkage(), duty.running().meanSpeed()));
    }
}
