package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class LimitCommandTest {

    @TempDir
    Path folder;

    private Run limit(String limits, String vary, String until) throws IOException {
        String file =
                Run.machine(folder, "\"reversalDuration\": \"15 deg\"", limits).toString();
        return Run.of("limit", file, "--vary", vary, "--until", until);
    }

    /** Closed form: 4.5 m/s = 2 · 150 mm · n gives 900 rpm; margins 1 − n/900. */
    @Test
    void aLimitIsSaidInTheUnitsAskedIn() throws IOException {
        assertEquals(
                new Run(ExitCode.DONE, """
                        Saltmarsh biogas booster at "normal", throw A
                        mean piston speed over drive.speed from 450 rpm to 1800 rpm

                          just met at  900 rpm  met below, not met above

                        Margin +50.0 % at 450 rpm and -100.0 % at 1800 rpm.
                        """, ""),
                limit("\"meanPistonSpeed\": \"4.5 m/s\"", "drive.speed=450 rpm..1800 rpm", "mean-piston-speed"));
        assertTrue(limit("\"meanPistonSpeed\": \"4.5 m/s\"", "drive.speed=30 Hz..7.5 Hz", "mean-piston-speed")
                .out()
                .contains("\n  just met at  15 Hz  met below, not met above\n"));
    }

    @Test
    void noLimitInTheRangeIsSaid() throws IOException {
        assertEquals(
                new Run(ExitCode.DONE, """
                        Saltmarsh biogas booster at "normal", throw A
                        mean piston speed over drive.speed from 450 rpm to 675 rpm

                          nowhere just met: met all the way

                        Margin +50.0 % at 450 rpm and +25.0 % at 675 rpm.
                        """, ""),
                limit("\"meanPistonSpeed\": \"4.5 m/s\"", "drive.speed=450 rpm..675 rpm", "mean-piston-speed"));
        assertTrue(limit("\"meanPistonSpeed\": \"4.5 m/s\"", "drive.speed=950 rpm..1000 rpm", "mean-piston-speed")
                .out()
                .contains("\n  nowhere just met: not met all the way\n"));
    }

    /** A rod that is too short for its mass centre makes no machine; l/r = 4 at 300 mm. */
    @Test
    void whereTheMachineEndsIsSaidWithItsReason() throws IOException {
        String out = limit("\"rodToCrankRatio\": 4", "throws[0].rodLength=100 mm..500 mm", "rod-to-crank-ratio")
                .out();

        assertTrue(out.contains("\n  ends at      130 mm  not met above; not possible below:\n"), out);
        assertTrue(
                out.replaceAll("\\s+", " ").contains("wanted a mass centre on the rod, from 0 to rodLength just"), out);
        assertTrue(out.contains("\n  just met at  300 mm  not met below, met above\n"), out);
        assertTrue(out.contains("\nMargin none at 100 mm and +66.7 % at 500 mm; least, -56.7 % at 130 mm.\n"), out);
        assertTrue(out.lines().allMatch(line -> line.length() <= 100), out);
    }

    @Test
    void withoutAMarginThereIsNothingToFind() throws IOException {
        Run run = limit("\"rodToCrankRatio\": 4", "drive.speed=450 rpm..675 rpm", "mean-piston-speed");

        assertEquals(
                new Run(
                        ExitCode.REFUSED,
                        "",
                        "throwbench: --until: the margin of mean-piston-speed cannot be had anywhere in the range: no limit"
                                + " given\n"),
                run);
    }

    @Test
    void whatIsWrongIsSaid() throws IOException {
        String file = Run.machine(folder).toString();

        assertEquals(new Run(ExitCode.REFUSED, "", """
                        throwbench: --vary: is missing, KEY=FROM..TO is wanted
                        throwbench: --until: is missing, ID is wanted
                        """), Run.of("limit", file));
        Run run = Run.of("limit", file, "--vary", "drive.speed=600 rpm", "--until", "rod-load-tensoin");
        assertEquals(ExitCode.REFUSED, run.code());
        assertTrue(
                run.err()
                        .startsWith("throwbench: --vary: \"drive.speed=600 rpm\", KEY=FROM..TO is wanted, as"
                                + " drive.speed=600 rpm..1000 rpm\nthrowbench: --until: no such finding \"rod-load-tensoin\";"
                                + " perhaps rod-load-tension\nthrowbench: --until: ID of gas-load-tension, "),
                run.err());
    }
}
