package throwbench.solver.document;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.OpenOption;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.util.Set;
import throwbench.solver.document.attached.AttachedFiles;
import throwbench.solver.document.json.JsonText;

/** Machine files on disk. */
public final class MachineFile {

    private static final String WANTED = "a machine file";
    private static final Set<OpenOption> NEW_CONTENT =
            Set.of(StandardOpenOption.CREATE, StandardOpenOption.TRUNCATE_EXISTING, StandardOpenOption.WRITE);

    private MachineFile() {}

    /** Reads a file, and the tables that it names; whatever is wrong with either is a fault. */
    public static Reading read(Path file) {
        byte[] bytes;
        try {
            if (Files.isDirectory(file)) {
                return Reading.faulty(new Fault("", "a folder", WANTED));
            }
            bytes = readLimited(file);
        } catch (NoSuchFileException missing) {
            return Reading.faulty(new Fault("", "no such file", WANTED));
        } catch (AccessDeniedException denied) {
            return Reading.faulty(new Fault("", "a file that may not be read", WANTED));
        } catch (IOException unreadable) {
            return Reading.faulty(
                    new Fault("", "a file that cannot be read (" + unreadable.getMessage() + ")", WANTED));
        }
        if (bytes.length > JsonText.LARGEST) {
            String found = "more than " + JsonText.LARGEST + " bytes";
            return Reading.faulty(new Fault("", found, "a machine file of at most that"));
        }
        return read(bytes, attachedTo(file));
    }

    private static Reading read(byte[] bytes, AttachedFiles attached) {
        CharsetDecoder strict = StandardCharsets.UTF_8.newDecoder();
        ByteBuffer rest = ByteBuffer.wrap(bytes);
        try {
            return MachineDocument.read(strict.decode(rest).toString(), attached);
        } catch (CharacterCodingException foreign) {
            return Reading.faulty(new Fault("", "bytes that are no UTF-8, from byte " + rest.position(), "UTF-8"));
        }
    }

    private static byte[] readLimited(Path file) throws IOException {
        try (InputStream in = Files.newInputStream(file)) {
            return in.readNBytes(JsonText.LARGEST + 1);
        }
    }

    /** The tables that a machine file at this place may name. */
    public static AttachedFiles attachedTo(Path file) {
        Path folder = file.toAbsolutePath().getParent();
        return folder == null ? AttachedFiles.NONE : AttachedFiles.inFolder(folder);
    }

    /**
     * Writes a document so that the file holds either the old text or the new one, whatever happens meanwhile.
     *
     * @throws IOException when it cannot be written; the old file is then untouched
     */
    public static void save(Path file, MachineDocument document) throws IOException {
        Path target = Files.exists(file) ? file.toRealPath() : file.toAbsolutePath();
        Path folder = target.getParent();
        if (folder == null) {
            throw new NoSuchFileException(file.toString());
        }
        if (Files.exists(target) && !Files.isWritable(target)) {
            throw new AccessDeniedException(file.toString());
        }
        long process = ProcessHandle.current().pid();
        Path beside = folder.resolve("." + target.getFileName() + "." + process + ".new");
        try {
            write(beside, document.text().getBytes(StandardCharsets.UTF_8));
            keepPermissions(target, beside);
            Files.move(beside, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } finally {
            Files.deleteIfExists(beside);
        }
    }

    private static void keepPermissions(Path from, Path to) throws IOException {
        boolean posix = Files.getFileStore(to).supportsFileAttributeView(PosixFileAttributeView.class);
        if (posix && Files.exists(from)) {
            Files.setPosixFilePermissions(to, Files.getPosixFilePermissions(from));
        }
    }

    private static void write(Path file, byte[] bytes) throws IOException {
        try (FileChannel channel = FileChannel.open(file, NEW_CONTENT)) {
            ByteBuffer left = ByteBuffer.wrap(bytes);
            while (left.hasRemaining()) {
                channel.write(left);
            }
            channel.force(true);
        }
    }
}
