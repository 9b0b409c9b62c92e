package throwbench.solver.revolution;

import java.util.Map;
import java.util.OptionalDouble;
import java.util.TreeMap;
import throwbench.solver.balance.TurnQuadrature;
import throwbench.solver.chamber.ChamberVolume;
import throwbench.solver.chamber.PressureCurve;
import throwbench.solver.chamber.Side;
import throwbench.solver.machine.Chamber;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;

/**
 * Means of one throw over the revolution by Gauss–Legendre quadrature between the break angles, so that no kink or step spoils them:
 * independent of the number of stations.
 */
final class TurnMeans {

    /** On it every quantity is analytic. */
    private static final double LONGEST_PIECE = Angles.TURN / 12;

    private final RunningThrow running;
    private final double meanSpeed;
    private double torque;
    /** Mean power of each chamber, W, positive when the gas takes it up. */
    private final double[] chamberPower;

    TurnMeans(RunningMachine machine, int index) {
        this.running = machine.throwsInOrder().get(index);
        this.meanSpeed = machine.meanSpeed();
        this.chamberPower = new double[running.chambers().size()];
        ThrowInstant instant = new ThrowInstant(machine, index);
        TurnQuadrature.over(
                BreakAngles.forIntegrals(machine, index),
                LONGEST_PIECE,
                (angle, weight) -> add(instant, angle, weight / Angles.TURN));
    }

    private void add(ThrowInstant instant, double angle, double weight) {
        instant.turnTo(angle, Approach.JUST_AFTER);
        torque += weight * instant.at(Column.THROW_TORQUE);
        // power is the work of a turn times turns a second, whatever the speed within the turn: ∮ p dV by the angle
        double speed = instant.at(Column.VELOCITY) * meanSpeed / instant.speed();
        for (int c = 0; c < chamberPower.length; c++) {
            ChamberVolume volume = running.volumes().get(c);
            double growth = volume.side() == Side.HEAD ? volume.area() * speed : -volume.area() * speed;
            chamberPower[c] -= weight * instant.pressure(c) * growth;
        }
    }

    /** Mean torque of the throw, N·m. */
    double torque() {
        return torque;
    }

    /** Indicated power by stage, W, positive when the machine absorbs it; without the loose chambers. */
    Map<String, Double> powerByStage() {
        Map<String, Double> byStage = new TreeMap<>();
        for (int c = 0; c < chamberPower.length; c++) {
            double power = chamberPower[c];
            running.chambers().get(c).stage().ifPresent(stage -> byStage.merge(stage, power, Double::sum));
        }
        return byStage;
    }

    /** Indicated power, W, every chamber counted. */
    double power() {
        double sum = 0;
        for (double power : chamberPower) {
            sum += power;
        }
        return sum;
    }

    /** Mass flow of one throw by stage, kg/s; empty where a chamber's mass is not known. */
    static Map<String, OptionalDouble> capacityByStage(RunningMachine running, int index) {
        Map<String, OptionalDouble> byStage = new TreeMap<>();
        RunningThrow t = running.throwsInOrder().get(index);
        for (int c = 0; c < t.chambers().size(); c++) {
            Chamber chamber = t.chambers().get(c);
            OptionalDouble mass = t.curves().get(c).massPerTurn();
            chamber.stage()
                    .ifPresent(stage -> byStage.merge(
                            stage,
                            mass.isPresent()
                                    ? OptionalDouble.of(mass.getAsDouble() * running.turnsPerSecond())
                                    : OptionalDouble.empty(),
                            TurnMeans::sum));
        }
        return byStage;
    }

    /** A sum is known when both parts are. */
    static OptionalDouble sum(OptionalDouble a, OptionalDouble b) {
        return a.isPresent() && b.isPresent()
                ? OptionalDouble.of(a.getAsDouble() + b.getAsDouble())
                : OptionalDouble.empty();
    }

    /** Volume flow of one throw by stage at inlet conditions, m³/s; empty where a chamber's flow is not known. */
    static Map<String, OptionalDouble> inletVolumeByStage(RunningMachine running, int index) {
        Map<String, OptionalDouble> byStage = new TreeMap<>();
        RunningThrow t = running.throwsInOrder().get(index);
        for (int c = 0; c < t.chambers().size(); c++) {
            PressureCurve curve = t.curves().get(c);
            OptionalDouble volume = curve.flowKnown()
                    ? OptionalDouble.of(curve.inletVolumePerTurn() * running.turnsPerSecond())
                    : OptionalDouble.empty();
            t.chambers().get(c).stage().ifPresent(stage -> byStage.merge(stage, volume, TurnMeans::sum));
        }
        return byStage;
    }
}
