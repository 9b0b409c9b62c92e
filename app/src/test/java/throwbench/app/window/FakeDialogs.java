package throwbench.app.window;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Answers prepared in advance; keeps what was told. */
final class FakeDialogs implements Dialogs {

    Optional<Path> open = Optional.empty();
    Optional<Path> save = Optional.empty();
    Unsaved unsaved = Unsaved.DISCARD;
    int asked;
    final List<String> told = new ArrayList<>();

    @Override
    public Optional<Path> fileToOpen() {
        return open;
    }

    @Override
    public Optional<Path> fileToSave(String suggestedName) {
        return save;
    }

    @Override
    public Unsaved unsavedChanges(String machineName) {
        asked++;
        return unsaved;
    }

    @Override
    public void tell(String title, String text) {
        told.add(title + ": " + text);
    }
}
