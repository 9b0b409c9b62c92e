package throwbench.solver.finding;

import java.util.OptionalDouble;
import throwbench.solver.machine.LimitKey;

/** A criterion whose words and limit stand together in a statement. */
interface StatedCriterion extends Criterion {

    Statement statement();

    @Override
    default String id() {
        return statement().id();
    }

    @Override
    default String title() {
        return statement().title();
    }

    @Override
    default String formula() {
        return statement().formula();
    }

    @Override
    default String source() {
        return statement().source();
    }

    @Override
    default LimitKey limitKey() {
        return statement().key();
    }

    @Override
    default boolean limitIsGreatest() {
        return statement().greatest();
    }

    @Override
    default String unit() {
        return statement().unit();
    }

    @Override
    default OptionalDouble defaultLimit() {
        return statement().usual();
    }
}
