package throwbench.solver.finding;

import java.util.List;
import java.util.OptionalDouble;
import throwbench.solver.machine.LimitKey;

/** One thing that is judged. An implementation says in its documentation what it computes and from what. */
public interface Criterion {

    /** The id written, as in {@code reversal-duration}. */
    String id();

    /** Its name in words, for people. */
    String title();

    /** The formula in one line, for people. */
    String formula();

    /** Where the default limit, or else the definition, comes from: work, edition, clause. */
    String source();

    /** The limit of the machine file that it is held against. */
    LimitKey limitKey();

    /** Whether the limit is the greatest value allowed, or the least. */
    boolean limitIsGreatest();

    /** Unit of value and limit as written: N, deg, 1, … */
    String unit();

    /** The limit that holds where the machine file sets none, in {@link #unit()}. */
    OptionalDouble defaultLimit();

    /** Judges a machine at one duty point: one finding for each throw, stage or chamber it applies to. */
    List<Finding> judge(JudgedDuty duty);
}
