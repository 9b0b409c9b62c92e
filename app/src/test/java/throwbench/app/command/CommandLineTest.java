package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import throwbench.app.Release;
import throwbench.app.Samples;

class CommandLineTest {

    @TempDir
    Path folder;

    private static void assertRefused(String err, String... words) {
        assertEquals(new Run(ExitCode.REFUSED, "", err), Run.of(words));
    }

    @Test
    void exitCodesAreThoseOfTheDesign() {
        assertEquals(0, ExitCode.DONE.number());
        assertEquals(1, ExitCode.NOT_MET.number());
        assertEquals(2, ExitCode.REFUSED.number());
        assertEquals(3, ExitCode.FAILED.number());
    }

    @Test
    void helpListsEveryCommandWithItsOptions() {
        String expected = """
                Throwbench: a bench for the running gear of reciprocating compressors and plunger pumps.

                throwbench [MACHINE.json]
                    opens the window on a machine, or on a sample
                throwbench solve MACHINE.json [--duty NAME] [--throw NAME] [--stations 720] [--format csv|json]
                        [--out FILE]
                    Solves one throw of a machine over the revolution at a duty point.
                throwbench check MACHINE.json [--duty NAME] [--format text|json]
                    Judges a machine against its limits. The exit code is 0 when every judged finding is met, else 1.
                throwbench map MACHINE.json --across KEY=FROM..TO:N --up KEY=FROM..TO:N --of RESULT [--duty NAME]
                        [--throw NAME] [--out FILE]
                    Computes one result over two numbers of the machine file.
                throwbench limit MACHINE.json --vary KEY=FROM..TO --until ID [--duty NAME] [--throw NAME]
                    Finds how far one number of the machine file may go until a finding is just met.
                throwbench sensitivity MACHINE.json --of ID [--duty NAME] [--throw NAME]
                    Ranks the numbers of the machine file by how much a finding's margin changes with them.
                throwbench tolerance MACHINE.json [--samples 10000] [--seed 1] [--duty NAME]
                    Judges many machines drawn within the tolerances of the file, as "75 mm ± 0.1 mm".
                throwbench COMMAND --help
                    tells more of a command
                throwbench --version
                    tells which version this is

                Exit codes: 0 done; 1 a limit is not met; 2 the command or its input was wrong; 3 the program failed.
                """;

        assertEquals(new Run(ExitCode.DONE, expected, ""), Run.of("--help"));
        assertEquals(new Run(ExitCode.DONE, expected, ""), Run.of("-h"));
    }

    @Test
    void helpOfACommandTellsOfEveryOptionItTakes() {
        for (Command command : List.of(
                new SolveCommand(),
                new CheckCommand(),
                new MapCommand(),
                new LimitCommand(),
                new SensitivityCommand(),
                new ToleranceCommand())) {
            Run run = Run.of(command.name(), "--help");

            assertEquals(ExitCode.DONE, run.code());
            assertEquals("throwbench " + command.synopsis() + "\n\n" + command.help(), run.out());
            for (Option option : command.options()) {
                assertTrue(command.synopsis().contains(option.word() + " "), option.word());
                assertTrue(command.help().contains("  " + option.word() + " "), option.word());
            }
            assertTrue(command.help().lines().allMatch(line -> line.length() <= 100), command.name());
        }
    }

    @Test
    void versionIsTheBuilds() {
        assertEquals(
                new Run(ExitCode.DONE, "throwbench " + System.getProperty("throwbench.version") + "\n", ""),
                Run.of("--version"));
        assertEquals(System.getProperty("throwbench.version"), Release.number());
    }

    @Test
    void anUnknownCommandIsToldWhichAreNearAndWhichThereAre() {
        assertRefused("throwbench: sovle: no such command; perhaps solve\n", "sovle", "m.json");
        assertRefused(
                "throwbench: plot: no such command; there are solve, check, map, limit, sensitivity and tolerance\n",
                "plot",
                "m.json");
        assertRefused("throwbench: --hlep: no such option; perhaps --help\n", "--hlep");
        assertRefused("throwbench: -x: no such option; there are --help and --version\n", "-x");
    }

    @Test
    void everyFaultOfTheWordsHasItsOwnLine() {
        assertRefused("""
                throwbench: --dutty: no such option of solve; perhaps --duty
                throwbench: --q: no such option of solve; it takes --duty, --throw, --stations, --format, --out, --help
                throwbench: --throw: given twice, once is wanted
                throwbench: --out: nothing stands after it, FILE is wanted
                """, "solve", "m.json", "--dutty", "x", "--q=1", "--throw=A", "--throw", "B", "--out");
    }

    @Test
    void anOptionIsNoValueOfTheOneBeforeIt() {
        assertRefused(
                "throwbench: --duty: nothing stands after it, NAME is wanted\n",
                "check",
                "m.json",
                "--duty",
                "--format",
                "json");
    }

    @Test
    void aCommandTakesOneMachineFile() {
        assertRefused(
                "throwbench: check: no machine file given, one is wanted; throwbench check --help tells more\n",
                "check");
        assertRefused(
                "throwbench: two.json: one word too many, solve takes one machine file\n", "solve", "1", "two.json");
    }

    @Test
    void behindTwoDashesEverythingIsAFile() {
        assertRefused("--duty: no such file, wanted a machine file\n", "solve", "--", "--duty");
    }

    @Test
    void valuesOutOfTheirRangeAreToldWhatIsWanted() {
        String stations = ", a whole number from 8 to 36000 is wanted\n";

        assertRefused("throwbench: --stations: \"7\"" + stations, "solve", "m.json", "--stations", "7");
        assertRefused("throwbench: --stations: \"36001\"" + stations, "solve", "m.json", "--stations", "36001");
        assertRefused("throwbench: --stations: \"-8\"" + stations, "solve", "m.json", "--stations", "-8");
        assertRefused("throwbench: --stations: \"9.5\"" + stations, "solve", "m.json", "--stations=9.5");
        assertRefused("throwbench: --stations: \"\"" + stations, "solve", "m.json", "--stations=");
        assertRefused("throwbench: --format: \"xml\", csv or json is wanted\n", "solve", "m.json", "--format", "xml");
        assertRefused("throwbench: --format: \"csv\", text or json is wanted\n", "check", "m.json", "--format", "csv");
    }

    @Test
    void aFileThatIsNoneIsNamedWithWhatItIs() throws IOException {
        String gone = folder.resolve("gone.json").toString();
        Path broken = Files.writeString(folder.resolve("broken.json"), "{ \"throwbench\": 1,\n  \"name\" \"x\" }");

        assertRefused(gone + ": no such file, wanted a machine file\n", "solve", gone);
        assertRefused(folder + ": a folder, wanted a machine file\n", "check", folder.toString());
        Run run = Run.of("check", broken.toString());
        assertEquals(ExitCode.REFUSED, run.code());
        assertTrue(run.err().startsWith(broken + ": line 2, column 10: "), run.err());
        assertEquals(1, run.err().lines().count());
    }

    @Test
    void everyFaultOfAFileHasItsOwnLineWithItsPath() throws IOException {
        Path file = Run.machineWith(Run.machine(folder), text -> text.replace("\"75 mm\"", "\"-75 mm\"")
                .replace("\"side\": \"head\"", "\"side\": \"top\""));
        List<String> lines = Run.of("solve", file.toString()).err().lines().toList();

        assertEquals(2, lines.size(), lines.toString());
        assertTrue(lines.get(0).startsWith(file + ": throws[0].crankRadius: "), lines.get(0));
        assertTrue(lines.get(1).startsWith(file + ": throws[0].chambers[0].side: "), lines.get(1));
    }

    @Test
    void anUnknownDutyPointOrThrowIsToldWhichExist() throws IOException {
        String file = Run.machine(folder).toString();
        String duty = file + ": dutyPoints: no duty point \"norml\", the file has \"normal\", \"crank end unloaded\"\n";

        assertRefused(
                duty + file + ": throws: no throw \"Q\", the file has \"A\"\n",
                "solve",
                file,
                "--duty",
                "norml",
                "--throw",
                "Q");
        assertRefused(duty, "check", file, "--duty", "norml");
    }

    @Test
    void whatCannotBeSolvedIsRefusedWithItsPlace() throws IOException {
        Path cold = Run.machine(
                folder,
                "\"molarMass\": \"27.2 g/mol\", \"isentropicExponent\": 1.29",
                "\"mixture\": { \"methane\": 1 }");
        Run.machineWith(cold, text -> text.replace("\"32 degC\"", "\"-150 degC\""));
        String file = cold.toString();
        String reason = "the heat capacity of methane is known from 200 K to 1000 K, not at 123.1 K\n";
        String refusal =
                file + ": throws[0].chambers[0].cycle: " + reason + file + ": throws[0].chambers[1].cycle: " + reason;

        assertRefused(refusal, "solve", file);
        assertRefused(refusal, "check", file);
    }

    @Test
    void aFailureOfTheProgramIsOneSentence() {
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        CommandLine failing =
                new CommandLine(List.of(new FailingCommand()), new Terminal(new ByteArrayOutputStream(), err));

        assertEquals(ExitCode.FAILED, failing.run(List.of("fail", "m.json")));
        assertEquals(
                "throwbench: the program failed, not the machine file: IllegalStateException: travel_m came out as NaN\n",
                err.toString(StandardCharsets.UTF_8));
    }

    private static final class FailingCommand implements Command {
        @Override
        public String name() {
            return "fail";
        }

        @Override
        public String synopsis() {
            return "fail MACHINE.json";
        }

        @Override
        public String help() {
            return "Fails.\n";
        }

        @Override
        public List<Option> options() {
            return List.of();
        }

        @Override
        public ExitCode run(Arguments arguments, Terminal terminal) {
            throw new IllegalStateException("travel_m came out as NaN");
        }
    }

    @Test
    void withoutAWindowTheFindingsAreShownAndTheJobIsDoneWhateverTheVerdict() throws IOException {
        String limited = Run.machine(folder, "\"rodTension\": \"120 kN\"", "\"rodTension\": \"20 kN\"")
                .toString();
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        CommandLine commandLine = new CommandLine(new Terminal(out, err));

        assertEquals(ExitCode.DONE, commandLine.showInstead("there is no display", List.of(limited)));
        assertEquals(
                "throwbench: no window: there is no display; here are the findings instead\n",
                err.toString(StandardCharsets.UTF_8));
        assertEquals(Run.of("check", limited).out(), out.toString(StandardCharsets.UTF_8));
        assertEquals(ExitCode.NOT_MET, Run.of("check", limited).code());
    }

    @Test
    void withoutAWindowAndAFileTheSampleIsShown() throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        CommandLine commandLine = new CommandLine(new Terminal(out, new ByteArrayOutputStream()));

        Path sample = Files.writeString(folder.resolve("sample.json"), Samples.text(Samples.DEFAULT));

        assertEquals(ExitCode.DONE, commandLine.showInstead("there is no display", List.of()));
        assertEquals(Run.of("check", sample.toString()).out(), out.toString(StandardCharsets.UTF_8));
    }

    @Test
    void withoutAWindowAWrongFileIsStillRefused() {
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        CommandLine commandLine = new CommandLine(new Terminal(new ByteArrayOutputStream(), err));

        assertEquals(ExitCode.REFUSED, commandLine.showInstead("there is no display", List.of("gone.json")));
        assertEquals("""
                throwbench: no window: there is no display; here are the findings instead
                gone.json: no such file, wanted a machine file
                """, err.toString(StandardCharsets.UTF_8));
    }
}
