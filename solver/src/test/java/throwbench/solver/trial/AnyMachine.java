package throwbench.solver.trial;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ArbitrarySupplier;
import net.jqwik.api.Combinators;
import throwbench.solver.chamber.ChamberCondition;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Site;
import throwbench.solver.machine.StageConditions;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Rotation;

/** Machines of one to three throws, anywhere on the shaft, some of their chambers held open or with a pocket. */
public final class AnyMachine implements ArbitrarySupplier<Machine> {

    @Override
    public Arbitrary<Machine> get() {
        return Combinators.combine(
                        new AnyThrow().get().list().ofMinSize(1).ofMaxSize(3),
                        Arbitraries.of(Rotation.class),
                        site(),
                        Numbers.between(5, 160),
                        lines(),
                        condition().list().ofSize(6))
                .as((throwsInOrder, rotation, site, speed, lines, conditions) ->
                        machine(named(throwsInOrder), rotation, site, speed, lines, conditions));
    }

    private static Arbitrary<Site> site() {
        return Combinators.combine(Numbers.between(0.9e5, 5e5), Arbitraries.of(true, false))
                .as((frame, gravity) -> new Site(101_325, frame, gravity));
    }

    /** Pressure ratios from next to nothing up to where no valve opens. */
    private static Arbitrary<StageConditions> lines() {
        return Combinators.combine(Numbers.between(0.5e5, 60e5), Numbers.between(1.3, 12))
                .as((suction, ratio) -> new StageConditions(
                        OptionalDouble.of(suction), OptionalDouble.of(300), OptionalDouble.of(suction * ratio)));
    }

    private static Arbitrary<ChamberCondition> condition() {
        return Combinators.combine(
                        Arbitraries.of(ChamberState.WORKING, ChamberState.WORKING, ChamberState.HELD_OPEN),
                        Numbers.between(0, 0.3))
                .as((state, pocket) -> new ChamberCondition(state, 0, new Clearance(pocket, true)));
    }

    private static List<Throw> named(List<Throw> throwsInOrder) {
        List<Throw> named = new ArrayList<>();
        for (int i = 0; i < throwsInOrder.size(); i++) {
            Throw t = throwsInOrder.get(i);
            String name = Character.toString('A' + i);
            List<Chamber> chambers = t.chambers().stream()
                    .map(c -> Machines.renamed(c, name + " " + c.name()))
                    .toList();
            named.add(Machines.changed(t, name, t.place(), t.linkage(), t.friction(), chambers));
        }
        return named;
    }

    private static Machine machine(
            List<Throw> throwsInOrder,
            Rotation rotation,
            Site site,
            double speed,
            StageConditions lines,
            List<ChamberCondition> conditions) {
        Map<String, ChamberCondition> byName = new HashMap<>();
        int next = 0;
        for (Throw t : throwsInOrder) {
            for (Chamber c : t.chambers()) {
                byName.put(c.name(), conditions.get(next++));
            }
        }
        DutyPoint duty = new DutyPoint("only", speed, Map.of(AnyThrow.STAGE, lines), byName);
        return Machines.of(throwsInOrder, rotation, site, duty, Limits.NONE);
    }
}
