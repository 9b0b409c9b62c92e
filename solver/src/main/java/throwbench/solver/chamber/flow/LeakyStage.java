package throwbench.solver.chamber.flow;

/**
 * The pressure at one stage of an implicit step of a chamber between two ports, p b + c N(p) = r, N the net flow outwards:
 * both terms grow with p, so there is one root. Newton's method runs in u = √|p/p_line − 1| of the nearest port that passes
 * anything, in which the flow has no infinite slope; it stays between pressures known to be too low and too high and
 * crosses a line's pressure only when the sign there says so.
 */
final class LeakyStage {

    private static final int MOST = 100;

    /** By rising line pressure. */
    private final Port lower;

    private final Port upper;
    private double rootTemperature;
    private double b;
    private double c;
    private double r;
    private double pressure;
    private double low;
    private double high;

    /** How many of the two line pressures lie below. */
    private int below;

    private double lowerU;
    private double upperU;
    private double lowerFlow;
    private double upperFlow;

    LeakyStage(Port lower, Port upper) {
        this.lower = lower;
        this.upper = upper;
    }

    /**
     * Solves for the pressure from a guess (Pa) with the chamber's temperature (K).
     *
     * @return false when there is no root above 0
     */
    boolean solve(double ofPressure, double ofFlow, double known, double guess, double temperature) {
        b = ofPressure;
        c = ofFlow;
        r = known;
        rootTemperature = Math.sqrt(temperature);
        if (c * (lower.leaving(false, 1, rootTemperature) + upper.leaving(false, 1, rootTemperature)) >= r) {
            return false;
        }
        low = 0;
        high = Double.POSITIVE_INFINITY;
        below = guess <= lower.line() ? 0 : guess <= upper.line() ? 1 : 2;
        stand(guess);
        double excess = excess();
        for (int i = 0; i < MOST && excess != 0; i++) {
            boolean near = step(excess);
            excess = excess();
            if (near) {
                break;
            }
        }
        return true;
    }

    private void stand(double at) {
        pressure = at;
        lowerU = lower.distance(at);
        upperU = upper.distance(at);
    }

    /** p b + c N − r here; what it says of the root is kept. */
    private double excess() {
        lowerFlow = lower.leaving(below > 0, lowerU, rootTemperature);
        upperFlow = upper.leaving(below > 1, upperU, rootTemperature);
        double excess = b * pressure + c * (lowerFlow + upperFlow) - r;
        if (excess > 0) {
            high = Math.min(high, pressure);
        } else {
            low = Math.max(low, pressure);
        }
        return excess;
    }

    /** One step of Newton's method; true when it has become so short that the next one would change nothing. */
    private boolean step(double excess) {
        boolean byLower = lower.passes(below > 0);
        boolean byUpper = upper.passes(below > 1);
        if (byLower && (!byUpper || lowerU <= upperU)) {
            return stepByDistance(excess, lower, lowerU, below > 0, straight(upper, upperU, below > 1));
        }
        if (byUpper) {
            return stepByDistance(excess, upper, upperU, below > 1, straight(lower, lowerU, below > 0));
        }
        return move(pressure - excess / b);
    }

    /** What the other port adds to the derivative by p. */
    private double straight(Port other, double u, boolean above) {
        return u > 0 ? c * Math.abs(other.slope(above, u, rootTemperature)) / (2 * u * other.line()) : 0;
    }

    private boolean stepByDistance(double excess, Port pivot, double u, boolean above, double otherStraight) {
        double side = above ? 1 : -1;
        double slope = side * 2 * u * pivot.line() * (b + otherStraight) + c * pivot.slope(above, u, rootTemperature);
        double next = u - excess / slope;
        if (next <= 0) {
            boolean thisSide = above ? low >= pivot.line() : high <= pivot.line();
            if (!thisSide) {
                return cross(pivot.line());
            }
            next = u / 2;
        }
        double target = pivot.line() * (1 + side * next * next);
        boolean inside = target >= low && target <= high;
        boolean near = move(target);
        if (inside && pressure == target) {
            // the distance is known better than the difference of two pressures
            lowerU = pivot == lower ? next : lowerU;
            upperU = pivot == upper ? next : upperU;
            return Math.abs(next - u) <= 1e-7 * next;
        }
        return near;
    }

    /** Moves to a pressure, or as far towards it as is known to be right. */
    private boolean move(double target) {
        double bottom = below == 0 ? 0 : below == 1 ? lower.line() : upper.line();
        double top = below == 0 ? lower.line() : below == 1 ? upper.line() : Double.POSITIVE_INFINITY;
        if (target < bottom && low < bottom) {
            return cross(bottom);
        }
        if (target > top && high > top) {
            return cross(top);
        }
        double before = pressure;
        boolean inside = target >= low && target <= high;
        double between = high < Double.POSITIVE_INFINITY ? (low + high) / 2 : 2 * low;
        stand(inside ? target : between);
        return Math.abs(pressure - before) <= 1e-9 * before;
    }

    /** Looks at a line's pressure which of its sides the root is on, and goes on from there. */
    private boolean cross(double line) {
        stand(line);
        boolean higher = excess() <= 0;
        if (line == lower.line()) {
            below = higher ? 1 : 0;
        }
        if (line == upper.line()) {
            below = higher ? 2 : below == 2 ? 1 : below;
        }
        return false;
    }

    /** The root, Pa. */
    double pressure() {
        return pressure;
    }

    /** What leaves through the port of the lower line there (below 0: enters), R T ṁ/ω. */
    double lowerFlow() {
        return lowerFlow;
    }

    /** What leaves through the other port. */
    double upperFlow() {
        return upperFlow;
    }
}
