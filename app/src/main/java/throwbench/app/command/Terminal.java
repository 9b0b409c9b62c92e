package throwbench.app.command;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import throwbench.solver.document.result.Written;

/** Standard output and standard error, both UTF-8. */
public final class Terminal {

    private final OutputStream out;
    private final OutputStream err;
    private final boolean watched;

    /** Neither stream is closed, and neither needs a buffer: whole texts are handed over. */
    public Terminal(OutputStream out, OutputStream err) {
        this(out, err, false);
    }

    /** @param watched whether somebody sees on standard error how a line changes */
    Terminal(OutputStream out, OutputStream err, boolean watched) {
        this.out = out;
        this.err = err;
        this.watched = watched;
    }

    /** The streams of this process. Only Linux tells whether standard error is a terminal; elsewhere none is assumed. */
    public static Terminal ofProcess() {
        return new Terminal(
                new FileOutputStream(FileDescriptor.out), new FileOutputStream(FileDescriptor.err), isErrTerminal());
    }

    private static boolean isErrTerminal() {
        try {
            return isTerminal(Files.readSymbolicLink(Path.of("/proc/self/fd/2")).toString());
        } catch (IOException | UnsupportedOperationException noSuchLink) {
            return false;
        }
    }

    /** Whether an open file of this name is a terminal. */
    static boolean isTerminal(String device) {
        return device.startsWith("/dev/pts/") || device.startsWith("/dev/tty") || device.equals("/dev/console");
    }

    /** Whether somebody sees how a line on standard error changes. */
    boolean isWatched() {
        return watched;
    }

    /** Writes on standard error over the line that stands there. */
    void overwrite(String line) {
        write("\r" + line);
    }

    /** Says on standard error what is wrong where: {@code file: key.path: what}. */
    void complain(String file, String path, String what) {
        complain(file, path.isEmpty() ? what : path + ": " + what);
    }

    /** Says on standard error what is wrong with a file as a whole. */
    void complain(String file, String what) {
        warn(oneLine(file) + ": " + oneLine(what));
    }

    /** Says one line on standard error. */
    void warn(String line) {
        write(line + "\n");
    }

    private void write(String text) {
        try {
            err.write(text.getBytes(StandardCharsets.UTF_8));
        } catch (IOException unheard) {
            // nobody listens on standard error, and there is no third place to say so
            return;
        }
    }

    /** A line break in a name must not begin a complaint of its own. */
    private static String oneLine(String text) {
        return text.replace('\n', ' ').replace('\r', ' ');
    }

    /** Writes a text on standard output; false, and said, where it cannot be. A reader that has left is no fault. */
    boolean print(Written text) {
        try {
            text.writeTo(out);
            out.flush();
            return true;
        } catch (IOException e) {
            if (readerHasLeft(e)) {
                return true;
            }
            complain("standard output", "cannot be written: " + e.getMessage());
            return false;
        }
    }

    /** Java has no type of its own for a broken pipe; these are the words of Linux and macOS, and of Windows. */
    private static boolean readerHasLeft(IOException e) {
        String message = e.getMessage();
        return message != null && (message.contains("Broken pipe") || message.contains("pipe is being closed"));
    }
}
