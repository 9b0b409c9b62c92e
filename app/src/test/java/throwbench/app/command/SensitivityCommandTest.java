package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SensitivityCommandTest {

    @TempDir
    Path folder;

    /** Closed form: margin l/(4 r) − 1 with l/r = 5.333, at 1 % of l, r and the limit. */
    @Test
    void numbersAreRankedWithBothChanges() throws IOException {
        String file = Run.machine(folder, "\"reversalDuration\": \"15 deg\"", "\"rodToCrankRatio\": 4")
                .toString();
        Run run = Run.of("sensitivity", file, "--of", "rod-to-crank-ratio");

        assertEquals(ExitCode.DONE, run.code());
        assertEquals("", run.err());
        assertTrue(run.out().startsWith("""
                Saltmarsh biogas booster at "normal", throw A
                rod to crank ratio: margin +33.3 %

                Change of the margin when a number changes by 1 % of its SI value, an angle by 1 deg:

                          up        down  number
                """), run.out());
        assertTrue(run.out().contains("\n     -1.32 %     +1.35 %  throws[0].crankRadius  75 mm\n"), run.out());
        assertTrue(run.out().contains("\n     -1.32 %     +1.35 %  limits.rodToCrankRatio  4\n"), run.out());
        assertTrue(run.out().contains("\n     +1.33 %     -1.33 %  throws[0].rodLength  400 mm\n"), run.out());
        assertTrue(run.out().endsWith(" other numbers change nothing.\n"), run.out());
        // nothing but those three moves it
        assertEquals(
                3,
                run.out()
                        .lines()
                        .filter(line -> line.startsWith("     ") && line.contains(" %  "))
                        .count());
        assertTrue(run.out().lines().allMatch(line -> line.length() <= 100), run.out());
    }

    @Test
    void aChangeThatIsImpossibleSaysWhy() throws IOException {
        Path file = Run.machine(folder, "\"rodLength\": \"400 mm\"", "\"rodLength\": \"130.5 mm\"");
        String out = Run.of("sensitivity", file.toString(), "--of", "reversal-duration")
                .out();

        assertTrue(out.contains("  impossible  throws[0].rodLength  130.5 mm\n"), out);
        assertTrue(
                out.contains("\n                          down: throws[0].connectingRod.massCentreFromCrankPin:"), out);
        assertTrue(out.lines().allMatch(line -> line.length() <= 100), out);
    }

    @Test
    void withoutAMarginThereIsNothingToRank() throws IOException {
        String file = Run.machine(folder).toString();

        assertEquals(
                new Run(ExitCode.REFUSED, "", "throwbench: --of: mean-piston-speed has no margin: no limit given\n"),
                Run.of("sensitivity", file, "--of", "mean-piston-speed"));
        assertEquals(
                new Run(ExitCode.REFUSED, "", "throwbench: --of: is missing, ID is wanted\n"),
                Run.of("sensitivity", file));
        assertTrue(Run.of("sensitivity", file, "--of", "reversal-rato")
                .err()
                .startsWith("throwbench: --of: no such finding \"reversal-rato\"; perhaps reversal-ratio\n"));
    }
}
