package throwbench.app.window;

import java.nio.file.Path;
import java.util.Optional;

/** The few questions that need an answer before anything else: an interface, so that tests can answer them. */
interface Dialogs {

    /** Which file to open; empty: none after all. */
    Optional<Path> fileToOpen();

    /** Where to save. */
    Optional<Path> fileToSave(String suggestedName);

    /** What to do with changes that are not saved. */
    Unsaved unsavedChanges(String machineName);

    /** Shows a text to read. */
    void tell(String title, String text);

    /** Answers to unsaved changes. */
    enum Unsaved {
        SAVE,
        DISCARD,
        STAY
    }
}
