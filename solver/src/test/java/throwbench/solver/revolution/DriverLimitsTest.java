package throwbench.solver.revolution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import throwbench.solver.drive.WantedInertia;
import throwbench.solver.machine.Driver;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Machine;
import throwbench.solver.trial.DrivenMachines;
import throwbench.solver.trial.Machines;

/** Drivers and flywheels at their limits: none, endless, too little, just as much as is asked for. */
class DriverLimitsTest {

    private static final Driver TORQUE = new Driver.ConstantTorque();
    private static final Driver MOTOR = new Driver.Slip(2400, 0.012);

    /** Limit: without end of inertia nothing is left of the fluctuation, which falls off as 1/J. */
    @Test
    void greatInertiaHoldsTheSpeed() {
        Machine machine = DrivenMachines.upright();
        double once = Machines.running(DrivenMachines.driven(machine, TORQUE, 1e6))
                .speedCurve()
                .fluctuation();
        double tenfold = Machines.running(DrivenMachines.driven(machine, TORQUE, 1e7))
                .speedCurve()
                .fluctuation();
        assertEquals(10, once / tenfold, 1e-4);
        RunningMachine steady = Machines.running(machine);
        RunningMachine heavy = Machines.running(DrivenMachines.driven(machine, TORQUE, 1e9));
        sameColumns(steady, heavy, 1e-7);
    }

    /** Limit: a motor without slip holds the speed whatever the inertia; the fluctuation falls off with the slip. */
    @Test
    void tinySlipHoldsTheSpeed() {
        Machine machine = DrivenMachines.upright();
        double tiny = Machines.running(DrivenMachines.driven(machine, new Driver.Slip(2400, 1e-5), 2))
                .speedCurve()
                .fluctuation();
        double tinier = Machines.running(DrivenMachines.driven(machine, new Driver.Slip(2400, 1e-6), 2))
                .speedCurve()
                .fluctuation();
        assertEquals(10, tiny / tinier, 1e-2);
        RunningMachine steady = Machines.running(machine);
        RunningMachine stiff = Machines.running(DrivenMachines.driven(machine, new Driver.Slip(2400, 1e-8), 2));
        sameColumns(steady, stiff, 1e-5);
    }

    private static void sameColumns(RunningMachine one, RunningMachine other, double share) {
        Revolution a = Revolution.solve(one, 0, 720);
        Revolution b = Revolution.solve(other, 0, 720);
        for (Column column : List.of(Column.SHAFT_SPEED, Column.ACCELERATION, Column.ROD_LOAD, Column.THROW_TORQUE)) {
            double peak = 0;
            for (int i = 0; i < 720; i++) {
                peak = Math.max(peak, Math.abs(a.at(column, i)));
            }
            for (int i = 0; i < 720; i++) {
                assertEquals(a.at(column, i), b.at(column, i), share * peak, column + " at station " + i);
            }
        }
    }

    /** Indicated work does not ask how fast it is done: ∮ p dV of a turn, and its power at the mean speed. */
    @Test
    void indicatedPowerIsThatOfConstantSpeed() {
        Machine machine = DrivenMachines.upright();
        double steady = Summary.of(Machines.running(machine), 0, Optional.empty())
                .throwFlow()
                .totalPower();
        Machine swinging = DrivenMachines.driven(machine, TORQUE, 2);
        double varying = Summary.of(Machines.running(swinging), 0, Optional.empty())
                .throwFlow()
                .totalPower();
        assertEquals(steady, varying, 1e-10 * steady);
    }

    @Test
    void shaftWithoutInertiaIsRefusedWhereItIsGiven() {
        Machine machine = DrivenMachines.driven(DrivenMachines.upright(), TORQUE, 0);
        Settling settling = RunningMachine.settle(machine, machine.dutyPoints().get(0));
        assertEquals(
                List.of(new Refusal(
                        "drive.rotatingInertia", "a constant-torque driver needs a rotatingInertia above 0")),
                settling.refusals());
    }

    /** At a tenth of the speed the moving parts hold a hundredth of the energy: the load would stop the shaft. */
    @Test
    void shaftThatWouldStopIsRefusedWithBothEnergies() {
        Machine machine = DrivenMachines.driven(DrivenMachines.upright(), TORQUE, 0.5);
        DutyPoint slow = DrivenMachines.at(machine.dutyPoints().get(0), 7);
        Settling settling = RunningMachine.settle(machine, slow);
        assertTrue(settling.running().isEmpty());
        Refusal refusal = settling.refusals().get(0);
        assertEquals("drive.rotatingInertia", refusal.path());
        assertTrue(
                refusal.sentence()
                        .matches(
                                "no speed is found that repeats: the load takes up to [0-9]+ J from the shaft "
                                        + "within a turn, and 0\\.5 kg m2 hold 12\\.25 J at the mean speed; wanted more rotatingInertia"),
                refusal.sentence());
    }

    /** The inertia found for a fluctuation has it; for a driver of one speed it is that of constant torque. */
    @Test
    void flywheelMeetsTheFluctuationAskedFor() {
        Machine machine = DrivenMachines.driven(DrivenMachines.opposedPair(0.08), MOTOR, 9);
        double inertia =
                Flywheel.inertiaFor(Machines.running(machine), 0.01).inertia().orElseThrow();
        Machine sized = DrivenMachines.driven(machine, MOTOR, inertia);
        assertEquals(0.01, Machines.running(sized).speedCurve().fluctuation(), 1e-9);

        Machine steady = DrivenMachines.upright();
        double wheel =
                Flywheel.inertiaFor(Machines.running(steady), 0.005).inertia().orElseThrow();
        Machine swinging = DrivenMachines.driven(steady, TORQUE, wheel);
        assertEquals(0.005, Machines.running(swinging).speedCurve().fluctuation(), 1e-9);
    }

    @Test
    void flywheelThatNothingAsksForIsSaidToBeNone() {
        Machine machine = DrivenMachines.driven(DrivenMachines.upright(), new Driver.Slip(2400, 1e-4), 1);
        WantedInertia wanted = Flywheel.inertiaFor(Machines.running(machine), 0.5);
        assertTrue(wanted.inertia().isEmpty());
        assertEquals("the speed fluctuates less than that with no rotating inertia at all", wanted.reason());
    }
}
