package throwbench.solver.revolution;

import throwbench.solver.drive.SpeedCurve;
import throwbench.solver.drive.WantedInertia;
import throwbench.solver.machine.Driver;

/** Sizes the rotating inertia of a running machine. */
public final class Flywheel {

    private static final double ANY_INERTIA = 10;

    private Flywheel() {}

    /**
     * The rotating inertia with which the coefficient of fluctuation, (ω_max − ω_min)/ω_mean, is a wanted one. A machine whose
     * driver holds one speed is taken with a driver of constant torque, for which flywheels are sized.
     *
     * @param fluctuation above 0
     */
    public static WantedInertia inertiaFor(RunningMachine running, double fluctuation) {
        RunningMachine steady = running.turning(SpeedCurve.constant(running.meanSpeed()));
        Driver driver = running.machine().drive().driver();
        Driver swinging = driver instanceof Driver.ConstantSpeed ? new Driver.ConstantTorque() : driver;
        double guess = running.machine().drive().rotatingInertia().orElse(ANY_INERTIA);
        return WantedInertia.find(
                fluctuation, guess > 0 ? guess : ANY_INERTIA, j -> VaryingSpeed.solve(steady, swinging, j));
    }
}
