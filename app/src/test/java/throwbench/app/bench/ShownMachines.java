package throwbench.app.bench;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.chamber.ChamberCondition;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.IdealValves;
import throwbench.solver.chamber.Side;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.attached.AttachedFiles;
import throwbench.solver.document.quantity.UnitSystem;
import throwbench.solver.finding.Judgement;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.load.Crank;
import throwbench.solver.load.Friction;
import throwbench.solver.load.ReciprocatingMasses;
import throwbench.solver.machine.Bookmark;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.Drive;
import throwbench.solver.machine.Driver;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Parts;
import throwbench.solver.machine.Ranges;
import throwbench.solver.machine.ShaftPlace;
import throwbench.solver.machine.Site;
import throwbench.solver.machine.Stage;
import throwbench.solver.machine.StageConditions;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Summary;

/** Invented machines for the tests of views: the numbers of a small biogas booster, and what views must stand. */
public final class ShownMachines {

    private static final double RPM = Math.PI / 30;
    private static final double BAR = 1e5;
    private static final double AMBIENT = 101_325;

    private ShownMachines() {}

    /** Both ends working: the rod load reverses well. */
    public static Machine booster() {
        return machine("Saltmarsh biogas booster", List.of("A head", "A crank"), 0, List.of(normal(), unloaded()));
    }

    /** The same with a guide offset: crank-end dead centre does not stand at 180°. */
    public static Machine offset() {
        return machine("Saltmarsh offset booster", List.of("A head", "A crank"), 0.06, List.of(normal(), unloaded()));
    }

    /** Names as long as users make them. */
    public static Machine longNames() {
        return machine(
                "Saltmarsh biogas booster, second train, as rebuilt after the winter overhaul",
                List.of("first stage cylinder north, head end", "first stage cylinder north, crank end"),
                0,
                List.of(named("both ends loaded, summer suction, relief valve lifting at the far end"), unloaded()));
    }

    /** A head end alone against a small inertia: the rod only pushes. */
    public static Machine neverReversing() {
        Throw full = booster().throwsInOrder().get(0);
        Throw headOnly = new Throw(
                full.name(),
                full.place(),
                full.linkage(),
                new ReciprocatingMasses(4, 2, 3),
                full.connectingRod(),
                full.crank(),
                full.friction(),
                full.chambers().subList(0, 1),
                full.parts(),
                full.limits());
        return with(booster(), List.of(headOnly), List.of(normal()));
    }

    /** A machine with other throws and duty points. */
    public static Machine with(Machine like, List<Throw> throwsInOrder, List<DutyPoint> duties) {
        return new Machine(
                like.name(),
                like.notes(),
                like.site(),
                like.drive(),
                like.fluids(),
                like.stages(),
                throwsInOrder,
                duties,
                like.limits(),
                like.loadSteps(),
                like.ranges(),
                like.bookmarks());
    }

    /** A machine with bookmarks. */
    public static Machine withBookmarks(Machine like, List<Bookmark> bookmarks) {
        return new Machine(
                like.name(),
                like.notes(),
                like.site(),
                like.drive(),
                like.fluids(),
                like.stages(),
                like.throwsInOrder(),
                like.dutyPoints(),
                like.limits(),
                like.loadSteps(),
                like.ranges(),
                bookmarks);
    }

    /** A machine with other limits. */
    public static Machine withLimits(Machine like, Limits limits) {
        return new Machine(
                like.name(),
                like.notes(),
                like.site(),
                like.drive(),
                like.fluids(),
                like.stages(),
                like.throwsInOrder(),
                like.dutyPoints(),
                limits,
                like.loadSteps(),
                like.ranges(),
                like.bookmarks());
    }

    /** A machine whose first throw has limits of its own. */
    public static Machine withThrowLimits(Machine like, Limits limits) {
        Throw first = like.throwsInOrder().get(0);
        Throw limited = new Throw(
                first.name(),
                first.place(),
                first.linkage(),
                first.masses(),
                first.connectingRod(),
                first.crank(),
                first.friction(),
                first.chambers(),
                first.parts(),
                limits);
        return with(like, List.of(limited), like.dutyPoints());
    }

    /** These machines are made from records: no file describes them, and no view reads one. */
    private static final MachineDocument NO_FILE =
            MachineDocument.read("{}", AttachedFiles.NONE).document().orElseThrow();

    /** The state of the bench for a duty point of a machine's first throw, SI. */
    public static Shown shown(Machine machine, int dutyIndex) {
        return shown(machine, dutyIndex, UnitSystem.SI);
    }

    /** The state of the bench for a duty point of a machine's first throw. */
    public static Shown shown(Machine machine, int dutyIndex, UnitSystem units) {
        RunningMachine running = RunningMachine.settle(
                        machine, machine.dutyPoints().get(dutyIndex))
                .get();
        return new Shown(
                NO_FILE,
                machine,
                dutyIndex,
                0,
                Summary.of(running, 0, Optional.empty()),
                Judgement.of(machine, machine.dutyPoints()).findings(),
                units,
                0);
    }

    private static Machine machine(String name, List<String> chambers, double offset, List<DutyPoint> duties) {
        return new Machine(
                name,
                "",
                new Site(AMBIENT, AMBIENT, false),
                new Drive(
                        740 * RPM, Rotation.COUNTER_CLOCKWISE, OptionalDouble.of(38), new Driver.ConstantSpeed(), 0.96),
                Map.of("biogas", new PerfectGas(0.0272, 1.29)),
                List.of(new Stage("first", "biogas", Optional.empty(), Optional.empty(), Limits.NONE)),
                List.of(firstThrow(chambers, offset)),
                duties.stream().map(d -> renamed(d, chambers)).toList(),
                new Limits(Map.of(
                        LimitKey.ROD_TENSION, 120e3,
                        LimitKey.ROD_COMPRESSION, 90e3,
                        LimitKey.REVERSAL_DURATION, Math.toRadians(15),
                        LimitKey.REVERSAL_RATIO, 0.03)),
                List.of(),
                Ranges.NONE,
                List.of());
    }

    private static Throw firstThrow(List<String> chambers, double offset) {
        return new Throw(
                "A",
                new ShaftPlace(0, 0, 0),
                new Linkage(0.075, 0.4, offset),
                new ReciprocatingMasses(38, 24, 42),
                new ConnectingRod(55, OptionalDouble.of(0.13), OptionalDouble.of(1.35)),
                new Crank(2.1, 0),
                Friction.NONE,
                List.of(
                        chamber(chambers.get(0), Side.HEAD, 0, 0.14),
                        chamber(chambers.get(1), Side.CRANK, 0.064, 0.16)),
                Parts.NONE,
                Limits.NONE);
    }

    private static Chamber chamber(String name, Side side, double innerDiameter, double clearance) {
        return new Chamber(
                name,
                side,
                Optional.of("first"),
                0.32,
                innerDiameter,
                new Clearance(clearance, true),
                new IdealValves(0.03, 0.04, OptionalDouble.empty(), OptionalDouble.empty()),
                0,
                Limits.NONE);
    }

    private static DutyPoint normal() {
        return named("normal");
    }

    private static DutyPoint named(String name) {
        return new DutyPoint(name, 740 * RPM, Map.of("first", lines()), Map.of());
    }

    private static DutyPoint unloaded() {
        return new DutyPoint(
                "crank end unloaded",
                600 * RPM,
                Map.of("first", lines()),
                Map.of("crank", new ChamberCondition(ChamberState.HELD_OPEN, 0, Clearance.NONE)));
    }

    /** A duty point's "crank" is the second chamber, whatever its name. */
    private static DutyPoint renamed(DutyPoint duty, List<String> chambers) {
        ChamberCondition crank = duty.condition("crank");
        return new DutyPoint(duty.name(), duty.speed(), duty.stages(), Map.of(chambers.get(1), crank));
    }

    private static StageConditions lines() {
        return new StageConditions(
                OptionalDouble.of(4.1 * BAR + AMBIENT),
                OptionalDouble.of(305.15),
                OptionalDouble.of(11.5 * BAR + AMBIENT));
    }
}
