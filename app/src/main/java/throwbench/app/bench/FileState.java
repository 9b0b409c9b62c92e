package throwbench.app.bench;

import java.nio.file.Path;
import java.util.Optional;
import throwbench.solver.document.MachineFile;
import throwbench.solver.document.attached.AttachedFiles;

/**
 * The file behind the bench.
 *
 * @param path empty for a sample or a new machine that was never saved
 * @param savedText the text it held when it was read or saved
 */
public record FileState(Optional<Path> path, String savedText) {

    /** The tables that the machine may name: those beside its file. */
    AttachedFiles attached() {
        return path.map(MachineFile::attachedTo).orElse(AttachedFiles.NONE);
    }
}
