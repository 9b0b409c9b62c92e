package throwbench.app;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.net.StandardProtocolFamily;
import java.net.UnixDomainSocketAddress;
import java.nio.channels.ServerSocketChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class DisplayTest {

    private static final Optional<String> NO_DISPLAY =
            Optional.of("there is no display (DISPLAY is not set; sit at a desktop, use ssh -X, or xvfb-run)");

    @TempDir
    Path root;

    @BeforeEach
    void installLibrary() throws IOException {
        Files.createDirectories(root.resolve("usr/lib"));
        Files.createFile(root.resolve("usr/lib/libgtk-3.so.0"));
    }

    private Optional<String> lacking(String system, String address, String toolkit) {
        return new Display(system, address, toolkit, "/lib::/usr/lib", root).lacking();
    }

    @Test
    void linuxWithoutADisplayLacksOne() {
        assertEquals(NO_DISPLAY, lacking("Linux", "", ""));
        assertEquals(NO_DISPLAY, lacking("Linux", "", "gtk"));
    }

    @Test
    void otherSystemsAndToolkitsLackNothing() {
        assertEquals(Optional.empty(), lacking("Mac OS X", "", ""));
        assertEquals(Optional.empty(), lacking("Windows 11", "", ""));
        assertEquals(Optional.empty(), lacking("Linux", "", "Monocle"));
    }

    @Test
    void aBareLinuxLacksGtkFirst() throws IOException {
        Files.delete(root.resolve("usr/lib/libgtk-3.so.0"));
        String gtk = "GTK 3 is not installed (package libgtk-3-0 on Debian and Ubuntu, gtk3 elsewhere)";

        assertEquals(Optional.of(gtk), lacking("Linux", "far:0", ""));
        assertEquals(
                Optional.of(gtk + ", nor is there a display (DISPLAY is not set; xvfb-run gives one)"),
                lacking("Linux", "", ""));
    }

    @Test
    void aLibraryThatTheLoaderListsIsInstalled() throws IOException {
        Files.delete(root.resolve("usr/lib/libgtk-3.so.0"));
        Files.createDirectories(root.resolve("etc"));
        Files.write(
                root.resolve("etc/ld.so.cache"),
                "\0\u00fflibgtk-3.so.0\0/opt/x/libgtk-3.so.0\0".getBytes(StandardCharsets.ISO_8859_1));

        assertEquals(Optional.empty(), lacking("Linux", "far:0", ""));
    }

    @Test
    void aDisplayThatNobodyServesIsNoDisplay() {
        assertEquals(Optional.of("no display answers at DISPLAY=:7"), lacking("Linux", ":7", ""));
        assertEquals(Optional.of("no display answers at DISPLAY=unix:7.0"), lacking("Linux", "unix:7.0", ""));
    }

    @Test
    void aDisplayWithAServerBehindItsSocketLacksNothing() throws IOException {
        Path sockets = Files.createDirectories(root.resolve("tmp/.X11-unix"));
        try (ServerSocketChannel server = ServerSocketChannel.open(StandardProtocolFamily.UNIX)) {
            server.bind(UnixDomainSocketAddress.of(sockets.resolve("X7")));

            assertEquals(Optional.empty(), lacking("Linux", ":7", ""));
            assertEquals(Optional.empty(), lacking("Linux", ":7.0", ""));
        }
    }

    @Test
    void aDisplayWithAServerThatTheKernelListsLacksNothing() throws IOException {
        Files.createDirectories(root.resolve("proc/net"));
        Files.writeString(root.resolve("proc/net/unix"), "0: 00000002 0 00010000 0001 01 1 @/tmp/.X11-unix/X7\n");

        assertEquals(Optional.empty(), lacking("Linux", ":7", ""));
    }

    @Test
    void aDisplayOnAnotherMachineIsBelieved() {
        assertEquals(Optional.empty(), lacking("Linux", "localhost:10.0", ""));
    }
}
