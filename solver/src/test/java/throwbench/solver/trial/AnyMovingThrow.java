package throwbench.solver.trial;

import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ArbitrarySupplier;
import net.jqwik.api.Combinators;
import throwbench.solver.load.ThrowBody;
import throwbench.solver.machine.Site;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Rotation;

/** Any throw, pushed by any gas load at any speed, gaining or losing it, with gravity and without. */
public final class AnyMovingThrow implements ArbitrarySupplier<MovingThrow> {

    @Override
    public Arbitrary<MovingThrow> get() {
        return Combinators.combine(
                        new AnyThrow().get(),
                        Arbitraries.of(0.0, Site.STANDARD_GRAVITY),
                        Arbitraries.of(Rotation.class),
                        // not on head-end dead centre, where friction steps
                        Numbers.between(0.001, 6.282),
                        Numbers.between(5, 160),
                        Numbers.between(-300, 300),
                        Numbers.between(-2e5, 2e5))
                .as((described, gravity, rotation, angle, speed, alpha, gas) ->
                        new MovingThrow(body(described, gravity), rotation, angle, speed, alpha, gas));
    }

    private static ThrowBody body(Throw t, double gravity) {
        return ThrowBody.of(
                t.linkage(),
                t.masses(),
                t.connectingRod(),
                t.crank(),
                t.friction(),
                t.place().axisDirection(),
                gravity);
    }
}
