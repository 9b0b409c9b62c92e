package throwbench.solver.revolution;

import java.util.List;
import java.util.Optional;
import throwbench.solver.mechanism.Angles;

/**
 * How the rod load of one throw changes its sign over the revolution: the combined load at the crosshead pin, friction and
 * weight left out.
 *
 * @param signChanges by crank angle; none where the rod only pulls or only pushes
 * @param spans every unbroken stretch of one sign, by its start; one whole turn where there is no change
 * @param tension greatest tension, N, ≥ 0, with its angle; empty where the rod never pulls
 * @param compression greatest compression as a magnitude, N, with its angle; empty where the rod never pushes
 */
public record Reversal(
        List<SignChange> signChanges, List<Span> spans, Optional<Extreme> tension, Optional<Extreme> compression) {

    /**
     * An unbroken stretch of one sign, counted through 360°.
     *
     * @param from crank angle at which it begins, rad, in [0, 2π)
     * @param length rad, in (0, 2π]
     */
    public record Span(double from, double length, boolean inTension) {}

    public Reversal {
        signChanges = List.copyOf(signChanges);
        spans = List.copyOf(spans);
    }

    /** The reversal of a trace of the rod load. */
    public static Reversal of(Trace rodLoad) {
        Extremes extremes = Extremes.of(rodLoad);
        List<SignChange> changes = SignChanges.of(rodLoad);
        Extreme most = extremes.greatest();
        Extreme least = extremes.least();
        return new Reversal(
                changes,
                spans(changes, most.value() > -least.value()),
                most.value() > 0 ? Optional.of(most) : Optional.empty(),
                least.value() < 0 ? Optional.of(new Extreme(-least.value(), least.crankAngle())) : Optional.empty());
    }

    private static List<Span> spans(List<SignChange> changes, boolean inTension) {
        if (changes.isEmpty()) {
            return List.of(new Span(0, Angles.TURN, inTension));
        }
        Span[] spans = new Span[changes.size()];
        for (int i = 0; i < spans.length; i++) {
            double from = changes.get(i).crankAngle();
            boolean last = i + 1 == spans.length;
            double to = last
                    ? changes.get(0).crankAngle() + Angles.TURN
                    : changes.get(i + 1).crankAngle();
            spans[i] = new Span(from, to - from, changes.get(i).toTension());
        }
        return List.of(spans);
    }

    /** Whether the load changes its sign at all. */
    public boolean reverses() {
        return !signChanges.isEmpty();
    }

    /** The longest unbroken span of one sign, rad; 0 where there is none. */
    public double longestSpan(boolean inTension) {
        return longest(inTension).map(Span::length).orElse(0.0);
    }

    /** The longest unbroken span of one sign. */
    public Optional<Span> longest(boolean inTension) {
        return spans.stream().filter(s -> s.inTension() == inTension).reduce((a, b) -> b.length() > a.length() ? b : a);
    }

    /** The span that counts for the criterion: the shorter of the two longest ones; empty without a sign change. */
    public Optional<Span> governing() {
        if (!reverses()) {
            return Optional.empty();
        }
        boolean tension = longestSpan(true) <= longestSpan(false);
        return longest(tension);
    }

    /** Reversal duration, rad: the shorter of the two longest unbroken spans; 0 without a sign change. */
    public double duration() {
        return duration(signChanges);
    }

    /** The same from sign changes alone, which rise by angle. */
    static double duration(List<SignChange> changes) {
        double tension = 0;
        double compression = 0;
        for (int i = 0; i < changes.size(); i++) {
            SignChange from = changes.get(i);
            boolean last = i + 1 == changes.size();
            double to = last
                    ? changes.get(0).crankAngle() + Angles.TURN
                    : changes.get(i + 1).crankAngle();
            double length = to - from.crankAngle();
            if (from.toTension()) {
                tension = Math.max(tension, length);
            } else {
                compression = Math.max(compression, length);
            }
        }
        return Math.min(tension, compression);
    }

    /** Reversal ratio: the smaller peak over the larger one; 0 without a sign change. */
    public double ratio() {
        if (!reverses()) {
            return 0;
        }
        double pull = tension.map(Extreme::value).orElse(0.0);
        double push = compression.map(Extreme::value).orElse(0.0);
        return Math.min(pull, push) / Math.max(pull, push);
    }

    /** Where the smaller peak stands, rad; empty without a sign change. */
    public Optional<Extreme> smallerPeak() {
        if (!reverses() || tension.isEmpty() || compression.isEmpty()) {
            return Optional.empty();
        }
        return tension.get().value() <= compression.get().value() ? tension : compression;
    }
}
