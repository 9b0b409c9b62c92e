package throwbench.solver.revolution;

import java.util.Optional;
import throwbench.solver.mechanism.Angles;

/**
 * Least and greatest value of a continuous curve over the revolution: break angles are candidates on both sides, smooth
 * tops are refined between the samples.
 */
public record Extremes(Extreme least, Extreme greatest) {

    /** Finds both extremes of a trace. */
    public static Extremes of(Trace trace) {
        return new Extremes(find(trace, -1), find(trace, 1));
    }

    private static Extreme find(Trace trace, double sense) {
        int best = 0;
        for (int i = 1; i < trace.count(); i++) {
            if (sense * trace.value(i) > sense * trace.value(best)) {
                best = i;
            }
        }
        double value = trace.value(best);
        double angle = trace.angle(best);
        Turning turning = new Turning(trace, sense);
        for (int i = 0; i < trace.count(); i++) {
            Optional<Extreme> top = turning.beside(i, value);
            if (top.isPresent() && sense * top.get().value() > sense * value) {
                value = top.get().value();
                angle = top.get().crankAngle();
            }
        }
        return new Extreme(value, Angles.wrap(angle));
    }
}
