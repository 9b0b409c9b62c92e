package throwbench.solver.revolution;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;
import throwbench.solver.chamber.PressureCurve;
import throwbench.solver.chamber.ValveEvent;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Sweep;

/**
 * The crank angles at which a curve may bend or step: dead centres, valve events and, with friction at the guide, where the
 * crosshead changes its side of the guide. Between them every quantity is smooth.
 */
public final class BreakAngles {

    private BreakAngles() {}

    /**
     * Those of one throw's curves, in its own crank angle: rad, rising, in [0, 2π). Where the speed varies, every throw's
     * events reach it through the shaft's acceleration.
     */
    public static double[] ofThrow(RunningMachine running, int throwIndex) {
        return running.speedCurve().constant() ? own(running, throwIndex) : ofMachine(running, throwIndex);
    }

    private static double[] own(RunningMachine running, int throwIndex) {
        double[] steps = steps(running, throwIndex);
        boolean friction =
                running.throwsInOrder().get(throwIndex).body().friction().guideCoefficient() != 0;
        return friction ? sorted(DoubleStream.concat(stream(steps), guideChanges(running, throwIndex, steps))) : steps;
    }

    /** Those of all throws, in the crank angle of one of them. */
    public static double[] ofMachine(RunningMachine running, int shown) {
        DoubleStream all = DoubleStream.empty();
        for (int i = 0; i < running.throwsInOrder().size(); i++) {
            double shift = running.angleBetween(shown, i);
            all = DoubleStream.concat(all, stream(own(running, i)).map(angle -> Angles.wrap(angle - shift)));
        }
        return sorted(all);
    }

    /** Those of the rod load, which holds no friction. */
    static double[] ofRodLoad(RunningMachine running, int throwIndex) {
        return running.speedCurve().constant() ? steps(running, throwIndex) : ofMachine(running, throwIndex);
    }

    /** Dead centres and valve events; in plain loops, since every point of a map asks for them. */
    private static double[] steps(RunningMachine running, int throwIndex) {
        RunningThrow t = running.throwsInOrder().get(throwIndex);
        List<PressureCurve> curves = t.curves();
        int count = 2;
        List<List<ValveEvent>> events = new ArrayList<>(curves.size());
        for (PressureCurve curve : curves) {
            events.add(curve.events());
            count += events.get(events.size() - 1).size();
        }
        double[] angles = new double[count];
        angles[--count] = t.body().linkage().crankEndDeadCentre(running.rotation());
        for (List<ValveEvent> ofChamber : events) {
            for (ValveEvent event : ofChamber) {
                angles[--count] = event.crankAngle();
            }
        }
        return sorted(angles); // the angle left at 0 is head-end dead centre
    }

    /** Those of a throw and the joints of its pressure curves: what an integral over the revolution is split at. */
    static double[] forIntegrals(RunningMachine running, int throwIndex) {
        if (!running.speedCurve().constant()) {
            return forMachineIntegrals(running, throwIndex);
        }
        return sorted(DoubleStream.concat(stream(own(running, throwIndex)), joints(running, throwIndex)));
    }

    /** The same of all throws, in the crank angle of one of them. */
    static double[] forMachineIntegrals(RunningMachine running, int shown) {
        DoubleStream all = stream(ofMachine(running, shown));
        for (int i = 0; i < running.throwsInOrder().size(); i++) {
            double shift = running.angleBetween(shown, i);
            all = DoubleStream.concat(all, joints(running, i).map(angle -> Angles.wrap(angle - shift)));
        }
        return sorted(all);
    }

    private static DoubleStream joints(RunningMachine running, int throwIndex) {
        return running.throwsInOrder().get(throwIndex).curves().stream()
                .map(PressureCurve::joints)
                .flatMapToDouble(Arrays::stream);
    }

    /** Where the guide force changes its sign, |N| and with it the guide's friction bend. */
    private static DoubleStream guideChanges(RunningMachine running, int throwIndex, double[] steps) {
        RunningThrow t = running.throwsInOrder().get(throwIndex);
        Sweep sweep = Sweep.wholeTurn(t.body().linkage(), running.rotation(), 0, Trace.STATIONS);
        ThrowStations stations =
                new ThrowStations(t, sweep, running.machine().site().framePressure(), List.of());
        double[] speed = new double[Trace.STATIONS];
        double[] alpha = new double[Trace.STATIONS];
        running.fillSpeed(throwIndex, sweep.crankAngle(), Approach.JUST_AFTER, speed, alpha);
        stations.solve(speed, alpha);
        ThrowInstant instant = new ThrowInstant(running, throwIndex);
        Trace guide = new Trace(
                (angle, side) -> instant.turnTo(angle, side).at(Column.GUIDE_FORCE),
                stations.column(Column.GUIDE_FORCE),
                steps);
        return SignChanges.of(guide).stream().mapToDouble(SignChange::crankAngle);
    }

    private static DoubleStream stream(double[] angles) {
        return Arrays.stream(angles);
    }

    private static double[] sorted(DoubleStream unsorted) {
        return sorted(unsorted.toArray());
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
