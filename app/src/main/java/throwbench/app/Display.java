package throwbench.app;

import java.io.IOException;
import java.net.StandardProtocolFamily;
import java.net.UnixDomainSocketAddress;
import java.nio.channels.SocketChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;

/**
 * Whether a window can open here, told without touching JavaFX, which fails with a stack trace where one cannot. Only Linux
 * lacks displays and libraries.
 *
 * @param system the operating system's name
 * @param address value of DISPLAY; empty where there is none
 * @param toolkit JavaFX's window toolkit where one is forced, which then needs neither display nor GTK; empty where none is
 * @param libraryFolders where shared libraries are looked for, separated by colons
 * @param root the file system's root
 */
record Display(String system, String address, String toolkit, String libraryFolders, Path root) {

    private static final String LIBRARY = "libgtk-3.so.0";

    /** The surroundings of this process. */
    static Display here() {
        String address = System.getenv("DISPLAY");
        return new Display(
                System.getProperty("os.name", ""),
                address == null ? "" : address,
                System.getProperty("glass.platform", ""),
                System.getProperty("java.library.path", ""),
                Path.of("/"));
    }

    /** What a window would need and does not find here, in one sentence with its remedy; empty where it can open. */
    Optional<String> lacking() {
        boolean other = !system.equals("Linux") || !(toolkit.isEmpty() || toolkit.equalsIgnoreCase("gtk"));
        if (other) {
            return Optional.empty();
        }
        if (!hasLibrary()) {
            return Optional.of("GTK 3 is not installed (package libgtk-3-0 on Debian and Ubuntu, gtk3 elsewhere)"
                    + (address.isEmpty() ? ", nor is there a display (DISPLAY is not set; xvfb-run gives one)" : ""));
        }
        if (address.isEmpty()) {
            // JavaFX draws through X11 under Wayland too, so a Wayland display alone does not help
            return Optional.of("there is no display (DISPLAY is not set; sit at a desktop, use ssh -X, or xvfb-run)");
        }
        return answers() ? Optional.empty() : Optional.of("no display answers at DISPLAY=" + address);
    }

    private boolean hasLibrary() {
        for (String folder : libraryFolders.split(":", -1)) {
            if (!folder.isEmpty() && Files.exists(root.resolve(relative(folder)).resolve(LIBRARY))) {
                return true;
            }
        }
        // the loader's own list of every library it knows, each by its name
        return contains(root.resolve("etc/ld.so.cache"), LIBRARY);
    }

    private static String relative(String folder) {
        return folder.startsWith("/") ? folder.substring(1) : folder;
    }

    /** Whether something listens at the address; one on another machine is believed. */
    private boolean answers() {
        int colon = address.lastIndexOf(':');
        boolean local = colon == 0 || address.startsWith("unix:");
        if (!local) {
            return true;
        }
        int dot = address.indexOf('.', colon);
        String socket = "tmp/.X11-unix/X" + address.substring(colon + 1, dot < 0 ? address.length() : dot);
        return listens(root.resolve(socket)) || contains(root.resolve("proc/net/unix"), "@/" + socket);
    }

    private static boolean listens(Path socket) {
        try (SocketChannel channel = SocketChannel.open(StandardProtocolFamily.UNIX)) {
            return channel.connect(UnixDomainSocketAddress.of(socket));
        } catch (IOException nobodyThere) {
            return false;
        }
    }

    private static boolean contains(Path file, String text) {
        try {
            return new String(Files.readAllBytes(file), StandardCharsets.ISO_8859_1).contains(text);
        } catch (IOException absent) {
            return false;
        }
    }
}
