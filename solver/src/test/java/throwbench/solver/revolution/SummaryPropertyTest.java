package throwbench.solver.revolution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import throwbench.solver.load.Friction;
import throwbench.solver.machine.Machine;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.trial.AnyMachine;
import throwbench.solver.trial.Machines;

/** What a revolution comes to, against identities and against a brute search. */
class SummaryPropertyTest {

    /** Over a turn the shaft takes up what the gas takes up and what friction wastes: 2π T = W_i + W_f. */
    @Property(tries = 100)
    void meanTorqueIsIndicatedAndFrictionWork(@ForAll(supplier = AnyMachine.class) Machine machine) {
        RunningMachine running = Machines.running(machine);
        Summary summary = Summary.of(running, 0, Optional.empty());
        Friction friction = machine.throwsInOrder().get(0).friction();
        double stroke = machine.throwsInOrder().get(0).linkage().stroke();
        Instant instant = new Instant(running, 0);
        double guided = friction.guideCoefficient()
                * integral(running, angle -> {
                    instant.turnTo(angle);
                    return Math.abs(instant.at(Column.GUIDE_FORCE) * instant.at(Column.VELOCITY)) / running.meanSpeed();
                });
        double indicated = summary.throwFlow().totalPower() / running.turnsPerSecond();
        double frictionWork = 2 * stroke * friction.packing() + guided;
        double scale = Math.abs(indicated) + Math.abs(frictionWork) + peakTorque(summary);
        assertEquals(indicated + frictionWork, Angles.TURN * summary.meanThrowTorque(), 1e-9 * scale);
    }

    /** Gauss–Legendre between break angles and the guide force's sign changes, found by a dense scan. */
    private static double integral(RunningMachine running, UnivariateFunction f) {
        Instant instant = new Instant(running, 0);
        UnivariateFunction guide = angle -> instant.turnTo(angle).at(Column.GUIDE_FORCE);
        double[] breaks = BreakAngles.ofMachine(running, 0);
        double[] pieces = DoubleStream.concat(
                        Arrays.stream(breaks),
                        DoubleStream.iterate(0, i -> i + 1).limit(2000).map(i -> i * Angles.TURN / 2000))
                .sorted()
                .toArray();
        GaussIntegratorFactory rules = new GaussIntegratorFactory();
        double sum = 0;
        for (int i = 0; i < pieces.length; i++) {
            double from = pieces[i];
            double to = i + 1 < pieces.length ? pieces[i + 1] : Angles.TURN;
            if (to - from < 1e-8) {
                continue;
            }
            double inside = 3e-9;
            boolean changes = guide.value(from + inside) * guide.value(to - inside) < 0;
            double cut =
                    changes ? new BrentSolver(1e-14).solve(200, guide, from + inside, to - inside) : (from + to) / 2;
            sum += rules.legendre(8, from, cut).integrate(f)
                    + rules.legendre(8, cut, to).integrate(f);
        }
        return sum;
    }

    private static double peakTorque(Summary summary) {
        Extremes torque = summary.extremes(Column.THROW_TORQUE);
        return Math.max(torque.greatest().value(), -torque.least().value());
    }

    @Property(tries = 100)
    void extremesAreValuesOfTheCurveAndNoSampleExceedsThem(@ForAll(supplier = AnyMachine.class) Machine machine) {
        RunningMachine running = Machines.running(machine);
        Summary summary = Summary.of(running, 0, Optional.empty());
        Revolution fine = Revolution.solve(running, 0, 7919);
        Instant instant = new Instant(running, 0);
        for (Column column : Column.values()) {
            if (column == Column.CRANK_ANGLE) {
                continue;
            }
            Extremes extremes = summary.extremes(column);
            double rounding = 1e-12 * magnitude(extremes) + noise(running, column);
            // a top that is flat beyond the square (inertia at crank-end dead centre, l/r = 4) is found less sharply
            double found = 1e-9 * magnitude(extremes) + noise(running, column);
            for (int i = 0; i < fine.count(); i++) {
                double value = fine.at(column, i);
                assertTrue(
                        value <= extremes.greatest().value() + found
                                && value >= extremes.least().value() - found,
                        () -> column + " " + value + " outside " + extremes);
            }
            for (Extreme extreme : List.of(extremes.least(), extremes.greatest())) {
                double after = instant.turnTo(extreme.crankAngle()).at(column);
                double before = instant.turnTo(extreme.crankAngle(), Approach.JUST_BEFORE)
                        .at(column);
                assertEquals(
                        0,
                        Math.min(Math.abs(after - extreme.value()), Math.abs(before - extreme.value())),
                        rounding,
                        () -> column + " has " + extreme + ", the curve has " + after + " or " + before);
            }
        }
    }

    private static double magnitude(Extremes extremes) {
        return Math.max(
                Math.abs(extremes.greatest().value()), Math.abs(extremes.least().value()));
    }

    /** What throws that cancel leave of rounding. */
    private static double noise(RunningMachine running, Column column) {
        double sum = 0;
        for (RunningThrow t : running.throwsInOrder()) {
            double mass = t.body().masses().total() + t.body().rodMass();
            double moment =
                    mass * t.body().linkage().crankRadius() + Math.abs(t.body().crankNet());
            sum += moment * running.meanSpeed() * running.meanSpeed();
        }
        return column.ofMachine() ? 1e-12 * sum : 0;
    }

    @Property(tries = 200)
    void signChangesAlternateAndSpansFillTheTurn(@ForAll(supplier = AnyMachine.class) Machine machine) {
        RunningMachine running = Machines.running(machine);
        Traces traces = Traces.of(running, 0, Optional.empty());
        Reversal reversal = Reversal.of(Traces.rodLoad(traces.revolution()));
        List<SignChange> changes = reversal.signChanges();
        assertEquals(0, changes.size() % 2, "as many to tension as to compression");
        for (int i = 0; i < changes.size(); i++) {
            SignChange next = changes.get((i + 1) % changes.size());
            assertEquals(!changes.get(i).toTension(), next.toTension(), "they alternate");
        }
        double sum =
                reversal.spans().stream().mapToDouble(Reversal.Span::length).sum();
        assertEquals(Angles.TURN, sum, 1e-12);

        // second method: signs of many samples against the spans
        Instant instant = new Instant(running, 0);
        int count = 1009;
        double scale = 1e-9 * traces.revolution().at(Column.ROD_LOAD, 0);
        for (int i = 0; i < count; i++) {
            double angle = Angles.TURN / count * i;
            double load = instant.turnTo(angle).at(Column.ROD_LOAD);
            boolean tension = reversal.spans().stream()
                    .filter(s -> Angles.wrap(angle - s.from()) <= s.length())
                    .findFirst()
                    .orElseThrow()
                    .inTension();
            if (Math.abs(load) > Math.abs(scale)) {
                assertEquals(load > 0, tension, "at " + angle + " the rod load is " + load);
            }
        }
        for (SignChange change : changes) {
            double before = instant.turnTo(change.crankAngle() - 2e-9).at(Column.ROD_LOAD);
            double after = instant.turnTo(change.crankAngle() + 2e-9).at(Column.ROD_LOAD);
            assertTrue(before * after < 0, () -> "at " + change + ": " + before + ", " + after);
            assertEquals(after > 0, change.toTension());
        }
    }
}
