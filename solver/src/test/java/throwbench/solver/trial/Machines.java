package throwbench.solver.trial;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.chamber.ChamberCondition;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.Cycle;
import throwbench.solver.chamber.IdealValves;
import throwbench.solver.chamber.Side;
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

/** Machines put together from few numbers. */
public final class Machines {

    private static final double AMBIENT = 101_325;

    private Machines() {}

    /** An invented biogas booster: one double-acting throw, both ends on ideal valves, 740 rpm, 4.1 to 11.5 bar gauge. */
    public static Machine booster(double guideOffset) {
        return of(
                List.of(boosterThrow(guideOffset)),
                Rotation.COUNTER_CLOCKWISE,
                new Site(AMBIENT, AMBIENT, false),
                boosterDuty(Map.of()),
                Limits.NONE);
    }

    public static DutyPoint boosterDuty(Map<String, ChamberCondition> conditions) {
        return new DutyPoint(
                "normal",
                740 * Math.PI / 30,
                Map.of(AnyThrow.STAGE, lines(AMBIENT + 4.1e5, AMBIENT + 11.5e5)),
                conditions);
    }

    public static StageConditions lines(double suctionPressure, double dischargePressure) {
        return new StageConditions(
                OptionalDouble.of(suctionPressure), OptionalDouble.of(305.15), OptionalDouble.of(dischargePressure));
    }

    public static Throw boosterThrow(double guideOffset) {
        IdealValves valves = new IdealValves(0.03, 0.04, OptionalDouble.empty(), OptionalDouble.empty());
        return new Throw(
                "A",
                new ShaftPlace(0, 0, 0),
                new Linkage(0.075, 0.4, guideOffset),
                new ReciprocatingMasses(38, 24, 42),
                new ConnectingRod(55, OptionalDouble.of(0.13), OptionalDouble.of(1.35)),
                new Crank(2.1, 0),
                Friction.NONE,
                List.of(
                        chamber("A head", Side.HEAD, 0.32, 0, 0.14, valves),
                        chamber("A crank", Side.CRANK, 0.32, 0.064, 0.16, valves)),
                Parts.NONE,
                Limits.NONE);
    }

    /** A chamber of the one stage. */
    public static Chamber chamber(
            String name, Side side, double bore, double innerDiameter, double clearance, Cycle cycle) {
        return new Chamber(
                name,
                side,
                Optional.of(AnyThrow.STAGE),
                bore,
                innerDiameter,
                new Clearance(clearance, true),
                cycle,
                0,
                Limits.NONE);
    }

    /** A machine with one stage of a biogas and one duty point, at constant speed. */
    public static Machine of(List<Throw> throwsInOrder, Rotation rotation, Site site, DutyPoint duty, Limits limits) {
        return new Machine(
                "trial",
                "",
                site,
                new Drive(duty.speed(), rotation, OptionalDouble.empty(), new Driver.ConstantSpeed(), 1),
                Map.of("gas", new PerfectGas(0.0272, 1.29)),
                List.of(new Stage(AnyThrow.STAGE, "gas", Optional.empty(), Optional.empty(), Limits.NONE)),
                throwsInOrder,
                List.of(duty),
                limits,
                List.of(),
                Ranges.NONE,
                List.of());
    }

    /** The same machine with other throws, rotation, site and duty point. */
    public static Machine changed(
            Machine machine, List<Throw> throwsInOrder, Rotation rotation, Site site, DutyPoint duty) {
        return of(throwsInOrder, rotation, site, duty, machine.limits());
    }

    public static Throw changed(
            Throw t, String name, ShaftPlace place, Linkage linkage, Friction friction, List<Chamber> chambers) {
        return new Throw(
                name,
                place,
                linkage,
                t.masses(),
                t.connectingRod(),
                t.crank(),
                friction,
                chambers,
                t.parts(),
                t.limits());
    }

    public static Chamber renamed(Chamber c, String name) {
        return new Chamber(
                name,
                c.side(),
                c.stage(),
                c.bore(),
                c.innerDiameter(),
                c.clearance(),
                c.cycle(),
                c.flowAllowance(),
                c.limits());
    }

    /** The machine running at its first duty point. */
    public static RunningMachine running(Machine machine) {
        return RunningMachine.settle(machine, machine.dutyPoints().get(0)).get();
    }
}
