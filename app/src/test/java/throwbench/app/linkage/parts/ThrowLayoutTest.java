package throwbench.app.linkage.parts;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import throwbench.app.linkage.parts.RodLine.Bar;
import throwbench.app.linkage.parts.RodLine.Barrel;
import throwbench.app.linkage.parts.RodLine.Cover;
import throwbench.app.linkage.parts.RodLine.Piston;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.IdealValves;
import throwbench.solver.chamber.LiquidValves;
import throwbench.solver.chamber.Side;
import throwbench.solver.fluid.Liquid;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.load.Crank;
import throwbench.solver.load.Friction;
import throwbench.solver.load.ReciprocatingMasses;
import throwbench.solver.machine.BearingPart;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.Drive;
import throwbench.solver.machine.Driver;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Parts;
import throwbench.solver.machine.Ranges;
import throwbench.solver.machine.ShaftPlace;
import throwbench.solver.machine.Site;
import throwbench.solver.machine.Stage;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;

/** Lengths that the file gives are drawn as given; those that are chosen let nothing meet anything at any angle. */
class ThrowLayoutTest {

    private static final int ANGLES = 180;

    private static final ReciprocatingMasses CROSSHEAD = new ReciprocatingMasses(38, 24, 42);
    private static final ReciprocatingMasses TRUNK = new ReciprocatingMasses(9, 0, 0);

    /** Every arrangement on linkages from squat to slender, in line and offset to either side, with wide and narrow bores. */
    private static List<Machine> machines() {
        List<Machine> machines = new ArrayList<>();
        for (double ratio : new double[] {2.6, 4, 5.3, 8}) {
            for (double offset : new double[] {0, 0.35, -0.6}) {
                for (double width : new double[] {0.7, 2, 5}) {
                    double r = 0.08;
                    Linkage linkage = new Linkage(r, ratio * r, offset * r);
                    double bore = width * r;
                    machines.add(doubleActing(linkage, bore));
                    machines.add(tandem(linkage, bore));
                    machines.add(stepped(linkage, bore));
                    machines.add(trunk(linkage, bore));
                    machines.add(plunger(linkage, bore / 2));
                }
            }
        }
        return machines;
    }

    private static Machine doubleActing(Linkage linkage, double bore) {
        return machine(
                linkage,
                CROSSHEAD,
                List.of(gas("head", Side.HEAD, bore, 0), gas("crank", Side.CRANK, bore, 0.2 * bore)));
    }

    private static Machine tandem(Linkage linkage, double bore) {
        return machine(
                linkage,
                CROSSHEAD,
                List.of(
                        gas("far head", Side.HEAD, 0.6 * bore, 0.12 * bore),
                        gas("near head", Side.HEAD, bore, 0.15 * bore),
                        gas("far crank", Side.CRANK, 0.6 * bore, 0.15 * bore),
                        gas("near crank", Side.CRANK, bore, 0.2 * bore)));
    }

    private static Machine stepped(Linkage linkage, double bore) {
        return machine(
                linkage,
                CROSSHEAD,
                List.of(gas("narrow", Side.HEAD, 0.6 * bore, 0), gas("ring", Side.HEAD, bore, 0.6 * bore)));
    }

    private static Machine trunk(Linkage linkage, double bore) {
        return machine(linkage, TRUNK, List.of(gas("head", Side.HEAD, bore, 0)));
    }

    private static Machine plunger(Linkage linkage, double bore) {
        LiquidValves cycle = new LiquidValves(0, 0, false, 0);
        Chamber barrel = new Chamber(
                "barrel", Side.HEAD, Optional.of("s"), bore, 0, new Clearance(0.4, true), cycle, 0, Limits.NONE);
        return machine(linkage, TRUNK, List.of(barrel));
    }

    private static Chamber gas(String name, Side side, double bore, double inner) {
        IdealValves cycle = new IdealValves(0, 0, OptionalDouble.empty(), OptionalDouble.empty());
        return new Chamber(name, side, Optional.of("s"), bore, inner, new Clearance(0.12, true), cycle, 0, Limits.NONE);
    }

    private static Machine machine(Linkage linkage, ReciprocatingMasses masses, List<Chamber> chambers) {
        return machine(linkage, masses, chambers, Parts.NONE);
    }

    private static Machine machine(Linkage linkage, ReciprocatingMasses masses, List<Chamber> chambers, Parts parts) {
        boolean liquid = chambers.get(0).cycle() instanceof LiquidValves;
        Throw t = new Throw(
                "A",
                new ShaftPlace(0, 0, 0),
                linkage,
                masses,
                new ConnectingRod(30, OptionalDouble.empty(), OptionalDouble.empty()),
                new Crank(2, 1),
                Friction.NONE,
                chambers,
                parts,
                Limits.NONE);
        return new Machine(
                "r %s l %s e %s %s"
                        .formatted(
                                linkage.crankRadius(),
                                linkage.rodLength(),
                                linkage.guideOffset(),
                                chambers.get(0).name()),
                "",
                new Site(101325, 101325, false),
                new Drive(60, Rotation.COUNTER_CLOCKWISE, OptionalDouble.empty(), new Driver.ConstantSpeed(), 1),
                Map.of("f", liquid ? new Liquid(1000, 2.2e9, 2300) : new PerfectGas(0.029, 1.4)),
                List.of(new Stage("s", "f", Optional.empty(), Optional.empty(), Limits.NONE)),
                List.of(t),
                List.of(new DutyPoint("d", 60, Map.of(), Map.of())),
                Limits.NONE,
                List.of(),
                Ranges.NONE,
                List.of());
    }

    private static ThrowLayout layout(Machine machine) {
        return ThrowLayout.of(machine, machine.throwsInOrder().get(0));
    }

    @Test
    void pistonsStayBetweenTheirCoversAtBothDeadCentres() {
        for (Machine machine : machines()) {
            ThrowLayout layout = layout(machine);
            double out = layout.linkage().greatestReach();
            double in = layout.linkage().leastReach();
            for (int i = 0; i < layout.line().pistons().size(); i++) {
                Piston p = layout.line().pistons().get(i);
                Barrel b = layout.line().barrels().get(i);
                assertTrue(p.headFace() > p.crankFace(), machine.name());
                b.headCover().ifPresent(c -> assertTrue(out + p.headFace() < c.face(), machine.name() + " head"));
                if (p.crankChamber().isPresent()) {
                    Cover c = b.crankCover().orElseThrow();
                    assertTrue(in + p.crankFace() > c.face(), machine.name() + " crank");
                }
                assertTrue(p.radius() <= b.radius(), machine.name() + " bore");
            }
        }
    }

    @Test
    void cylindersStandOneBeyondTheOther() {
        for (Machine machine : machines()) {
            List<Barrel> barrels = layout(machine).line().barrels();
            for (int i = 1; i < barrels.size(); i++) {
                double end = barrels.get(i - 1)
                        .headCover()
                        .map(c -> c.face() + Math.max(c.thickness(), c.packing()))
                        .orElse(barrels.get(i - 1).to());
                double start = barrels.get(i)
                        .crankCover()
                        .map(c -> c.face() - Math.max(c.thickness(), c.packing()))
                        .orElse(barrels.get(i).from());
                assertTrue(start >= end - 1e-12, machine.name() + ": " + start + " before " + end);
            }
        }
    }

    @Test
    void crossheadMeetsNeitherPackingNorCrank() {
        for (Machine machine : machines()) {
            ThrowLayout layout = layout(machine);
            GearShape.Slider slider = layout.gear().slider();
            double back = layout.linkage().leastReach() - slider.back();
            assertTrue(back > layout.gear().crank().hub(), machine.name() + " hub");
            assertTrue(back > layout.gear().crank().counterweight(), machine.name() + " counterweight");
            if (!slider.trunk()) {
                double front = layout.linkage().greatestReach() + slider.front();
                assertTrue(slider.guide().from() < back && slider.guide().to() > front, machine.name() + " guide");
                Barrel first = layout.line().barrels().get(0);
                double packing =
                        first.crankCover().map(c -> c.face() - c.packing()).orElse(first.from());
                assertTrue(front < packing, machine.name() + " packing");
            }
        }
    }

    @Test
    void connectingRodClearsTheGuideAndTheCylinder() {
        for (Machine machine : machines()) {
            ThrowLayout layout = layout(machine);
            GearShape.Slider slider = layout.gear().slider();
            double edge = slider.trunk()
                    ? layout.line().barrels().get(0).from()
                    : slider.guide().from();
            double half = slider.trunk() ? layout.line().barrels().get(0).radius() : slider.halfHeight();
            for (int i = 0; i < ANGLES; i++) {
                double theta = 2 * Math.PI * i / ANGLES;
                double x = layout.linkage().reach(theta);
                double sin = layout.linkage().sinRodAngle(theta);
                double cos = Math.sqrt(1 - sin * sin);
                double behind = x - edge;
                double pin = layout.linkage().crankRadius() * Math.cos(theta);
                if (behind > 0 && edge > pin) {
                    double shank =
                            behind * Math.abs(sin) / cos + layout.gear().rod().shankSmall() / cos;
                    assertTrue(shank < half, machine.name() + " at " + Math.toDegrees(theta) + "°: " + shank);
                }
            }
        }
    }

    @Test
    void barsReachTheirPackingsAtBothDeadCentres() {
        for (Machine machine : machines()) {
            ThrowLayout layout = layout(machine);
            for (Bar bar : layout.line().bars()) {
                assertTrue(bar.to() > bar.from(), machine.name());
                for (Barrel b : layout.line().barrels()) {
                    for (Cover c : List.of(b.crankCover(), b.headCover()).stream()
                            .flatMap(Optional::stream)
                            .toList()) {
                        boolean passes = c.face() > layout.linkage().leastReach() + bar.from()
                                && c.face() < layout.linkage().greatestReach() + bar.to();
                        boolean throughIt = c.opening() == bar.radius();
                        assertTrue(!passes || throughIt, machine.name() + ": a bar meets a cover");
                    }
                }
            }
        }
    }

    @Test
    void lengthsOfTheFileAreDrawnAsGiven() {
        Parts parts = new Parts(
                Optional.empty(),
                Optional.empty(),
                Optional.of(new BearingPart(OptionalDouble.of(0.061), OptionalDouble.empty())),
                Optional.of(new BearingPart(OptionalDouble.of(0.072), OptionalDouble.empty())));
        Machine machine = machine(
                new Linkage(0.08, 0.41, 0.013),
                CROSSHEAD,
                List.of(gas("head", Side.HEAD, 0.31, 0.045), gas("crank", Side.CRANK, 0.31, 0.063)),
                parts);
        ThrowLayout layout = layout(machine);
        assertEquals(0.061 / 2, layout.gear().crank().pin(), 1e-12);
        assertEquals(0.072 / 2, layout.gear().crank().journal(), 1e-12);
        Piston piston = layout.line().pistons().get(0);
        assertEquals(0.31 / 2, piston.radius(), 1e-12);
        assertEquals(0.063 / 2, layout.line().bars().get(0).radius(), 1e-12);
        assertEquals(0.045 / 2, layout.line().bars().get(1).radius(), 1e-12, "the tail rod");
        Barrel barrel = layout.line().barrels().get(0);
        double gap = barrel.headCover().orElseThrow().face() - layout.linkage().greatestReach() - piston.headFace();
        assertEquals(0.12 * layout.linkage().stroke(), gap, 1e-12, "clearance over area is the gap that is left");
    }

    @Test
    void chambersOfOneBoreShareAPistonAndTheWiderStandsNearer() {
        ThrowLayout layout = layout(tandem(new Linkage(0.08, 0.4, 0), 0.3));
        List<Piston> pistons = layout.line().pistons();
        assertEquals(2, pistons.size());
        assertEquals(Optional.of(3), pistons.get(0).crankChamber());
        assertEquals(Optional.of(1), pistons.get(0).headChamber());
        assertEquals(Optional.of(2), pistons.get(1).crankChamber());
        assertEquals(Optional.of(0), pistons.get(1).headChamber());
        assertEquals(3, layout.line().bars().size(), "piston rod, neck, tail rod");
        assertTrue(layout.line().bars().get(0).rod());
    }

    @Test
    void aPumpHasAPlungerAndAGasEndATrunkPiston() {
        Linkage linkage = new Linkage(0.06, 0.3, 0);
        assertTrue(layout(plunger(linkage, 0.08)).line().pistons().get(0).plunger());
        assertTrue(layout(trunk(linkage, 0.12)).gear().slider().trunk());
        assertEquals(0, layout(trunk(linkage, 0.12)).line().bars().size(), "no piston rod");
    }
}
