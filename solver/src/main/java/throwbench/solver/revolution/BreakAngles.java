package throwbench.solver.revolution;

import java.util.Arrays;
import throwbench.solver.chamber.PressureCurve;
import throwbench.solver.chamber.ValveEvent;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;

/**
 * The crank angles at which a curve may bend or step: dead centres and valve events. Between them every quantity is smooth.
 */
public final class BreakAngles {

    private BreakAngles() {}

    /** Those of one throw, in its own crank angle: rad, rising, in [0, 2π). */
    public static double[] ofThrow(RunningMachine running, int throwIndex) {
        return sorted(collect(running, throwIndex, throwIndex, new double[0]));
    }

    /** Those of all throws, in the crank angle of one of them. */
    public static double[] ofMachine(RunningMachine running, int shown) {
        double[] all = new double[0];
        for (int i = 0; i < running.throwsInOrder().size(); i++) {
            all = collect(running, shown, i, all);
        }
        return sorted(all);
    }

    /** Those of all throws and the joints of their pressure curves: what an integral over the revolution is split at. */
    static double[] forIntegrals(RunningMachine running, int shown) {
        double[] all = ofMachine(running, shown);
        for (int i = 0; i < running.throwsInOrder().size(); i++) {
            double shift = running.angleBetween(shown, i);
            for (PressureCurve curve : running.throwsInOrder().get(i).curves()) {
                double[] joints = curve.joints();
                int before = all.length;
                all = Arrays.copyOf(all, before + joints.length);
                for (int k = 0; k < joints.length; k++) {
                    all[before + k] = Angles.wrap(joints[k] - shift);
                }
            }
        }
        return sorted(all);
    }

    private static double[] collect(RunningMachine running, int shown, int index, double[] before) {
        RunningThrow t = running.throwsInOrder().get(index);
        int events = t.curves().stream().mapToInt(c -> c.events().size()).sum();
        double[] all = Arrays.copyOf(before, before.length + 2 + events);
        int at = before.length;
        double shift = running.angleBetween(shown, index);
        all[at++] = Angles.wrap(-shift);
        all[at++] = Angles.wrap(t.body().linkage().crankEndDeadCentre(running.rotation()) - shift);
        for (PressureCurve curve : t.curves()) {
            for (ValveEvent event : curve.events()) {
                all[at++] = Angles.wrap(event.crankAngle() - shift);
            }
        }
        return all;
    }

    private static double[] sorted(double[] angles) {
        Arrays.sort(angles);
        int kept = 0;
        for (double angle : angles) {
            // angles of two throws that mean the same instant differ by rounding; just below a turn is angle 0
            boolean wrapped = angle > Angles.TURN - Approach.TOLERANCE;
            double taken = wrapped ? 0 : angle;
            if (kept == 0 || (!wrapped && taken - angles[kept - 1] > Approach.TOLERANCE)) {
                angles[kept++] = taken;
            }
        }
        return Arrays.copyOf(angles, kept);
    }
}
