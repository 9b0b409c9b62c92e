package throwbench.solver.map;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.attached.AttachedFiles;
import throwbench.solver.finding.Judgement;
import throwbench.solver.machine.Machine;

class DutyMapTest {

    private static final double BAR = 1e5;

    private final Subject subject = Boosters.subject();
    private final Variable speed = Boosters.variable(subject, Boosters.SPEED);
    private final Variable suction = Boosters.variable(subject, Boosters.SUCTION);

    private MapRun run(String result, int columns, int rows) {
        return new MapRun(
                subject,
                new Axis(speed, 300 * Boosters.RPM, 1500 * Boosters.RPM, columns),
                new Axis(suction, 3 * BAR, 14 * BAR, rows),
                Boosters.result(subject, result));
    }

    private static List<Outcome> cells(DutyMap map) {
        List<Outcome> cells = new ArrayList<>();
        for (int row = 0; row < map.up().points(); row++) {
            for (int column = 0; column < map.across().points(); column++) {
                cells.add(map.at(column, row).orElseThrow());
            }
        }
        return cells;
    }

    /** Identity: a cell against the file with both numbers written into it, read, settled and judged as check does. */
    @Test
    void everyPossibleCellIsWhatTheFileWithItsNumbersGives() {
        for (String id : List.of("rod-load-tension", "reversal-duration", "reversal-duration.margin", "shaft-power")) {
            DutyMap map = run(id, 4, 5).fill(2, Watch.NONE);
            int possible = 0;
            for (int row = 0; row < 5; row++) {
                for (int column = 0; column < 4; column++) {
                    MachineDocument edited = subject.document()
                            .withNumber(speed.path(), map.across().at(column))
                            .withNumber(suction.path(), map.up().at(row));
                    Optional<Machine> machine = edited.read(AttachedFiles.NONE).machine();
                    Outcome cell = map.at(column, row).orElseThrow();
                    assertEquals(machine.isPresent(), cell.isPossible(), cell.reason());
                    if (machine.isPresent()) {
                        // sign changes are found to 1e-10 rad on either way
                        assertEquals(judged(machine.get(), id), cell.value().getAsDouble(), 1e-7);
                        possible++;
                    }
                }
            }
            assertEquals(16, possible, id);
        }
    }

    private static double judged(Machine machine, String result) {
        boolean margin = result.endsWith(".margin");
        String id = result.replace(".margin", "");
        return Judgement.of(machine, machine.dutyPoints().subList(0, 1)).findings().stream()
                .filter(f -> f.criterion().id().equals(id))
                .filter(f -> f.where().throwName().map("A"::equals).orElse(true))
                .mapToDouble(f -> (margin ? f.margin() : f.value()).orElseThrow())
                .findFirst()
                .orElseThrow();
    }

    @Test
    void anImpossibleCellSaysWhy() {
        Outcome last = run("rod_load_N.max", 2, 2).fill(1, Watch.NONE).at(0, 1).orElseThrow();

        assertEquals(
                "dutyPoints[0].stages.first.dischargePressure: dischargePressure \"11.5 bar g\" with suctionPressure"
                        + " \"1400000 Pa a\" and the losses of A head, wanted a discharge pressure above the suction"
                        + " pressure",
                last.reason());
        assertFalse(last.isPossible());
    }

    @Test
    void anyNumberOfThreadsGivesTheSameMap() {
        for (String result : List.of("reversal-duration", "rod_load_N.min", "pressure_Pa[B head].max")) {
            List<Outcome> one = cells(run(result, 9, 7).fill(1, Watch.NONE));

            assertEquals(one, cells(run(result, 9, 7).fill(2, Watch.NONE)), result);
            assertEquals(one, cells(run(result, 9, 7).fill(5, Watch.NONE)), result);
        }
    }

    @Test
    void aCancelledMapKeepsItsCoarseNet() {
        MapRun run = run("reversal-duration", 9, 9);
        // the net of every eighth cell has four of them, that of every fourth nine
        DutyMap map = run.fill(1, new Stop(9));

        assertEquals(9, map.known());
        assertFalse(map.isComplete());
        for (int row = 0; row < 9; row++) {
            for (int column = 0; column < 9; column++) {
                boolean ofNet = row % 4 == 0 && column % 4 == 0;
                assertEquals(ofNet, map.at(column, row).isPresent());
                assertEquals(map.at(column / 4 * 4, row / 4 * 4), map.nearest(column, row));
            }
        }
        assertEquals(9, run.snapshot().known());
    }

    @Test
    void nothingIsNearestBeforeTheFirstCell() {
        DutyMap map = run("reversal-duration", 3, 3).snapshot();

        assertEquals(Optional.empty(), map.nearest(2, 2));
        assertTrue(map.least().isEmpty());
        assertTrue(map.greatest().isEmpty());
    }

    @Test
    void progressCountsEveryCellOnce() {
        List<Integer> parts = new ArrayList<>();
        run("reversal-duration", 6, 5).fill(3, new Watch() {
            @Override
            public void done(int part, int total) {
                assertEquals(30, total);
                parts.add(part);
            }
        });

        assertEquals(IntStream.rangeClosed(1, 30).boxed().toList(), parts);
    }

    @Test
    void leastAndGreatestAreThoseOfTheCells() {
        DutyMap map = run("rod_load_N.max", 4, 4).fill(2, Watch.NONE);
        double[] values = cells(map).stream()
                .flatMapToDouble(cell -> cell.value().stream())
                .sorted()
                .toArray();

        assertTrue(map.isComplete());
        assertEquals(values[0], map.least().getAsDouble());
        assertEquals(values[values.length - 1], map.greatest().getAsDouble());
    }

    @Test
    void anAxisHasBothEndsExactly() {
        Axis axis = new Axis(speed, 0.1, 0.7, 7);

        assertEquals(0.1, axis.at(0));
        assertEquals(0.7, axis.at(6));
        // identity: equal steps
        assertEquals(0.4, axis.at(3), 1e-15);
    }

    /** Ends a study after so many parts. */
    private static final class Stop implements Watch {
        private final int parts;
        private int done;

        Stop(int parts) {
            this.parts = parts;
        }

        @Override
        public synchronized void done(int part, int total) {
            done = part;
        }

        @Override
        public synchronized boolean cancelled() {
            return done >= parts;
        }
    }
}
