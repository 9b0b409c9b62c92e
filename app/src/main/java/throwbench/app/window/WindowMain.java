package throwbench.app.window;

import java.util.logging.Logger;
import javafx.application.Application;

/** Starts JavaFX. A class of its own so that the command line never loads JavaFX. */
public final class WindowMain {

    // held: a logger that nobody holds may be collected, and its filter with it
    private static final Logger JAVAFX = Logger.getLogger("javafx");

    private WindowMain() {}

    /** Opens the window on a machine file, or without an argument on the sample; returns when it is closed. */
    public static void launch(String[] args) {
        // one jar means JavaFX on the class path; it works, and JavaFX warns at each start
        JAVAFX.setFilter(r -> !String.valueOf(r.getMessage()).startsWith("Unsupported JavaFX configuration"));
        Application.launch(ThrowbenchApp.class, args);
    }
}
