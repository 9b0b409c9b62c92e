package throwbench.solver.revolution;

import java.util.List;
import java.util.Optional;
import throwbench.solver.drive.SpeedCurve;
import throwbench.solver.drive.SpeedOutcome;
import throwbench.solver.drive.SpeedSolver;
import throwbench.solver.machine.Drive;
import throwbench.solver.machine.Driver;
import throwbench.solver.mechanism.Approach;

/**
 * Finds the speed over the revolution of a settled machine. Where there is friction at a guide, the angles at which it bends
 * depend on the speed: they are found again with each speed until they stand.
 */
final class VaryingSpeed {

    /** Each round brings the break angles nearer by the share that friction has in the torque. */
    private static final int MOST_ROUNDS = 12;

    private VaryingSpeed() {}

    /** @param steady the machine at one speed */
    static Settling settle(RunningMachine steady) {
        Drive drive = steady.machine().drive();
        if (drive.driver() instanceof Driver.ConstantSpeed) {
            return new Settling(Optional.of(steady), List.of());
        }
        if (!(drive.rotatingInertia().orElse(0) > 0)) {
            String wanted = "a " + drive.driver().kind() + " driver needs a rotatingInertia above 0";
            return new Settling(Optional.empty(), List.of(new Refusal("drive.rotatingInertia", wanted)));
        }
        SpeedOutcome outcome =
                solve(steady, drive.driver(), drive.rotatingInertia().getAsDouble());
        return outcome.curve().isPresent()
                ? new Settling(Optional.of(steady.turning(outcome.curve().get())), List.of())
                : new Settling(Optional.empty(), List.of(new Refusal("drive.rotatingInertia", outcome.refusal())));
    }

    /** The speed with a driver and a rotating inertia (kg m², above 0) of the caller's. */
    static SpeedOutcome solve(RunningMachine steady, Driver driver, double rotatingInertia) {
        SpeedSolver solver = new SpeedSolver(new MachineLoad(steady), rotatingInertia, driver, steady.meanSpeed());
        SpeedCurve curve = steady.speedCurve();
        double[] breaks = BreakAngles.forMachineIntegrals(steady, 0);
        boolean stand = steady.throwsInOrder().stream()
                .allMatch(t -> t.body().friction().guideCoefficient() == 0);
        for (int n = 0; n < MOST_ROUNDS && !stand; n++) {
            SpeedOutcome outcome = solver.solveOnce(breaks, curve);
            if (outcome.curve().isEmpty()) {
                return outcome;
            }
            curve = outcome.curve().get();
            double[] moved = BreakAngles.forMachineIntegrals(steady.turning(curve), 0);
            stand = same(breaks, moved);
            breaks = moved;
        }
        return solver.solve(breaks, curve);
    }

    private static boolean same(double[] before, double[] after) {
        if (before.length != after.length) {
            return false;
        }
        for (int i = 0; i < before.length; i++) {
            if (Math.abs(after[i] - before[i]) > Approach.TOLERANCE) {
                return false;
            }
        }
        return true;
    }
}
