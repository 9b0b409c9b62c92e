package throwbench.solver.document;

import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Scanner;
import throwbench.solver.document.attached.AttachedFiles;
import throwbench.solver.machine.Machine;

/** The machine files of these tests. */
final class Samples {

    static final AttachedFiles TABLES = AttachedFiles.ofTexts(Map.of("tables/b-2.csv", table(8)));

    private Samples() {}

    /** A recorded pressure of so many rows. */
    static String table(int rows) {
        StringBuilder text = new StringBuilder("crank_angle_deg,pressure_Pa\n");
        for (int row = 0; row < rows; row++) {
            text.append(360.0 * row / rows)
                    .append(',')
                    .append(200_000 + 1000 * row)
                    .append('\n');
        }
        return text.toString();
    }

    static String text(String resource) {
        InputStream in = Objects.requireNonNull(Samples.class.getResourceAsStream(resource), resource);
        try (Scanner whole = new Scanner(in, StandardCharsets.UTF_8).useDelimiter("\\A")) {
            return whole.next();
        }
    }

    /** The lines of a resource that are neither blank nor remarks. */
    static List<String> rows(String resource) {
        return text(resource)
                .lines()
                .filter(line -> !line.isBlank() && !line.startsWith("#"))
                .toList();
    }

    static String pageExample() {
        return text("page-example.json");
    }

    static String everyKey() {
        return text("every-key.json");
    }

    static Reading read(String text) {
        return MachineDocument.read(text, TABLES);
    }

    static Reading read(MachineDocument document) {
        return document.read(TABLES);
    }

    static MachineDocument document(String text) {
        return read(text).document().orElseThrow();
    }

    static Machine machine(String text) {
        Reading reading = read(text);
        return reading.machine()
                .orElseThrow(() -> new AssertionError(reading.faults().toString()));
    }

    /** What a map has under a name; it must have it. */
    static <T> T at(Map<String, T> map, String name) {
        return Objects.requireNonNull(map.get(name), name);
    }
}
