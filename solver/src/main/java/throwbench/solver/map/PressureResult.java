package throwbench.solver.map;

import java.util.Optional;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Traces;

/**
 * The greatest or least pressure in a chamber over the revolution, Pa absolute.
 *
 * @param throwOfChamber index of the throw that carries the chamber, whatever throw is shown
 * @param index of the chamber among its throw's
 */
record PressureResult(String chamber, int throwOfChamber, int index, boolean greatest) implements Result {

    @Override
    public String text() {
        return Column.pressureName(chamber) + (greatest ? ".max" : ".min");
    }

    @Override
    public String unit() {
        return "";
    }

    @Override
    public Probe probe(int throwIndex) {
        return this::at;
    }

    private Outcome at(RunningMachine running) {
        Extremes extremes =
                Extremes.of(Traces.of(running, throwOfChamber, Optional.empty()).pressure(index));
        return Outcome.of((greatest ? extremes.greatest() : extremes.least()).value());
    }
}
