package throwbench.solver.document.attached;

import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import throwbench.solver.chamber.RecordedPressure;
import throwbench.solver.document.quantity.Refusal;

/** The tables that a machine file names, found by their path relative to it. */
@FunctionalInterface
public interface AttachedFiles {

    /** No folder: every table is missing. */
    AttachedFiles NONE = ofTexts(Map.of());

    /**
     * A recorded pressure, or what is wrong with its file.
     *
     * @param recording present without a refusal, and the other way round
     */
    record Attached(Optional<RecordedPressure> recording, Optional<Refusal> refusal) {

        static Attached of(RecordedPressure recording) {
            return new Attached(Optional.of(recording), Optional.empty());
        }

        static Attached refused(String found, String wanted) {
            return new Attached(Optional.empty(), Optional.of(new Refusal(found, wanted)));
        }
    }

    /** The table at a path as the machine file writes it. */
    Attached read(String path);

    /** Tables in the folder of a machine file and below it. */
    static AttachedFiles inFolder(Path folder) {
        return new FolderFiles(folder);
    }

    /** Tables at hand as texts, by path. */
    static AttachedFiles ofTexts(Map<String, String> texts) {
        Map<String, String> kept = Map.copyOf(texts);
        return path -> {
            String text = kept.get(path);
            return text == null
                    ? Attached.refused("no file \"" + path + "\"", RecordedTable.WANTED)
                    : RecordedTable.parse(path, text);
        };
    }
}
