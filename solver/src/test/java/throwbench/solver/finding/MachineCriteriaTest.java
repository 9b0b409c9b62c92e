package throwbench.solver.finding;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.load.Crank;
import throwbench.solver.load.ReciprocatingMasses;
import throwbench.solver.machine.Driver;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Parts;
import throwbench.solver.machine.ShaftPlace;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Revolution;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.trial.DrivenMachines;
import throwbench.solver.trial.JudgedMachine;
import throwbench.solver.trial.Machines;

/** What is judged of the machine as a whole, against closed forms and a second method. */
class MachineCriteriaTest {

    private static final double OMEGA = 740 * Math.PI / 30;

    private static Finding only(Machine machine, String id) {
        List<Finding> found = Judgement.of(machine, machine.dutyPoints()).findings().stream()
                .filter(f -> f.criterion().id().equals(id))
                .toList();
        assertEquals(1, found.size(), id);
        return found.get(0);
    }

    private static double value(Machine machine, String id) {
        return only(machine, id).value().orElseThrow();
    }

    /** A massless connecting rod: what reciprocates moves exactly as the crosshead does. */
    private static Throw bare(String name, ShaftPlace place, double unbalance) {
        Throw t = Machines.boosterThrow(0);
        return new Throw(
                name,
                place,
                new Linkage(0.075, 0.3, 0),
                new ReciprocatingMasses(60, 0, 40),
                new ConnectingRod(0, OptionalDouble.empty(), OptionalDouble.empty()),
                new Crank(unbalance, 0),
                t.friction(),
                t.chambers().stream()
                        .map(c -> Machines.renamed(c, name + " " + c.name()))
                        .toList(),
                Parts.NONE,
                Limits.NONE);
    }

    private static Machine of(Throw... throwsInOrder) {
        return Machines.of(
                List.of(throwsInOrder),
                Rotation.COUNTER_CLOCKWISE,
                Machines.booster(0).site(),
                Machines.boosterDuty(Map.of()),
                Limits.NONE);
    }

    /** r A_2 of x″ at l/r = 4, A_2 = λ + λ³/4 + 15 λ⁵/128 + 35 λ⁷/512 + …: every text on engine balance. */
    private static double secondOrder() {
        double q = 0.25;
        // the next term, of order λ⁹, is below 3e-7 of the first
        return 0.075 * (q + Math.pow(q, 3) / 4 + 15 * Math.pow(q, 5) / 128 + 35 * Math.pow(q, 7) / 512);
    }

    @Test
    void aSingleThrowShakesWithItsReciprocatingMassAlongItsStroke() {
        Machine machine = of(bare("A", new ShaftPlace(0, Math.PI / 6, 0), 0));
        double primary = 100 * 0.075 * OMEGA * OMEGA;
        assertEquals(primary, value(machine, "shaking-force-primary"), 1e-10 * primary);
        assertEquals(
                "greatest along 30.0 deg from X, none across it; no limit given",
                only(machine, "shaking-force-primary").note());
        double secondary = 100 * secondOrder() * OMEGA * OMEGA;
        assertEquals(secondary, value(machine, "shaking-force-secondary"), 1e-6 * secondary);
        assertEquals(0, value(machine, "shaking-couple-primary"));
        assertEquals(0, value(machine, "shaking-couple-secondary"));
    }

    @Test
    void twoCranksOpposedInOneLineTradeTheirForceForACouple() {
        double d = 0.4;
        Machine machine = of(bare("A", new ShaftPlace(0, 0, 1), 0), bare("B", new ShaftPlace(Math.PI, 0, 1 + d), 0));
        double couple = 100 * 0.075 * OMEGA * OMEGA * d;
        assertEquals(0, value(machine, "shaking-force-primary"));
        assertEquals(
                "cancels within the machine; no limit given",
                only(machine, "shaking-force-primary").note());
        assertEquals(couple, value(machine, "shaking-couple-primary"), 1e-9 * couple);
        // the second orders are in step: twice the force, no couple
        double secondary = 2 * 100 * secondOrder() * OMEGA * OMEGA;
        assertEquals(secondary, value(machine, "shaking-force-secondary"), 1e-6 * secondary);
        assertEquals(0, value(machine, "shaking-couple-secondary"));
    }

    @Test
    void twoThrowsAtRightAnglesOnOneCrankTurnTheirForceWithTheShaft() {
        // the classic V of 90 degrees: one force of the size of one throw's, turning with the crank
        Machine machine = of(bare("A", new ShaftPlace(0, 0, 0), 0), bare("B", new ShaftPlace(0, Math.PI / 2, 0), 0));
        double primary = 100 * 0.075 * OMEGA * OMEGA;
        assertEquals(primary, value(machine, "shaking-force-primary"), 1e-10 * primary);
        assertEquals(
                "equally great all round, turning with the shaft; no limit given",
                only(machine, "shaking-force-primary").note());
    }

    @Test
    void anUnbalancedCrankAddsToTheForceAlongTheStrokeAndShowsAcrossIt() {
        Machine machine = of(bare("A", new ShaftPlace(0, 0, 0), 2));
        double along = (100 * 0.075 + 2) * OMEGA * OMEGA;
        assertEquals(along, value(machine, "shaking-force-primary"), 1e-10 * along);
        String across = String.format(Locale.ROOT, "%.4g", 2 * OMEGA * OMEGA / 1e3);
        assertEquals(
                "greatest along 0.0 deg from X, " + across + " kN across it; no limit given",
                only(machine, "shaking-force-primary").note());
    }

    @Test
    void indicatedPowerIsThatOfTheClosedFormAndShaftPowerMoreByTheEfficiency() {
        JudgedMachine file = JudgedMachine.twoStages()
                .with(
                        "\"compressionExponent\": 1.25, \"expansionExponent\": 1.2",
                        "\"compressionExponent\": 1.25," + " \"expansionExponent\": 1.25");
        // n/(n−1) p₁ V_in ((p₂/p₁)^((n−1)/n) − 1) a turn with both exponents n; 10 turns a second
        double stroke = Math.sqrt(0.44 * 0.44 - 0.005 * 0.005) - Math.sqrt(0.28 * 0.28 - 0.005 * 0.005);
        double head = work(Math.PI / 4 * 0.3 * 0.3 * stroke, 0.12, 1.2e5, 4e5);
        double crank = work(Math.PI / 4 * (0.3 * 0.3 - 0.06 * 0.06) * stroke, 0.15, 1.2e5, 4e5);
        double second = work(Math.PI / 4 * 0.21 * 0.21 * 0.16, 0.10, 4e5, 9e5);
        double power = 10 * (head + crank + second);
        assertEquals(power, file.value("indicated-power", ""), 1e-9 * power);
        assertEquals(power / 0.92, file.value("shaft-power", ""), 1e-9 * power);
        assertEquals(
                "mechanical efficiency 92.00 %; no limit given",
                file.finding("shaft-power", "").note());
    }

    private static double work(double swept, double clearance, double p1, double p2) {
        double n = 1.25;
        double inlet = swept * (1 + clearance - clearance * Math.pow(p2 / p1, 1 / n));
        return n / (n - 1) * p1 * inlet * (Math.pow(p2 / p1, (n - 1) / n) - 1);
    }

    @Test
    void peakToMeanTorqueIsThatOfTheStations() {
        RunningMachine running = Machines.running(JudgedMachine.twoStages().machine());
        int count = 36_000;
        Revolution stations = Revolution.solve(running, 0, count);
        double peak = 0;
        double sum = 0;
        for (int i = 0; i < count; i++) {
            peak = Math.max(peak, Math.abs(stations.at(Column.SHAFT_TORQUE, i)));
            sum += stations.at(Column.SHAFT_TORQUE, i);
        }
        double expected = peak / Math.abs(sum / count);
        // packing friction steps at the dead centres: a sum over stations is off by a station's share of it
        assertEquals(expected, JudgedMachine.twoStages().value("peak-to-mean-torque", ""), 1e-4 * expected);
    }

    @Test
    void aMachineThatDoesNoWorkHasNoPeakToMeanTorque() {
        JudgedMachine idle = JudgedMachine.twoStages()
                .with("\"400 N\"", "\"0 N\"")
                .with("\"guideCoefficient\": 0.03", "\"guideCoefficient\": 0")
                .with(
                        "{ \"name\": \"normal\"",
                        "{ \"name\": \"normal\", \"chambers\": { \"A head\": { \"state\": \"held-open\" }, \"A crank\":"
                                + " { \"state\": \"held-open\" }, \"B head\": { \"state\": \"held-open\" } }");
        Finding finding = idle.finding("peak-to-mean-torque", "");
        assertEquals("the mean torque is 0", finding.note());
        assertEquals(OptionalDouble.empty(), finding.value());
    }

    @Test
    void speedFluctuationIsThatOfTheSpeedCurve() {
        Machine steady = Machines.booster(0);
        assertEquals(0, value(steady, "speed-fluctuation"));
        assertEquals(
                "the driver holds the speed constant; no limit given",
                only(steady, "speed-fluctuation").note());
        Machine driven = DrivenMachines.driven(steady, new Driver.ConstantTorque(), 38);
        Revolution stations = Revolution.solve(Machines.running(driven), 0, 36_000);
        double least = Double.POSITIVE_INFINITY;
        double greatest = 0;
        for (int i = 0; i < stations.count(); i++) {
            least = Math.min(least, stations.at(Column.SHAFT_SPEED, i));
            greatest = Math.max(greatest, stations.at(Column.SHAFT_SPEED, i));
        }
        double expected = (greatest - least) / OMEGA;
        assertEquals(expected, value(driven, "speed-fluctuation"), 1e-6 * expected);
    }
}
