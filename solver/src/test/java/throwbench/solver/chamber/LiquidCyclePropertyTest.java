package throwbench.solver.chamber;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import throwbench.solver.fluid.Liquid;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.mechanism.Sweep;
import throwbench.solver.trial.AnyLinkage;
import throwbench.solver.trial.Numbers;

/** Random liquid chambers: any linkage, stiffness, clearance, loss and lag. */
class LiquidCyclePropertyTest {

    /** A chamber, its valves and its solution. */
    record Solved(LiquidValves valves, ChamberDuty duty, PressureCurve curve) {}

    @Provide
    Arbitrary<Solved> solved() {
        Arbitrary<ChamberDuty> duties = Combinators.combine(
                        new AnyLinkage().get(),
                        Arbitraries.of(Rotation.values()),
                        Arbitraries.of(Side.values()),
                        Numbers.between(-3, 1.5),
                        Numbers.between(6, 12),
                        Numbers.between(4.5, 6),
                        Numbers.between(4.5, 8))
                .as(LiquidCyclePropertyTest::duty);
        return Combinators.combine(
                        duties,
                        Numbers.between(0, 2e5),
                        Numbers.between(0, 2e6),
                        Arbitraries.of(true, false),
                        Numbers.between(0, 0.999))
                .as((duty, suctionLoss, dischargeLoss, moving, lag) -> {
                    LiquidValves valves =
                            new LiquidValves(suctionLoss, dischargeLoss, moving, lag * shorterStroke(duty));
                    return new Solved(valves, duty, LiquidChambers.solved(valves, duty));
                });
    }

    /** Clearance, bulk modulus and pressures are powers of ten. */
    private static ChamberDuty duty(
            Linkage linkage, Rotation rotation, Side side, double clearance, double modulus, double low, double rise) {
        double stroke = linkage.stroke();
        double suction = Math.pow(10, low);
        return new ChamberDuty(
                linkage,
                rotation,
                new ChamberVolume(side, 0.01, stroke, Math.pow(10, clearance) * 0.01 * stroke),
                new Liquid(900, Math.pow(10, modulus), 2300),
                new LineConditions(suction, suction + Math.pow(10, rise), OptionalDouble.empty()),
                ChamberCondition.WORKING,
                20,
                0);
    }

    private static double shorterStroke(ChamberDuty duty) {
        double inward = duty.linkage().crankEndDeadCentre(duty.rotation());
        return Math.min(inward, Angles.TURN - inward);
    }

    @Property
    void pressureIsFiniteAndLiesBetweenTheOpenPressures(@ForAll("solved") Solved s) {
        double[] pressures = pressures(s, 0, 360);
        double rateLimit = 3.5 * 3.5;
        double factor = s.valves().lossGrowsWithSpeed() ? rateLimit * fastest(s.duty()) : 1;
        double low = s.duty().lines().suctionPressure() - factor * s.valves().suctionLoss();
        double high = s.duty().lines().dischargePressure() + factor * s.valves().dischargeLoss();
        for (double pressure : pressures) {
            assertTrue(pressure >= low && pressure <= high, () -> "pressure " + pressure);
        }
        assertTrue(
                Math.abs(s.curve().inletVolumePerTurn()) <= s.duty().volume().swept(), "passes at most what it sweeps");
        assertEquals(
                900 * s.curve().inletVolumePerTurn(), s.curve().massPerTurn().orElseThrow(), 1e-12);
    }

    /** (greatest speed / 3.5 mean speeds)², at least 1. */
    private static double fastest(ChamberDuty duty) {
        double greatest = 0;
        Sweep turn = Sweep.wholeTurn(duty.linkage(), duty.rotation(), 0, 720);
        for (double rate : turn.reach1()) {
            greatest =
                    Math.max(greatest, Math.PI * Math.abs(rate) / duty.linkage().stroke());
        }
        return Math.max(1, Math.pow(greatest / 3.5, 2) * 1.001);
    }

    @Property
    void eachValveOpensAndShutsInTurn(@ForAll("solved") Solved s) {
        List<ValveEvent> events = s.curve().events();
        assertTrue(events.size() == 0 || events.size() == 2 || events.size() == 4, () -> "events " + events);
        if (events.size() == 4) {
            double shuts = LiquidChambers.angleOf(s.curve(), ValveEvent.Valve.SUCTION, false);
            double opens = after(shuts, LiquidChambers.angleOf(s.curve(), ValveEvent.Valve.DISCHARGE, true));
            double ends = after(shuts, LiquidChambers.angleOf(s.curve(), ValveEvent.Valve.DISCHARGE, false));
            double again = after(shuts, LiquidChambers.angleOf(s.curve(), ValveEvent.Valve.SUCTION, true));
            assertTrue(opens <= ends && ends <= again, () -> "in turn: " + events);
        }
        for (ValveEvent event : events) {
            assertTrue(event.crankAngle() >= 0 && event.crankAngle() < Angles.TURN, event::toString);
        }
        assertEquals(
                events.size() < 4,
                s.curve().inletVolumePerTurn() == 0 && !s.curve().notes().isEmpty());
    }

    /** The crank angle from one event on to another; a whole turn less rounding is none. */
    private static double after(double from, double to) {
        double turned = Angles.wrap(to - from);
        return turned > Angles.TURN - 1e-9 ? 0 : turned;
    }

    @Property
    void pressureHasNoSteps(@ForAll("solved") Solved s) {
        double scale = s.duty().lines().dischargePressure() + s.valves().dischargeLoss();
        for (ValveEvent event : s.curve().events()) {
            double before = LiquidChambers.at(s.curve(), s.duty(), event.crankAngle() - 1e-11, Approach.JUST_BEFORE)
                    .pressure();
            double after = LiquidChambers.at(s.curve(), s.duty(), event.crankAngle() + 1e-11, Approach.JUST_AFTER)
                    .pressure();
            // in 2e-11 rad the stiffest liquid in the least clearance rises by K · 2e-11 · swept/clearance
            double steep = 2e-11
                    * 4
                    * ((Liquid) s.duty().fluid()).bulkModulus()
                    * s.duty().volume().swept()
                    / s.duty().volume().least();
            // and beside a dead centre an opening is known to 1e-8 rad, where V′ is as small
            assertEquals(before, after, 1e-6 * scale + steep, event::toString);
        }
    }

    @Property
    void wholeTurnsAndSingleAnglesAgree(@ForAll("solved") Solved s) {
        double[] pressures = pressures(s, 0.3, 24);
        for (int i = 0; i < 24; i++) {
            double alone = LiquidChambers.at(s.curve(), s.duty(), 0.3 + i * Angles.TURN / 24)
                    .pressure();
            double scale = s.duty().lines().dischargePressure() + s.valves().dischargeLoss();
            double digit = 1e-13
                    * ((Liquid) s.duty().fluid()).bulkModulus()
                    * s.duty().volume().greatest()
                    / s.duty().volume().least();
            assertEquals(alone, pressures[i], 1e-9 * scale + digit);
        }
    }

    @Property
    void rotationTheOtherWayRoundMirrorsTheOffset(@ForAll("solved") Solved s) {
        ChamberDuty duty = s.duty();
        Linkage linkage = duty.linkage();
        Rotation other = duty.rotation() == Rotation.CLOCKWISE ? Rotation.COUNTER_CLOCKWISE : Rotation.CLOCKWISE;
        ChamberDuty mirrored = new ChamberDuty(
                new Linkage(linkage.crankRadius(), linkage.rodLength(), -linkage.guideOffset()),
                other,
                duty.volume(),
                duty.fluid(),
                duty.lines(),
                duty.condition(),
                duty.meanSpeed(),
                0);
        PressureCurve curve = LiquidChambers.solved(s.valves(), mirrored);
        assertEquals(s.curve().events().size(), curve.events().size());
        assertEquals(
                s.curve().inletVolumePerTurn(),
                curve.inletVolumePerTurn(),
                1e-9 * duty.volume().swept());
    }

    private static double[] pressures(Solved s, double start, int count) {
        Sweep turn = Sweep.wholeTurn(s.duty().linkage(), s.duty().rotation(), start, count);
        double[] pressures = new double[count];
        s.curve().fill(new ChamberSweep(turn, s.duty().volume()), pressures);
        return pressures;
    }
}
