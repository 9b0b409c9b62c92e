package throwbench.solver.revolution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import throwbench.solver.chamber.ChamberCondition;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.IdealValves;
import throwbench.solver.chamber.Side;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.load.Crank;
import throwbench.solver.load.Friction;
import throwbench.solver.load.ReciprocatingMasses;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Parts;
import throwbench.solver.machine.ShaftPlace;
import throwbench.solver.machine.Site;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.trial.AnyThrow;
import throwbench.solver.trial.Machines;

/** Reversal of machines whose rod load is known without solving them. */
class ReversalTest {

    private static final ChamberCondition HELD_OPEN = new ChamberCondition(ChamberState.HELD_OPEN, 0, Clearance.NONE);

    private static Reversal of(Machine machine) {
        Traces traces = Traces.of(Machines.running(machine), 0, Optional.empty());
        return Reversal.of(Traces.rodLoad(traces.revolution()));
    }

    /** A massless plunger held open in a frame at suction pressure: its valve's loss alone pulls and pushes. */
    @ParameterizedTest
    @CsvSource({"0, COUNTER_CLOCKWISE", "0.05, COUNTER_CLOCKWISE", "0.05, CLOCKWISE", "-0.02, CLOCKWISE"})
    void heldOpenPlungerStepsThroughZeroAtItsDeadCentres(double offset, Rotation rotation) {
        double suction = 4e5;
        double bore = 0.1;
        Linkage linkage = new Linkage(0.075, 0.4, offset);
        Reversal reversal = of(plunger(linkage, rotation, bore, 0.1, suction, 8e5, HELD_OPEN, 0));
        double crankEnd = linkage.crankEndDeadCentre(rotation);
        assertEquals(
                List.of(new SignChange(0, true), new SignChange(crankEnd, false)),
                reversal.signChanges(),
                "inwards the chamber draws: its pressure is below the frame's, the rod pulls");
        assertEquals(Math.min(crankEnd, Angles.TURN - crankEnd), reversal.duration(), 1e-12);
        double load = Math.PI / 4 * bore * bore * suction * 0.1;
        assertEquals(load, reversal.tension().orElseThrow().value(), 1e-9 * load);
        assertEquals(load, reversal.compression().orElseThrow().value(), 1e-9 * load);
        assertEquals(1, reversal.ratio(), 1e-12);
    }

    /** High pressure and little mass: the plunger only pushes. */
    @Test
    void plungerThatOnlyPushesNeverReverses() {
        Reversal reversal = of(plunger(
                new Linkage(0.075, 0.4, 0),
                Rotation.COUNTER_CLOCKWISE,
                0.1,
                0,
                50e5,
                90e5,
                ChamberCondition.WORKING,
                5));
        assertFalse(reversal.reverses());
        assertEquals(List.of(new Reversal.Span(0, Angles.TURN, false)), reversal.spans());
        assertEquals(0, reversal.duration());
        assertEquals(0, reversal.ratio());
        assertEquals(Optional.empty(), reversal.tension());
        assertEquals(Optional.empty(), reversal.governing());
        assertEquals(Optional.empty(), reversal.smallerPeak());
        assertEquals(0, reversal.longestSpan(true));
        assertEquals(Angles.TURN, reversal.longestSpan(false));
    }

    /** Heavy and fast at next to no pressure: the inertia of a slider-crank with l → ∞ reverses half a turn. */
    @Test
    void longRodsInertiaAloneReversesHalfATurn() {
        Reversal reversal = of(
                plunger(new Linkage(0.05, 500, 0), Rotation.CLOCKWISE, 0.05, 0, 101_325, 101_325.001, HELD_OPEN, 100));
        assertEquals(Math.PI, reversal.duration(), 3e-4, "r/l = 1e-4 turns the changes by about that");
        assertEquals(1, reversal.ratio(), 3e-4);
        assertEquals(2, reversal.signChanges().size());
    }

    /** The published rod load of an unloaded crank end, the trade's dreaded case, against a scan of every hundredth degree. */
    @Test
    void unloadedCrankEndReversesWhereADenseScanSaysSo() {
        Machine booster = Machines.booster(0);
        Machine unloaded = Machines.changed(
                booster,
                booster.throwsInOrder(),
                Rotation.COUNTER_CLOCKWISE,
                booster.site(),
                Machines.boosterDuty(Map.of("A crank", HELD_OPEN)));
        Reversal reversal = of(unloaded);
        Instant instant = new Instant(Machines.running(unloaded), 0);
        int changes = 0;
        int count = 36_000;
        double before = instant.turnTo(-1e-6).at(Column.ROD_LOAD);
        for (int i = 0; i < count; i++) {
            double angle = Angles.TURN / count * i + 1e-6;
            double load = instant.turnTo(angle).at(Column.ROD_LOAD);
            if (load * before < 0) {
                double found = reversal.signChanges().get(changes).crankAngle();
                assertTrue(
                        found <= angle && found >= angle - Angles.TURN / count - 1e-6,
                        () -> reversal.signChanges() + " but a scan sees one just before " + angle);
                changes++;
            }
            before = load;
        }
        assertEquals(changes, reversal.signChanges().size());
        assertTrue(changes >= 2, "it does reverse");
    }

    /** Clearance so great or pressures so far apart that no valve opens: gas is pressed and eases again. */
    @Test
    void machineWhoseValvesNeverOpenDeliversNothingAndTakesNoPower() {
        Machine booster = Machines.booster(0.012);
        DutyPoint far = new DutyPoint("far apart", 60, Map.of(AnyThrow.STAGE, Machines.lines(1e5, 60e5)), Map.of());
        Machine machine = Machines.changed(booster, booster.throwsInOrder(), Rotation.CLOCKWISE, booster.site(), far);
        RunningMachine running = Machines.running(machine);
        Summary summary = Summary.of(running, 0, Optional.empty());
        double area = machine.throwsInOrder().get(0).chambers().get(0).area();
        double full = area * 0.15 * 60e5;
        assertEquals(0, summary.throwFlow().totalPower(), 1e-9 * full);
        assertEquals(0, summary.meanThrowTorque(), 1e-9 * full);
        assertEquals(OptionalDouble.of(0), summary.throwFlow().capacity().get(AnyThrow.STAGE));
        assertEquals(2, summary.notes().size(), () -> "" + summary.notes());
        assertTrue(summary.notes().get(0).startsWith("A head: no valve opens"), () -> "" + summary.notes());
        assertEquals(List.of(), running.throwsInOrder().get(0).curves().get(0).events());
        // its greatest pressure stands at its own dead centre: p_s (V_max/V_min)^k
        double reached = 1e5 * 0.97 * Math.pow(1.14 / 0.14, 1.29);
        assertEquals(reached, summary.pressures().get(0).greatest().value(), 1e-9 * reached);
        assertEquals(0, summary.pressures().get(0).greatest().crankAngle());
    }

    private static Machine plunger(
            Linkage linkage,
            Rotation rotation,
            double bore,
            double loss,
            double suction,
            double discharge,
            ChamberCondition condition,
            double mass) {
        IdealValves valves = new IdealValves(loss, 0, OptionalDouble.empty(), OptionalDouble.empty());
        Throw t = new Throw(
                "A",
                new ShaftPlace(0, 0, 0),
                linkage,
                new ReciprocatingMasses(mass, 0, 0),
                new ConnectingRod(0, OptionalDouble.empty(), OptionalDouble.empty()),
                new Crank(0, 0),
                Friction.NONE,
                List.of(Machines.chamber("barrel", Side.HEAD, bore, 0, 0.2, valves)),
                Parts.NONE,
                Limits.NONE);
        DutyPoint duty = new DutyPoint(
                "only", 60, Map.of(AnyThrow.STAGE, Machines.lines(suction, discharge)), Map.of("barrel", condition));
        double frame = condition.equals(HELD_OPEN) ? suction : 101_325;
        return Machines.of(List.of(t), rotation, new Site(101_325, frame, false), duty, Limits.NONE);
    }
}
