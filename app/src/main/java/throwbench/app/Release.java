package throwbench.app;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/** Which version of the program this is. */
public final class Release {

    private static final String RESOURCE = "version.txt";

    private Release() {}

    /** The version, as the build wrote it. */
    public static String number() {
        try (InputStream in = Release.class.getResourceAsStream(RESOURCE)) {
            if (in == null) {
                throw new IllegalStateException("the program was built without its " + RESOURCE);
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8).strip();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
