package throwbench.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import throwbench.app.command.CommandLine;
import throwbench.app.command.Terminal;

class LauncherTest {

    @TempDir
    Path folder;

    private static boolean opensWindow(String... words) {
        OutputStream nowhere = OutputStream.nullOutputStream();
        return Launcher.opensWindow(new CommandLine(new Terminal(nowhere, nowhere)), List.of(words));
    }

    @Test
    void noWordsOrOneMachineFileOpenTheWindow() throws IOException {
        Path plain = Files.createFile(folder.resolve("booster"));

        assertTrue(opensWindow());
        assertTrue(opensWindow("booster.json"));
        assertTrue(opensWindow("gone/booster"));
        assertTrue(opensWindow(plain.toString()));
    }

    @Test
    void commandsOptionsAndWhatIsNoFileStayOnTheCommandLine() {
        assertFalse(opensWindow("solve"));
        assertFalse(opensWindow("check", "booster.json"));
        assertFalse(opensWindow("--version"));
        assertFalse(opensWindow("sovle"));
        assertFalse(opensWindow("booster.json", "other.json"));
    }

    /** Runs the program as its users do, in a process of its own that tells which classes it loads. */
    private String start(List<String> javaOptions, String... words) throws IOException, InterruptedException {
        List<String> command = new ArrayList<>();
        command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
        command.addAll(javaOptions);
        command.addAll(List.of("-cp", System.getProperty("java.class.path"), Launcher.class.getName()));
        command.addAll(List.of(words));
        ProcessBuilder builder = new ProcessBuilder(command).redirectErrorStream(true);
        builder.environment().remove("DISPLAY");
        Process process = builder.start();
        String output = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        return process.waitFor() + "\n" + output;
    }

    @Test
    void aCommandRunsWithoutLoadingAnyWindowClass() throws IOException, InterruptedException {
        Path machine = Files.writeString(folder.resolve("m.json"), Samples.text(Samples.DEFAULT));
        Path classes = folder.resolve("classes.txt");
        String output = start(List.of("-Xlog:class+load:file=" + classes), "solve", machine.toString());
        List<String> loaded = Files.readAllLines(classes);

        assertTrue(output.startsWith("0\ncrank_angle_deg,travel_m,"), output);
        assertEquals(722, output.lines().count());
        assertTrue(loaded.stream().anyMatch(line -> line.contains("throwbench.solver.revolution.Revolution ")));
        for (String foreign :
                List.of("javafx.", "com.sun.", "org.controlsfx.", "jackson.databind", "java.util.logging")) {
            assertEquals(
                    List.of(),
                    loaded.stream()
                            .filter(line -> line.contains("] " + foreign))
                            .toList());
        }
    }

    @Test
    void theExitCodeLeavesTheProcess() throws IOException, InterruptedException {
        assertEquals("2\nthrowbench: sovle: no such command; perhaps solve\n", start(List.of(), "sovle"));
    }
}
