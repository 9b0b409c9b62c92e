package throwbench.app.window;

import java.util.Optional;
import java.util.function.Consumer;
import javafx.scene.control.CheckMenuItem;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.SeparatorMenuItem;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCombination;

/** What can be done with the machine and the window; every item has a key. */
final class MachineMenu extends MenuButton {

    /** What the items do. */
    interface Actions {
        void open();

        void save();

        void saveAs();

        void undo();

        void redo();

        void frameAll();

        void showSheet(boolean show);

        void showSide(boolean show);

        void dark(boolean dark);

        void keys();

        void about();

        void close();
    }

    private final MenuItem undo;
    private final MenuItem redo;

    MachineMenu(Actions actions) {
        super("Machine");
        setId("machine-menu");
        setTooltip(new Tooltip("open, save, undo, panels, colours"));
        undo = item("Undo", "Shortcut+Z", actions::undo);
        redo = item("Redo", "Shortcut+Shift+Z", actions::redo);
        CheckMenuItem sheet = check("Build sheet", "F6", true, actions::showSheet);
        CheckMenuItem side = check("Gauges and findings", "F7", true, actions::showSide);
        CheckMenuItem dark = check("Dark colours", "Shortcut+D", false, actions::dark);
        dark.setId("dark");
        getItems()
                .addAll(
                        item("Open…", "Shortcut+O", actions::open),
                        item("Save", "Shortcut+S", actions::save),
                        item("Save as…", "Shortcut+Shift+S", actions::saveAs),
                        new SeparatorMenuItem(),
                        undo,
                        redo,
                        new SeparatorMenuItem(),
                        item("Frame the linkage", "F8", actions::frameAll),
                        sheet,
                        side,
                        dark,
                        new SeparatorMenuItem(),
                        item("Keys", "F1", actions::keys),
                        item("About and caution", "Shift+F1", actions::about),
                        item("Close", "Shortcut+Q", actions::close));
    }

    private static MenuItem item(String text, String key, Runnable action) {
        MenuItem item = new MenuItem(text);
        item.setAccelerator(KeyCombination.keyCombination(key));
        item.setOnAction(e -> action.run());
        return item;
    }

    private static CheckMenuItem check(String text, String key, boolean on, Consumer<Boolean> action) {
        CheckMenuItem item = new CheckMenuItem(text);
        item.setSelected(on);
        item.setAccelerator(KeyCombination.keyCombination(key));
        item.selectedProperty().addListener((o, before, now) -> action.accept(now));
        return item;
    }

    /** Names the edits that undo and redo would act on. */
    void tellHistory(Optional<String> undoName, Optional<String> redoName) {
        undo.setText(undoName.map(n -> "Undo " + n).orElse("Undo"));
        undo.setDisable(undoName.isEmpty());
        redo.setText(redoName.map(n -> "Redo " + n).orElse("Redo"));
        redo.setDisable(redoName.isEmpty());
    }
}
