package throwbench.solver.trial;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.chamber.ChamberCondition;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.Cycle;
import throwbench.solver.chamber.LiquidValves;
import throwbench.solver.chamber.Side;
import throwbench.solver.fluid.Fluid;
import throwbench.solver.fluid.Liquid;
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
import throwbench.solver.machine.SuctionLine;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.revolution.RunningMachine;

/** Pumps put together from few numbers. */
public final class Pumps {

    /** The one stage that their chambers belong to. */
    public static final String STAGE = "lift";

    /** Valves without loss or lag. */
    public static final LiquidValves IDEAL = new LiquidValves(0, 0, false, 0);

    /** A liquid that does not give by one digit: valves open at the dead centres. */
    public static final Liquid RIGID = new Liquid(1000, 1e30, 2300);

    public static final Liquid WATER = new Liquid(998, 2.2e9, 2300);

    public static final SuctionLine NO_LINE = new SuctionLine(
            OptionalDouble.empty(), OptionalDouble.empty(), 0, 0, OptionalDouble.empty(), OptionalDouble.empty());

    private static final double AMBIENT = 101_325;

    private Pumps() {}

    /**
     * Conditions of a pump.
     *
     * @param speed rad/s
     * @param suction Pa absolute
     * @param discharge likewise
     */
    public record Duty(
            Fluid fluid,
            double speed,
            double suction,
            double discharge,
            SuctionLine line,
            Map<String, ChamberCondition> conditions) {

        public Duty with(SuctionLine other) {
            return new Duty(fluid, speed, suction, discharge, other, conditions);
        }

        public Duty at(double otherSpeed) {
            return new Duty(fluid, otherSpeed, suction, discharge, line, conditions);
        }

        public Duty with(Map<String, ChamberCondition> other) {
            return new Duty(fluid, speed, suction, discharge, line, other);
        }
    }

    public static Duty duty(Liquid liquid) {
        return new Duty(liquid, 31, 1.5e5, 41e5, NO_LINE, Map.of());
    }

    /** Plungers at the head end of cranks of 60 mm, at these crank phases (degrees). */
    public static List<Throw> plungers(double rodToCrank, Cycle valves, double... phases) {
        List<Throw> all = new ArrayList<>();
        for (int i = 0; i < phases.length; i++) {
            String name = "P" + (i + 1);
            Chamber barrel = chamber(name + " head", Side.HEAD, 0.07, 0, 0.4, valves);
            all.add(throwOf(name, phases[i], new Linkage(0.06, 0.06 * rodToCrank, 0), List.of(barrel)));
        }
        return all;
    }

    /** Double-acting pistons with a rod too thin to count. */
    public static List<Throw> pistons(double rodToCrank, Cycle valves, double... phases) {
        List<Throw> all = new ArrayList<>();
        for (int i = 0; i < phases.length; i++) {
            String name = "P" + (i + 1);
            Chamber head = chamber(name + " head", Side.HEAD, 0.07, 0, 0.4, valves);
            Chamber crank = chamber(name + " crank", Side.CRANK, 0.07, 0, 0.3, valves);
            all.add(throwOf(name, phases[i], new Linkage(0.06, 0.06 * rodToCrank, 0), List.of(head, crank)));
        }
        return all;
    }

    public static double[] equallySpaced(int count) {
        double[] phases = new double[count];
        for (int i = 0; i < count; i++) {
            phases[i] = 360.0 * i / count;
        }
        return phases;
    }

    public static Throw throwOf(String name, double phaseDeg, Linkage linkage, List<Chamber> chambers) {
        return new Throw(
                name,
                new ShaftPlace(Math.toRadians(phaseDeg), 0, 0),
                linkage,
                new ReciprocatingMasses(11, 0, 7),
                new ConnectingRod(9, OptionalDouble.empty(), OptionalDouble.empty()),
                new Crank(0, 0),
                Friction.NONE,
                chambers,
                Parts.NONE,
                Limits.NONE);
    }

    /** A chamber of the one stage; its clearance is a share of the swept volume. */
    public static Chamber chamber(String name, Side side, double bore, double inner, double clearance, Cycle cycle) {
        return new Chamber(
                name, side, Optional.of(STAGE), bore, inner, new Clearance(clearance, true), cycle, 0, Limits.NONE);
    }

    public static Machine machine(List<Throw> throwsInOrder, Rotation rotation, Duty duty) {
        DutyPoint point = new DutyPoint(
                "normal",
                duty.speed(),
                Map.of(
                        STAGE,
                        new StageConditions(
                                OptionalDouble.of(duty.suction()),
                                OptionalDouble.empty(),
                                OptionalDouble.of(duty.discharge()))),
                duty.conditions());
        Optional<SuctionLine> line = duty.line().equals(NO_LINE) ? Optional.empty() : Optional.of(duty.line());
        return new Machine(
                "trial pump",
                "",
                new Site(AMBIENT, AMBIENT, false),
                new Drive(duty.speed(), rotation, OptionalDouble.empty(), new Driver.ConstantSpeed(), 1),
                Map.of("fluid", duty.fluid()),
                List.of(new Stage(STAGE, "fluid", Optional.empty(), line, Limits.NONE)),
                throwsInOrder,
                List.of(point),
                Limits.NONE,
                List.of(),
                Ranges.NONE,
                List.of());
    }

    public static RunningMachine running(List<Throw> throwsInOrder, Duty duty) {
        return running(throwsInOrder, Rotation.COUNTER_CLOCKWISE, duty);
    }

    public static RunningMachine running(List<Throw> throwsInOrder, Rotation rotation, Duty duty) {
        Machine machine = machine(throwsInOrder, rotation, duty);
        return RunningMachine.settle(machine, machine.dutyPoints().get(0)).get();
    }
}
