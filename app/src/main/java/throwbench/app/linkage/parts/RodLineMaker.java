package throwbench.app.linkage.parts;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import throwbench.app.linkage.parts.RodLine.Bar;
import throwbench.app.linkage.parts.RodLine.Barrel;
import throwbench.app.linkage.parts.RodLine.Cover;
import throwbench.app.linkage.parts.RodLine.Piston;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;

/**
 * Places pistons, cylinders and bars along the line of stroke, from the crank outwards, each beyond what the one before it
 * reaches at its dead centre. A chamber's gap at its dead centre is its clearance spread over its area, where that is not
 * too long to draw.
 */
final class RodLineMaker {

    private final Throw t;
    private final Stack stack;
    private final GearShape gear;
    private final Linkage linkage;
    private final double stroke;
    private final double inner;
    private final double outer;
    private final List<Piston> pistons = new ArrayList<>();
    private final List<Barrel> barrels = new ArrayList<>();
    private final List<Bar> bars = new ArrayList<>();

    /** x up to which the line is built, fixed. */
    private double built;

    RodLineMaker(Throw t, Stack stack, GearShape gear) {
        this.t = t;
        this.stack = stack;
        this.gear = gear;
        this.linkage = t.linkage();
        this.stroke = linkage.stroke();
        this.inner = linkage.leastReach();
        this.outer = linkage.greatestReach();
    }

    RodLine make() {
        GearShape.Slider slider = gear.slider();
        double boss = slider.front() + 0.12 * stroke;
        built = slider.trunk()
                ? clearOfCrank(slider)
                : Math.max(slider.guide().to(), outer + boss) + 0.12 * linkage.crankRadius();
        double barFrom = slider.trunk() ? -slider.back() : slider.front();
        for (int i = 0; i < stack.pistons().size(); i++) {
            Stack.Unit unit = stack.pistons().get(i);
            double bar = i == 0 ? stack.rodRadius() : neck(i);
            boolean step = i > 0 && Stack.same(2 * bar, unit.bore());
            Piston piston = place(unit, i, bar, step);
            boolean solidTrunk = i == 0 && slider.trunk();
            if (!step && !solidTrunk && !piston.plunger() && piston.crankFace() > barFrom) {
                bars.add(new Bar(barFrom, piston.crankFace(), bar, i == 0));
            }
            pistons.add(piston);
            barFrom = piston.headFace();
        }
        tailRod(barFrom);
        return new RodLine(pistons, barrels, bars);
    }

    /** x beyond which a trunk piston's cylinder meets neither crank nor big end. */
    private double clearOfCrank(GearShape.Slider slider) {
        double sweep = gear.sweep(linkage.crankRadius());
        double side = slider.halfHeight() - Math.abs(linkage.guideOffset());
        double clear = side < sweep && side > -sweep ? Math.sqrt((sweep - side) * (sweep + side)) : 0;
        return Math.max(inner - slider.back(), clear + 0.08 * linkage.crankRadius());
    }

    private double neck(int i) {
        Stack.Unit before = stack.pistons().get(i - 1);
        Stack.Unit here = stack.pistons().get(i);
        double diameter = before.headInner() > 0 ? before.headInner() : here.crankInner();
        return diameter > 0 ? diameter / 2 : Math.min(0.09 * before.bore(), 0.4 * here.bore());
    }

    private Piston place(Stack.Unit unit, int i, double bar, boolean step) {
        boolean trunk = i == 0 && gear.slider().trunk();
        boolean plunger = i == 0 && !trunk && plungerShaped(unit);
        double radius = unit.bore() / 2;
        double wall = wall(radius);
        if (plunger) {
            return placePlunger(unit, radius, wall);
        }
        double crankFace;
        double from;
        Optional<Cover> crankCover = Optional.empty();
        if (unit.crank().isPresent()) {
            Chamber chamber = t.chambers().get(unit.crank().get());
            double packing = packing(bar, wall);
            double face = built + packing;
            if (trunk) {
                face = Math.max(face, outer - gear.slider().back() + packing + 0.1 * stroke);
            }
            crankCover = Optional.of(new Cover(face, wall, bar, packing));
            crankFace = face + gap(chamber) - inner;
            from = face;
        } else if (trunk) {
            crankFace = -gear.slider().back();
            from = built;
        } else if (step) {
            crankFace = built - inner - stroke;
            from = built;
        } else {
            from = built;
            crankFace = from + 0.1 * stroke - inner;
        }
        double headFace = crankFace + length(radius, trunk, unit);
        if (trunk && unit.crank().isEmpty()) {
            headFace = gear.slider().front();
        } else if (step) {
            crankFace = pistons.get(i - 1).headFace();
            headFace = built + 0.12 * stroke - inner;
        }
        Optional<Cover> headCover = headCover(unit, outer + headFace, wall, radius);
        double to = headCover.map(Cover::face).orElse(outer + headFace + 0.08 * stroke);
        barrels.add(new Barrel(from, to, radius, wall, crankCover, headCover));
        built = headCover
                        .map(c -> c.face() + Math.max(c.thickness(), c.packing()))
                        .orElse(to)
                + (nextIsStep(i) ? 0 : 0.3 * stroke);
        return new Piston(unit.crank(), unit.head(), radius, crankFace, headFace, false);
    }

    private boolean nextIsStep(int i) {
        return i + 1 < stack.pistons().size()
                && Stack.same(2 * neck(i + 1), stack.pistons().get(i + 1).bore());
    }

    private boolean plungerShaped(Stack.Unit unit) {
        // the rod of a plunger pump is its plunger
        return unit.crank().isEmpty() && unit.headInner() == 0 && stack.plunger();
    }

    private Piston placePlunger(Stack.Unit unit, double radius, double wall) {
        double packing = Math.max(0.9 * radius, 0.3 * stroke);
        double face = built + packing;
        double tip = face + 0.1 * stroke - inner;
        double barrel = 1.18 * radius;
        Cover gland = new Cover(face, wall, radius, packing);
        Chamber chamber = t.chambers().get(unit.head().orElseThrow());
        double end = outer + tip + gap(chamber);
        Cover head = new Cover(end, 1.2 * wall, 0, 0);
        barrels.add(new Barrel(face, end, barrel, wall, Optional.of(gland), Optional.of(head)));
        built = end + 1.2 * wall + 0.3 * stroke;
        return new Piston(Optional.empty(), unit.head(), radius, gear.slider().front(), tip, true);
    }

    private Optional<Cover> headCover(Stack.Unit unit, double faceAtDeadCentre, double wall, double radius) {
        if (unit.head().isEmpty()) {
            return Optional.empty();
        }
        Chamber chamber = t.chambers().get(unit.head().get());
        double opening = chamber.innerDiameter() / 2;
        boolean stepped = opening > 0.6 * radius;
        double packing = opening == 0 ? 0 : stepped ? wall : packing(opening, wall);
        return Optional.of(new Cover(faceAtDeadCentre + gap(chamber), wall, opening, packing));
    }

    /** A tail rod stays in its packing at crank-end dead centre. */
    private void tailRod(double from) {
        Stack.Unit last = stack.pistons().get(stack.pistons().size() - 1);
        if (last.head().isPresent() && last.headInner() > 0) {
            bars.add(new Bar(from, built - 0.2 * stroke - inner, last.headInner() / 2, false));
        }
    }

    private double length(double radius, boolean trunk, Stack.Unit unit) {
        double usual = Math.max(0.35 * stroke, Math.min(0.62 * radius, 0.9 * stroke));
        return trunk && unit.crank().isPresent() ? Math.max(usual, gear.slider().front()) : usual;
    }

    private double packing(double opening, double wall) {
        return Math.max(wall, Math.max(0.2 * stroke, Math.min(2.2 * opening, 0.5 * stroke)));
    }

    private double wall(double radius) {
        return Math.max(0.11 * radius, Math.min(0.12 * stroke, 0.25 * radius));
    }

    /** Length of the chamber at its dead centre, m. */
    private double gap(Chamber chamber) {
        Clearance clearance = chamber.clearance();
        double spread = clearance.volume(chamber.area() * stroke) / chamber.area();
        double least = 0.03 * stroke;
        double most = 0.4 * stroke;
        return Math.max(least, Math.min(most, spread));
    }
}
