package throwbench.solver.map;

/**
 * Equally spaced values of a variable, SI.
 *
 * @param from the first value
 * @param to the last one, above or below the first
 * @param points number of values, both ends counted, at least 2
 */
public record Axis(Variable variable, double from, double to, int points) {

    public Axis {
        if (!(points >= 2 && Double.isFinite(to - from) && from != to)) {
            throw new IllegalArgumentException("no axis: " + points + " points from " + from + " to " + to);
        }
    }

    /** A value by its place, from 0; the ends are exactly those given. */
    public double at(int place) {
        return place == points - 1 ? to : from + (to - from) * place / (points - 1);
    }
}
