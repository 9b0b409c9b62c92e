package throwbench.solver.revolution;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import throwbench.solver.drive.SpeedCurve;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Machine;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Rotation;

/**
 * A machine settled at one duty point: every chamber's cycle is solved and the speed is known. What depends on an angle is
 * read from it by a {@link Revolution} or an {@link Instant}.
 *
 * @param dutyPoint with every balanced interstage pressure found
 * @param throwsInOrder one for each throw of the machine
 * @param speedCurve ω and α over the crank angle of the first throw
 */
public record RunningMachine(
        Machine machine, DutyPoint dutyPoint, List<RunningThrow> throwsInOrder, SpeedCurve speedCurve) {

    public RunningMachine {
        throwsInOrder = List.copyOf(throwsInOrder);
    }

    /** Settles a machine at a duty point, or says for every place why it cannot. */
    public static Settling settle(Machine machine, DutyPoint dutyPoint) {
        List<Refusal> refusals = new ArrayList<>();
        DutyPoint settled = InterstageBalance.settle(machine, dutyPoint, refusals);
        List<RunningThrow> running = new ArrayList<>();
        if (!refusals.isEmpty()) {
            return new Settling(Optional.empty(), List.copyOf(refusals));
        }
        for (int i = 0; i < machine.throwsInOrder().size(); i++) {
            new ThrowSettler(machine, settled, i, refusals).settle().ifPresent(running::add);
        }
        if (!refusals.isEmpty()) {
            return new Settling(Optional.empty(), List.copyOf(refusals));
        }
        SpeedCurve steady = SpeedCurve.constant(dutyPoint.speed());
        return VaryingSpeed.settle(new RunningMachine(machine, settled, running, steady));
    }

    /** The same machine with another speed over the turn. */
    RunningMachine turning(SpeedCurve curve) {
        return new RunningMachine(machine, dutyPoint, throwsInOrder, curve);
    }

    /** Fills ω and α at crank angles of a throw. */
    void fillSpeed(int throwIndex, double[] crankAngles, Approach approach, double[] speed, double[] acceleration) {
        speedCurve.fill(crankAngles, angleBetween(throwIndex, 0), approach, speed, acceleration);
    }

    public Rotation rotation() {
        return machine.drive().rotation();
    }

    /** ω_mean, rad/s. */
    public double meanSpeed() {
        return dutyPoint.speed();
    }

    /** Turns a second. */
    public double turnsPerSecond() {
        return meanSpeed() / Angles.TURN;
    }

    /** The crank angle of one throw when another stands at head-end dead centre, rad, continuous. */
    public double angleBetween(int reference, int other) {
        return throwsInOrder.get(other).phase() - throwsInOrder.get(reference).phase();
    }

    /** Z_0: halfway between the outermost throws, m; couples are taken about it. */
    public double coupleCentre() {
        double least = Double.POSITIVE_INFINITY;
        double greatest = Double.NEGATIVE_INFINITY;
        for (RunningThrow t : throwsInOrder) {
            double z = t.described().place().shaftPosition();
            least = Math.min(least, z);
            greatest = Math.max(greatest, z);
        }
        return (least + greatest) / 2;
    }
}
