package throwbench.solver.revolution;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Arrays;
import java.util.stream.Stream;
import org.junit.jupiter.api.Named;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import throwbench.solver.drive.DrivingTorque;
import throwbench.solver.drive.SpeedCurve;
import throwbench.solver.machine.Driver;
import throwbench.solver.machine.Machine;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.trial.DrivenMachines;
import throwbench.solver.trial.Machines;

/** Speed over the revolution, against a general integrator, identities and limits. */
class VaryingSpeedTest {

    private static final Driver TORQUE = new Driver.ConstantTorque();
    private static final Driver MOTOR = new Driver.Slip(2400, 0.012);

    static Stream<Named<Machine>> machines() {
        return Stream.of(
                Named.of("offset, constant torque", DrivenMachines.driven(Machines.booster(0.012), TORQUE, 38)),
                Named.of("offset, light flywheel", DrivenMachines.driven(Machines.booster(-0.02), TORQUE, 6)),
                Named.of("upright, motor", DrivenMachines.driven(DrivenMachines.upright(), MOTOR, 12)),
                Named.of("upright, torque", DrivenMachines.driven(DrivenMachines.upright(), TORQUE, 12)),
                Named.of("opposed, motor", DrivenMachines.driven(DrivenMachines.opposedPair(0), MOTOR, 25)),
                Named.of("opposed, guides", DrivenMachines.driven(DrivenMachines.opposedPair(0.08), TORQUE, 9)),
                Named.of("opposed, guides, motor", DrivenMachines.driven(DrivenMachines.opposedPair(0.08), MOTOR, 9)));
    }

    /** Second method: tied bodies by Newton and Euler, integrated by Dormand and Prince's pair of order 8. */
    @ParameterizedTest
    @MethodSource("machines")
    void generalIntegratorGoesRoundWithTheSameSpeedAndTime(Machine machine) {
        RunningMachine running = Machines.running(machine);
        SpeedCurve curve = running.speedCurve();
        TiedBodiesShaft shaft =
                new TiedBodiesShaft(running, machine.drive().rotatingInertia().getAsDouble());
        double[] breaks = BreakAngles.ofMachine(running, 0);
        double[] ends = Arrays.copyOf(breaks, breaks.length + 1);
        ends[breaks.length] = Angles.TURN;
        double[] y = {curve.speedAt(0, Approach.JUST_AFTER), 0};
        for (int i = 0; i < breaks.length; i++) {
            y = shaft.integrate(ends[i], ends[i + 1], y);
            assertEquals(y[0], curve.speedAt(ends[i + 1], Approach.JUST_BEFORE), 1e-8 * curve.meanSpeed());
        }
        assertEquals(Angles.TURN / curve.meanSpeed(), y[1], 1e-9 * y[1], "time of a turn");
    }

    /** Identity: J α = T_driver − Σ throw torque at any angle, with the torque of the columns. */
    @ParameterizedTest
    @MethodSource("machines")
    void accelerationIsWhatTheTorquesLeave(Machine machine) {
        RunningMachine running = Machines.running(machine);
        double inertia = machine.drive().rotatingInertia().getAsDouble();
        DrivingTorque driving = running.speedCurve().driving().orElseThrow();
        Revolution revolution = Revolution.solve(running, 0, 7919);
        double peak = 0;
        for (int i = 0; i < revolution.count(); i++) {
            peak = Math.max(peak, Math.abs(revolution.at(Column.SHAFT_TORQUE, i)));
        }
        for (int i = 0; i < revolution.count(); i++) {
            double angle = Angles.TURN / 7919 * i;
            double alpha = running.speedCurve().accelerationAt(angle, Approach.JUST_AFTER);
            double left = driving.at(revolution.at(Column.SHAFT_SPEED, i)) - revolution.at(Column.SHAFT_TORQUE, i);
            assertEquals(left, inertia * alpha, 1e-7 * peak, "at " + angle);
        }
    }
}
