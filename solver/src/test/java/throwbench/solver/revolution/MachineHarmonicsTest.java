package throwbench.solver.revolution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.transform.DftNormalization;
import org.apache.commons.math3.transform.FastFourierTransformer;
import org.apache.commons.math3.transform.TransformType;
import org.junit.jupiter.api.Test;
import throwbench.solver.balance.Counterweights;
import throwbench.solver.balance.Harmonic;
import throwbench.solver.balance.OrderVector;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.load.Crank;
import throwbench.solver.load.Friction;
import throwbench.solver.machine.Driver;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.ShaftPlace;
import throwbench.solver.machine.Site;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.trial.DrivenMachines;
import throwbench.solver.trial.Machines;

/** Harmonics, what standard arrangements cancel, and counterweights. */
class MachineHarmonicsTest {

    private static final int SAMPLES = 1 << 15;

    private static Throw placed(String name, double phaseDeg, double axisDeg, double position) {
        Throw t = Machines.boosterThrow(0);
        return new Throw(
                name,
                new ShaftPlace(Math.toRadians(phaseDeg), Math.toRadians(axisDeg), position),
                new Linkage(0.075, 0.4, 0),
                t.masses(),
                new ConnectingRod(55, OptionalDouble.of(0.13), OptionalDouble.of(1.35)),
                new Crank(0, 0),
                Friction.NONE,
                t.chambers(),
                t.parts(),
                t.limits());
    }

    private static RunningMachine running(Rotation rotation, List<Throw> throwsInOrder) {
        return Machines.running(Machines.of(
                throwsInOrder,
                rotation,
                new Site(101_325, 101_325, false),
                Machines.boosterDuty(Map.of()),
                Limits.NONE));
    }

    private static RunningMachine arranged(double[] phases, double[] axes) {
        List<Throw> all = new ArrayList<>();
        for (int i = 0; i < phases.length; i++) {
            all.add(placed("T" + i, phases[i], axes[i % axes.length], 0.5 * i));
        }
        return running(Rotation.COUNTER_CLOCKWISE, all);
    }

    /** Second method: a fast Fourier transform of a fine revolution; kinks leave it an error that falls off as 1/N². */
    @Test
    void fourierTransformOfAFineRevolutionHasTheSameHarmonics() {
        for (Driver driver : List.of(new Driver.ConstantSpeed(), new Driver.ConstantTorque())) {
            Machine machine = DrivenMachines.driven(DrivenMachines.opposedPair(0.08), driver, 9);
            RunningMachine running = Machines.running(machine);
            MachineHarmonics harmonics = MachineHarmonics.of(running);
            Revolution fine = Revolution.solve(running, 0, SAMPLES);
            against(fine, 0, Column.SHAFT_TORQUE, harmonics.shaftTorque());
            against(fine, 0, Column.THROW_TORQUE, harmonics.throwTorques().get(0));
            against(fine, 1, Column.THROW_TORQUE, harmonics.throwTorques().get(1));
            against(fine, 0, Column.SHAKING_FORCE_X, harmonics.forceX());
            against(fine, 0, Column.SHAKING_FORCE_Y, harmonics.forceY());
            against(fine, 0, Column.SHAKING_COUPLE_X, harmonics.coupleX());
            against(fine, 0, Column.SHAKING_COUPLE_Y, harmonics.coupleY());
            against(fine, 1, Column.ROD_LOAD, MachineHarmonics.ofColumn(running, 1, Column.ROD_LOAD, 48));
        }
    }

    private static void against(Revolution fine, int throwIndex, Column column, List<Harmonic> found) {
        double[] values = new double[SAMPLES];
        double peak = 0;
        for (int i = 0; i < SAMPLES; i++) {
            values[i] = fine.at(throwIndex, column, i);
            peak = Math.max(peak, Math.abs(values[i]));
        }
        Complex[] lines =
                new FastFourierTransformer(DftNormalization.STANDARD).transform(values, TransformType.FORWARD);
        for (Harmonic harmonic : found) {
            Complex line = lines[harmonic.order()].multiply(2.0 / SAMPLES);
            double reach = 1e-7 * peak;
            assertEquals(line.getReal(), harmonic.cos(), reach, () -> column + " " + harmonic);
            assertEquals(-line.getImaginary(), harmonic.sin(), reach, () -> column + " " + harmonic);
        }
        assertEquals(found.size(), found.get(found.size() - 1).order());
    }

    /** Identity: a torque is its mean and its harmonics (Parseval), as far as 24 orders go. */
    @Test
    void amplitudeIsThatOfTheSumOfSquares() {
        Harmonic harmonic = new Harmonic(5, -3, 4);
        assertEquals(5, harmonic.amplitude());
        assertEquals(-3 * Math.cos(2) + 4 * Math.sin(2), harmonic.at(0.4), 1e-15);
    }

    /** What these arrangements cancel, with exact motion and rigid rods: standard balancing results, from symmetry. */
    @Test
    void standardArrangementsCancelWhatTheyShould() {
        double[] one = {0};
        double[] opposed = {0, 180};
        vanishes(arranged(new double[] {0, 180}, opposed), new int[] {1, 2, 3, 4}, new int[] {});
        vanishes(arranged(new double[] {0, 120, 240}, one), new int[] {1, 2, 4, 5, 7, 8}, new int[] {3, 6});
        vanishes(arranged(new double[] {0, 120, 240, 240, 120, 0}, one), new int[] {1, 2, 3, 4, 5}, new int[] {
            1, 2, 3, 4, 5, 6
        });
        vanishes(arranged(new double[] {0, 180, 90, 270}, opposed), new int[] {1, 2, 3, 4}, new int[] {2, 6});
        vanishes(arranged(new double[] {0, 180, 120, 300, 240, 60}, opposed), new int[] {1, 2, 3, 4, 5, 6}, new int[] {
            1, 2, 3, 4
        });
    }

    private static void vanishes(RunningMachine running, int[] forces, int[] couples) {
        MachineHarmonics harmonics = MachineHarmonics.of(running);
        double single = MachineHarmonics.of(arranged(new double[] {0}, new double[] {0}))
                .force(1)
                .size();
        for (int order : forces) {
            assertEquals(0, harmonics.force(order).size(), 1e-11 * single, "force of order " + order);
        }
        for (int order : couples) {
            assertEquals(0, harmonics.couple(order).size(), 1e-11 * single, "couple of order " + order);
        }
    }

    /** Two in a V of 90° on one pin: the primary force has one length all round, and the usual counterweight takes it off. */
    @Test
    void counterweightTakesOffThePrimaryForceOfAVOfNinetyDegrees() {
        for (Rotation rotation : Rotation.values()) {
            List<Throw> pair = List.of(placed("A", 20, 0, 0), placed("B", 20, 90, 0));
            RunningMachine bare = running(rotation, pair);
            OrderVector primary = MachineHarmonics.of(bare).force(1);
            assertEquals(primary.size(), primary.leastSize(), 1e-11 * primary.size());
            assertTrue(primary.direction().isEmpty());
            // one pin: each throw balanced by itself, all that turns and half of what reciprocates, balances the pair
            List<Throw> balanced = pair.stream()
                    .map(t -> counterweight(t, Counterweights.usual(t, Counterweights.CUSTOMARY_SHARE)))
                    .toList();
            OrderVector left = MachineHarmonics.of(running(rotation, balanced)).force(1);
            assertEquals(0, left.size(), 1e-11 * primary.size());
        }
    }

    /** A single crank keeps half the primary force of its reciprocating masses (B1 of the printed arrangements). */
    @Test
    void usualCounterweightHalvesThePrimaryForceOfOneCrank() {
        Throw bare = placed("A", 0, 0, 0);
        RunningMachine running =
                running(Rotation.COUNTER_CLOCKWISE, List.of(counterweight(bare, Counterweights.usual(bare, 0.5))));
        double reciprocating = bare.masses().total() + 55 * 0.13 / 0.4;
        double whole = reciprocating * 0.075 * running.meanSpeed() * running.meanSpeed();
        OrderVector primary = MachineHarmonics.of(running).force(1);
        assertEquals(whole / 2, primary.size(), 1e-11 * whole);
        assertEquals(whole / 2, primary.leastSize(), 1e-11 * whole);
        Throw turningOnly = counterweight(bare, Counterweights.usual(bare, 0));
        OrderVector along = MachineHarmonics.of(running(Rotation.COUNTER_CLOCKWISE, List.of(turningOnly)))
                .force(1);
        assertEquals(whole, along.size(), 1e-11 * whole);
        assertEquals(0, along.leastSize(), 1e-11 * whole);
        assertEquals(0, Math.sin(along.direction().orElseThrow()), 1e-9);
    }

    /** What is advised leaves only the part that turns against the shaft, and no other weights near it do better. */
    @Test
    void advisedCounterweightsLeaveTheLeastPrimaryForce() {
        List<Throw> odd = List.of(placed("A", 10, 0, 0), placed("B", 130, 60, 0.4), placed("C", 215, 200, 0.9));
        for (Rotation rotation : Rotation.values()) {
            RunningMachine bare = running(rotation, odd);
            List<CounterweightAdvice> advice = CounterweightAdvice.of(bare, MachineHarmonics.of(bare));
            double against = MachineHarmonics.of(bare)
                    .force(1)
                    .length(rotation == Rotation.CLOCKWISE ? Rotation.COUNTER_CLOCKWISE : Rotation.CLOCKWISE);
            double least = primary(rotation, odd, advice, 0, 0);
            assertEquals(against, least, 1e-10 * against);
            for (int i = 0; i < 3; i++) {
                // the force of a counterweight turns: a change of it adds in full
                double unit = bare.meanSpeed() * bare.meanSpeed();
                assertEquals(least + 0.3 * unit, primary(rotation, odd, advice, i, 0.3), 1e-9 * least);
                assertEquals(least + 0.3 * unit, primary(rotation, odd, advice, i, -0.3), 1e-9 * least);
            }
        }
    }

    private static double primary(
            Rotation rotation, List<Throw> bare, List<CounterweightAdvice> advice, int changed, double change) {
        List<Throw> all = new ArrayList<>();
        for (int i = 0; i < bare.size(); i++) {
            double weight = advice.get(i).leastPrimaryForce() + (i == changed ? change : 0);
            all.add(counterweight(bare.get(i), weight));
        }
        return MachineHarmonics.of(running(rotation, all)).force(1).size();
    }

    private static Throw counterweight(Throw t, double counterweight) {
        return new Throw(
                t.name(),
                t.place(),
                t.linkage(),
                t.masses(),
                t.connectingRod(),
                new Crank(t.crank().unbalance(), counterweight),
                t.friction(),
                t.chambers(),
                t.parts(),
                t.limits());
    }
}
