package throwbench.solver.benchmarks;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.chamber.Clearance;
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

/** The booster that every benchmark solves: one double-acting throw on ideal valves, in line or 12 mm offset. */
final class Booster {

    static final double AMBIENT = 101_325;
    static final double SPEED = 740 * Math.PI / 30;
    static final double SUCTION = AMBIENT + 4.1e5;
    static final double DISCHARGE = AMBIENT + 11.5e5;

    private static final IdealValves VALVES =
            new IdealValves(0.03, 0.04, OptionalDouble.empty(), OptionalDouble.empty());

    private Booster() {}

    static double offset(String mechanism) {
        return switch (mechanism) {
            case "inline" -> 0;
            case "offset" -> 0.012;
            default -> throw new IllegalArgumentException(mechanism);
        };
    }

    static Machine machine(String mechanism) {
        return machine(mechanism, 0.4);
    }

    static Machine machine(String mechanism, double rodLength) {
        Throw t = new Throw(
                "A",
                new ShaftPlace(0, 0, 0),
                new Linkage(0.075, rodLength, offset(mechanism)),
                new ReciprocatingMasses(38, 24, 42),
                new ConnectingRod(55, OptionalDouble.of(0.13), OptionalDouble.of(1.35)),
                new Crank(2.1, 0),
                Friction.NONE,
                List.of(chamber("A head", Side.HEAD, 0, 0.14), chamber("A crank", Side.CRANK, 0.064, 0.16)),
                Parts.NONE,
                Limits.NONE);
        return new Machine(
                "booster",
                "",
                new Site(AMBIENT, AMBIENT, false),
                new Drive(SPEED, Rotation.COUNTER_CLOCKWISE, OptionalDouble.empty(), new Driver.ConstantSpeed(), 1),
                Map.of("biogas", new PerfectGas(0.0272, 1.29)),
                List.of(new Stage("first", "biogas", Optional.empty(), Optional.empty(), Limits.NONE)),
                List.of(t),
                List.of(duty(SPEED, SUCTION)),
                Limits.NONE,
                List.of(),
                Ranges.NONE,
                List.of());
    }

    private static Chamber chamber(String name, Side side, double innerDiameter, double clearance) {
        return new Chamber(
                name,
                side,
                Optional.of("first"),
                0.32,
                innerDiameter,
                new Clearance(clearance, true),
                VALVES,
                0,
                Limits.NONE);
    }

    static DutyPoint duty(double speed, double suctionPressure) {
        StageConditions lines = new StageConditions(
                OptionalDouble.of(suctionPressure), OptionalDouble.of(305.15), OptionalDouble.of(DISCHARGE));
        return new DutyPoint("normal", speed, Map.of("first", lines), Map.of());
    }

    static RunningMachine running(Machine machine, double speed, double suctionPressure) {
        return RunningMachine.settle(machine, duty(speed, suctionPressure)).get();
    }
}
