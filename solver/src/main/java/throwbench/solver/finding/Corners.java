package throwbench.solver.finding;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Ranges.Range;
import throwbench.solver.machine.Ranges.StageRange;
import throwbench.solver.machine.Stage;
import throwbench.solver.machine.StageConditions;
import throwbench.solver.revolution.Refusal;

/** The corners of a machine's ranges, with those at relief pressure. */
final class Corners {

    /** Between the parts of a name. */
    static final String APART = " · ";

    private final Machine machine;
    private final DutyPoint base;
    private final CornerNames names;
    private final Set<Refusal> refusals = new LinkedHashSet<>();

    /**
     * One corner.
     *
     * @param label its name: what is in the ranges, in words; empty where nothing is
     * @param speed rad/s
     */
    record Corner(String label, double speed, Map<String, StageConditions> stages) {}

    /** One choice of a stage's conditions. */
    private record Choice(String label, StageConditions lines, boolean atRelief) {}

    Corners(Machine machine) {
        this.machine = machine;
        this.base = machine.dutyPoints().get(0);
        this.names = new CornerNames(machine);
    }

    /** Whether the machine has no ranges. */
    boolean none() {
        return machine.ranges().speed().isEmpty() && machine.ranges().stages().isEmpty();
    }

    /** How many there are; as a floating number, since they grow fast. */
    double count() {
        double count = ends(machine.ranges().speed()).size();
        for (StageRange range : machine.ranges().stages().values()) {
            double discharges = ends(range.dischargePressure()).size()
                    + (range.reliefPressure().isPresent() ? 1 : 0);
            count *= ends(range.suctionPressure()).size()
                    * (double) ends(range.suctionTemperature()).size()
                    * discharges;
        }
        return count;
    }

    /** All corners; those that make no sense are left out and refused. */
    List<Corner> all() {
        List<Corner> corners = new ArrayList<>();
        for (OptionalDouble speed : ends(machine.ranges().speed())) {
            String label = speed.isPresent() ? CornerNames.speed(speed.getAsDouble()) : "";
            Map<String, Choice> none = new LinkedHashMap<>();
            addStages(new Corner(label, speed.orElse(base.speed()), base.stages()), 0, none, corners);
        }
        return corners;
    }

    /** Why some corners are left out; known once they are made. */
    List<Refusal> refusals() {
        return List.copyOf(refusals);
    }

    /** Goes through the choices of one stage after another. */
    private void addStages(Corner so, int next, Map<String, Choice> chosen, List<Corner> corners) {
        if (next == machine.stages().size()) {
            Map<String, StageConditions> stages = settled(chosen);
            if (rises(stages)) {
                corners.add(new Corner(so.label(), so.speed(), stages));
            }
            return;
        }
        String stage = machine.stages().get(next).name();
        StageRange range = machine.ranges().stages().get(stage);
        if (range == null || !base.stages().containsKey(stage)) {
            addStages(so, next + 1, chosen, corners);
            return;
        }
        for (Choice choice : choices(stage, range)) {
            Map<String, Choice> more = new LinkedHashMap<>(chosen);
            more.put(stage, choice);
            String label = so.label().isEmpty() || choice.label().isEmpty() ? so.label() : so.label() + APART;
            addStages(new Corner(label + choice.label(), so.speed(), so.stages()), next + 1, more, corners);
        }
    }

    private List<Choice> choices(String stage, StageRange range) {
        StageConditions written = written(stage);
        fixed(stage, "suctionPressure", range.suctionPressure(), written.suctionPressure());
        fixed(stage, "dischargePressure", range.dischargePressure(), written.dischargePressure());
        List<Choice> choices = new ArrayList<>();
        for (OptionalDouble suction : ends(range.suctionPressure())) {
            for (OptionalDouble temperature : ends(range.suctionTemperature())) {
                for (OptionalDouble discharge : ends(range.dischargePressure())) {
                    choices.add(choice(stage, suction, temperature, discharge, false));
                }
                range.reliefPressure()
                        .map(OptionalDouble::of)
                        .ifPresent(relief -> choices.add(choice(stage, suction, temperature, relief, true)));
            }
        }
        return choices;
    }

    /** A pressure that is found from balance has no range. */
    private void fixed(String stage, String key, Optional<Range> range, OptionalDouble written) {
        if (range.isPresent() && written.isEmpty()) {
            refusals.add(new Refusal(
                    "ranges.stages." + stage + "." + key,
                    "this pressure is balanced at \"" + base.name() + "\"; a range needs a pressure there"));
        }
    }

    private Choice choice(
            String stage,
            OptionalDouble suction,
            OptionalDouble temperature,
            OptionalDouble discharge,
            boolean atRelief) {
        StageConditions written = written(stage);
        StageConditions lines = new StageConditions(
                suction.isPresent() && written.suctionPressure().isPresent() ? suction : written.suctionPressure(),
                temperature.isPresent() ? temperature : written.suctionTemperature(),
                discharge.isPresent()
                                && (atRelief || written.dischargePressure().isPresent())
                        ? discharge
                        : written.dischargePressure());
        return new Choice(names.stage(stage, suction, temperature, discharge, atRelief), lines, atRelief);
    }

    private StageConditions written(String stage) {
        return base.stages()
                .getOrDefault(
                        stage,
                        new StageConditions(OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty()));
    }

    /** The conditions of all stages; where one lifts its relief valve, a balanced suction behind it has that pressure. */
    private Map<String, StageConditions> settled(Map<String, Choice> chosen) {
        Map<String, StageConditions> stages = new LinkedHashMap<>(base.stages());
        chosen.forEach((name, choice) -> stages.put(name, choice.lines()));
        for (Stage stage : machine.stages()) {
            Choice before = stage.follows().map(chosen::get).orElse(null);
            StageConditions lines = stages.get(stage.name());
            if (before != null
                    && before.atRelief()
                    && lines != null
                    && lines.suctionPressure().isEmpty()) {
                stages.put(
                        stage.name(),
                        new StageConditions(
                                before.lines().dischargePressure(),
                                lines.suctionTemperature(),
                                lines.dischargePressure()));
            }
        }
        return stages;
    }

    private boolean rises(Map<String, StageConditions> stages) {
        for (Map.Entry<String, StageConditions> stage : stages.entrySet()) {
            OptionalDouble suction = stage.getValue().suctionPressure();
            OptionalDouble discharge = stage.getValue().dischargePressure();
            boolean changed = !stage.getValue().equals(base.stages().get(stage.getKey()));
            boolean known = changed && suction.isPresent() && discharge.isPresent();
            if (known && !(discharge.getAsDouble() > suction.getAsDouble())) {
                refusals.add(
                        new Refusal(
                                "ranges.stages." + stage.getKey(),
                                names.pressure(discharge.getAsDouble()) + " of discharge with "
                                        + names.pressure(suction.getAsDouble())
                                        + " of suction at a corner; wanted is a discharge pressure above the suction pressure"));
                return false;
            }
        }
        return true;
    }

    /** Both ends, one where they are equal; a single empty one where there is no range. */
    private static List<OptionalDouble> ends(Optional<Range> range) {
        if (range.isEmpty()) {
            return List.of(OptionalDouble.empty());
        }
        OptionalDouble least = OptionalDouble.of(range.get().least());
        OptionalDouble greatest = OptionalDouble.of(range.get().greatest());
        return least.equals(greatest) ? List.of(least) : List.of(least, greatest);
    }
}
