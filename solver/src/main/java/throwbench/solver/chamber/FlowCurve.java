package throwbench.solver.chamber;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.chamber.flow.FlowSteps;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Strokes;

/** The solved cycle of a chamber behind flowing valves: cubics over the steps while gas passes, isentropes while shut. */
final class FlowCurve implements PressureCurve {

    private final Optional<ShutLegs> legs;
    private final List<FlowSteps> open;
    private final List<ValveEvent> events;
    private final Totals totals;
    private final List<String> notes;

    /**
     * The isentropes of a chamber that is tight while its valves are shut.
     *
     * @param atGreatest pressure of the compression's isentrope at the greatest volume, Pa
     * @param atLeast pressure of the expansion's isentrope at the least volume, Pa
     */
    record ShutLegs(double k, double atGreatest, double atLeast) {}

    /**
     * What a turn comes to.
     *
     * @param mass net suction flow, kg
     * @param inletVolume the same at suction line conditions, m³
     */
    record Totals(double mass, double inletVolume, OptionalDouble dischargeTemperature, ValveLossWork loss) {}

    /** @param legs empty where gas passes all the time and the steps cover the whole turn */
    FlowCurve(
            Optional<ShutLegs> legs, List<FlowSteps> open, List<ValveEvent> events, Totals totals, List<String> notes) {
        this.legs = legs;
        this.open = List.copyOf(open);
        this.events = List.copyOf(events);
        this.totals = totals;
        this.notes = List.copyOf(notes);
    }

    @Override
    public void fill(ChamberSweep sweep, double[] pressure) {
        legs.ifPresent(shut -> fill(shut, sweep, pressure));
        for (FlowSteps steps : open) {
            steps.fill(sweep.sweep(), pressure);
        }
    }

    private static void fill(ShutLegs shut, ChamberSweep sweep, double[] pressure) {
        double[] powers = sweep.legs(shut.k(), shut.k());
        Strokes strokes = sweep.sweep().strokes();
        for (int s = 0; s < strokes.count(); s++) {
            boolean grows = sweep.chamber().growsOn(strokes.inward(s));
            double start = grows ? shut.atLeast() : shut.atGreatest();
            for (int i = strokes.from(s); i < strokes.to(s); i++) {
                pressure[i] = start * powers[i];
            }
        }
    }

    @Override
    public List<ValveEvent> events() {
        return events;
    }

    @Override
    public double[] joints() {
        return open.stream()
                .flatMapToDouble(FlowSteps::joints)
                .map(Angles::wrap)
                .sorted()
                .toArray();
    }

    @Override
    public OptionalDouble massPerTurn() {
        return OptionalDouble.of(totals.mass());
    }

    @Override
    public double inletVolumePerTurn() {
        return totals.inletVolume();
    }

    @Override
    public OptionalDouble dischargeTemperature() {
        return totals.dischargeTemperature();
    }

    @Override
    public Optional<ValveLossWork> valveLossWork() {
        return Optional.of(totals.loss());
    }

    @Override
    public List<String> notes() {
        return notes;
    }
}
