package throwbench.solver.trial;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ArbitrarySupplier;
import net.jqwik.api.Combinators;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.IdealValves;
import throwbench.solver.chamber.Side;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.load.Crank;
import throwbench.solver.load.Friction;
import throwbench.solver.load.ReciprocatingMasses;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Parts;
import throwbench.solver.machine.ShaftPlace;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;

/** Throws of any geometry, mass, friction and place on the shaft, single or double-acting, with ideal valves. */
public final class AnyThrow implements ArbitrarySupplier<Throw> {

    /** The one stage that their chambers belong to. */
    public static final String STAGE = "first";

    @Override
    public Arbitrary<Throw> get() {
        return Combinators.combine(new AnyLinkage().get(), masses(), rod(), crank(), place(), friction(), chambers())
                .as((linkage, masses, rod, crank, place, friction, chambers) -> new Throw(
                        "A",
                        place,
                        linkage,
                        masses,
                        scaled(rod, linkage),
                        crank,
                        allowed(friction, linkage),
                        chambers,
                        Parts.NONE,
                        Limits.NONE));
    }

    private static Arbitrary<ReciprocatingMasses> masses() {
        return Combinators.combine(Numbers.between(1, 400), Numbers.between(0, 200), Numbers.between(0, 300))
                .as(ReciprocatingMasses::new);
    }

    /** Mass; mass centre and radius of gyration as shares of the length. */
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

    private static Arbitrary<ShaftPlace> place() {
        Arbitrary<Double> angle = Arbitraries.oneOf(
                Arbitraries.of(0.0, Math.PI, Math.PI / 2, -Math.PI / 4), Numbers.between(-Math.PI, Math.PI));
        return Combinators.combine(angle, angle, Numbers.between(-1, 1)).as(ShaftPlace::new);
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

    private static Arbitrary<List<Chamber>> chambers() {
        return Arbitraries.of(List.of(Side.HEAD), List.of(Side.CRANK), List.of(Side.HEAD, Side.CRANK))
                .flatMap(sides -> chamber().list().ofSize(sides.size()).map(any -> sided(any, sides)));
    }

    private static List<Chamber> sided(List<Chamber> any, List<Side> sides) {
        List<Chamber> chambers = new ArrayList<>();
        for (int i = 0; i < any.size(); i++) {
            Chamber c = any.get(i);
            chambers.add(new Chamber(
                    sides.get(i).text(),
                    sides.get(i),
                    c.stage(),
                    c.bore(),
                    c.innerDiameter(),
                    c.clearance(),
                    c.cycle(),
                    c.flowAllowance(),
                    Limits.NONE));
        }
        return chambers;
    }

    private static Arbitrary<Chamber> chamber() {
        return Combinators.combine(
                        Numbers.between(0.05, 0.6),
                        Numbers.between(0, 0.5),
                        Numbers.between(0.03, 0.6),
                        valves(),
                        Numbers.between(0, 0.2))
                .as((bore, rod, clearance, valves, allowance) -> new Chamber(
                        "",
                        Side.HEAD,
                        Optional.of(STAGE),
                        bore,
                        rod * bore,
                        new Clearance(clearance, true),
                        valves,
                        allowance,
                        Limits.NONE));
    }

    private static Arbitrary<IdealValves> valves() {
        return Combinators.combine(
                        Numbers.between(0, 0.1),
                        Numbers.between(0, 0.1),
                        Numbers.between(1.05, 1.5),
                        Numbers.between(1.05, 1.5))
                .as((suction, discharge, nc, ne) ->
                        new IdealValves(suction, discharge, OptionalDouble.of(nc), OptionalDouble.of(ne)));
    }
}
