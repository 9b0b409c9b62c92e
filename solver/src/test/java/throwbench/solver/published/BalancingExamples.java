package throwbench.solver.published;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.load.Crank;
import throwbench.solver.load.Friction;
import throwbench.solver.load.ReciprocatingMasses;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Parts;
import throwbench.solver.machine.ShaftPlace;
import throwbench.solver.machine.Site;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.revolution.CounterweightAdvice;
import throwbench.solver.revolution.MachineHarmonics;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.trial.Machines;

/**
 * Arrangements of cranks as the solver balances them. The printed figures hold two terms of the piston's acceleration: the
 * machine has rods so long that they are exact, and its order 2 is brought to the printed l/r in proportion.
 */
final class BalancingExamples {

    /** l/r: the third term is (r/l)²/4 of the second, rounding grows with l/r. */
    private static final double RODS = 3e4;

    private static final double SPACING = 0.4;

    static final Map<String, ToDoubleFunction<PublishedRow>> BY_QUANTITY = Map.of(
            "primary force / F'", row -> harmonics(row).force(1).size() / primary(row),
            "secondary force / F''", row -> harmonics(row).force(2).size() / primary(row) * RODS,
            "primary couple / (F' D)", row -> harmonics(row).couple(1).size() / (primary(row) * SPACING),
            "secondary couple / (F'' D)", row -> harmonics(row).couple(2).size() / (primary(row) * SPACING) * RODS,
            "secondary force", row -> harmonics(row).force(2).size() * rods(row),
            "least secondary force", row -> harmonics(row).force(2).leastSize() * rods(row),
            "primary couple", row -> harmonics(row).couple(1).size() * row.si("spacing") / SPACING,
            "secondary couple", row -> harmonics(row).couple(2).size() * row.si("spacing") / SPACING * rods(row),
            "balance weight at 3.5 in", BalancingExamples::balanceWeight);

    private BalancingExamples() {}

    /** From order 2 with the long rods to the printed l/r. */
    private static double rods(PublishedRow row) {
        return RODS * row.si("crank") / row.si("rod");
    }

    private static double crank(PublishedRow row) {
        return row.has("crank") ? row.si("crank") : 0.1;
    }

    private static double mass(PublishedRow row) {
        double printed = row.has("reciprocating mass") ? row.si("reciprocating mass") : 20;
        // weights over a rounded g: the printed forces come out in pounds of that g
        return row.has("g") ? printed * Site.STANDARD_GRAVITY / row.si("g") : printed;
    }

    private static double speed(PublishedRow row) {
        return row.has("speed") ? row.si("speed") : 50;
    }

    /** F′ = m r ω². */
    private static double primary(PublishedRow row) {
        return mass(row) * crank(row) * speed(row) * speed(row);
    }

    private static MachineHarmonics harmonics(PublishedRow row) {
        return MachineHarmonics.of(running(row));
    }

    private static double balanceWeight(PublishedRow row) {
        RunningMachine running = running(row);
        double moment = CounterweightAdvice.of(running, MachineHarmonics.of(running)).stream()
                .mapToDouble(CounterweightAdvice::leastPrimaryForce)
                .sum();
        return moment * row.si("reciprocating mass") / mass(row) / (3.5 * PrintedQuantity.factor("in"));
    }

    private static RunningMachine running(PublishedRow row) {
        List<PrintedQuantity> phases = PrintedQuantity.allIn(row.inputs().get("crank phases"));
        List<PrintedQuantity> positions = PrintedQuantity.allIn(row.inputs().get("positions"));
        List<PrintedQuantity> axes = PrintedQuantity.allIn(row.inputs().get("axis directions"));
        List<Throw> throwsInOrder = new ArrayList<>();
        for (int i = 0; i < phases.size(); i++) {
            double axis = axes.get(axes.size() == 1 ? 0 : i).number();
            ShaftPlace place = new ShaftPlace(
                    Math.toRadians(phases.get(i).number()),
                    Math.toRadians(axis),
                    SPACING * positions.get(i).number());
            throwsInOrder.add(reciprocating(row, "T" + i, place));
        }
        DutyPoint duty = Machines.boosterDuty(Map.of());
        return Machines.running(Machines.of(
                throwsInOrder,
                Rotation.COUNTER_CLOCKWISE,
                new Site(101_325, 101_325, false),
                new DutyPoint(duty.name(), speed(row), duty.stages(), duty.chambers()),
                Limits.NONE));
    }

    private static Throw reciprocating(PublishedRow row, String name, ShaftPlace place) {
        Throw t = Machines.boosterThrow(0);
        return new Throw(
                name,
                place,
                new Linkage(crank(row), RODS * crank(row), 0),
                new ReciprocatingMasses(mass(row), 0, 0),
                new ConnectingRod(0, OptionalDouble.empty(), OptionalDouble.empty()),
                new Crank(0, 0),
                Friction.NONE,
                t.chambers(),
                Parts.NONE,
                Limits.NONE);
    }
}
