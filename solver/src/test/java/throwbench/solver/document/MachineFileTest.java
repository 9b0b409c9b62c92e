package throwbench.solver.document;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class MachineFileTest {

    @TempDir
    Path folder;

    private static String only(Reading reading) {
        assertEquals(1, reading.faults().size(), reading.faults().toString());
        return reading.faults().get(0).line();
    }

    private Path write(String text) throws IOException {
        return Files.writeString(folder.resolve("machine.json"), text);
    }

    @Test
    void readsAMachineWithTheTablesOfItsFolder() throws IOException {
        Files.createDirectory(folder.resolve("tables"));
        Files.writeString(folder.resolve("tables/b-2.csv"), Samples.table(12));
        Reading reading = MachineFile.read(write(Samples.everyKey()));
        assertEquals(List.of(), reading.faults());
        assertEquals("Hollowmere test stand", reading.machine().orElseThrow().name());
    }

    @Test
    void missingTableIsAFaultAtItsKey() throws IOException {
        assertEquals(
                "throws[1].chambers[1].cycle.file: no readable file \"tables/b-2.csv\", wanted a table that begins with "
                        + "crank_angle_deg,pressure_Pa",
                only(MachineFile.read(write(Samples.everyKey()))));
    }

    @Test
    void whatIsNoFileIsSaidInOneLine() throws IOException {
        assertEquals("no such file, wanted a machine file", only(MachineFile.read(folder.resolve("none.json"))));
        assertEquals("a folder, wanted a machine file", only(MachineFile.read(folder)));
        Path huge = Files.write(folder.resolve("huge.json"), new byte[4 * 1024 * 1024 + 1]);
        assertEquals("more than 4194304 bytes, wanted a machine file of at most that", only(MachineFile.read(huge)));
        Path latin =
                Files.write(folder.resolve("latin.json"), "{\"name\": \"é\"}".getBytes(StandardCharsets.ISO_8859_1));
        assertEquals("bytes that are no UTF-8, from byte 10, wanted UTF-8", only(MachineFile.read(latin)));
        Path wide = Files.write(folder.resolve("wide.json"), "{\"name\": \"é\"}".getBytes(StandardCharsets.UTF_16LE));
        assertEquals(1, MachineFile.read(wide).faults().size());
    }

    @Test
    void savedFileHoldsEveryByteOfTheText() throws IOException {
        String rough = "\ufeff{ \"name\" :\r\n\t\"A\\u0042\\/ é😀\", \"throwbench\":1.0e0 ,\"site\":{ }}\r\n\r\n";
        for (String text : List.of(rough, Samples.pageExample(), Samples.everyKey(), "{}")) {
            Path file = write(text);
            byte[] before = Files.readAllBytes(file);
            MachineFile.save(file, MachineFile.read(file).document().orElseThrow());
            assertArrayEquals(before, Files.readAllBytes(file));
        }
    }

    @Test
    void savingLeavesNothingBesideTheFile() throws IOException {
        Path file = folder.resolve("new.json");
        MachineFile.save(file, Samples.document(Samples.pageExample()));
        assertEquals(Samples.pageExample(), Files.readString(file));
        try (Stream<Path> all = Files.list(folder)) {
            assertEquals(List.of(file), all.toList());
        }
    }

    @Test
    void savingFollowsALinkAndKeepsPermissions() throws IOException {
        Path file = write("{}");
        Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("rw-r-----"));
        Path link = Files.createSymbolicLink(folder.resolve("link.json"), file);
        MachineFile.save(link, Samples.document("{ }"));
        assertTrue(Files.isSymbolicLink(link));
        assertEquals("{ }", Files.readString(file));
        assertEquals("rw-r-----", PosixFilePermissions.toString(Files.getPosixFilePermissions(file)));
    }

    @Test
    void failedSaveLeavesTheOldFile() throws IOException {
        Path missing = folder.resolve("none/machine.json");
        assertThrows(IOException.class, () -> MachineFile.save(missing, Samples.document("{}")));
        Path busy = folder.resolve("busy.json");
        Files.createDirectories(busy.resolve("inner"));
        assertThrows(IOException.class, () -> MachineFile.save(busy, Samples.document("{}")));
        try (Stream<Path> all = Files.list(folder)) {
            assertEquals(List.of(busy), all.toList());
        }
    }
}
