package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ToleranceCommandTest {

    @TempDir
    Path folder;

    private String file() throws IOException {
        Path file = Run.machine(folder, "\"740 rpm\"", "\"740 rpm ± 20 rpm\"");
        return Run.machineWith(
                        file,
                        text -> text.replace("\"reversalDuration\": \"15 deg\"", "\"meanPistonSpeed\": \"3.75 m/s\""))
                .toString();
    }

    /** Closed form: the speed is uniform from 720 to 760 rpm and may be 750: three quarters meet it, give or take. */
    @Test
    void theLeastOftenMetFindingStandsFirst() throws IOException {
        Run run = Run.of("tolerance", file(), "--samples", "400", "--seed", "3");
        String[] lines = run.out().split("\n", -1);

        assertEquals(ExitCode.DONE, run.code());
        assertEquals("", run.err());
        assertEquals("Saltmarsh biogas booster at \"normal\"", lines[0]);
        assertEquals("400 machines drawn with seed 3 within the tolerances of 1 quantity:", lines[1]);
        assertEquals("  drive.speed 740 rpm ± 20 rpm", lines[2]);
        assertEquals("   met by  finding                     margin        5 %       95 %", lines[4]);
        String first = lines[5];
        assertTrue(first.contains(" %  mean piston speed           +1.3 %     -"), first);
        assertTrue(first.endsWith("  throw A"), first);
        double share = Double.parseDouble(first.substring(0, first.indexOf('%')).strip());
        assertEquals(75, share, 4 * 100 * Math.sqrt(0.75 * 0.25 / 400));
        // it alone is missed by any
        String answer =
                first.substring(0, first.indexOf('%') + 1).strip() + " of the machines meet every judged finding.";
        assertTrue(run.out().contains("\n" + answer + "\n"), run.out());
        assertTrue(run.out().lines().allMatch(line -> line.length() <= 100), run.out());
    }

    @Test
    void theSameSeedGivesTheSameText() throws IOException {
        String file = file();
        Run one = Run.of("tolerance", file, "--samples", "50");

        assertEquals(one, Run.of("tolerance", file, "--samples", "50", "--seed", "1"));
        assertTrue(!one.out()
                .equals(Run.of("tolerance", file, "--samples", "50", "--seed", "2")
                        .out()));
    }

    @Test
    void machinesThatCannotRunAreCounted() throws IOException {
        Path file = Run.machine(folder, "\"rodLength\": \"400 mm\"", "\"rodLength\": \"400 mm ± 390 mm\"");
        String out = Run.of("tolerance", file.toString(), "--samples", "60").out();

        assertTrue(out.contains(" of them cannot run and meet nothing; the first: throws[0]."), out);
        assertTrue(out.lines().allMatch(line -> line.length() <= 100), out);
    }

    @Test
    void whatIsWrongIsSaid() throws IOException {
        String file = Run.machine(folder).toString();

        assertEquals(
                new Run(
                        ExitCode.REFUSED,
                        "",
                        file + ": no quantity of this duty point carries a tolerance, as \"75 mm ± 0.1 mm\"\n"),
                Run.of("tolerance", file));
        assertEquals(new Run(ExitCode.REFUSED, "", """
                        throwbench: --samples: "0", a whole number from 1 to 1000000 is wanted
                        throwbench: --seed: "x", a whole number from 0 to 9223372036854775807 is wanted
                        """), Run.of("tolerance", file, "--samples", "0", "--seed", "x"));
    }
}
