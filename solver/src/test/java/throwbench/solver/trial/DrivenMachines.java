package throwbench.solver.trial;

import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.load.Crank;
import throwbench.solver.load.Friction;
import throwbench.solver.machine.Drive;
import throwbench.solver.machine.Driver;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.ShaftPlace;
import throwbench.solver.machine.Site;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;

/** Machines whose speed varies over the turn. */
public final class DrivenMachines {

    private static final double AMBIENT = 101_325;

    private DrivenMachines() {}

    /** The same machine with another driver and rotating inertia (kg m²). */
    public static Machine driven(Machine m, Driver driver, double rotatingInertia) {
        Drive drive = new Drive(
                m.drive().speed(),
                m.drive().rotation(),
                OptionalDouble.of(rotatingInertia),
                driver,
                m.drive().mechanicalEfficiency());
        return new Machine(
                m.name(),
                m.notes(),
                m.site(),
                drive,
                m.fluids(),
                m.stages(),
                m.throwsInOrder(),
                m.dutyPoints(),
                m.limits(),
                m.loadSteps(),
                m.ranges(),
                m.bookmarks());
    }

    /** Two throws opposed, unlike each other, clockwise, with weight and friction of packing and guide. */
    public static Machine opposedPair(double guideCoefficient) {
        Throw a = placed("A", new ShaftPlace(0.3, 0, 0), new Linkage(0.075, 0.4, 0.012), guideCoefficient);
        Throw b = placed("B", new ShaftPlace(0.3 + Math.PI, Math.PI, 0.35), new Linkage(0.07, 0.38, -0.008), 0.02);
        return Machines.of(
                List.of(a, b),
                Rotation.CLOCKWISE,
                new Site(AMBIENT, AMBIENT, true),
                Machines.boosterDuty(Map.of()),
                Limits.NONE);
    }

    /** One throw standing upright, offset, with weight and friction of the packing. */
    public static Machine upright() {
        return Machines.of(
                List.of(placed("A", new ShaftPlace(0, Math.PI / 2, 0), new Linkage(0.075, 0.36, -0.02), 0)),
                Rotation.COUNTER_CLOCKWISE,
                new Site(AMBIENT, AMBIENT, true),
                Machines.boosterDuty(Map.of()),
                Limits.NONE);
    }

    private static Throw placed(String name, ShaftPlace place, Linkage linkage, double guideCoefficient) {
        Throw t = Machines.boosterThrow(0);
        return new Throw(
                name,
                place,
                linkage,
                t.masses(),
                new ConnectingRod(55, OptionalDouble.of(0.13), OptionalDouble.of(1.35)),
                new Crank(2.1, 0.4),
                new Friction(900, guideCoefficient),
                t.chambers().stream()
                        .map(c -> Machines.renamed(c, name + c.name().substring(1)))
                        .toList(),
                t.parts(),
                t.limits());
    }

    /** The machine at another mean speed (rad/s). */
    public static DutyPoint at(DutyPoint duty, double speed) {
        return new DutyPoint(duty.name(), speed, duty.stages(), duty.chambers());
    }
}
