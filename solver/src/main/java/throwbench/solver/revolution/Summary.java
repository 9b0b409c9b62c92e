package throwbench.solver.revolution;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.machine.Throw;

/**
 * What a revolution comes to, for one throw of a machine at a duty point. Independent of the number of stations asked for.
 *
 * @param revolution the stations that the extremes were bracketed on
 * @param extremes least and greatest value of every column, SI
 * @param pressures the same of every chamber of the throw, Pa absolute
 * @param throwFlow what the shown throw takes and passes, by stage
 * @param machineFlow the same of the whole machine
 * @param harmonics of torques, shaking forces and couples, phases from the first throw's head-end dead centre
 * @param notes what a user must be told, in sentences
 */
public record Summary(
        Revolution revolution,
        Map<Column, Extremes> extremes,
        List<Extremes> pressures,
        Reversal reversal,
        double meanThrowTorque,
        double meanShaftTorque,
        StageFlows throwFlow,
        StageFlows machineFlow,
        MachineHarmonics harmonics,
        List<String> notes) {

    /**
     * Power and flow by stage.
     *
     * @param indicatedPower W, positive when absorbed
     * @param capacity kg/s; empty where a suction temperature is missing or a pressure is recorded
     * @param inletVolume m³/s at inlet conditions; empty where a pressure is recorded
     * @param totalPower W, every chamber counted
     */
    public record StageFlows(
            Map<String, Double> indicatedPower,
            Map<String, OptionalDouble> capacity,
            Map<String, OptionalDouble> inletVolume,
            double totalPower) {}

    /** Sums up one throw; an earlier summary lends its geometry. */
    public static Summary of(RunningMachine running, int shown, Optional<Summary> earlier) {
        Traces traces = Traces.of(running, shown, earlier.map(Summary::revolution));
        Map<Column, Extremes> extremes = new EnumMap<>(Column.class);
        for (Column column : Column.values()) {
            if (column != Column.CRANK_ANGLE) {
                extremes.put(column, Extremes.of(traces.column(column)));
            }
        }
        List<Extremes> pressures = new ArrayList<>();
        for (int c = 0; c < running.throwsInOrder().get(shown).chambers().size(); c++) {
            pressures.add(Extremes.of(traces.pressure(c)));
        }
        List<TurnMeans> means = new ArrayList<>();
        for (int i = 0; i < running.throwsInOrder().size(); i++) {
            means.add(new TurnMeans(running, i));
        }
        MachineMeans machine = MachineMeans.of(running, means);
        return new Summary(
                traces.revolution(),
                extremes,
                List.copyOf(pressures),
                Reversal.of(Traces.rodLoad(traces.revolution())),
                means.get(shown).torque(),
                machine.shaftTorque(),
                MachineMeans.ofThrow(running, shown, means.get(shown)),
                machine.flow(),
                MachineHarmonics.of(running),
                Notes.of(running, shown));
    }

    public RunningMachine running() {
        return revolution.running();
    }

    /** The throw that it is about. */
    public Throw shownThrow() {
        return running().throwsInOrder().get(revolution.shownThrow()).described();
    }

    /** (ω_max − ω_min)/ω_mean. */
    public double speedFluctuation() {
        return running().speedCurve().fluctuation();
    }

    /** Extremes of a column. */
    public Extremes extremes(Column column) {
        Extremes found = extremes.get(column);
        if (found == null) {
            throw new IllegalArgumentException(column + " has no extremes");
        }
        return found;
    }
}
