package throwbench.solver.finding;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Stage;
import throwbench.solver.machine.Throw;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extreme;
import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.MachineHarmonics;
import throwbench.solver.revolution.MachineMeans;
import throwbench.solver.revolution.Reversal;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Traces;

/** A machine running at a duty point, with what several criteria need of it computed once. Not for several threads. */
public final class JudgedDuty {

    private final RunningMachine running;
    private final List<ThrowResults> throwResults = new ArrayList<>();
    private Optional<MachineMeans> means = Optional.empty();
    private Optional<MachineHarmonics> harmonics = Optional.empty();

    /** What is known of one throw so far. */
    private static final class ThrowResults {
        private Optional<Traces> traces = Optional.empty();
        private Optional<Reversal> reversal = Optional.empty();
        private final Map<Column, Extremes> extremes = new EnumMap<>(Column.class);
    }

    public JudgedDuty(RunningMachine running) {
        this.running = running;
        for (int i = 0; i < running.throwsInOrder().size(); i++) {
            throwResults.add(new ThrowResults());
        }
    }

    public RunningMachine running() {
        return running;
    }

    /** Name of the duty point. */
    public String name() {
        return running.dutyPoint().name();
    }

    /** Number of throws. */
    public int throwCount() {
        return throwResults.size();
    }

    /** A throw as described. */
    public Throw described(int throwIndex) {
        return running.throwsInOrder().get(throwIndex).described();
    }

    /** A throw of this duty point as the place of a finding. */
    public Finding.Place place(int throwIndex) {
        return Finding.Place.ofThrow(name(), described(throwIndex).name());
    }

    /** Names of the stages that have chambers, in the order of the file. */
    List<String> stages() {
        return running.machine().stages().stream()
                .map(Stage::name)
                .filter(stage -> running.machine().throwsInOrder().stream()
                        .flatMap(t -> t.chambers().stream())
                        .anyMatch(
                                chamber -> chamber.stage().filter(stage::equals).isPresent()))
                .toList();
    }

    /** The limit for a throw: its own before the machine's before the criterion's default. */
    public OptionalDouble limit(Criterion criterion, int throwIndex) {
        return limit(criterion, place(throwIndex), OptionalDouble.empty());
    }

    /** The limit for a place: a narrower level before a wider one, then what is usual there, then the default. */
    private OptionalDouble limit(Criterion criterion, Finding.Place where, OptionalDouble usual) {
        for (Limits level : levels(where)) {
            OptionalDouble set = level.get(criterion.limitKey());
            if (set.isPresent()) {
                // angles are limited in degrees, everything else in SI
                return criterion.unit().equals("deg") ? OptionalDouble.of(Math.toDegrees(set.getAsDouble())) : set;
            }
        }
        return usual.isPresent() ? usual : criterion.defaultLimit();
    }

    /** The limits set for a place: its chamber's, its throw's, its stage's, the machine's. */
    private List<Limits> levels(Finding.Place where) {
        Machine machine = running.machine();
        List<Limits> levels = new ArrayList<>();
        for (Throw t : machine.throwsInOrder()) {
            if (where.throwName().filter(t.name()::equals).isPresent()) {
                t.chambers().stream()
                        .filter(c -> where.chamber().filter(c.name()::equals).isPresent())
                        .map(Chamber::limits)
                        .forEach(levels::add);
                levels.add(t.limits());
            }
        }
        where.stage().map(machine::stage).map(Stage::limits).ifPresent(levels::add);
        levels.add(machine.limits());
        return levels;
    }

    /** Holds what was found at a place against the limit there. */
    Finding held(Criterion criterion, Finding.Place where, Found found) {
        OptionalDouble limit = limit(criterion, where, found.usual());
        return found.value().isPresent()
                ? Finding.judged(criterion, where, found.value().getAsDouble(), limit, found.angle(), found.note())
                : Finding.unknown(criterion, where, limit, found.note());
    }

    /** The reversal of a throw's rod load. */
    public Reversal reversal(int throwIndex) {
        ThrowResults results = throwResults.get(throwIndex);
        Reversal reversal = results.reversal.orElseGet(
                () -> Reversal.of(Traces.rodLoad(traces(throwIndex).revolution())));
        results.reversal = Optional.of(reversal);
        return reversal;
    }

    /** Extremes of a column of a throw. */
    public Extremes extremes(int throwIndex, Column column) {
        return throwResults
                .get(throwIndex)
                .extremes
                .computeIfAbsent(column, c -> Extremes.of(traces(throwIndex).column(c)));
    }

    /** The greatest size of a force of a throw that two columns hold the components of. */
    Extreme greatestSize(int throwIndex, Column x, Column y) {
        return Extremes.of(traces(throwIndex).size(x, y)).greatest();
    }

    /** Mean torque, power and flow of the machine. */
    MachineMeans means() {
        MachineMeans known = means.orElseGet(() -> MachineMeans.of(running));
        means = Optional.of(known);
        return known;
    }

    /** Harmonics of torques and shaking forces. */
    MachineHarmonics harmonics() {
        MachineHarmonics known = harmonics.orElseGet(() -> MachineHarmonics.of(running));
        harmonics = Optional.of(known);
        return known;
    }

    private Traces traces(int throwIndex) {
        ThrowResults results = throwResults.get(throwIndex);
        Traces traces = results.traces.orElseGet(() -> Traces.of(running, throwIndex, Optional.empty()));
        results.traces = Optional.of(traces);
        return traces;
    }
}
