package throwbench.solver.revolution;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Machine;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Rotation;

/**
 * A machine settled at one duty point: every chamber's cycle is solved and the speed is known. What depends on an angle is
 * read from it by a {@link Revolution} or an {@link Instant}.
 *
 * @param throwsInOrder one for each throw of the machine
 */
public record RunningMachine(Machine machine, DutyPoint dutyPoint, List<RunningThrow> throwsInOrder) {

    public RunningMachine {
        throwsInOrder = List.copyOf(throwsInOrder);
    }

    /** Settles a machine at a duty point, or says for every place why it cannot. */
    public static Settling settle(Machine machine, DutyPoint dutyPoint) {
        List<Refusal> refusals = new ArrayList<>();
        if (!machine.drive().driver().kind().equals("constant-speed")) {
            refusals.add(new Refusal(
                    "drive.driver.kind",
                    machine.drive().driver().kind() + " drivers are not solved by this version; use constant-speed"));
        }
        List<RunningThrow> running = new ArrayList<>();
        for (int i = 0; i < machine.throwsInOrder().size(); i++) {
            new ThrowSettler(machine, dutyPoint, i, refusals).settle().ifPresent(running::add);
        }
        return refusals.isEmpty()
                ? new Settling(Optional.of(new RunningMachine(machine, dutyPoint, running)), List.of())
                : new Settling(Optional.empty(), List.copyOf(refusals));
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
