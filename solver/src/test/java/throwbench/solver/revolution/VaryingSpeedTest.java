package throwbench.solver.revolution;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Arrays;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Named;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import throwbench.solver.balance.TurnQuadrature;
import throwbench.solver.drive.DrivingTorque;
import throwbench.solver.drive.SpeedCurve;
import throwbench.solver.load.ThrowBody;
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

    /** D = ratedTorque / (ratedSlip ω_s): slower by the rated slip of ω_s = ω_mean / (1 − ratedSlip), it gives so much more. */
    @Test
    void motorGivesItsRatedTorqueOverItsRatedSlip() {
        DrivingTorque driving = Machines.running(DrivenMachines.driven(DrivenMachines.upright(), MOTOR, 12))
                .speedCurve()
                .driving()
                .orElseThrow();
        double mean = driving.meanSpeed();
        double synchronous = mean / (1 - 0.012);
        double more = driving.at(mean - 0.012 * synchronous) - driving.at(mean);
        assertEquals(2400, more, 1e-9);
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

    /** Identity: what the driver gives and the load takes in a turn is equal; the mean shaft torque is that of the load. */
    @ParameterizedTest
    @MethodSource("machines")
    void energyOfATurnIsWhatGasAndFrictionTake(Machine machine) {
        RunningMachine running = Machines.running(machine);
        Summary summary = Summary.of(running, 0, Optional.empty());
        double friction = 0;
        for (RunningThrow t : running.throwsInOrder()) {
            friction += 2 * t.body().linkage().stroke() * t.body().friction().packing();
        }
        Instant instant = new Instant(running, 0);
        double[] sums = new double[2];
        DrivingTorque driving = running.speedCurve().driving().orElseThrow();
        TurnQuadrature.over(BreakAngles.ofMachine(running, 0), 0.1, (angle, weight) -> {
            instant.turnTo(angle);
            double speed = instant.at(Column.SHAFT_SPEED);
            sums[0] += weight * driving.at(speed);
            for (int i = 0; i < running.throwsInOrder().size(); i++) {
                double mu = running.throwsInOrder().get(i).body().friction().guideCoefficient();
                sums[1] += weight
                        * mu
                        * Math.abs(instant.at(i, Column.GUIDE_FORCE) * instant.at(i, Column.VELOCITY))
                        / speed;
            }
        });
        double gas = summary.machineFlow().totalPower() / running.turnsPerSecond();
        double taken = gas + friction + sums[1];
        assertEquals(taken, Angles.TURN * summary.meanShaftTorque(), 1e-8 * taken, "mean shaft torque");
        assertEquals(taken, sums[0], 1e-8 * taken, "driver");
    }

    /** Identity: T ω = −(F_gas + F_pk + F_gd) dx/dt + d(KE + PE)/dt, KE of the moving parts at the speed that they have. */
    @ParameterizedTest
    @MethodSource("machines")
    void powerIsThatOfGasAndFrictionAndTheEnergyOfMotion(Machine machine) {
        RunningMachine running = Machines.running(machine);
        Instant instant = new Instant(running, 0);
        double peak = 0;
        for (int i = 0; i < 360; i++) {
            peak = Math.max(peak, Math.abs(instant.turnTo(i * Angles.TURN / 360).at(Column.THROW_TORQUE)));
        }
        RunningThrow t = running.throwsInOrder().get(0);
        double h = 1e-5;
        for (int i = 0; i < 97; i++) {
            double angle = 0.013 + i * Angles.TURN / 97;
            double rise = (energy(instant.turnTo(angle + h), t) - energy(instant.turnTo(angle - h), t)) / (2 * h);
            instant.turnTo(angle);
            double perTurn = -instant.at(Column.VELOCITY) / instant.at(Column.SHAFT_SPEED); // dx/dφ
            double sense = Math.signum(perTurn);
            double mu = t.body().friction().guideCoefficient();
            double force = instant.at(Column.GAS_LOAD)
                    - sense * (t.body().friction().packing() + mu * Math.abs(instant.at(Column.GUIDE_FORCE)));
            // central differences over 2e-5 rad: their third derivatives leave some 1e-9
            assertEquals(-force * perTurn + rise, instant.at(Column.THROW_TORQUE), 1e-7 * peak, "at " + angle);
        }
    }

    /** KE and PE of the parts of the first throw, from places and speeds alone. */
    private static double energy(Instant instant, RunningThrow t) {
        ThrowBody body = t.body();
        double l = body.linkage().rodLength();
        double share = body.rodMassCentre() / l;
        double sign = instant.running().rotation().sign();
        double speed = instant.at(Column.SHAFT_SPEED);
        double r = body.linkage().crankRadius();
        double vx = -instant.at(Column.VELOCITY);
        double pinX = -r * instant.sinPin(0) * sign * speed;
        double pinY = r * instant.cosPin(0) * sign * speed;
        double gx = (1 - share) * pinX + share * vx;
        double gy = (1 - share) * pinY;
        double beta1 = instant.at(Column.ROD_VELOCITY);
        double kinetic = body.masses().total() * vx * vx / 2
                + body.rodMass() * (gx * gx + gy * gy) / 2
                + body.rodInertia() * beta1 * beta1 / 2;
        double x = body.linkage().greatestReach() - instant.at(Column.TRAVEL);
        double up = Math.sin(body.axisDirection());
        double across = Math.cos(body.axisDirection());
        double centreX = (1 - share) * r * instant.cosPin(0) + share * x;
        double centreY =
                (1 - share) * r * instant.sinPin(0) + share * body.linkage().guideOffset();
        double height = body.masses().total() * x * up
                + body.rodMass() * (centreX * up + centreY * across)
                + body.crankNet() * (instant.cosPin(0) * up + instant.sinPin(0) * across);
        return kinetic + body.gravity() * height;
    }

    @ParameterizedTest
    @MethodSource("machines")
    void accelerationIsTheSlopeOfTheSpeed(Machine machine) {
        SpeedCurve curve = Machines.running(machine).speedCurve();
        double h = 1e-6;
        double greatest = 0;
        for (int i = 0; i < 720; i++) {
            greatest = Math.max(greatest, Math.abs(curve.accelerationAt(i * Angles.TURN / 720, Approach.JUST_AFTER)));
        }
        for (int i = 0; i < 501; i++) {
            double angle = i * Angles.TURN / 501 + 0.001;
            double after = curve.speedAt(angle + h, Approach.JUST_AFTER);
            double before = curve.speedAt(angle - h, Approach.JUST_AFTER);
            double slope = (after * after - before * before) / (4 * h);
            assertEquals(slope, curve.accelerationAt(angle, Approach.JUST_AFTER), 2e-6 * greatest, "at " + angle);
        }
    }

    @ParameterizedTest
    @MethodSource("machines")
    void extremesAreThoseOfADenseScan(Machine machine) {
        SpeedCurve curve = Machines.running(machine).speedCurve();
        double greatest = 0;
        double least = Double.MAX_VALUE;
        int count = 200_000;
        for (int i = 0; i < count; i++) {
            double speed = curve.speedAt(i * Angles.TURN / count, Approach.JUST_AFTER);
            greatest = Math.max(greatest, speed);
            least = Math.min(least, speed);
        }
        assertEquals(greatest, curve.greatest(), 1e-9 * greatest);
        assertEquals(least, curve.least(), 1e-9 * least);
    }

    @ParameterizedTest
    @MethodSource("machines")
    void stationsDoNotTouchTheSpeed(Machine machine) {
        RunningMachine running = Machines.running(machine);
        Revolution coarse = Revolution.solve(running, 0, 8);
        Revolution fine = Revolution.solve(running, 0, 36_000);
        for (int i = 0; i < 8; i++) {
            double few = coarse.at(Column.SHAFT_SPEED, i);
            assertEquals(few, fine.at(Column.SHAFT_SPEED, 4500 * i), 1e-12 * few);
            double torque = coarse.at(Column.SHAFT_TORQUE, i);
            assertEquals(torque, fine.at(Column.SHAFT_TORQUE, 4500 * i), 1e-9 * Math.abs(torque) + 1e-7);
        }
    }

    /** An instant of any throw, the rod load's own curve and the columns are the same motion. */
    @ParameterizedTest
    @MethodSource("machines")
    void everyWayOfReadingSeesTheSameSpeed(Machine machine) {
        RunningMachine running = Machines.running(machine);
        int last = running.throwsInOrder().size() - 1;
        Revolution revolution = Revolution.solve(running, last, 360);
        Instant instant = new Instant(running, last);
        RodLoadCurve rodLoad = new RodLoadCurve(running, last);
        for (int i = 0; i < 360; i++) {
            double angle = Angles.TURN / 360 * i;
            double load = revolution.at(Column.ROD_LOAD, i);
            double scale = 1e-12 * Math.max(1e4, Math.abs(load));
            assertEquals(load, instant.turnTo(angle).at(Column.ROD_LOAD), scale);
            assertEquals(load, rodLoad.at(angle, Approach.JUST_AFTER), scale);
            double first = angle + running.angleBetween(last, 0);
            double speed = running.speedCurve().speedAt(first, Approach.JUST_AFTER);
            assertEquals(speed, revolution.at(Column.SHAFT_SPEED, i), 1e-12 * speed);
        }
    }
}
