package throwbench.app.strip;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import throwbench.app.bench.ShownMachines;
import throwbench.app.drawing.ColumnWords;
import throwbench.app.drawing.Signal;
import throwbench.solver.machine.Throw;
import throwbench.solver.revolution.Column;

class LanesTest {

    private final Throw shown = ShownMachines.booster().throwsInOrder().get(0);

    @Test
    void everyColumnButTheAxisHasALaneAndOneTraceInIt() {
        List<Column> all = Arrays.stream(Column.values())
                .filter(c -> c != Column.CRANK_ANGLE)
                .toList();
        List<Lane> lanes = Lanes.of(shown, all);
        for (Column column : all) {
            long traces = lanes.stream()
                    .flatMap(l -> l.traces().stream())
                    .filter(t -> t.signal().equals(new Signal.OfColumn(column)))
                    .count();
            assertEquals(1, traces, column::name);
        }
        assertThrows(IllegalArgumentException.class, () -> Lane.Kind.of(Column.CRANK_ANGLE));
    }

    @Test
    void columnsOfALaneShareTheirKindOfQuantity() {
        for (Column a : Column.values()) {
            for (Column b : Column.values()) {
                if (a != Column.CRANK_ANGLE && b != Column.CRANK_ANGLE && Lane.Kind.of(a) == Lane.Kind.of(b)) {
                    assertEquals(a.kind(), b.kind(), () -> a + " and " + b);
                }
            }
        }
    }

    @Test
    void usualLanesAreLoadsPressureTorqueAndSpeed() {
        assertEquals(
                List.of(Lane.Kind.LOADS, Lane.Kind.PRESSURE, Lane.Kind.TORQUE, Lane.Kind.SPEED),
                Lanes.of(shown, List.of()).stream().map(Lane::kind).toList());
    }

    @Test
    void everyColumnHasItsOwnName() {
        assertEquals(
                Column.values().length,
                Arrays.stream(Column.values())
                        .map(ColumnWords::title)
                        .distinct()
                        .count());
    }
}
