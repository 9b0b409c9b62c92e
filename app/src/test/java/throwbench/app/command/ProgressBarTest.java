package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

class ProgressBarTest {

    private final ByteArrayOutputStream err = new ByteArrayOutputStream();

    private String shown() {
        return err.toString(StandardCharsets.UTF_8);
    }

    @Test
    void theBarGrowsInOneLineAndGoes() {
        ProgressBar bar = new ProgressBar(new Terminal(new ByteArrayOutputStream(), err, true));
        bar.done(500, 1000);
        String half = "\r[" + "#".repeat(25) + " ".repeat(25) + "] 50 %";
        assertEquals(half, shown());

        bar.done(501, 1000);
        assertEquals(half, shown());

        bar.done(1000, 1000);
        assertEquals(half + "\r[" + "#".repeat(50) + "] 100 %\r" + " ".repeat(58) + "\r", shown());
    }

    @Test
    void nobodySeesItInAFile() {
        ProgressBar bar = new ProgressBar(new Terminal(new ByteArrayOutputStream(), err));
        bar.done(1, 2);
        bar.done(2, 2);

        assertEquals("", shown());
    }

    @Test
    void onlyATerminalIsOne() {
        assertTrue(Terminal.isTerminal("/dev/pts/3"));
        assertTrue(Terminal.isTerminal("/dev/tty1"));
        assertTrue(Terminal.isTerminal("/dev/console"));
        assertFalse(Terminal.isTerminal("/dev/null"));
        assertFalse(Terminal.isTerminal("pipe:[4711]"));
        assertFalse(Terminal.isTerminal("/home/tester/err.txt"));
    }
}
