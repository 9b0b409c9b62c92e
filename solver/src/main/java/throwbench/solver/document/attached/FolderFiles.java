package throwbench.solver.document.attached;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.nio.file.attribute.BasicFileAttributes;
import java.nio.file.attribute.FileTime;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import throwbench.solver.document.quantity.QuantityText;

/** Tables in one folder and below it; no path leads out of it, not by a link either. */
final class FolderFiles implements AttachedFiles {

    /** Largest table, bytes: some two hundred thousand rows. */
    private static final long LARGEST = 4L * 1024 * 1024;

    private static final String INSIDE = "a path inside the machine file's folder, as a-head.csv";

    private final Path folder;
    // a machine file is read again at every dragged value, its tables are not
    private final Map<String, Kept> kept = new ConcurrentHashMap<>();

    private record Kept(FileTime changed, long size, Attached attached) {}

    FolderFiles(Path folder) {
        this.folder = folder;
    }

    @Override
    public Attached read(String path) {
        Optional<Path> place = inside(path);
        if (place.isEmpty()) {
            return Attached.refused(QuantityText.quoted(path), INSIDE);
        }
        try {
            return readAt(path, place.get());
        } catch (IOException unreadable) {
            return Attached.refused("no readable file " + QuantityText.quoted(path), RecordedTable.WANTED);
        }
    }

    private Attached readAt(String path, Path place) throws IOException {
        Path real = place.toRealPath();
        if (!real.startsWith(folder.toRealPath())) {
            return Attached.refused(QuantityText.quoted(path) + ", a link out of the folder", INSIDE);
        }
        BasicFileAttributes now = Files.readAttributes(real, BasicFileAttributes.class);
        if (!now.isRegularFile()) {
            return Attached.refused(QuantityText.quoted(path) + ", which is no file", RecordedTable.WANTED);
        }
        if (now.size() > LARGEST) {
            return Attached.refused(now.size() + " bytes in " + path, "at most " + LARGEST);
        }
        Kept before = kept.get(path);
        if (before != null && before.changed.equals(now.lastModifiedTime()) && before.size == now.size()) {
            return before.attached;
        }
        // bytes that are no UTF-8 become signs that no number holds, and are refused with their line
        Attached read = RecordedTable.parse(path, new String(Files.readAllBytes(real), StandardCharsets.UTF_8));
        kept.put(path, new Kept(now.lastModifiedTime(), now.size(), read));
        return read;
    }

    private Optional<Path> inside(String path) {
        boolean foreign = path.isBlank() || path.startsWith("/") || path.indexOf('\\') >= 0 || path.indexOf(':') >= 0;
        if (foreign || path.indexOf('\0') >= 0) {
            return Optional.empty();
        }
        for (String part : path.split("/", -1)) {
            if (part.isEmpty() || part.equals(".") || part.equals("..")) {
                return Optional.empty();
            }
        }
        try {
            return Optional.of(folder.resolve(path));
        } catch (InvalidPathException unspeakable) {
            return Optional.empty();
        }
    }
}
