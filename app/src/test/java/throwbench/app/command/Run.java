package throwbench.app.command;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import java.util.function.UnaryOperator;

/** A command line that was run in this process, with all that it wrote. */
record Run(ExitCode code, String out, String err) {

    static Run of(String... words) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        ExitCode code = new CommandLine(new Terminal(out, err)).run(List.of(words));
        return new Run(code, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    }

    /** Writes the sample machine into a folder, one piece of its text replaced. */
    static Path machine(Path folder, String replaced, String by) throws IOException {
        String text = oneThrow();
        if (!text.contains(replaced)) {
            throw new IllegalArgumentException("the sample does not hold " + replaced);
        }
        return Files.writeString(folder.resolve("machine.json"), text.replace(replaced, by));
    }

    /** A machine of one throw and two duty points. */
    private static String oneThrow() throws IOException {
        try (InputStream in = Run.class.getResourceAsStream("one-throw.json")) {
            return new String(Objects.requireNonNull(in).readAllBytes(), StandardCharsets.UTF_8);
        }
    }

    /** Changes the text of a machine file. */
    static Path machineWith(Path file, UnaryOperator<String> change) throws IOException {
        return Files.writeString(file, change.apply(Files.readString(file)));
    }

    /** Writes the sample machine into a folder. */
    static Path machine(Path folder) throws IOException {
        return machine(folder, "", "");
    }
}
