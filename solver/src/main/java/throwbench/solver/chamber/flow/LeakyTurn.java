package throwbench.solver.chamber.flow;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import throwbench.solver.mechanism.Angles;

/**
 * One turn, from greatest volume to greatest volume, of a chamber that gas may leave and enter on either side at any time.
 * Steps end exactly where the pressure passes a line's, start short there, and every choice of their length depends
 * continuously on the state.
 */
public final class LeakyTurn {

    private static final double NEAR = Math.toRadians(0.1);

    private static final double SHORTEST_START = 1e-5;

    private static final double GROWTH = 1.5;

    /** Nearer to a line's pressure than this share a state stands on it, and no step ends there first. */
    private static final double ROUNDING = 1e-13;

    /**
     * The pressure falls below the suction line's or rises above the discharge line's (opens), or comes back (shuts).
     *
     * @param crankAngle rad, in [0, 2π)
     */
    public record Passing(boolean suction, boolean opens, double crankAngle) {}

    private final PistonPath path;
    private final double k;
    private final Port suction;
    private final Port discharge;
    private final LeakyStep step;
    private final double start;
    private final double longest;
    private final LeakyTotals totals;
    private final FlowSteps.Log log = new FlowSteps.Log();
    private final List<Passing> passings = new ArrayList<>();

    private double angle;
    private double pressure;
    private double content;
    private double volume;
    private double volumeSlope;
    private double slope;
    private double landedAt;
    private final Valve suctionValve = new Valve(true);
    private final Valve dischargeValve = new Valve(false);

    /**
     * @param start crank angle of the greatest volume, rad
     * @param longest step, rad, at most {@link PistonPath#LONGEST}
     */
    public LeakyTurn(PistonPath path, double k, Port suction, Port discharge, double start, double longest) {
        this.path = path;
        this.k = k;
        this.suction = suction;
        this.discharge = discharge;
        boolean suctionIsLower = suction.line() <= discharge.line();
        this.step = new LeakyStep(path, k, suctionIsLower ? suction : discharge, suctionIsLower ? discharge : suction);
        this.start = start;
        this.longest = longest;
        this.totals = new LeakyTotals(suction, discharge);
    }

    /** Runs a turn from a pressure (Pa) and a content m R (Pa m³/K) at the greatest volume. */
    public void run(double startPressure, double startContent) {
        begin(startPressure, startContent);
        double end = start + Angles.TURN;
        double h = longest / 4;
        double suctionRate = 0;
        double dischargeRate = 0;
        while (end - angle > 1e-12) {
            h = Math.min(h, Math.min(limit(suction, suctionRate), limit(discharge, dischargeRate)));
            double length = Math.min(h, end - angle);
            double before = pressure;
            Port landed = advance(length);
            double taken = angle - log.angle(log.count() - 2);
            suctionRate = approach(suction, before, taken);
            dischargeRate = approach(discharge, before, taken);
            h = landed == null ? Math.min(GROWTH * h, longest) : firstStep(landed);
        }
        suctionValve.end();
        dischargeValve.end();
    }

    private void begin(double startPressure, double startContent) {
        path.standAt(start);
        angle = start;
        pressure = startPressure;
        content = startContent;
        step.standAt(pressure, content);
        volume = path.volume();
        volumeSlope = path.slope();
        slope = -k / volume * (flow(suction) + flow(discharge) + pressure * volumeSlope);
        landedAt = start;
        suctionValve.begin();
        dischargeValve.begin();
        log.clear();
        log.add(angle, pressure, slope);
        passings.clear();
        totals.clear();
    }

    private double flow(Port port) {
        return port.leaving(pressure > port.line(), port.distance(pressure), Math.sqrt(pressure * volume / content));
    }

    /** Half the way to a line whose flow is dying down, straight on along the last step's chord. */
    private double limit(Port port, double rate) {
        boolean dying = rate > 0 && port.passes(pressure > port.line());
        return dying ? Math.max(NEAR, Math.abs(pressure / port.line() - 1) / rate / 2) : longest;
    }

    private double approach(Port port, double before, double taken) {
        return (Math.abs(before / port.line() - 1) - Math.abs(pressure / port.line() - 1)) / taken;
    }

    /** A twentieth of the angle over which a flow that sets in comes to follow the piston. */
    private double firstStep(Port landed) {
        double leaving = Math.abs(slope) / landed.line();
        double response = k / volume * landed.onset(Math.sqrt(pressure * volume / content)) / landed.line();
        double relaxation = response > 0 ? leaving / (response * response) : Double.POSITIVE_INFINITY;
        return Math.max(SHORTEST_START, Math.min(longest / 4, relaxation / 20));
    }

    /** Takes a step, or the part of it up to a line's pressure; gives the port of that line, or null. */
    private @Nullable Port advance(double length) {
        double reached = step.take(length);
        Port crossed = crossed(reached);
        double taken = length;
        if (crossed != null) {
            taken = Landing.length(
                    length, pressure - crossed.line(), ROUNDING * crossed.line(), at -> step.take(at) - crossed.line());
            step.take(taken);
            reached = crossed.line();
        }
        path.look(taken);
        path.advance();
        accept(taken, reached);
        if (crossed != null) {
            landedAt = angle;
        }
        return crossed;
    }

    /** The first line whose pressure lies strictly between the present one and another. */
    private @Nullable Port crossed(double reached) {
        boolean suctionCrossed = crosses(suction, reached);
        boolean dischargeCrossed = crosses(discharge, reached);
        if (suctionCrossed && dischargeCrossed) {
            boolean suctionNearer = Math.abs(pressure - suction.line()) < Math.abs(pressure - discharge.line());
            return suctionNearer ? suction : discharge;
        }
        return suctionCrossed ? suction : dischargeCrossed ? discharge : null;
    }

    private boolean crosses(Port port, double reached) {
        double away = pressure - port.line();
        return away * (reached - port.line()) < 0 && Math.abs(away) > ROUNDING * port.line();
    }

    private void accept(double taken, double reached) {
        totals.add(step, taken, pressure, slope, volume, volumeSlope, reached);
        angle += taken;
        pressure = reached;
        slope = step.pressureSlope();
        content = step.content();
        volume = step.endVolume();
        volumeSlope = step.endVolumeSlope();
        step.standAt(pressure, content);
        log.add(angle, pressure, slope);
        if (pressure != suction.line()) {
            suctionValve.see(pressure < suction.line());
        }
        if (pressure != discharge.line()) {
            dischargeValve.see(pressure > discharge.line());
        }
    }

    /** What a valve is seen to do over a turn; at the line's pressure itself it is not told. */
    private final class Valve {

        private final boolean suctionSide;
        private boolean told;
        private boolean openAtFirst;
        private boolean open;

        Valve(boolean suctionSide) {
            this.suctionSide = suctionSide;
        }

        void begin() {
            told = false;
        }

        void see(boolean openNow) {
            if (!told) {
                told = true;
                openAtFirst = openNow;
            } else if (openNow != open) {
                passings.add(new Passing(suctionSide, openNow, Angles.wrap(landedAt)));
            }
            open = openNow;
        }

        /** Where the turn closes, the valve must be found as it was at first. */
        void end() {
            if (told && open != openAtFirst) {
                passings.add(new Passing(suctionSide, openAtFirst, Angles.wrap(start)));
            }
        }
    }

    /** Pressure at the end of the turn, Pa. */
    public double pressure() {
        return pressure;
    }

    /** Content m R at the end of the turn, Pa m³/K. */
    public double content() {
        return content;
    }

    public LeakyTotals totals() {
        return totals;
    }

    public FlowSteps steps() {
        return log.steps(1);
    }

    /** When the pressure passed a line's, in the order of the turn. */
    public List<Passing> passings() {
        return List.copyOf(passings);
    }

    /** The steps that it took. */
    public int count() {
        return log.count() - 1;
    }
}
