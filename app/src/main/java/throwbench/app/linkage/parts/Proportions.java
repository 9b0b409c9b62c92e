package throwbench.app.linkage.parts;

import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.machine.BearingPart;
import throwbench.solver.machine.CrossheadPart;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;

/**
 * Chooses the sizes of crank, connecting rod and crosshead that the file leaves open, so that nothing meets anything at
 * either dead centre. The factors are a draughtsman's, picked by eye.
 */
final class Proportions {

    /** Angles at which clearances are looked for. */
    private static final int LOOKS = 90;

    private final Throw t;
    private final Stack stack;
    private final double r;
    private final Linkage linkage;

    private Proportions(Throw t, Stack stack) {
        this.t = t;
        this.stack = stack;
        this.linkage = t.linkage();
        this.r = linkage.crankRadius();
    }

    static GearShape of(Throw t, Stack stack) {
        return new Proportions(t, stack).gear();
    }

    private GearShape gear() {
        double pin = diameter(t.parts().crankPin()).orElse(0.84 * r) / 2;
        double journal = diameter(t.parts().mainBearing()).orElse(0.92 * r) / 2;
        double wrist = t.parts()
                        .crosshead()
                        .map(CrossheadPart::pinDiameter)
                        .orElse(OptionalDouble.empty())
                        .orElse(Math.min(0.64 * r, stack.trunk() ? 0.5 * stack.rodRadius() : 0.64 * r))
                / 2;
        // both eyes must leave a shank between them
        double room = 0.8 * linkage.rodLength() / (1.5 * pin + 1.6 * wrist);
        double shrink = Math.min(1, room);
        double bigEye = 1.5 * pin * shrink;
        double smallEye = 1.6 * wrist * shrink;
        GearShape.Rod rod =
                new GearShape.Rod(bigEye, smallEye, wrist * shrink, 0.5 * bigEye, Math.min(0.48, 0.5) * smallEye);
        GearShape.Slider slider = stack.trunk() ? trunk(rod) : crosshead(rod, bigEye);
        double hub = 1.42 * journal;
        double behind = linkage.leastReach() - slider.back() - 0.08 * r;
        double wanted = r * (t.crank().counterweight() > 0 ? 1.5 : 1.2);
        double counterweight = Math.max(hub, Math.min(wanted, behind));
        return new GearShape(
                new GearShape.Crank(journal, hub, pin * shrink, 1.04 * bigEye, counterweight), rod, slider);
    }

    private static OptionalDouble diameter(Optional<BearingPart> part) {
        return part.map(BearingPart::diameter).orElse(OptionalDouble.empty());
    }

    private GearShape.Slider crosshead(GearShape.Rod rod, double bigEye) {
        double body = Math.max(1.3 * rod.smallEye(), 1.25 * stackRodRadius());
        double room = 0.45 * (linkage.leastReach() - Math.min(r, bigEye));
        double half = Math.max(1.02 * rod.smallEye(), Math.min(1.5 * rod.smallEye(), room));
        double shoe = 0.26 * rod.smallEye();
        double margin = 0.1 * r;
        double from = linkage.leastReach() - half - margin;
        double to = linkage.greatestReach() + half + margin;
        double halfHeight = Math.max(body + shoe, rodAt(from, rod) + margin / 2);
        return new GearShape.Slider(
                false, half, half, halfHeight, shoe, new GearShape.Guide(from, to, 0.3 * rod.smallEye()));
    }

    /** The rod radius that a crosshead must hold: a plunger or stepped body is wider than any rod. */
    private double stackRodRadius() {
        return Math.min(stack.rodRadius(), 0.9 * r);
    }

    private GearShape.Slider trunk(GearShape.Rod rod) {
        double radius = stack.rodRadius();
        double room = linkage.leastReach() - 1.42 * 0.46 * r - 0.1 * r;
        double back = Math.max(1.2 * rod.smallEye(), Math.min(0.9 * radius, 0.6 * room));
        double front = Math.max(1.45 * rod.smallEye(), 0.85 * radius);
        double wall = Math.max(0.09 * radius, Math.min(0.2 * radius, 0.12 * r));
        return new GearShape.Slider(true, back, front, radius, wall, new GearShape.Guide(0, 0, 0));
    }

    /** How far from the line of stroke the connecting rod's shank reaches where it passes a place x. */
    private double rodAt(double x, GearShape.Rod rod) {
        double most = 0;
        for (int i = 0; i < LOOKS; i++) {
            double theta = 2 * Math.PI * i / LOOKS;
            double sinBeta = linkage.sinRodAngle(theta);
            double cosBeta = Math.sqrt(1 - sinBeta * sinBeta);
            double behind = linkage.reach(theta) - x;
            if (behind > 0 && behind < linkage.rodLength() * cosBeta) {
                most = Math.max(most, behind * Math.abs(sinBeta) / cosBeta + rod.shankBig() / cosBeta);
            }
        }
        return most;
    }
}
