package throwbench.solver.trial;

import java.util.OptionalDouble;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ArbitrarySupplier;
import net.jqwik.api.Combinators;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.load.Crank;
import throwbench.solver.load.Friction;
import throwbench.solver.load.ReciprocatingMasses;
import throwbench.solver.load.ThrowBody;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;

/** Throws of any geometry, mass, friction, direction and speed law, with gravity and without. */
public final class AnyMovingThrow implements ArbitrarySupplier<MovingThrow> {

    @Override
    public Arbitrary<MovingThrow> get() {
        return Combinators.combine(
                        body(),
                        Arbitraries.of(Rotation.class),
                        // not on head-end dead centre, where friction steps
                        Numbers.between(0.001, 6.282),
                        Numbers.between(5, 160),
                        Numbers.between(-300, 300),
                        Numbers.between(-2e5, 2e5))
                .as(MovingThrow::new);
    }

    private static Arbitrary<ThrowBody> body() {
        return Combinators.combine(new AnyLinkage().get(), masses(), rod(), crank(), place(), friction())
                .as((linkage, masses, rod, crank, place, friction) -> ThrowBody.of(
                        linkage, masses, scaled(rod, linkage), crank, allowed(friction, linkage), place[0], place[1]));
    }

    private static Arbitrary<ReciprocatingMasses> masses() {
        return Combinators.combine(Numbers.between(1, 400), Numbers.between(0, 200), Numbers.between(0, 300))
                .as(ReciprocatingMasses::new);
    }

    /** Mass centre and radius of gyration as shares of the length. */
    private static Arbitrary<double[]> rod() {
        return Combinators.combine(Numbers.between(0, 400), Numbers.between(0, 1), Numbers.between(0.1, 0.6))
                .as((mass, centre, gyration) -> new double[] {mass, centre, gyration});
    }

    private static ConnectingRod scaled(double[] rod, Linkage linkage) {
        double gyration = rod[2] * linkage.rodLength();
        return new ConnectingRod(
                rod[0],
                OptionalDouble.of(rod[1] * linkage.rodLength()),
                OptionalDouble.of(rod[0] * gyration * gyration));
    }

    private static Arbitrary<Crank> crank() {
        return Combinators.combine(Numbers.between(0, 30), Numbers.between(0, 30))
                .as(Crank::new);
    }

    /** γ and g. */
    private static Arbitrary<double[]> place() {
        return Combinators.combine(Numbers.between(-Math.PI, Math.PI), Arbitraries.of(0.0, 9.80665))
                .as((direction, gravity) -> new double[] {direction, gravity});
    }

    private static Arbitrary<Friction> friction() {
        return Combinators.combine(Numbers.between(0, 2000), Numbers.between(0, 0.9))
                .as(Friction::new);
    }

    /** μ as a share of what still has one solution, μ |tan β| < 1. */
    private static Friction allowed(Friction friction, Linkage linkage) {
        double sin = linkage.greatestSinRodAngle();
        double greatest = Math.sqrt(1 - sin * sin) / sin;
        return new Friction(friction.packing(), Math.min(0.5, friction.guideCoefficient() * greatest));
    }
}
