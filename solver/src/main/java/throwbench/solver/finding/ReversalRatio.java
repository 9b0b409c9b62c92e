package throwbench.solver.finding;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.revolution.Extreme;
import throwbench.solver.revolution.Reversal;

/**
 * Whether the combined load at the crosshead pin reverses hard enough: the smaller of the peaks in tension and in
 * compression over the larger; 0 where the load never reverses.
 */
public final class ReversalRatio implements Criterion {

    @Override
    public String id() {
        return "reversal-ratio";
    }

    @Override
    public String title() {
        return "reversal, share of peak";
    }

    @Override
    public String formula() {
        return "smaller peak of rod load by sign / larger peak";
    }

    @Override
    public String source() {
        return "API 618, 5th edition (2007), 6.6.4";
    }

    @Override
    public LimitKey limitKey() {
        return LimitKey.REVERSAL_RATIO;
    }

    @Override
    public boolean limitIsGreatest() {
        return false;
    }

    @Override
    public String unit() {
        return "1";
    }

    @Override
    public OptionalDouble defaultLimit() {
        return OptionalDouble.of(0.03);
    }

    @Override
    public List<Finding> judge(JudgedDuty duty) {
        List<Finding> findings = new ArrayList<>();
        for (int i = 0; i < duty.throwCount(); i++) {
            Reversal reversal = duty.reversal(i);
            OptionalDouble angle = reversal.smallerPeak()
                    .map(Extreme::crankAngle)
                    .map(OptionalDouble::of)
                    .orElse(OptionalDouble.empty());
            String note = reversal.reverses() ? "" : "the rod load never changes its sign";
            findings.add(Finding.judged(this, duty.place(i), reversal.ratio(), duty.limit(this, i), angle, note));
        }
        return findings;
    }
}
