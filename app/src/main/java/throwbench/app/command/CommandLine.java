package throwbench.app.command;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import throwbench.app.Release;
import throwbench.app.Samples;

/** The program without a window: finds the command of the first word and runs it. */
public final class CommandLine {

    private final List<Command> commands;
    private final Terminal terminal;

    /** Every command, with a terminal to speak to. */
    public CommandLine(Terminal terminal) {
        this(
                List.of(
                        new SolveCommand(),
                        new CheckCommand(),
                        new MapCommand(),
                        new LimitCommand(),
                        new SensitivityCommand(),
                        new ToleranceCommand()),
                terminal);
    }

    CommandLine(List<Command> commands, Terminal terminal) {
        this.commands = commands;
        this.terminal = terminal;
    }

    /** Whether a word is a command or an option, and not a machine file. */
    public boolean knows(String word) {
        return word.startsWith("-") || find(word).isPresent();
    }

    /**
     * Runs the words of a command line.
     *
     * @param words at least one
     */
    public ExitCode run(List<String> words) {
        return guarded(words, false);
    }

    /**
     * Says in one line why no window opens, and prints the findings of the machine it would have shown.
     *
     * @param machineFile none, or one
     */
    public ExitCode showInstead(String lacking, List<String> machineFile) {
        terminal.warn("throwbench: no window: " + lacking + "; here are the findings instead");
        return guarded(machineFile, true);
    }

    /** The one place that a failure of the program comes to: it is said in a sentence. */
    private ExitCode guarded(List<String> words, boolean show) {
        try {
            return show ? show(words) : dispatch(words);
        } catch (Throwable failure) {
            String message = failure.getMessage();
            String what = failure.getClass().getSimpleName() + (message == null ? "" : ": " + message);
            terminal.complain("throwbench", "the program failed, not the machine file: " + what);
            return ExitCode.FAILED;
        }
    }

    private ExitCode dispatch(List<String> words) {
        String first = words.get(0);
        if (first.equals("--help") || first.equals("-h")) {
            return print(overview());
        }
        if (first.equals("--version")) {
            return print("throwbench " + Release.number() + "\n");
        }
        Optional<Command> command = find(first);
        if (command.isEmpty()) {
            terminal.complain("throwbench", first, unknown(first));
            return ExitCode.REFUSED;
        }
        List<String> rest = words.subList(1, words.size());
        if (rest.contains("--help") || rest.contains("-h")) {
            return print("throwbench " + command.get().synopsis() + "\n\n"
                    + command.get().help());
        }
        Optional<Arguments> arguments = Arguments.read(command.get(), rest, terminal);
        return arguments.isPresent() ? command.get().run(arguments.get(), terminal) : ExitCode.REFUSED;
    }

    /** The job is to show the findings: it is done whatever the verdict. */
    private ExitCode show(List<String> machineFile) {
        Optional<MachineSource> source = machineFile.isEmpty()
                ? MachineSource.of(Samples.DEFAULT, Samples.read(Samples.DEFAULT), terminal)
                : MachineSource.read(machineFile.get(0), terminal);
        if (source.isEmpty()) {
            return ExitCode.REFUSED;
        }
        ExitCode judged =
                CheckCommand.judge(source.get(), source.get().machine().dutyPoints(), "text", terminal);
        return judged == ExitCode.NOT_MET ? ExitCode.DONE : judged;
    }

    private ExitCode print(String text) {
        return terminal.print(out -> out.write(text.getBytes(StandardCharsets.UTF_8)))
                ? ExitCode.DONE
                : ExitCode.REFUSED;
    }

    private Optional<Command> find(String word) {
        for (Command command : commands) {
            if (command.name().equals(word)) {
                return Optional.of(command);
            }
        }
        return Optional.empty();
    }

    private String unknown(String word) {
        List<String> names = new ArrayList<>();
        for (Command command : commands) {
            names.add(command.name());
        }
        List<String> known = word.startsWith("-") ? List.of("--help", "--version") : names;
        List<String> near = NearWords.of(word, known);
        return (word.startsWith("-") ? "no such option" : "no such command")
                + (near.isEmpty() ? "; there are " : "; perhaps ")
                + (near.isEmpty() ? listed(known) : String.join(" or ", near));
    }

    private static String listed(List<String> words) {
        int last = words.size() - 1;
        return String.join(", ", words.subList(0, last)) + " and " + words.get(last);
    }

    private String overview() {
        StringBuilder text = new StringBuilder("""
                Throwbench: a bench for the running gear of reciprocating compressors and plunger pumps.

                throwbench [MACHINE.json]
                    opens the window on a machine, or on a sample
                """);
        for (Command command : commands) {
            text.append(usage(command)).append('\n');
            text.append("    ").append(command.help(), 0, command.help().indexOf('\n') + 1);
        }
        return text.append("""
                throwbench COMMAND --help
                    tells more of a command
                throwbench --version
                    tells which version this is

                Exit codes: 0 done; 1 a limit is not met; 2 the command or its input was wrong; 3 the program failed.
                """).toString();
    }

    /** The words of a command in lines, none broken between an option and its value. */
    private static String usage(Command command) {
        StringBuilder text = new StringBuilder();
        int length = 0;
        for (String part :
                ("throwbench " + command.synopsis()).replace(" [", "\n[").split("\n", -1)) {
            boolean breaks = length + 1 + part.length() > TextColumns.PAGE;
            text.append(breaks ? "\n        " : length == 0 ? "" : " ").append(part);
            length = (breaks ? 8 : length + 1) + part.length();
        }
        return text.toString();
    }
}
