package throwbench.solver.document.attached;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import throwbench.solver.chamber.RecordedPressure;
import throwbench.solver.document.attached.AttachedFiles.Attached;
import throwbench.solver.document.quantity.Refusal;

class AttachedFilesTest {

    private static final String HEADER = "crank_angle_deg,pressure_Pa\n";
    private static final String ROWS =
            "0,100000\n45,200000\n90,3e5\n135,400000\n180,500000\n225,400000\n270,300000\n315.5,150000.25\n";

    @TempDir
    Path parent;

    private Path folder;

    @BeforeEach
    void writeTables() throws IOException {
        folder = Files.createDirectories(parent.resolve("machine"));
        Files.createDirectories(folder.resolve("tables"));
        Files.writeString(folder.resolve("a.csv"), HEADER + ROWS);
        Files.writeString(folder.resolve("tables/b.csv"), HEADER + ROWS);
        Files.writeString(parent.resolve("outside.csv"), HEADER + ROWS);
    }

    private static RecordedPressure recording(Attached attached) {
        return attached.recording()
                .orElseThrow(() -> new AssertionError(attached.refusal().toString()));
    }

    private static Refusal refusal(String text) {
        Attached attached = AttachedFiles.ofTexts(Map.of("a.csv", text)).read("a.csv");
        return attached.refusal().orElseThrow();
    }

    private Refusal refusalOf(String path) {
        return AttachedFiles.inFolder(folder).read(path).refusal().orElseThrow(() -> new AssertionError(path));
    }

    // tables

    @Test
    void readsAnglesInRadiansAndPressures() {
        for (String text : List.of(
                HEADER + ROWS,
                "\ufeff" + HEADER + ROWS,
                (HEADER + ROWS).replace("\n", "\r\n"),
                HEADER + ROWS.replace(",", " , ") + "\n\n")) {
            RecordedPressure read =
                    recording(AttachedFiles.ofTexts(Map.of("a.csv", text)).read("a.csv"));
            assertEquals("a.csv", read.file());
            assertEquals(8, read.crankAngles().size());
            assertEquals(Math.PI / 4, read.crankAngles().get(1), 1e-15);
            assertEquals(Math.toRadians(315.5), read.crankAngles().get(7), 1e-15);
            assertEquals(List.of(1e5, 2e5, 3e5, 4e5, 5e5, 4e5, 3e5, 150_000.25), read.pressures());
        }
    }

    @Test
    void everyWrongRowIsNamedByItsLine() {
        String wanted = "a crank angle and a pressure, as 37.5,820000";
        assertEquals(new Refusal("line 10 of a.csv: \"x,1\"", wanted), refusal(HEADER + ROWS + "x,1\n"));
        assertEquals(new Refusal("line 10 of a.csv: \"330;1\"", wanted), refusal(HEADER + ROWS + "330;1\n"));
        assertEquals(new Refusal("line 10 of a.csv: \"330,1,2\"", wanted), refusal(HEADER + ROWS + "330,1,2\n"));
        assertEquals(new Refusal("line 10 of a.csv: \"330,NaN\"", wanted), refusal(HEADER + ROWS + "330,NaN\n"));
        assertEquals(new Refusal("line 2 of a.csv: \"\"", wanted), refusal(HEADER + "\n" + ROWS));
        assertEquals(
                new Refusal("line 10 of a.csv: \"360,1\"", "a crank angle from 0 to below 360"),
                refusal(HEADER + ROWS + "360,1\n"));
        assertEquals(
                new Refusal("line 2 of a.csv: \"-1,1\"", "a crank angle from 0 to below 360"),
                refusal(HEADER + "-1,1\n" + ROWS));
        assertEquals(
                new Refusal("line 10 of a.csv: \"315.5,1\"", "a crank angle above that of the row before"),
                refusal(HEADER + ROWS + "315.5,1\n"));
        assertEquals(
                new Refusal("line 10 of a.csv: \"330,0\"", "an absolute pressure above 0"),
                refusal(HEADER + ROWS + "330,0\n"));
        assertEquals(
                new Refusal("line 10 of a.csv: \"330,1e999\"", "an absolute pressure above 0"),
                refusal(HEADER + ROWS + "330,1e999\n"));
    }

    @Test
    void headerAndEightRowsAreNeeded() {
        String wanted = "a table that begins with crank_angle_deg,pressure_Pa";
        assertEquals(new Refusal("line 1 of a.csv: \"angle,pressure\"", wanted), refusal("angle,pressure\n" + ROWS));
        assertEquals(new Refusal("an empty file a.csv", wanted), refusal(""));
        assertEquals(
                new Refusal("7 rows in a.csv", "at least 8"), refusal(HEADER + ROWS.substring(ROWS.indexOf('\n') + 1)));
        assertEquals(new Refusal("0 rows in a.csv", "at least 8"), refusal(HEADER));
    }

    // folder

    @Test
    void tablesLieInTheFolderOrBelowIt() {
        AttachedFiles files = AttachedFiles.inFolder(folder);
        assertEquals(8, recording(files.read("a.csv")).pressures().size());
        assertEquals("tables/b.csv", recording(files.read("tables/b.csv")).file());
    }

    @Test
    void noPathLeadsOutOfTheFolder() throws IOException {
        String absolute = folder.resolve("a.csv").toAbsolutePath().toString();
        for (String path : List.of(
                "../outside.csv",
                "tables/../../outside.csv",
                "tables/../a.csv",
                absolute,
                "./a.csv",
                "tables//b.csv",
                "..\\outside.csv",
                "C:a.csv",
                "",
                "a.csv\0",
                "tables/")) {
            assertEquals(
                    "a path inside the machine file's folder, as a-head.csv",
                    refusalOf(path).wanted(),
                    path);
        }
        Files.createSymbolicLink(folder.resolve("link.csv"), parent.resolve("outside.csv"));
        Files.createSymbolicLink(folder.resolve("up"), parent);
        assertEquals(
                "\"link.csv\", a link out of the folder", refusalOf("link.csv").found());
        assertEquals(
                "\"up/outside.csv\", a link out of the folder",
                refusalOf("up/outside.csv").found());
        Files.createSymbolicLink(folder.resolve("inner.csv"), folder.resolve("tables/b.csv"));
        assertTrue(AttachedFiles.inFolder(folder).read("inner.csv").recording().isPresent());
    }

    @Test
    void missingFileFolderAndHugeFileAreRefused() throws IOException {
        assertEquals("no readable file \"none.csv\"", refusalOf("none.csv").found());
        assertEquals("\"tables\", which is no file", refusalOf("tables").found());
        Files.writeString(folder.resolve("huge.csv"), " ".repeat(4 * 1024 * 1024 + 1));
        assertEquals("4194305 bytes in huge.csv", refusalOf("huge.csv").found());
        Files.write(folder.resolve("latin.csv"), new byte[] {(byte) 0xe9, '\n'});
        assertEquals("line 1 of latin.csv: \"\ufffd\"", refusalOf("latin.csv").found());
    }

    @Test
    void changedTableIsReadAgain() throws IOException {
        AttachedFiles files = AttachedFiles.inFolder(folder);
        Attached first = files.read("a.csv");
        assertEquals(first, files.read("a.csv"));
        Path table = folder.resolve("a.csv");
        Files.writeString(table, HEADER + ROWS.replace("0,100000", "0,110000"));
        Files.setLastModifiedTime(table, FileTime.fromMillis(1_000_000_000_000L));
        assertEquals(110_000, recording(files.read("a.csv")).pressures().get(0));
    }
}
