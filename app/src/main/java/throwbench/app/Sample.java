package throwbench.app;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import throwbench.app.bench.Opened;

/** The machine that the program shows when it is given none; bundled from the sample mechanisms. */
public final class Sample {

    /** Its file among the sample mechanisms. */
    public static final String FILE = "saltmarsh-biogas-booster.json";

    private Sample() {}

    /** The text of its machine file. */
    public static String text() {
        try (InputStream in = Sample.class.getResourceAsStream(FILE)) {
            if (in == null) {
                throw new IllegalStateException("the bundled sample " + FILE + " is missing");
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The sample ready for the bench. */
    public static Opened opened() {
        return Opened.read(text())
                .opened()
                .orElseThrow(() -> new IllegalStateException("the bundled sample " + FILE + " has faults"));
    }
}
