package throwbench.app;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import throwbench.app.command.CommandLine;
import throwbench.app.command.ExitCode;
import throwbench.app.command.Terminal;
import throwbench.app.window.WindowMain;

/** Where the program starts: a command runs without loading any JavaFX class, anything else opens the window. */
public final class Launcher {

    private Launcher() {}

    public static void main(String[] args) {
        Terminal terminal = Terminal.ofProcess();
        CommandLine commandLine = new CommandLine(terminal);
        List<String> words = List.of(args);
        if (!opensWindow(commandLine, words)) {
            exit(commandLine.run(words));
            return;
        }
        Optional<String> lacking = Display.here().lacking();
        if (lacking.isPresent()) {
            exit(commandLine.showInstead(lacking.get(), words));
            return;
        }
        WindowMain.launch(args);
    }

    /** No words, or one that can only be a machine file. */
    static boolean opensWindow(CommandLine commandLine, List<String> words) {
        if (words.isEmpty()) {
            return true;
        }
        return words.size() == 1 && !commandLine.knows(words.get(0)) && isFile(words.get(0));
    }

    private static boolean isFile(String word) {
        return word.endsWith(".json")
                || word.indexOf('/') >= 0
                || word.indexOf('\\') >= 0
                || Files.exists(Path.of(word));
    }

    private static void exit(ExitCode code) {
        System.exit(code.number());
    }
}
