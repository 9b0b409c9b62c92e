package throwbench.solver.chamber;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import throwbench.solver.chamber.LiquidCycle.Hold;
import throwbench.solver.chamber.LiquidCycle.Passed;
import throwbench.solver.chamber.LiquidCycle.Span;
import throwbench.solver.chamber.ValveEvent.Valve;
import throwbench.solver.fluid.Liquid;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Sweep;

/**
 * Follows a liquid chamber from its greatest volume, full at the open suction pressure, until it repeats. Crank angles count
 * on from that place. Beside the working cycle there are four ways to pass nothing: held open, no valve opening, and (with a
 * closing lag) only one of the two valves opening and giving back what came through it.
 */
final class LiquidCycleSolver {

    /** Stations at which the least pressure is looked for: fine enough for a sentence. */
    private static final int STATIONS = 360;

    private static final String NO_VALVE = "no valve opens: the liquid trapped in the chamber is compressed and expands"
            + " again, nothing is delivered";
    private static final String NO_DISCHARGE =
            "the discharge valve does not open: the suction valve shuts too late, and"
                    + " what is drawn in flows back, nothing is delivered";
    private static final String NO_SUCTION =
            "the suction valve does not open: the discharge valve shuts too late, and what"
                    + " flows back is delivered again, nothing is drawn in";
    private static final String BACKWARDS =
            "more flows back through the valves that shut late than is delivered: capacity is negative";
    private static final String BOILS =
            "the pressure falls below the liquid's vapour pressure: it would boil, which this cycle does not follow";

    private final ChamberDuty duty;
    private final Liquid liquid;
    private final OpenPressures open;
    private final LegEnd legEnd;
    private final LiquidPlace place;
    private final double greatest;
    private final double least;
    private final double nextGreatest;
    private final double suctionShuts;
    private final double dischargeShuts;

    private LiquidCycleSolver(LiquidValves valves, ChamberDuty duty, Liquid liquid, OpenPressures open) {
        this.duty = duty;
        this.liquid = liquid;
        this.open = open;
        this.legEnd = new LegEnd(duty, open, valves.lossGrowsWithSpeed());
        this.place = new LiquidPlace(duty, open);
        this.greatest = duty.greatestVolumeAngle();
        this.least = greatest + Angles.wrap(duty.leastVolumeAngle() - greatest);
        this.nextGreatest = greatest + Angles.TURN;
        this.suctionShuts = greatest + valves.closingLag();
        this.dischargeShuts = least + valves.closingLag();
    }

    static CycleOutcome solve(LiquidValves valves, ChamberDuty duty) {
        if (!(duty.fluid() instanceof Liquid liquid)) {
            return CycleOutcome.refused("a liquid cycle needs a liquid");
        }
        OpenPressures open =
                new OpenPressures(valves, duty.lines(), duty.volume().stroke());
        LiquidCycleSolver solver = new LiquidCycleSolver(valves, duty, liquid, open);
        return switch (duty.condition().state()) {
            case HELD_OPEN -> CycleOutcome.solved(solver.warned(solver.heldOpen()));
            case WORKING ->
                solver.refusal().isEmpty()
                        ? CycleOutcome.solved(solver.warned(solver.working()))
                        : CycleOutcome.refused(solver.refusal());
            case FAILED_SUCTION, FAILED_DISCHARGE -> CycleOutcome.refused("a failed valve needs the cycle valve-flow");
        };
    }

    /** Why the chamber cannot work; empty where it can. */
    private String refusal() {
        double shorter = Math.min(least - greatest, nextGreatest - least);
        double lag = suctionShuts - greatest;
        if (!(lag < shorter)) {
            return String.format(
                    Locale.ROOT,
                    "closingLag %.2f deg, want less than the shorter stroke of %.2f deg",
                    Math.toDegrees(lag),
                    Math.toDegrees(shorter));
        }
        return open.clash().orElse("");
    }

    private LiquidCycle heldOpen() {
        LiquidLeg none = legFrom(greatest, true);
        return new LiquidCycle(
                open,
                greatest,
                List.of(new Span(Hold.SUCTION_HELD_OPEN, Angles.TURN, none)),
                List.of(),
                Passed.NOTHING,
                List.of());
    }

    private LiquidCycle working() {
        LiquidLeg full = legFrom(greatest, true);
        if (legEnd.dischargeOpens(full, greatest, least).isEmpty()) {
            List<Span> one = List.of(new Span(Hold.LEG, Angles.TURN, full));
            return new LiquidCycle(open, greatest, one, List.of(), Passed.NOTHING, List.of(NO_VALVE));
        }
        LiquidLeg up = legFrom(suctionShuts, true);
        OptionalDouble dischargeOpens = legEnd.dischargeOpens(up, suctionShuts, least);
        if (dischargeOpens.isEmpty()) {
            double suctionOpens = legEnd.suctionOpens(up, least, nextGreatest).orElse(nextGreatest);
            return oneValve(Valve.SUCTION, suctionOpens, suctionShuts, up);
        }
        LiquidLeg down = legFrom(dischargeShuts, false);
        OptionalDouble suctionOpens = legEnd.suctionOpens(down, dischargeShuts, nextGreatest);
        if (suctionOpens.isEmpty()) {
            double nextLeast = least + Angles.TURN;
            double opens = legEnd.dischargeOpens(down, nextGreatest, nextLeast).orElse(nextLeast);
            return oneValve(Valve.DISCHARGE, opens, dischargeShuts, down);
        }
        return fourLegs(up, dischargeOpens.getAsDouble(), down, suctionOpens.getAsDouble());
    }

    private LiquidCycle fourLegs(LiquidLeg up, double dischargeOpens, LiquidLeg down, double suctionOpens) {
        List<Span> spans = List.of(
                new Span(Hold.LEG, dischargeOpens - suctionShuts, up),
                new Span(Hold.DISCHARGE_OPEN, dischargeShuts - suctionShuts, up),
                new Span(Hold.LEG, suctionOpens - suctionShuts, down),
                new Span(Hold.SUCTION_OPEN, Angles.TURN, down));
        List<ValveEvent> events = List.of(
                event(Valve.SUCTION, false, suctionShuts),
                event(Valve.DISCHARGE, true, dischargeOpens),
                event(Valve.DISCHARGE, false, dischargeShuts),
                event(Valve.SUCTION, true, suctionOpens));
        double drawn = up.volume() - place.turnTo(suctionOpens).volume();
        double volume = drawn * (1 - duty.flowAllowance());
        Passed passed = new Passed(volume, volume * liquid.density());
        return new LiquidCycle(open, suctionShuts, spans, events, passed, volume < 0 ? List.of(BACKWARDS) : List.of());
    }

    /** A chamber whose one valve opens and gives back what came through it. */
    private LiquidCycle oneValve(Valve valve, double opens, double shuts, LiquidLeg leg) {
        boolean suction = valve == Valve.SUCTION;
        return new LiquidCycle(
                open,
                shuts,
                List.of(
                        new Span(Hold.LEG, opens - shuts, leg),
                        new Span(suction ? Hold.SUCTION_OPEN : Hold.DISCHARGE_OPEN, Angles.TURN, leg)),
                List.of(event(valve, true, opens), event(valve, false, shuts)),
                Passed.NOTHING,
                List.of(suction ? NO_DISCHARGE : NO_SUCTION));
    }

    private LiquidLeg legFrom(double shuts, boolean afterSuction) {
        place.turnTo(shuts);
        double pressure = afterSuction ? place.suction() : place.discharge();
        return new LiquidLeg(place.volume(), pressure, liquid.bulkModulus());
    }

    private static ValveEvent event(Valve valve, boolean opens, double angle) {
        return new ValveEvent(valve, opens, Angles.wrap(angle));
    }

    private LiquidCycle warned(LiquidCycle cycle) {
        double[] pressures = new double[STATIONS];
        Sweep turn = Sweep.wholeTurn(duty.linkage(), duty.rotation(), 0, STATIONS);
        cycle.fill(new ChamberSweep(turn, duty.volume()), pressures);
        double lowest = Arrays.stream(pressures).min().orElseThrow();
        return lowest < liquid.vapourPressure() ? cycle.noting(BOILS) : cycle;
    }
}
