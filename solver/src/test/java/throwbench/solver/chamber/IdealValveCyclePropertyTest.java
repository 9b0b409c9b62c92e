package throwbench.solver.chamber;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import throwbench.solver.chamber.ValveEvent.Valve;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Sweep;
import throwbench.solver.trial.AnyIdealCycle;
import throwbench.solver.trial.AnyIdealCycle.IdealCycle;

/** Ideal-valve cycles of any chamber: the laws of their legs, and closed forms of what they come to. */
class IdealValveCyclePropertyTest {

    @Property
    void polytropicLawHoldsOnBothLegs(
            @ForAll(supplier = AnyIdealCycle.class) IdealCycle cycle, @ForAll @IntRange(max = 9999) int some) {
        PressureCurve curve = cycle.solved();
        double angle = 2 * Math.PI * some / 10_000 + 1e-6;
        boolean grows = cycle.grows(angle);
        double volume = cycle.volumeAt(angle);
        double pressure = pressureAt(cycle, curve, angle);
        double low = cycle.low();
        double high = cycle.high();
        double greatest = cycle.volume().greatest();
        double least = cycle.volume().least();
        double expected;
        if (!cycle.valvesOpen()) {
            expected = low * Math.pow(greatest / volume, cycle.smallerExponent());
        } else if (grows) {
            expected = Math.max(low, high * Math.pow(least / volume, cycle.expansionExponent()));
        } else {
            expected = Math.min(high, low * Math.pow(greatest / volume, cycle.compressionExponent()));
        }
        assertEquals(expected, pressure, 1e-12 * high);
    }

    /** A valve opens where the leg has reached its pressure, and shuts at the dead centre. */
    @Property
    void valvesOpenWhereTheLegMeetsTheLine(@ForAll(supplier = AnyIdealCycle.class) IdealCycle cycle) {
        PressureCurve curve = cycle.solved();
        if (!cycle.valvesOpen()) {
            assertEquals(List.of(), curve.events());
            return;
        }
        assertEquals(4, curve.events().size());
        for (ValveEvent event : curve.events()) {
            double volume = cycle.volumeAt(event.crankAngle());
            boolean suction = event.valve() == Valve.SUCTION;
            if (!event.opens()) {
                double deadVolume =
                        suction ? cycle.volume().greatest() : cycle.volume().least();
                assertEquals(deadVolume, volume, 1e-12 * cycle.volume().greatest());
            } else if (suction) {
                double met = cycle.high() * Math.pow(cycle.volume().least() / volume, cycle.expansionExponent());
                assertEquals(cycle.low(), met, 1e-10 * cycle.low());
                assertTrue(
                        cycle.grows(event.crankAngle() - 1e-7) || event.crankAngle() < 1e-6,
                        "suction opens while the volume grows");
            } else {
                double met = cycle.low() * Math.pow(cycle.volume().greatest() / volume, cycle.compressionExponent());
                assertEquals(cycle.high(), met, 1e-10 * cycle.high());
            }
        }
    }

    /** ∮ p dV of four polytropic legs, and the mass between the valves, in closed form. */
    @Property
    void workAndMassAreThoseOfTheClosedForm(@ForAll(supplier = AnyIdealCycle.class) IdealCycle cycle) {
        PressureCurve curve = cycle.solved();
        double work = -loopIntegral(cycle, curve);
        double scale = cycle.high() * cycle.volume().greatest();
        assertEquals(cycle.closedFormWork(), work, 1e-9 * scale);
        double gasConstant = cycle.gas().gasConstant();
        double drawn = cycle.valvesOpen()
                ? cycle.volume().greatest()
                        - cycle.volume().least() * Math.pow(cycle.high() / cycle.low(), 1 / cycle.expansionExponent())
                : 0;
        double kept = 1 - cycle.flowAllowance();
        assertEquals(
                cycle.low() * drawn * kept / (gasConstant * cycle.suctionTemperature()),
                curve.massPerTurn().getAsDouble(),
                1e-12 * cycle.low() * cycle.volume().greatest() / (gasConstant * cycle.suctionTemperature()));
        assertEquals(
                drawn * kept * cycle.low() / cycle.suctionPressure(),
                curve.inletVolumePerTurn(),
                1e-12 * cycle.volume().greatest());
        if (cycle.valvesOpen()) {
            double n = cycle.compressionExponent();
            assertEquals(
                    cycle.suctionTemperature() * Math.pow(cycle.high() / cycle.low(), (n - 1) / n),
                    curve.dischargeTemperature().getAsDouble(),
                    1e-10 * cycle.suctionTemperature());
        } else {
            assertEquals(OptionalDouble.empty(), curve.dischargeTemperature());
        }
    }

    /** Simpson's rule between the events, by crank angle: dV = A ds. */
    private static double loopIntegral(IdealCycle cycle, PressureCurve curve) {
        double sum = 0;
        double[] breaks = cycle.breaks(curve);
        for (int i = 0; i + 1 < breaks.length; i++) {
            int pieces = 2 * (int) Math.ceil(600 * (breaks[i + 1] - breaks[i]) + 4);
            double h = (breaks[i + 1] - breaks[i]) / pieces;
            for (int k = 0; k <= pieces; k++) {
                double angle = breaks[i] + k * h;
                double weight = k == 0 || k == pieces ? 1 : k % 2 == 1 ? 4 : 2;
                sum += weight * h / 3 * pressureAt(cycle, curve, angle) * cycle.volumeRate(angle);
            }
        }
        return sum;
    }

    /** A head end and a crank end with the same sizes run through the same pressures over their volumes. */
    @Property
    void crankEndIsTheHeadEndSeenFromTheOtherDeadCentre(
            @ForAll(supplier = AnyIdealCycle.class) IdealCycle cycle, @ForAll @IntRange(max = 999) int some) {
        IdealCycle other = cycle.onTheOtherSide();
        double moved = cycle.linkage().stroke() * some / 1000;
        for (boolean grows : new boolean[] {true, false}) {
            double here = pressureAt(cycle, cycle.solved(), angleAt(cycle, moved, grows));
            double there = pressureAt(other, other.solved(), angleAt(other, moved, grows));
            assertEquals(here, there, 1e-9 * cycle.high());
        }
        assertEquals(
                cycle.solved().massPerTurn().getAsDouble(),
                other.solved().massPerTurn().getAsDouble(),
                1e-15);
    }

    /** The angle at which the piston has moved so far from the chamber's own dead centre. */
    private static double angleAt(IdealCycle cycle, double moved, boolean grows) {
        double travel =
                cycle.volume().side() == Side.HEAD ? moved : cycle.linkage().stroke() - moved;
        Linkage.TravelAngles angles = cycle.linkage().anglesAtTravel(travel, cycle.rotation());
        return cycle.volume().growsOn(true) == grows ? angles.inward() : angles.outward();
    }

    /** A small change of a line's pressure moves no event far. */
    @Property
    void eventAnglesAreContinuousInPressure(@ForAll(supplier = AnyIdealCycle.class) IdealCycle cycle) {
        double small = 1e-9;
        IdealCycle raised = cycle.withDischarge(cycle.dischargePressure() * (1 + small));
        if (!cycle.valvesOpen() || !raised.valvesOpen()) {
            return;
        }
        for (int i = 0; i < 4; i++) {
            ValveEvent a = cycle.solved().events().get(i);
            ValveEvent b = raised.solved().events().get(i);
            assertEquals(a.valve(), b.valve());
            assertEquals(a.opens(), b.opens());
            // where the volume stands still the angle moves with the root of the change
            assertEquals(a.crankAngle(), b.crankAngle(), 1e-3);
            assertEquals(
                    cycle.volumeAt(a.crankAngle()),
                    cycle.volumeAt(b.crankAngle()),
                    1e-7 * cycle.volume().greatest());
        }
    }

    @Property
    void heldOpenChamberBreathesAtSuctionPressure(
            @ForAll(supplier = AnyIdealCycle.class) IdealCycle cycle, @ForAll @IntRange(max = 9999) int some) {
        IdealCycle open = cycle.heldOpen();
        double angle = 2 * Math.PI * some / 10_000 + 1e-6;
        double pressure = pressureAt(open, open.solved(), angle);
        double loss = open.suctionLoss() * (open.grows(angle) ? -1 : 1);
        assertEquals(open.suctionPressure() * (1 + loss), pressure, 1e-12 * open.suctionPressure());
        assertEquals(0, open.solved().massPerTurn().getAsDouble());
    }

    /** Every station of a whole turn, whose powers are running products, against the law at that angle. */
    @Property(tries = 100)
    void stationsOfAWholeTurnHoldTheLaw(
            @ForAll(supplier = AnyIdealCycle.class) IdealCycle cycle,
            @ForAll @IntRange(min = 8, max = 4000) int count) {
        PressureCurve curve = cycle.solved();
        Sweep sweep = Sweep.wholeTurn(cycle.linkage(), cycle.rotation(), 0, count);
        double[] pressures = new double[count];
        curve.fill(new ChamberSweep(sweep, cycle.volume()), pressures);
        // the travel is a difference of two reaches: its rounding weighs more the smaller the clearance
        double rounding = 1e-13
                * Math.max(1, 0.04 * cycle.volume().swept() / cycle.volume().clearance());
        for (int i = 0; i < count; i++) {
            double expected = pressureAt(cycle, curve, sweep.crankAngle()[i]);
            assertEquals(expected, pressures[i], rounding * cycle.high());
        }
    }

    private static double pressureAt(IdealCycle cycle, PressureCurve curve, double angle) {
        Sweep single = Sweep.single(cycle.linkage(), cycle.rotation());
        single.turnTo(angle, Approach.JUST_AFTER);
        double[] pressure = new double[1];
        curve.fill(new ChamberSweep(single, cycle.volume()), pressure);
        return pressure[0];
    }
}
