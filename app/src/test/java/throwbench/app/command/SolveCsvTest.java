package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Revolution;

class SolveCsvTest {

    /** The order of the columns as the design fixes it, for the chambers of the sample. */
    private static final String HEADER = "crank_angle_deg,travel_m,velocity_m_s,acceleration_m_s2,rod_angle_deg,"
            + "rod_velocity_rad_s,rod_acceleration_rad_s2,pressure_Pa[A head],pressure_Pa[A crank],gas_load_N,"
            + "inertia_load_N,rod_load_N,piston_rod_load_N,guide_force_N,crosshead_pin_x_N,crosshead_pin_y_N,"
            + "crank_pin_x_N,crank_pin_y_N,main_bearing_x_N,main_bearing_y_N,throw_torque_N_m,shaft_torque_N_m,"
            + "shaft_speed_rad_s,shaking_force_x_N,shaking_force_y_N,shaking_couple_x_N_m,shaking_couple_y_N_m";

    @TempDir
    Path folder;

    @Test
    void headerNamesEveryColumnInTheOrderOfTheDesign() throws IOException {
        Run run = Run.of("solve", Run.machine(folder).toString());

        assertEquals(HEADER, run.out().lines().findFirst().orElseThrow());
        assertEquals("", run.err());
        assertEquals(ExitCode.DONE, run.code());
    }

    @Test
    void oneRowAStationEndsInALineFeedAndTheTurnIsNotRepeated() throws IOException {
        String out = Run.of("solve", Run.machine(folder).toString()).out();
        List<String> rows = out.lines().skip(1).toList();

        assertEquals(720, rows.size());
        assertEquals('\n', out.charAt(out.length() - 1));
        assertFalse(out.contains("\r"));
        for (int i = 0; i < rows.size(); i++) {
            assertEquals(360.0 * i / 720, Double.parseDouble(rows.get(i).split(",", -1)[0]));
        }
    }

    @Test
    void everyNumberReadsBackAsTheSolverHasIt() throws IOException {
        Path file = Run.machine(folder);
        Revolution solved = Revolution.solve(SampleMachine.running(file, 1), 0, 90);
        Run run = Run.of("solve", file.toString(), "--duty", "crank end unloaded", "--stations=90", "--throw", "A");
        List<String> names = List.of(HEADER.split(",", -1));
        List<String> rows = run.out().lines().skip(1).toList();

        for (int i = 0; i < 90; i++) {
            String[] cells = rows.get(i).split(",", -1);
            assertEquals(names.size(), cells.length);
            for (Column column : Column.values()) {
                if (column != Column.CRANK_ANGLE) {
                    double written = Double.parseDouble(cells[names.indexOf(column.fileName())]);
                    assertEquals(column.inFile(solved.at(column, i)) + 0.0, written, 0, column.fileName());
                }
            }
            assertEquals(solved.pressure(0, i), Double.parseDouble(cells[names.indexOf("pressure_Pa[A head]")]), 0);
            assertEquals(solved.pressure(1, i), Double.parseDouble(cells[names.indexOf("pressure_Pa[A crank]")]), 0);
        }
        assertEquals(90, rows.size());
    }

    @Test
    void chamberNamesWithCommasAndQuotesAreQuoted() throws IOException {
        Path file = Run.machine(folder, "\"A head\"", "\"A \\\"head\\\", outer\"");
        String header =
                Run.of("solve", file.toString()).out().lines().findFirst().orElseThrow();

        // RFC 4180, 2.6 and 2.7
        assertEquals(HEADER.replace("pressure_Pa[A head]", "\"pressure_Pa[A \"\"head\"\", outer]\""), header);
    }

    @Test
    void bothEndsOfTheRangeOfStationsAreSolved() throws IOException {
        String file = Run.machine(folder).toString();

        assertEquals(
                1 + 8, Run.of("solve", file, "--stations", "8").out().lines().count());
        assertEquals(
                1 + 36000,
                Run.of("solve", file, "--stations", "36000").out().lines().count());
    }

    @Test
    void noNumberIsNegativeZero() throws IOException {
        String out = Run.of("solve", Run.machine(folder).toString()).out();

        assertFalse(out.contains(",-0.0,") || out.contains(",-0.0\n"));
    }
}
