package throwbench.solver.chamber;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.chamber.flow.FlowFunction;
import throwbench.solver.chamber.flow.PistonPath;
import throwbench.solver.chamber.flow.StepRule;
import throwbench.solver.chamber.flow.ValveOpening;
import throwbench.solver.mechanism.Angles;

/**
 * The periodic state of a chamber whose two valves work. One number is looked for: the volume V_c at which the discharge
 * valve shuts. All else of a turn follows from it, the masses and the temperature in closed form from the energy balance.
 */
final class WorkingFlow {

    private static final StepRule SOLVE_SUCTION = new StepRule(Math.toRadians(1.85), 2e-5, 0.03, 1.3, 3e-4);

    /** The volume is small there and changes by a greater share with every degree. */
    private static final StepRule SOLVE_DISCHARGE = new StepRule(Math.toRadians(0.75), 2e-5, 0.05, 1.3, 3e-4);

    private static final StepRule MAP = new StepRule(Math.toRadians(4), 1e-4, 0.2, 1.8, 1e-2);

    private final ChamberDuty duty;
    private final ValveOpening suction;
    private final ValveOpening discharge;
    private final double k;
    private final double gasConstant;
    private final double volumeRatio;
    private final double scalePerRootKelvin;
    private final double suctionArea;
    private final double dischargeArea;
    private final double suctionTemperature;

    private double suctionOpensAt;
    private double suctionOpens;
    private double suctionShuts;
    private double dischargeOpensAt;
    private double dischargeOpens;
    private double dischargeShuts;
    private double drawn;
    private double lineTemperature;
    private int passes;

    WorkingFlow(FlowValves valves, ChamberDuty duty, double gasConstant, double k, double suctionTemperature) {
        this.duty = duty;
        this.k = k;
        this.gasConstant = gasConstant;
        this.suctionTemperature = suctionTemperature;
        PistonPath path = duty.pistonPath();
        FlowFunction law = new FlowFunction(k);
        boolean map = duty.accuracy() == CycleAccuracy.MAP;
        suction = new ValveOpening(path, law, true, map ? MAP : SOLVE_SUCTION);
        discharge = new ValveOpening(path, law, false, map ? MAP : SOLVE_DISCHARGE);
        LineConditions lines = duty.lines();
        volumeRatio = Math.pow(lines.dischargePressure() / lines.suctionPressure(), 1 / k);
        scalePerRootKelvin = Math.sqrt(gasConstant) / duty.meanSpeed();
        suctionArea = valves.suctionFlowArea();
        dischargeArea = valves.dischargeFlowArea();
    }

    /** Whether the volumes reach from one line pressure to the other; otherwise no valve ever opens. */
    boolean reaches() {
        return duty.volume().least() * volumeRatio < duty.volume().greatest();
    }

    /**
     * Runs turns until V_c repeats. It lies between V_min, which shuts too early, and V_max/r_v, where the suction valve
     * would not open any more; a turn's V_c moves from either towards it, so a secant kept between them can't miss it.
     *
     * @param tolerance within which V_c shall repeat, as a share of the volume discharged
     * @return whether it does after at most so many turns
     */
    boolean search(double tolerance, int mostTurns) {
        double low = duty.volume().least();
        double high = duty.volume().greatest() / volumeRatio;
        double before = 0;
        double beforeBy = 0;
        double at = low;
        for (passes = 1; passes <= mostTurns; passes++) {
            turn(at);
            double by = dischargeShuts - at;
            double passed = dischargeOpens - at;
            if (Math.abs(by) <= tolerance * passed || high - low <= tolerance * at) {
                balance(dischargeShuts);
                return true;
            }
            if (by > 0) {
                low = at;
            } else {
                high = at;
            }
            double next = passes == 1 ? dischargeShuts : at - by * (at - before) / (by - beforeBy);
            before = at;
            beforeBy = by;
            at = next > low && next < high ? next : (low + high) / 2;
        }
        return false;
    }

    private void turn(double shuts) {
        suctionOpens = shuts * volumeRatio;
        suctionOpensAt = duty.crankAngleAt(suctionOpens, true);
        suction.run(suctionOpensAt, suctionArea * scalePerRootKelvin * Math.sqrt(suctionTemperature));
        suctionShuts = suction.shutVolume();
        dischargeOpens = suctionShuts / volumeRatio;
        balance(shuts);
        dischargeOpensAt = duty.crankAngleAt(dischargeOpens, false);
        discharge.run(dischargeOpensAt, dischargeArea * scalePerRootKelvin * Math.sqrt(lineTemperature));
        dischargeShuts = discharge.shutVolume();
    }

    /** R dm/p_s T_s from the energy of what is in the chamber; then T at p_d from the masses before and after. */
    private void balance(double shuts) {
        double opens = shuts * volumeRatio;
        drawn = suctionShuts - opens - (k - 1) / k * suction.lostVolume();
        double pressureRatio = duty.lines().dischargePressure() / duty.lines().suctionPressure();
        lineTemperature = pressureRatio * suctionTemperature * (dischargeOpens - shuts) / drawn;
    }
    /** The turns that the last search took. */
    int passes() {
        return passes;
    }

    /** What enters in a turn, as a volume at suction line conditions, m³: from the energy balance. */
    double drawn() {
        return drawn;
    }

    /** The same, summed up from the flow through the valve. */
    double flowedIn() {
        return suction.flow();
    }

    /** ∫ R T ṁ/p_suction of what leaves in a turn, summed up from the flow through the discharge valve, m³. */
    double flowedOut() {
        return discharge.flow()
                * duty.lines().dischargePressure()
                / duty.lines().suctionPressure();
    }

    private List<ValveEvent> events() {
        List<ValveEvent> events = new ArrayList<>();
        add(events, ValveEvent.Valve.SUCTION, true, suctionOpensAt);
        add(events, ValveEvent.Valve.SUCTION, false, suction.shutAngle());
        add(events, ValveEvent.Valve.DISCHARGE, true, dischargeOpensAt);
        add(events, ValveEvent.Valve.DISCHARGE, false, discharge.shutAngle());
        events.sort(Comparator.comparingDouble(ValveEvent::crankAngle));
        return events;
    }

    private static void add(List<ValveEvent> events, ValveEvent.Valve valve, boolean opens, double angle) {
        events.add(new ValveEvent(valve, opens, Angles.wrap(angle)));
    }

    /** The periodic state found, as a curve. */
    FlowCurve curve(List<String> notes) {
        LineConditions lines = duty.lines();
        ChamberVolume volume = duty.volume();
        double low = lines.suctionPressure();
        double high = lines.dischargePressure();
        double mass = low * drawn / (gasConstant * suctionTemperature);
        // energy of what leaves: on its isentrope the gas is hottest at the peak
        double mean = lineTemperature * (1 + (k - 1) / k * discharge.lostVolume() / (dischargeOpens - dischargeShuts));
        FlowCurve.ShutLegs legs = new FlowCurve.ShutLegs(
                k,
                low * Math.pow(suctionShuts / volume.greatest(), k),
                high * Math.pow(dischargeShuts / volume.least(), k));
        return new FlowCurve(
                Optional.of(legs),
                List.of(suction.log().steps(low), discharge.log().steps(high)),
                events(),
                new FlowCurve.Totals(
                        mass,
                        drawn,
                        OptionalDouble.of(mean),
                        new ValveLossWork(low * suction.lostVolume(), high * discharge.lostVolume())),
                notes);
    }
}
