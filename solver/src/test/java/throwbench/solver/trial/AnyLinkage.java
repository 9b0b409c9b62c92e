package throwbench.solver.trial;

import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ArbitrarySupplier;
import net.jqwik.api.Combinators;
import throwbench.solver.mechanism.Linkage;

/** Linkages that turn: in line and offset to either side, from very short rods to long ones. */
public final class AnyLinkage implements ArbitrarySupplier<Linkage> {

    @Override
    public Arbitrary<Linkage> get() {
        Arbitrary<Double> radius = Numbers.between(0.02, 0.4);
        Arbitrary<Double> rodToCrank = Numbers.between(1.7, 8);
        // a share of the offset at which it would lock
        Arbitrary<Double> offset = Arbitraries.oneOf(Arbitraries.just(0.0), Numbers.between(-0.9, 0.9));
        return Combinators.combine(radius, rodToCrank, offset)
                .as((r, ratio, share) -> new Linkage(r, ratio * r, share * (ratio - 1) * r));
    }
}
