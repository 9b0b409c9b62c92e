package throwbench.app;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.Reading;
import throwbench.solver.document.attached.AttachedFiles;

/** Sample machines that come inside the program, so that it opens one from any folder. */
public final class Samples {

    /** The machine shown where none is named. */
    public static final String DEFAULT = "saltmarsh-biogas-booster.json";

    private Samples() {}

    /** The text of a sample. */
    public static String text(String name) {
        try (InputStream in = Samples.class.getResourceAsStream("samples/" + name)) {
            if (in == null) {
                throw new IllegalArgumentException("no sample " + name + " is built in");
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Reads a sample that names no other files. */
    public static Reading read(String name) {
        return MachineDocument.read(text(name), AttachedFiles.NONE);
    }
}
