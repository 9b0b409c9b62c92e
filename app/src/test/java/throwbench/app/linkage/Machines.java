package throwbench.app.linkage;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.app.bench.Shown;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.IdealValves;
import throwbench.solver.chamber.LiquidValves;
import throwbench.solver.chamber.Side;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.attached.AttachedFiles;
import throwbench.solver.document.quantity.UnitSystem;
import throwbench.solver.fluid.Fluid;
import throwbench.solver.fluid.Liquid;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.load.Crank;
import throwbench.solver.load.Friction;
import throwbench.solver.load.ReciprocatingMasses;
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
import throwbench.solver.machine.StageConditions;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Summary;

/** Invented machines of every arrangement that the linkage view draws. */
final class Machines {

    private Machines() {}

    /** One double-acting horizontal throw. */
    static Machine booster() {
        return machine("Saltmarsh biogas booster", Rotation.COUNTER_CLOCKWISE, List.of(doubleActing("A", 0, 0, 0)));
    }

    /** The same with every bore so many times as large. */
    static Machine booster(double factor) {
        List<Chamber> chambers = List.of(
                chamber("A head", Side.HEAD, 0.32 * factor, 0, 0.14),
                chamber("A crank", Side.CRANK, 0.32 * factor, 0.064, 0.16));
        return machine(
                "Saltmarsh biogas booster",
                Rotation.COUNTER_CLOCKWISE,
                List.of(of("A", 0, 0, new Linkage(0.075, 0.4, 0), new ReciprocatingMasses(38, 24, 42), chambers)));
    }

    /** The first turning the other way, with the line of stroke above the crank centre. */
    static Machine offset() {
        return machine("offset", Rotation.CLOCKWISE, List.of(doubleActing("A", 0, 0, 0.06)));
    }

    /** Two opposed double-acting throws. */
    static Machine opposed() {
        return machine(
                "opposed",
                Rotation.COUNTER_CLOCKWISE,
                List.of(doubleActing("A", 0, 0, 0), doubleActing("B", Math.toRadians(180), Math.PI, 0)));
    }

    /** Two single-acting trunk pistons in a V. */
    static Machine vee() {
        return machine(
                "vee",
                Rotation.CLOCKWISE,
                List.of(trunk("L", Math.toRadians(135), 0), trunk("R", Math.toRadians(45), 0)));
    }

    /** A vertical trunk piston. */
    static Machine vertical() {
        return machine("vertical", Rotation.COUNTER_CLOCKWISE, List.of(trunk("A", Math.PI / 2, 0)));
    }

    /** Two pistons on one rod, the outer one with a tail rod. */
    static Machine tandem() {
        List<Chamber> chambers = List.of(
                chamber("low crank", Side.CRANK, 0.40, 0.07, 0.15),
                chamber("low head", Side.HEAD, 0.40, 0.05, 0.15),
                chamber("high crank", Side.CRANK, 0.22, 0.05, 0.15),
                chamber("high head", Side.HEAD, 0.22, 0.04, 0.15));
        return machine(
                "tandem",
                Rotation.COUNTER_CLOCKWISE,
                List.of(of("A", 0, 0, new Linkage(0.075, 0.4, 0), new ReciprocatingMasses(70, 30, 42), chambers)));
    }

    /** A stepped piston: an annular chamber of a wide bore round a narrower one, both towards the head. */
    static Machine stepped() {
        List<Chamber> chambers = List.of(
                chamber("wide ring at the crank side with a long name", Side.HEAD, 0.34, 0.20, 0.12),
                chamber("narrow", Side.HEAD, 0.20, 0, 0.12));
        return machine(
                "stepped",
                Rotation.COUNTER_CLOCKWISE,
                List.of(of("A", 0, 0, new Linkage(0.075, 0.4, 0), new ReciprocatingMasses(60, 20, 42), chambers)));
    }

    /** Three plungers side by side, a third of a turn apart. */
    static Machine triplex() {
        double third = 2 * Math.PI / 3;
        return machine(
                "triplex",
                Rotation.COUNTER_CLOCKWISE,
                List.of(plunger("1", 0), plunger("2", third), plunger("3", -third)),
                new Liquid(1025, 2.2e9, 2300));
    }

    /** Every arrangement by name. */
    static List<Machine> all() {
        return List.of(booster(), offset(), opposed(), vee(), vertical(), tandem(), stepped(), triplex());
    }

    static Shown shown(Machine machine, int throwIndex) {
        RunningMachine running =
                RunningMachine.settle(machine, machine.dutyPoints().get(0)).get();
        Summary summary = Summary.of(running, throwIndex, Optional.empty());
        // these machines come from no file; the view reads nothing of it
        MachineDocument none =
                MachineDocument.read("{}", AttachedFiles.NONE).document().orElseThrow();
        return new Shown(none, machine, 0, throwIndex, summary, List.of(), UnitSystem.SI, 0);
    }

    private static Throw doubleActing(String name, double phase, double direction, double offset) {
        List<Chamber> chambers = List.of(
                chamber(name + " head", Side.HEAD, 0.32, 0, 0.14),
                chamber(name + " crank", Side.CRANK, 0.32, 0.064, 0.16));
        return of(
                name, phase, direction, new Linkage(0.075, 0.4, offset), new ReciprocatingMasses(38, 24, 42), chambers);
    }

    private static Throw trunk(String name, double direction, double phase) {
        return of(
                name,
                phase,
                direction,
                new Linkage(0.05, 0.2, 0),
                new ReciprocatingMasses(4.2, 0, 0),
                List.of(chamber(name + " head", Side.HEAD, 0.14, 0, 0.08)));
    }

    private static Throw plunger(String name, double phase) {
        return of(
                name,
                phase,
                0,
                new Linkage(0.06, 0.33, 0),
                new ReciprocatingMasses(18, 0, 25),
                List.of(new Chamber(
                        "barrel " + name,
                        Side.HEAD,
                        Optional.of("first"),
                        0.09,
                        0,
                        new Clearance(0.3, true),
                        new LiquidValves(0.2e5, 0.4e5, false, Math.toRadians(4)),
                        0,
                        Limits.NONE)));
    }

    private static Chamber chamber(String name, Side side, double bore, double inner, double clearance) {
        IdealValves cycle = new IdealValves(0.03, 0.04, OptionalDouble.empty(), OptionalDouble.empty());
        return new Chamber(
                name, side, Optional.of("first"), bore, inner, new Clearance(clearance, true), cycle, 0, Limits.NONE);
    }

    private static Throw of(
            String name,
            double phase,
            double direction,
            Linkage linkage,
            ReciprocatingMasses masses,
            List<Chamber> chambers) {
        return new Throw(
                name,
                new ShaftPlace(phase, direction, 0),
                linkage,
                masses,
                new ConnectingRod(55 * linkage.rodLength() / 0.4, OptionalDouble.empty(), OptionalDouble.empty()),
                new Crank(2.1, 0.4),
                Friction.NONE,
                chambers,
                Parts.NONE,
                Limits.NONE);
    }

    private static Machine machine(String name, Rotation rotation, List<Throw> throwsInOrder) {
        return machine(name, rotation, throwsInOrder, new PerfectGas(0.0272, 1.29));
    }

    private static Machine machine(String name, Rotation rotation, List<Throw> throwsInOrder, Fluid fluid) {
        double ambient = 101325;
        Map<String, Fluid> fluids = Map.of("fluid", fluid);
        StageConditions conditions = new StageConditions(
                OptionalDouble.of(4.1e5 + ambient), OptionalDouble.of(305.15), OptionalDouble.of(11.5e5 + ambient));
        return new Machine(
                name,
                "",
                new Site(ambient, ambient, false),
                new Drive(740 * Math.PI / 30, rotation, OptionalDouble.of(38), new Driver.ConstantSpeed(), 1),
                fluids,
                List.of(new Stage("first", "fluid", Optional.empty(), Optional.empty(), Limits.NONE)),
                throwsInOrder,
                List.of(new DutyPoint("normal", 740 * Math.PI / 30, Map.of("first", conditions), Map.of())),
                Limits.NONE,
                List.of(),
                Ranges.NONE,
                List.of());
    }
}
