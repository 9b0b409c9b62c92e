package throwbench.solver.revolution;

import static org.junit.jupiter.api.Assertions.assertEquals;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import throwbench.solver.balance.TurnQuadrature;
import throwbench.solver.drive.DrivingTorque;
import throwbench.solver.drive.SpeedCurve;
import throwbench.solver.machine.Driver;
import throwbench.solver.machine.Machine;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.trial.AnyMachine;
import throwbench.solver.trial.DrivenMachines;
import throwbench.solver.trial.Machines;

/** Any machine on any driver, with an inertia from light to heavy. */
class AnySpeedPropertyTest {

    /**
     * Identities: J α = T_driver − Σ throw torque, a turn takes its time, and the curve closes.
     *
     * @param share energy of the rotating inertia over what the greatest torque does in one radian
     */
    @Property(tries = 150)
    void torquesBalanceAndTheMeanSpeedIsKept(
            @ForAll(supplier = AnyMachine.class) Machine any,
            @ForAll @DoubleRange(min = 3, max = 40) double share,
            @ForAll @DoubleRange(min = 0.2, max = 10) double slipPercent,
            @ForAll boolean motor) {
        Revolution steady = Revolution.solve(Machines.running(any), 0, 360);
        double peak = 0;
        for (int i = 0; i < 360; i++) {
            peak = Math.max(peak, Math.abs(steady.at(Column.SHAFT_TORQUE, i)));
        }
        double mean = steady.running().meanSpeed();
        double inertia = share * 2 * peak / (mean * mean);
        Driver driver = motor ? new Driver.Slip(peak, slipPercent / 100) : new Driver.ConstantTorque();
        RunningMachine running = Machines.running(DrivenMachines.driven(any, driver, inertia));
        SpeedCurve curve = running.speedCurve();
        DrivingTorque driving = curve.driving().orElseThrow();
        Instant instant = new Instant(running, 0);
        double[] time = new double[1];
        TurnQuadrature.over(
                BreakAngles.ofMachine(running, 0),
                0.05,
                (angle, weight) -> time[0] += weight / curve.speedAt(angle, Approach.JUST_AFTER));
        assertEquals(Angles.TURN / mean, time[0], 1e-8 * time[0]);
        for (int i = 0; i < 359; i++) {
            instant.turnTo(Angles.TURN / 359 * i);
            double left = driving.at(instant.at(Column.SHAFT_SPEED)) - instant.at(Column.SHAFT_TORQUE);
            assertEquals(left, inertia * instant.shaftAcceleration(), 1e-6 * peak, "at station " + i);
        }
        double first = curve.speedAt(0, Approach.JUST_AFTER);
        assertEquals(first, curve.speedAt(0, Approach.JUST_BEFORE), 1e-10 * first);
    }
}
