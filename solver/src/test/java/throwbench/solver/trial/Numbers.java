package throwbench.solver.trial;

import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.RandomDistribution;
import net.jqwik.api.Tuple;

/** Random numbers with all their digits; now and then one of their bounds. */
public final class Numbers {

    private Numbers() {}

    public static Arbitrary<Double> between(double least, double greatest) {
        // jqwik's own edge cases of a dozen numbers multiply until nothing else is tried
        Arbitrary<Double> inside = Arbitraries.doubles()
                .between(least, greatest)
                .ofScale(15)
                .shrinkTowards(least)
                .withDistribution(RandomDistribution.uniform())
                .withoutEdgeCases();
        return Arbitraries.frequencyOf(
                        Tuple.of(1, Arbitraries.just(least)),
                        Tuple.of(1, Arbitraries.just(greatest)),
                        Tuple.of(18, inside))
                .withoutEdgeCases();
    }
}
