package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import throwbench.solver.document.result.Written;

class OutputFileTest {

    @TempDir
    Path folder;

    private final ByteArrayOutputStream out = new ByteArrayOutputStream();
    private final ByteArrayOutputStream err = new ByteArrayOutputStream();

    private boolean deliver(Written text, Path machine, String name) {
        Terminal terminal = new Terminal(out, err);
        List<String> words = List.of(machine.toString(), "--out", name);
        Arguments arguments =
                Arguments.read(new SolveCommand(), words, terminal).orElseThrow();
        return OutputFile.deliver(text, arguments, terminal);
    }

    private static Written text(String text) {
        return to -> to.write(text.getBytes(StandardCharsets.UTF_8));
    }

    private List<String> names() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(file -> file.getFileName().toString()).sorted().toList();
        }
    }

    private String said() {
        return err.toString(StandardCharsets.UTF_8);
    }

    @Test
    void theFileHoldsWhatStandardOutputWouldHave() throws IOException {
        Path file = Run.machine(folder);
        Path wanted = folder.resolve("a.csv");
        Run run = Run.of("solve", file.toString(), "--stations", "12", "--out", wanted.toString());

        assertEquals(new Run(ExitCode.DONE, "", ""), run);
        assertEquals(Run.of("solve", file.toString(), "--stations", "12").out(), Files.readString(wanted));
        assertEquals(List.of("a.csv", "machine.json"), names());
    }

    @Test
    void anOldFileIsReplacedWhole() throws IOException {
        Path wanted = Files.writeString(folder.resolve("a.csv"), "a much longer text than the new one");

        assertTrue(deliver(text("new"), folder.resolve("m.json"), wanted.toString()), said());
        assertEquals("new", Files.readString(wanted));
        assertEquals(List.of("a.csv"), names());
    }

    @Test
    void aTextThatBreaksOffLeavesTheOldFileAndNothingBesideIt() throws IOException {
        Path wanted = Files.writeString(folder.resolve("a.csv"), "old");
        Written broken = to -> {
            to.write('x');
            throw new IOException("No space left on device");
        };

        assertEquals(false, deliver(broken, folder.resolve("m.json"), wanted.toString()));
        assertEquals("throwbench: --out: \"" + wanted + "\" cannot be written: No space left on device\n", said());
        assertEquals("old", Files.readString(wanted));
        assertEquals(List.of("a.csv"), names());
    }

    @Test
    void aFileLeftBesideIsNotTakenForOurs() throws IOException {
        Path other = Files.writeString(folder.resolve("a.csv.part1"), "someone else's");

        assertTrue(
                deliver(
                        text("new"),
                        folder.resolve("m.json"),
                        folder.resolve("a.csv").toString()),
                said());
        assertEquals("someone else's", Files.readString(other));
        assertEquals(List.of("a.csv", "a.csv.part1"), names());
    }

    @Test
    void aLinkStaysALinkAndItsFileIsReplaced() throws IOException {
        Path real = Files.writeString(folder.resolve("real.csv"), "old");
        Path link = Files.createSymbolicLink(folder.resolve("link.csv"), real);

        assertTrue(deliver(text("new"), folder.resolve("m.json"), link.toString()), said());
        assertTrue(Files.isSymbolicLink(link));
        assertEquals("new", Files.readString(real));
    }

    @Test
    void placesThatCannotBeWrittenAreRefusedWithTheReason() throws IOException {
        Path machine = Run.machine(folder);
        Path nowhere = folder.resolve("no").resolve("a.csv");
        String text = Files.readString(machine);

        assertEquals(false, deliver(text("x"), machine, folder.toString()));
        assertEquals(false, deliver(text("x"), machine, nowhere.toString()));
        assertEquals(false, deliver(text("x"), machine, machine.toString()));
        assertEquals(false, deliver(text("x"), machine, ""));
        assertEquals(
                "throwbench: --out: \"" + folder + "\" cannot be written: is a folder\n"
                        + "throwbench: --out: \"" + nowhere + "\" cannot be written: there is no such folder\n"
                        + "throwbench: --out: \"" + machine + "\" cannot be written: is the machine file itself\n"
                        + "throwbench: --out: \"\" cannot be written: no file name\n",
                said());
        assertEquals(text, Files.readString(machine));
        assertEquals(List.of("machine.json"), names());
    }

    @Test
    void aWrongPlaceIsAWrongCommand() throws IOException {
        String file = Run.machine(folder).toString();

        assertEquals(
                ExitCode.REFUSED,
                Run.of("solve", file, "--out", folder.toString()).code());
    }
}
