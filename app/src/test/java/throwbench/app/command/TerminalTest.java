package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class TerminalTest {

    @TempDir
    Path folder;

    private final ByteArrayOutputStream err = new ByteArrayOutputStream();

    /** A stream that takes nothing. */
    private static final class Closed extends OutputStream {
        private final String reason;

        Closed(String reason) {
            this.reason = reason;
        }

        @Override
        public void write(int b) throws IOException {
            throw new IOException(reason);
        }
    }

    private ExitCode run(OutputStream out, String... words) {
        return new CommandLine(new Terminal(out, err)).run(List.of(words));
    }

    @Test
    void aReaderThatHasLeftIsNoFault() throws IOException {
        String file = Run.machine(folder).toString();

        assertEquals(ExitCode.DONE, run(new Closed("Broken pipe"), "solve", file));
        assertEquals(ExitCode.DONE, run(new Closed("Broken pipe"), "check", file));
        assertEquals(ExitCode.DONE, run(new Closed("The pipe is being closed"), "--help"));
        assertEquals("", err.toString(StandardCharsets.UTF_8));
    }

    @Test
    void anOutputThatCannotBeWrittenIsSaid() throws IOException {
        String file = Run.machine(folder).toString();

        assertEquals(ExitCode.REFUSED, run(new Closed("No space left on device"), "solve", file));
        assertEquals(
                "standard output: cannot be written: No space left on device\n", err.toString(StandardCharsets.UTF_8));
    }

    @Test
    void aLineBreakInANameBeginsNoComplaintOfItsOwn() {
        assertEquals(ExitCode.REFUSED, run(new ByteArrayOutputStream(), "check", "a\nb.json"));
        assertEquals("a b.json: no such file, wanted a machine file\n", err.toString(StandardCharsets.UTF_8));
    }

    @Test
    void namesLeaveInUtf8() {
        assertEquals(ExitCode.REFUSED, run(new ByteArrayOutputStream(), "check", "größe.json"));
        assertEquals("größe.json: no such file, wanted a machine file\n", err.toString(StandardCharsets.UTF_8));
    }
}
