package throwbench.solver;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Rules of the house that no compiler knows, checked on the sources. */
class HouseTest {

    private static final int LONGEST_FILE = 400;

    private static final Set<String> VAGUE_PACKAGES = Set.of("util", "utils", "common", "helper", "helpers", "manager");

    /** Surefire sets the module's folder; an editor may start elsewhere. */
    private static final Path BASE =
            Path.of(Optional.ofNullable(System.getProperty("basedir")).orElse(""));

    private static List<Path> sources(String tree) throws IOException {
        try (Stream<Path> files = Files.walk(BASE.resolve(tree))) {
            List<Path> sources =
                    files.filter(p -> p.toString().endsWith(".java")).sorted().toList();
            assertTrue(sources.size() > 20, () -> "found only " + sources.size() + " sources under " + tree);
            return sources;
        }
    }

    @Test
    void noMainFileIsLongerThanItMayBe() throws IOException {
        List<String> tooLong = new ArrayList<>();
        for (Path source : sources("src/main/java")) {
            long lines = Files.readAllLines(source).size();
            if (lines > LONGEST_FILE) {
                tooLong.add(source + " has " + lines + " lines");
            }
        }
        assertEquals(List.of(), tooLong);
    }

    @Test
    void everyPackageSaysWhatItIs() throws IOException {
        Set<String> silent = new TreeSet<>();
        for (Path source : sources("src/main/java")) {
            Path info = source.resolveSibling("package-info.java");
            if (!Files.exists(info)) {
                silent.add(info + " is missing");
            } else if (!Files.readString(info).contains("@NullMarked")) {
                silent.add(info + " is not @NullMarked");
            }
        }
        assertEquals(Set.of(), silent);
    }

    @Test
    void noPackageIsNamedAfterNothing() throws IOException {
        for (Path source : sources("src/main/java")) {
            String folder = source.getName(source.getNameCount() - 2).toString();
            assertTrue(!VAGUE_PACKAGES.contains(folder), () -> source + " lies in a package named " + folder);
        }
    }

    @Test
    void noWorkIsLeftForLater() throws IOException {
        List<String> left = new ArrayList<>();
        for (Path source : sources("src/main/java")) {
            String text = Files.readString(source);
            for (String mark : List.of("TO" + "DO", "FIX" + "ME", "XX" + "X")) {
                if (text.contains(mark)) {
                    left.add(source + ": " + mark);
                }
            }
        }
        assertEquals(List.of(), left);
    }

    /** A property and a plain test in one class: one engine's report overwrites the other's. */
    @Test
    void testsAreFoundByTheirNamesAndKeepTheirEnginesApart() throws IOException {
        List<String> wrong = new ArrayList<>();
        for (Path source : sources("src/test/java")) {
            String text = Files.readString(source);
            String name = source.getFileName().toString();
            boolean property = text.contains("@Prop" + "erty");
            boolean test = text.contains("@Te" + "st\n") || text.contains("@Parameterized" + "Test");
            if (property && test) {
                wrong.add(source + " mixes engines");
            }
            if ((property && !name.endsWith("PropertyTest.java")) || (test && !name.endsWith("Test.java"))) {
                wrong.add(source + " is not run by its name");
            }
            if (text.contains("} cat" + "ch (")) {
                wrong.add(source + " catches: a test fails by what is thrown");
            }
        }
        assertEquals(List.of(), wrong);
    }
}
