package throwbench.solver.revolution;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.complex.ComplexUtils;
import throwbench.solver.load.Friction;
import throwbench.solver.load.ThrowBody;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.ShaftPlace;
import throwbench.solver.machine.Site;
import throwbench.solver.machine.StageConditions;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.trial.AnyMachine;
import throwbench.solver.trial.AnyThrow;
import throwbench.solver.trial.Machines;

/** What must hold for any machine, whatever is printed of it. */
class RevolutionPropertyTest {

    @Property(tries = 150)
    void columnsAreTheInstantAtTheirAngle(
            @ForAll(supplier = AnyMachine.class) Machine machine,
            @ForAll @IntRange(min = 8, max = 900) int count,
            @ForAll @IntRange(max = 100_000) int some) {
        RunningMachine running = Machines.running(machine);
        int shown = some % running.throwsInOrder().size();
        Revolution revolution = Revolution.solve(running, shown, count);
        Instant instant = new Instant(running, shown);
        double[] angles = revolution.read(Column.CRANK_ANGLE, new double[count]);
        for (int i : new int[] {0, some % count, count / 2, count - 1}) {
            instant.turnTo(angles[i]);
            for (Column column : Column.values()) {
                assertEquals(
                        instant.at(column),
                        revolution.at(column, i),
                        1e-13 * scale(revolution, shown, column),
                        column + " at " + i);
            }
            for (int k = 0; k < running.throwsInOrder().size(); k++) {
                for (int c = 0; c < running.throwsInOrder().get(k).chambers().size(); c++) {
                    double pressure = instant.pressure(k, c);
                    assertEquals(pressure, revolution.pressure(k, c, i), 1e-13 * pressure, "pressure at " + i);
                }
            }
        }
    }

    @Property(tries = 100)
    void valuesDoNotDependOnTheNumberOfStations(
            @ForAll(supplier = AnyMachine.class) Machine machine,
            @ForAll @IntRange(min = 8, max = 300) int count,
            @ForAll @IntRange(min = 2, max = 5) int times) {
        RunningMachine running = Machines.running(machine);
        Revolution coarse = Revolution.solve(running, 0, count);
        Revolution fine = Revolution.solve(running, 0, count * times);
        for (Column column : Column.values()) {
            double peak = scale(fine, 0, column);
            for (int i = 0; i < count; i++) {
                assertEquals(fine.at(column, i * times), coarse.at(column, i), 1e-13 * peak, column + " at " + i);
            }
        }
    }

    @Property(tries = 100)
    void keptGeometryGivesWhatFreshGeometryGives(
            @ForAll(supplier = AnyMachine.class) Machine machine, @ForAll(supplier = AnyMachine.class) Machine other) {
        DutyPoint duty = machine.dutyPoints().get(0);
        StageConditions lines = other.dutyPoints().get(0).stages().get(AnyThrow.STAGE);
        DutyPoint dragged = new DutyPoint(
                "dragged", other.dutyPoints().get(0).speed(), Map.of(AnyThrow.STAGE, lines), duty.chambers());
        Revolution before = Revolution.solve(Machines.running(machine), 0, 90);
        double[] torque = before.read(Column.SHAFT_TORQUE, new double[90]);
        RunningMachine next = RunningMachine.settle(machine, dragged).get();
        Revolution kept = Revolution.solve(next, 0, 90, Optional.of(before));
        Revolution fresh = Revolution.solve(next, 0, 90);
        for (Column column : Column.values()) {
            for (int i = 0; i < 90; i++) {
                assertEquals(fresh.at(column, i), kept.at(column, i), column + " at " + i);
            }
        }
        for (int i = 0; i < 90; i++) {
            assertEquals(torque[i], before.at(Column.SHAFT_TORQUE, i), "the earlier revolution stays as it was");
        }
    }

    @Property(tries = 100)
    void everyThrowIsTheThrowAloneWhereOneShaftPutsIt(
            @ForAll(supplier = AnyMachine.class) Machine machine, @ForAll @IntRange(max = 719) int station) {
        RunningMachine running = Machines.running(machine);
        Revolution together = Revolution.solve(running, 0, 720);
        Instant instant = new Instant(running, 0);
        instant.turnTo(Angles.TURN / 720 * station);
        double shaft = shaftPosition(machine, instant, 0);
        double torque = 0;
        for (int k = 0; k < machine.throwsInOrder().size(); k++) {
            // the crankshaft is one piece of steel
            assertEquals(0, Math.sin(shaftPosition(machine, instant, k) - shaft), 1e-12);
            assertEquals(1, Math.cos(shaftPosition(machine, instant, k) - shaft), 1e-12);
            Machine alone = Machines.changed(
                    machine,
                    List.of(machine.throwsInOrder().get(k)),
                    machine.drive().rotation(),
                    machine.site(),
                    machine.dutyPoints().get(0));
            Instant lone = new Instant(Machines.running(alone), 0);
            lone.turnTo(instant.at(k, Column.CRANK_ANGLE));
            for (Column column : Column.values()) {
                if (!column.ofMachine()) {
                    assertEquals(
                            lone.at(column), instant.at(k, column), 1e-12 * scale(together, k, column), "" + column);
                }
            }
            torque += instant.at(k, Column.THROW_TORQUE);
        }
        assertEquals(torque, instant.at(Column.SHAFT_TORQUE), 1e-12 * scale(together, 0, Column.SHAFT_TORQUE));
    }

    /** ψ = θ + γ − δ, from where the pin stands. */
    private static double shaftPosition(Machine machine, Instant instant, int k) {
        ShaftPlace place = machine.throwsInOrder().get(k).place();
        return Math.atan2(instant.sinPin(k), instant.cosPin(k)) + place.axisDirection() - place.crankPhase();
    }

    /** Seen from the other end of the shaft a machine turns the other way and its right is left: X → −X. */
    @Property(tries = 100)
    void clockwiseMachineIsTheMirrorImage(
            @ForAll(supplier = AnyMachine.class) Machine machine, @ForAll @IntRange(max = 89) int i) {
        List<Throw> mirrored = machine.throwsInOrder().stream()
                .map(t -> Machines.changed(
                        t,
                        t.name(),
                        new ShaftPlace(
                                -t.place().crankPhase(),
                                Math.PI - t.place().axisDirection(),
                                t.place().shaftPosition()),
                        new Linkage(
                                t.linkage().crankRadius(),
                                t.linkage().rodLength(),
                                -t.linkage().guideOffset()),
                        t.friction(),
                        t.chambers()))
                .toList();
        Rotation other =
                machine.drive().rotation() == Rotation.CLOCKWISE ? Rotation.COUNTER_CLOCKWISE : Rotation.CLOCKWISE;
        Machine image = Machines.changed(
                machine, mirrored, other, machine.site(), machine.dutyPoints().get(0));
        Revolution own = Revolution.solve(Machines.running(machine), 0, 90);
        Revolution seen = Revolution.solve(Machines.running(image), 0, 90);
        for (Column column : Column.values()) {
            double sense =
                    switch (column) {
                        case ROD_ANGLE,
                                ROD_VELOCITY,
                                ROD_ACCELERATION,
                                GUIDE_FORCE,
                                CROSSHEAD_PIN_Y,
                                CRANK_PIN_Y,
                                MAIN_BEARING_Y,
                                SHAKING_FORCE_X,
                                SHAKING_COUPLE_X -> -1;
                        default -> 1;
                    };
            assertEquals(
                    own.at(column, i), sense * seen.at(column, i), 1e-12 * scale(own, 0, column), column + " at " + i);
        }
    }

    /**
     * What the moving parts do to the frame is what the frame and the gas do to them, turned round: bearings, guides and gas
     * add up to −(shaking force), in machine axes; its moments about the middle are the couples.
     */
    @Property(tries = 150)
    void shakingIsMinusAllForcesOnTheMovingParts(
            @ForAll(supplier = AnyMachine.class) Machine any, @ForAll @IntRange(max = 719) int station) {
        List<Throw> smooth = any.throwsInOrder().stream()
                .map(t -> Machines.changed(t, t.name(), t.place(), t.linkage(), Friction.NONE, t.chambers()))
                .toList();
        Site weightless = new Site(any.site().ambientPressure(), any.site().framePressure(), false);
        Machine machine = Machines.changed(
                any,
                smooth,
                any.drive().rotation(),
                weightless,
                any.dutyPoints().get(0));
        RunningMachine running = Machines.running(machine);
        Instant instant = new Instant(running, 0).turnTo(Angles.TURN / 720 * station);
        double[] sums = new double[4];
        double size = 0;
        double least = smooth.stream()
                .mapToDouble(t -> t.place().shaftPosition())
                .min()
                .orElseThrow();
        double greatest = smooth.stream()
                .mapToDouble(t -> t.place().shaftPosition())
                .max()
                .orElseThrow();
        for (int k = 0; k < smooth.size(); k++) {
            double along = instant.at(k, Column.MAIN_BEARING_X) + instant.at(k, Column.GAS_LOAD);
            double across = instant.at(k, Column.MAIN_BEARING_Y) + instant.at(k, Column.GUIDE_FORCE);
            ShaftPlace place = smooth.get(k).place();
            // counter-clockwise by the axis direction, written as a product of complex numbers
            Complex force = new Complex(along, across).multiply(ComplexUtils.polar2Complex(1, place.axisDirection()));
            double arm = place.shaftPosition() - (least + greatest) / 2;
            sums[0] -= force.getReal();
            sums[1] -= force.getImaginary();
            sums[2] -= arm * force.getReal();
            sums[3] -= arm * force.getImaginary();
            size += Math.abs(instant.at(k, Column.GAS_LOAD))
                    + Math.abs(across)
                    + Math.abs(instant.at(k, Column.MAIN_BEARING_X));
        }
        double rounding = 1e-11 * size;
        assertEquals(sums[0], instant.at(Column.SHAKING_FORCE_X), rounding);
        assertEquals(sums[1], instant.at(Column.SHAKING_FORCE_Y), rounding);
        assertEquals(sums[2], instant.at(Column.SHAKING_COUPLE_X), 2 * rounding);
        assertEquals(sums[3], instant.at(Column.SHAKING_COUPLE_Y), 2 * rounding);
    }

    /** Pressure on a closed surface makes no force: one pressure everywhere, on both sides and in the frame. */
    @Property(tries = 100)
    void onePressureEverywhereMakesNoGasLoad(
            @ForAll(supplier = AnyMachine.class) Machine machine, @ForAll @IntRange(max = 89) int i) {
        DutyPoint duty = machine.dutyPoints().get(0);
        double raised = 3e5;
        Revolution own = Revolution.solve(Machines.running(machine), 0, 90);
        // raise the frame pressure alone: what is left uncovered carries it, tension positive towards the head end
        Site site = machine.site();
        Machine in = Machines.changed(
                machine,
                machine.throwsInOrder(),
                machine.drive().rotation(),
                new Site(site.ambientPressure(), site.framePressure() + raised, site.gravity()),
                duty);
        Revolution pressed = Revolution.solve(Machines.running(in), 0, 90);
        RunningThrow t = own.running().throwsInOrder().get(0);
        double onChambers = 0;
        double area = 0;
        for (int c = 0; c < t.chambers().size(); c++) {
            double signed = t.chambers().get(c).area()
                    * (t.chambers().get(c).side().text().equals("head") ? -1 : 1);
            onChambers += signed * (own.pressure(c, i) - site.framePressure());
            area += signed;
        }
        // loads count from the frame pressure: chambers at frame pressure press nothing
        double scale = 1e-12 * Math.max(1, scale(own, 0, Column.GAS_LOAD) + site.framePressure() * Math.abs(area));
        assertEquals(onChambers, own.at(Column.GAS_LOAD, i), scale);
        assertEquals(own.at(Column.GAS_LOAD, i) - raised * area, pressed.at(Column.GAS_LOAD, i), 2 * scale);
    }

    /** A column's peak; where throws may cancel, the sum of theirs. */
    private static double scale(Revolution revolution, int throwIndex, Column column) {
        if (!column.ofMachine() || column == Column.SHAFT_SPEED) {
            return peak(revolution, throwIndex, column);
        }
        double sum = 0;
        for (int k = 0; k < revolution.running().throwsInOrder().size(); k++) {
            ThrowBody body = revolution.running().throwsInOrder().get(k).body();
            double mass = body.masses().total() + body.rodMass();
            double moment = mass * body.linkage().crankRadius() + Math.abs(body.crankNet());
            double speed = revolution.running().meanSpeed();
            sum += column == Column.SHAFT_TORQUE
                    ? peak(revolution, k, Column.THROW_TORQUE)
                    : 2 * moment * speed * speed;
        }
        return sum;
    }

    private static double peak(Revolution revolution, int throwIndex, Column column) {
        double peak = 0;
        for (int i = 0; i < revolution.count(); i++) {
            peak = Math.max(peak, Math.abs(revolution.at(throwIndex, column, i)));
        }
        return peak;
    }
}
