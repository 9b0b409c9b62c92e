package throwbench.solver.chamber;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.chamber.flow.FlowFunction;
import throwbench.solver.chamber.flow.LeakyTotals;
import throwbench.solver.chamber.flow.LeakyTurn;
import throwbench.solver.chamber.flow.Port;
import throwbench.solver.chamber.flow.RepeatSearch;

/**
 * The periodic state of a chamber that gas may pass either way: a valve held open or broken, or a discharge line at no more
 * than suction pressure, which lets both valves stand open at once. Two numbers are looked for, the pressure and the mass
 * at the greatest volume.
 */
final class LeakyFlow {

    private static final double SOLVE_STEP = Math.toRadians(0.5);

    private static final double MAP_STEP = Math.toRadians(2);

    private final ChamberDuty duty;
    private final double gasConstant;
    private final double suctionTemperature;
    private final LeakyTurn turn;
    private int turns;

    LeakyFlow(FlowValves valves, ChamberDuty duty, double gasConstant, double k, double suctionTemperature) {
        this.duty = duty;
        this.gasConstant = gasConstant;
        this.suctionTemperature = suctionTemperature;
        LineConditions lines = duty.lines();
        double low = lines.suctionPressure();
        double high = lines.dischargePressure();
        double leak = duty.condition().leakArea();
        ChamberState state = duty.condition().state();
        double suctionLeak =
                switch (state) {
                    case HELD_OPEN -> valves.suctionFlowArea();
                    case FAILED_SUCTION -> leak;
                    case WORKING, FAILED_DISCHARGE -> 0;
                };
        double dischargeLeak = state == ChamberState.FAILED_DISCHARGE ? leak : 0;
        double root = Math.sqrt(gasConstant) / duty.meanSpeed();
        FlowFunction law = new FlowFunction(k);
        double dischargeTemperature = suctionTemperature * Math.pow(high / low, (k - 1) / k);
        turn = new LeakyTurn(
                duty.pistonPath(),
                k,
                new Port(low, suctionTemperature, valves.suctionFlowArea(), suctionLeak, root, law),
                new Port(high, dischargeTemperature, dischargeLeak, valves.dischargeFlowArea(), root, law),
                duty.greatestVolumeAngle(),
                duty.accuracy() == CycleAccuracy.MAP ? MAP_STEP : SOLVE_STEP);
    }

    /** Runs turns until pressure and mass at the greatest volume repeat within a share; whether they do after so many. */
    boolean search(double tolerance, int mostTurns) {
        double pressure = duty.lines().suctionPressure();
        double content = pressure * duty.volume().greatest() / suctionTemperature;
        RepeatSearch search = new RepeatSearch(Math.log(pressure), Math.log(content));
        for (turns = 1; turns <= mostTurns; turns++) {
            turn.run(Math.exp(search.first()), Math.exp(search.second()));
            if (search.ended(Math.log(turn.pressure()), Math.log(turn.content())) <= tolerance) {
                return true;
            }
        }
        return false;
    }

    /** The turns that the last search took. */
    int turns() {
        return turns;
    }

    LeakyTurn turn() {
        return turn;
    }

    /** The periodic state found, as a curve. */
    FlowCurve curve(List<String> notes) {
        LeakyTotals totals = turn.totals();
        OptionalDouble temperature = totals.delivered() > 0
                ? OptionalDouble.of(totals.deliveredEnergy() / totals.delivered())
                : OptionalDouble.empty();
        // a turn that repeats and delivers nothing has drawn nothing; rounding must not make a flow of it
        boolean delivers = totals.delivered() > 0 || duty.condition().state() == ChamberState.FAILED_DISCHARGE;
        double drawn = delivers ? totals.drawn() : 0;
        double inletVolume = drawn * suctionTemperature / duty.lines().suctionPressure();
        return new FlowCurve(
                Optional.empty(),
                List.of(turn.steps()),
                events(),
                new FlowCurve.Totals(
                        drawn / gasConstant,
                        inletVolume,
                        temperature,
                        new ValveLossWork(totals.suctionLoss(), totals.dischargeLoss())),
                notes);
    }

    /** A suction valve held open does not move; every other valve opens and shuts as its line's pressure is passed. */
    private List<ValveEvent> events() {
        boolean held = duty.condition().state() == ChamberState.HELD_OPEN;
        return turn.passings().stream()
                .filter(passing -> !(held && passing.suction()))
                .map(passing -> new ValveEvent(
                        passing.suction() ? ValveEvent.Valve.SUCTION : ValveEvent.Valve.DISCHARGE,
                        passing.opens(),
                        passing.crankAngle()))
                .sorted(Comparator.comparingDouble(ValveEvent::crankAngle))
                .toList();
    }
}
