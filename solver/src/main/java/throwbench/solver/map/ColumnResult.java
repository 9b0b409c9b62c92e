package throwbench.solver.map;

import java.util.Optional;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.Revolution;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Traces;

/**
 * The greatest or least value of a column over the revolution, in the column's unit: refined between stations.
 *
 * @param greatest the greatest value, and not the least
 */
record ColumnResult(Column column, boolean greatest) implements Result {

    @Override
    public String text() {
        return column.fileName() + (greatest ? ".max" : ".min");
    }

    @Override
    public String unit() {
        return "";
    }

    @Override
    public Probe probe(int throwIndex) {
        return new Kept(throwIndex);
    }

    /** Lends the geometry of one revolution to the next. */
    private final class Kept implements Probe {

        private final int throwIndex;
        private Optional<Revolution> earlier = Optional.empty();

        Kept(int throwIndex) {
            this.throwIndex = throwIndex;
        }

        @Override
        public Outcome at(RunningMachine running) {
            Traces traces = Traces.of(running, throwIndex, earlier);
            earlier = Optional.of(traces.revolution());
            Extremes extremes = Extremes.of(traces.column(column));
            double value = (greatest ? extremes.greatest() : extremes.least()).value();
            return Outcome.of(column.inFile(value));
        }
    }
}
