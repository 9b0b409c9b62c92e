package throwbench.solver.finding;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Throw;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.Reversal;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Traces;

/** A machine running at a duty point, with what several criteria need of it computed once. Not for several threads. */
public final class JudgedDuty {

    private final RunningMachine running;
    private final List<Optional<Traces>> traces = new ArrayList<>();
    private final List<Optional<Reversal>> reversals = new ArrayList<>();

    public JudgedDuty(RunningMachine running) {
        this.running = running;
        for (int i = 0; i < running.throwsInOrder().size(); i++) {
            traces.add(Optional.empty());
            reversals.add(Optional.empty());
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
        return traces.size();
    }

    /** A throw as described. */
    public Throw described(int throwIndex) {
        return running.throwsInOrder().get(throwIndex).described();
    }

    /** A throw of this duty point as the place of a finding. */
    public Finding.Place place(int throwIndex) {
        return Finding.Place.ofThrow(name(), described(throwIndex).name());
    }

    /** The limit for a throw: its own before the machine's before the criterion's default. */
    public OptionalDouble limit(Criterion criterion, int throwIndex) {
        LimitKey key = criterion.limitKey();
        OptionalDouble own = described(throwIndex).limits().get(key);
        Limits wide = running.machine().limits();
        OptionalDouble set = own.isPresent() ? own : wide.get(key);
        if (set.isEmpty()) {
            return criterion.defaultLimit();
        }
        // angles are limited in degrees, everything else in SI
        return criterion.unit().equals("deg") ? OptionalDouble.of(Math.toDegrees(set.getAsDouble())) : set;
    }

    /** The reversal of a throw's rod load. */
    public Reversal reversal(int throwIndex) {
        Optional<Reversal> known = reversals.get(throwIndex);
        if (known.isPresent()) {
            return known.get();
        }
        Reversal found = Reversal.of(Traces.rodLoad(tracesOf(throwIndex).revolution()));
        reversals.set(throwIndex, Optional.of(found));
        return found;
    }

    /** Extremes of a column of a throw. */
    public Extremes extremes(int throwIndex, Column column) {
        return Extremes.of(tracesOf(throwIndex).column(column));
    }

    private Traces tracesOf(int throwIndex) {
        Optional<Traces> known = traces.get(throwIndex);
        if (known.isPresent()) {
            return known.get();
        }
        Traces made = Traces.of(running, throwIndex, Optional.empty());
        traces.set(throwIndex, Optional.of(made));
        return made;
    }
}
