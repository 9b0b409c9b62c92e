package throwbench.solver.pump;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import throwbench.solver.chamber.LiquidValves;
import throwbench.solver.chamber.Side;
import throwbench.solver.fluid.Liquid;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.trial.AnyLinkage;
import throwbench.solver.trial.Numbers;
import throwbench.solver.trial.Pumps;

/** Random pumps: up to five unlike throws at any angles, with lags, losses and liquids that give much or nothing. */
class ManifoldFlowPropertyTest {

    @Provide
    Arbitrary<RunningMachine> pumps() {
        Arbitrary<LiquidValves> valves = Combinators.combine(
                        Numbers.between(0, 1e5),
                        Numbers.between(0, 5e5),
                        Arbitraries.of(true, false),
                        // less than the shorter stroke of any of these linkages
                        Numbers.between(0, 0.78))
                .as(LiquidValves::new);
        Arbitrary<Throw> throwOf = Combinators.combine(
                        new AnyLinkage()
                                .get()
                                .filter(linkage ->
                                        Math.abs(linkage.crankEndDeadCentre(Rotation.CLOCKWISE) - Math.PI) < 2.3),
                        valves,
                        Numbers.between(0, 360),
                        Numbers.between(0.05, 2))
                .as((linkage, valve, phase, clearance) -> Pumps.throwOf(
                        "P",
                        phase,
                        linkage,
                        List.of(
                                Pumps.chamber("head", Side.HEAD, 0.08, 0, clearance, valve),
                                Pumps.chamber("crank", Side.CRANK, 0.08, 0.03, clearance, valve))));
        return Combinators.combine(
                        throwOf.list().ofMinSize(1).ofMaxSize(5),
                        Arbitraries.of(Rotation.values()),
                        Numbers.between(7.5, 14))
                .as((throwsInOrder, rotation, modulus) -> Pumps.running(
                        new ArrayList<>(throwsInOrder),
                        rotation,
                        new Pumps.Duty(
                                new Liquid(950, Math.pow(10, modulus), 2000), 25, 2e5, 3e6, Pumps.NO_LINE, Map.of())));
    }

    @Property(tries = 200)
    void flowIsFiniteAboutItsMean(@ForAll("pumps") RunningMachine running) {
        for (ManifoldFlow flow : List.of(
                ManifoldFlow.discharge(running, Pumps.STAGE).value().orElseThrow(),
                ManifoldFlow.suction(running, Pumps.STAGE).value().orElseThrow())) {
            Extremes extremes = flow.extremes();
            double slack = 1e-12 * Math.abs(flow.mean());
            assertTrue(
                    extremes.least().value() <= flow.mean() + slack
                            && flow.mean() <= extremes.greatest().value() + slack,
                    extremes::toString);
            assertTrue(Double.isFinite(flow.greatestRise().value()) && Double.isFinite(flow.greatestStep()));
            assertTrue(flow.greatestStep()
                    <= extremes.greatest().value() - extremes.least().value() + slack);
        }
    }

    /** Where every chamber works: one of them may else draw and give back, or breathe. */
    @Property(tries = 200)
    void efficiencyIsTheSuctionFlowOverTheSweptVolume(@ForAll("pumps") RunningMachine running) {
        double swept = 0;
        for (var t : running.throwsInOrder()) {
            for (var volume : t.volumes()) {
                swept += volume.swept();
            }
        }
        boolean everyChamberPumps = running.throwsInOrder().stream()
                .flatMap(t -> t.curves().stream())
                .allMatch(curve -> curve.events().size() == 4);
        if (everyChamberPumps) {
            double mean = ManifoldFlow.suction(running, Pumps.STAGE)
                    .value()
                    .orElseThrow()
                    .mean();
            double efficiency =
                    VolumetricEfficiency.ofStage(running, Pumps.STAGE).orElseThrow();
            assertEquals(mean / (swept * running.turnsPerSecond()), efficiency, 1e-11);
        }
    }
}
