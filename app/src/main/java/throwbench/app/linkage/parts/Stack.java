package throwbench.app.linkage.parts;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.chamber.LiquidValves;
import throwbench.solver.chamber.Side;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.PistonRodPart;
import throwbench.solver.machine.Throw;

/**
 * In which order a throw's chambers stand along the rod, told from their sides, bores and inner diameters: two chambers of
 * one bore on opposite sides share a piston; a chamber that nothing passes through closes the line; wider pistons stand
 * nearer to the crank.
 *
 * @param pistons from the crank outwards
 * @param rodRadius of what joins crosshead and first piston; of a trunk piston the skirt, m
 * @param trunk whether the crosshead pin sits in the first piston
 * @param plunger whether the first one is a plunger
 */
record Stack(List<Unit> pistons, double rodRadius, boolean trunk, boolean plunger) {

    /** Bores nearer than this to each other, relatively, are one. */
    private static final double SAME = 0.01;

    /** Piston rod diameter over bore where the file gives neither rod nor inner diameter. */
    private static final double USUAL_ROD = 0.18;

    /**
     * The chambers on one piston.
     *
     * @param crank index in file order
     * @param head index in file order
     */
    record Unit(Optional<Integer> crank, Optional<Integer> head, double bore, double crankInner, double headInner) {}

    static Stack of(Machine machine, Throw t) {
        List<Unit> units = new ArrayList<>();
        List<Chamber> chambers = t.chambers();
        boolean[] used = new boolean[chambers.size()];
        for (int c = 0; c < used.length; c++) {
            if (!used[c] && chambers.get(c).side() == Side.CRANK) {
                Optional<Integer> partner =
                        partner(chambers, used, chambers.get(c).bore());
                used[c] = true;
                partner.ifPresent(p -> used[p] = true);
                units.add(unit(chambers, Optional.of(c), partner));
            }
        }
        for (int h = 0; h < used.length; h++) {
            if (!used[h]) {
                units.add(unit(chambers, Optional.empty(), Optional.of(h)));
            }
        }
        units.sort(Comparator.comparing(Stack::closesTheLine)
                .thenComparing(Comparator.comparingDouble(Unit::bore).reversed()));
        boolean plunger = isPlunger(machine, t, units.get(0));
        boolean bare = t.masses().crosshead() == 0 && t.masses().pistonRod() == 0;
        boolean trunk = bare && !plunger;
        return new Stack(List.copyOf(units), rodRadius(t, units.get(0), trunk || plunger), trunk, plunger);
    }

    private static Optional<Integer> partner(List<Chamber> chambers, boolean[] used, double bore) {
        for (int h = 0; h < used.length; h++) {
            if (!used[h]
                    && chambers.get(h).side() == Side.HEAD
                    && same(chambers.get(h).bore(), bore)) {
                return Optional.of(h);
            }
        }
        return Optional.empty();
    }

    private static Unit unit(List<Chamber> chambers, Optional<Integer> crank, Optional<Integer> head) {
        double bore = Math.max(
                crank.map(i -> chambers.get(i).bore()).orElse(0.0),
                head.map(i -> chambers.get(i).bore()).orElse(0.0));
        return new Unit(
                crank,
                head,
                bore,
                crank.map(i -> chambers.get(i).innerDiameter()).orElse(0.0),
                head.map(i -> chambers.get(i).innerDiameter()).orElse(0.0));
    }

    private static boolean closesTheLine(Unit unit) {
        return unit.head().isPresent() && unit.headInner() == 0;
    }

    static boolean same(double a, double b) {
        return Math.abs(a - b) <= SAME * Math.max(a, b);
    }

    /** Whether a piston is a plunger: one chamber of liquid at its end, nothing through it. */
    static boolean isPlunger(Machine machine, Throw t, Unit unit) {
        return unit.crank().isEmpty()
                && unit.headInner() == 0
                && unit.head()
                        .map(h -> t.chambers().get(h))
                        .filter(c -> c.cycle() instanceof LiquidValves
                                || c.stage()
                                        .filter(s -> !machine.fluidOf(s).isGas())
                                        .isPresent())
                        .isPresent();
    }

    private static double rodRadius(Throw t, Unit first, boolean bodyIsRod) {
        if (first.crankInner() > 0) {
            return first.crankInner() / 2;
        }
        if (bodyIsRod) {
            return first.bore() / 2;
        }
        OptionalDouble given =
                t.parts().pistonRod().map(PistonRodPart::diameter).orElse(OptionalDouble.empty());
        return given.orElse(USUAL_ROD * first.bore()) / 2;
    }
}
