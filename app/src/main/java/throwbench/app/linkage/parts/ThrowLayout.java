package throwbench.app.linkage.parts;

import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;

/**
 * One throw laid out for drawing, in throw axes, m. True along the stroke and in every length that the file gives.
 *
 * @param web outline of the crank web about the crank centre, the pin along its x
 * @param shank outline of the connecting rod from the crank pin, the crosshead pin along its x
 * @param groove recess along the shank
 */
public record ThrowLayout(
        Linkage linkage, GearShape gear, RodLine line, Outline web, Outline shank, Outline groove, Extent extent) {

    /** What the throw covers at any angle. */
    public record Extent(double leastX, double greatestX, double leastY, double greatestY) {}

    public static ThrowLayout of(Machine machine, Throw t) {
        Stack stack = Stack.of(machine, t);
        GearShape gear = Proportions.of(t, stack);
        RodLine line = new RodLineMaker(t, stack, gear).make();
        Outline web = RodOutlines.web(gear.crank(), t.linkage().crankRadius());
        double l = t.linkage().rodLength();
        return new ThrowLayout(
                t.linkage(),
                gear,
                line,
                web,
                RodOutlines.rod(gear.rod(), l),
                RodOutlines.groove(gear.rod(), l),
                extent(t.linkage(), gear, line));
    }

    private static Extent extent(Linkage linkage, GearShape gear, RodLine line) {
        double sweep = gear.sweep(linkage.crankRadius());
        double reach = linkage.greatestReach() + gear.slider().front();
        double half = gear.slider().halfHeight() + gear.slider().guide().bar();
        for (RodLine.Barrel b : line.barrels()) {
            reach = Math.max(reach, b.to());
            half = Math.max(half, b.radius() + b.wall());
            reach = Math.max(
                    reach,
                    b.headCover()
                            .map(c -> c.face() + Math.max(c.thickness(), c.packing()))
                            .orElse(0.0));
        }
        for (RodLine.Piston p : line.pistons()) {
            reach = Math.max(reach, linkage.greatestReach() + p.headFace());
        }
        for (RodLine.Bar b : line.bars()) {
            reach = Math.max(reach, linkage.greatestReach() + b.to());
        }
        double e = linkage.guideOffset();
        return new Extent(-sweep, reach, Math.min(-sweep, e - half), Math.max(sweep, e + half));
    }
}
