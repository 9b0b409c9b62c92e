package throwbench.app.window;

import java.io.File;
import java.nio.file.Path;
import java.util.Optional;
import javafx.scene.control.Alert;
import javafx.scene.control.ButtonBar;
import javafx.scene.control.ButtonType;
import javafx.scene.control.DialogPane;
import javafx.scene.control.Label;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import javafx.stage.FileChooser;
import javafx.stage.Window;
import org.jspecify.annotations.Nullable;

/** The system's file chooser and the window's own questions. */
final class RealDialogs implements Dialogs {

    private static final double TEXT_WIDTH = 520;

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
        alert.setGraphic(null);
        DialogPane pane = alert.getDialogPane();
        pane.getStylesheets().setAll(owner.getScene().getStylesheets());
        pane.setContent(content(text));
        pane.setMinHeight(Region.USE_PREF_SIZE);
        return alert;
    }

    /** Paragraphs; lines with a tab are rows of two columns. */
    private static VBox content(String text) {
        VBox box = new VBox(8);
        GridPane rows = new GridPane();
        rows.setHgap(22);
        rows.setVgap(5);
        for (String line : text.split("\n", -1)) {
            int tab = line.indexOf('\t');
            if (tab >= 0) {
                Label key = new Label(line.substring(0, tab));
                key.setStyle("-fx-font-weight: bold;");
                rows.addRow(rows.getRowCount(), key, new Label(line.substring(tab + 1)));
            } else if (!line.isBlank()) {
                Label paragraph = new Label(line);
                paragraph.setWrapText(true);
                paragraph.setMaxWidth(TEXT_WIDTH);
                paragraph.setMinHeight(Region.USE_PREF_SIZE);
                box.getChildren().add(paragraph);
            }
        }
        if (rows.getRowCount() > 0) {
            box.getChildren().add(rows);
        }
        return box;
    }
}
