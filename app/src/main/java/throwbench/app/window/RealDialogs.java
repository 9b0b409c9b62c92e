package throwbench.app.window;

import java.io.File;
import java.nio.file.Path;
import java.util.Optional;
import javafx.scene.control.Alert;
import javafx.scene.control.ButtonBar;
import javafx.scene.control.ButtonType;
import javafx.stage.FileChooser;
import javafx.stage.Window;
import org.jspecify.annotations.Nullable;

/** The system's file chooser and the window's own questions. */
final class RealDialogs implements Dialogs {

    private final Window owner;

    RealDialogs(Window owner) {
        this.owner = owner;
    }

    private static FileChooser chooser(String title) {
        FileChooser chooser = new FileChooser();
        chooser.setTitle(title);
        chooser.getExtensionFilters().add(new FileChooser.ExtensionFilter("machine files", "*.json"));
        return chooser;
    }

    private static Optional<Path> path(@Nullable File file) {
        return Optional.ofNullable(file).map(File::toPath);
    }

    @Override
    public Optional<Path> fileToOpen() {
        return path(chooser("Open a machine").showOpenDialog(owner));
    }

    @Override
    public Optional<Path> fileToSave(String suggestedName) {
        FileChooser chooser = chooser("Save the machine");
        chooser.setInitialFileName(suggestedName);
        return path(chooser.showSaveDialog(owner));
    }

    @Override
    public Unsaved unsavedChanges(String machineName) {
        ButtonType save = new ButtonType("Save", ButtonBar.ButtonData.YES);
        ButtonType discard = new ButtonType("Discard", ButtonBar.ButtonData.NO);
        Alert alert = alert(
                Alert.AlertType.CONFIRMATION, "Unsaved changes", machineName + " has changes that no file holds.");
        alert.getButtonTypes().setAll(save, discard, ButtonType.CANCEL);
        ButtonType answer = alert.showAndWait().orElse(ButtonType.CANCEL);
        return answer == save ? Unsaved.SAVE : answer == discard ? Unsaved.DISCARD : Unsaved.STAY;
    }

    @Override
    public void tell(String title, String text) {
        Alert alert = alert(Alert.AlertType.INFORMATION, title, text);
        alert.getButtonTypes().setAll(ButtonType.CLOSE);
        alert.showAndWait();
    }

    private Alert alert(Alert.AlertType type, String title, String text) {
        Alert alert = new Alert(type);
        alert.initOwner(owner);
        alert.setTitle(title);
        alert.setHeaderText(title);
        alert.setContentText(text);
        alert.setGraphic(null);
        alert.getDialogPane().setPrefWidth(560);
        alert.getDialogPane().getStylesheets().setAll(owner.getScene().getStylesheets());
        alert.getDialogPane().setStyle(owner.getScene().getRoot().getStyle());
        return alert;
    }
}
