package throwbench.solver.finding;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.revolution.Reversal;

/**
 * Whether the combined load at the crosshead pin stays reversed long enough for oil to reach the loaded side: the shorter of
 * the longest unbroken spans in tension and in compression, in degrees of crank angle; 0 where the load never reverses.
 */
public final class ReversalDuration implements Criterion {

    @Override
    public String id() {
        return "reversal-duration";
    }

    @Override
    public String title() {
        return "reversal, span";
    }

    @Override
    public String formula() {
        return "the shorter of the longest unbroken spans of rod load in tension and in compression";
    }

    @Override
    public String source() {
        return "API 618, 5th edition (2007), 6.6.4";
    }

    @Override
    public LimitKey limitKey() {
        return LimitKey.REVERSAL_DURATION;
    }

    @Override
    public boolean limitIsGreatest() {
        return false;
    }

    @Override
    public String unit() {
        return "deg";
    }

    @Override
    public OptionalDouble defaultLimit() {
        return OptionalDouble.of(15);
    }

    @Override
    public List<Finding> judge(JudgedDuty duty) {
        List<Finding> findings = new ArrayList<>();
        for (int i = 0; i < duty.throwCount(); i++) {
            Reversal reversal = duty.reversal(i);
            Optional<Reversal.Span> span = reversal.governing();
            // in the middle of the span that governs; without one, where the load comes nearest to reversing
            OptionalDouble angle = span.isPresent()
                    ? OptionalDouble.of(
                            Angles.wrap(span.get().from() + span.get().length() / 2))
                    : OptionalDouble.empty();
            findings.add(Finding.judged(
                    this,
                    duty.place(i),
                    Math.toDegrees(reversal.duration()),
                    duty.limit(this, i),
                    angle,
                    note(reversal, span)));
        }
        return findings;
    }

    private static String note(Reversal reversal, Optional<Reversal.Span> governing) {
        if (governing.isEmpty()) {
            return reversal.tension().isPresent()
                    ? "the rod load stays in tension all round"
                    : "the rod load stays in compression all round";
        }
        return governing.get().inTension() ? "the span in tension governs" : "the span in compression governs";
    }
}
