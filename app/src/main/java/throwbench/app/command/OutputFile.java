package throwbench.app.command;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.Optional;
import throwbench.solver.document.result.Written;

/** A file that a command writes: whole, or not at all. */
final class OutputFile {

    /** Files of this name that earlier runs may have left beside the wanted one. */
    private static final int TRIES = 100;

    private final String name;
    private final Terminal terminal;

    OutputFile(String name, Terminal terminal) {
        this.name = name;
        this.terminal = terminal;
    }

    /** Writes the text to this place, or to standard output where none is given; false, and said, where it cannot be. */
    static boolean deliver(Written text, Arguments arguments, Terminal terminal) {
        Optional<String> name = arguments.value(Option.OUT);
        if (name.isEmpty()) {
            return terminal.print(text);
        }
        return new OutputFile(name.get(), terminal).write(text, Path.of(arguments.machineFile()));
    }

    private boolean write(Written text, Path machineFile) {
        try {
            Path wanted = Path.of(name);
            if (name.isEmpty() || Files.isDirectory(wanted)) {
                return refuse(name.isEmpty() ? "no file name" : "is a folder");
            }
            if (!Files.exists(wanted)) {
                writeBeside(text, wanted.toAbsolutePath());
                return true;
            }
            if (Files.exists(machineFile) && Files.isSameFile(wanted, machineFile)) {
                return refuse("is the machine file itself");
            }
            if (!Files.isWritable(wanted)) {
                return refuse("is write-protected");
            }
            if (Files.isRegularFile(wanted)) {
                // a link stays a link: what it points at is replaced
                writeBeside(text, wanted.toRealPath());
            } else {
                writeInto(text, wanted);
            }
            return true;
        } catch (InvalidPathException e) {
            return refuse("is no file name: " + e.getReason());
        } catch (IOException e) {
            return refuse(reason(e));
        }
    }

    private boolean refuse(String what) {
        terminal.complain("throwbench", Option.OUT.word(), "\"" + name + "\" cannot be written: " + what);
        return false;
    }

    private static String reason(IOException e) {
        if (e instanceof NoSuchFileException) {
            return "there is no such folder";
        }
        if (e instanceof AccessDeniedException) {
            return "the folder is write-protected";
        }
        String message = e.getMessage();
        return message == null ? e.getClass().getSimpleName() : message;
    }

    private static void writeBeside(Written text, Path wanted) throws IOException {
        Path beside = createBeside(wanted);
        try {
            writeInto(text, beside);
            Files.move(beside, wanted, StandardCopyOption.REPLACE_EXISTING, StandardCopyOption.ATOMIC_MOVE);
        } finally {
            Files.deleteIfExists(beside);
        }
    }

    /** Not a temporary file of Java's: those are closed to everyone else, and the written file would stay so. */
    private static Path createBeside(Path wanted) throws IOException {
        for (int i = 1; i < TRIES; i++) {
            Path beside = wanted.resolveSibling(wanted.getFileName() + ".part" + i);
            if (!Files.exists(beside)) {
                return Files.createFile(beside);
            }
        }
        throw new FileAlreadyExistsException(wanted + ".part1 to .part" + (TRIES - 1) + " exist already");
    }

    private static void writeInto(Written text, Path file) throws IOException {
        try (OutputStream out =
                Files.newOutputStream(file, StandardOpenOption.WRITE, StandardOpenOption.TRUNCATE_EXISTING)) {
            text.writeTo(out);
        }
    }
}
