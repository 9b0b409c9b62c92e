package throwbench.app.window;

import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.ButtonBase;
import javafx.scene.control.ComboBoxBase;
import javafx.scene.control.MenuButton;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.KeyEvent;
import throwbench.app.bench.Bench;
import throwbench.app.bench.Shown;

/** Keys that work anywhere in the window: playing and duty points. Menu items and views have their own. */
final class Keys {

    static final String TEXT = """
            Space\tturn the crank, or hold it
            ← →\t1° back or on; with Shift 10°, with Ctrl 0.1°
            Home, End\thead-end and crank-end dead centre
            B, N\tthe event before, the next event
            Page Up, Page Down\tthe duty point before, the next one
            F8\tframe the whole linkage; wheel zooms, drag moves
            F6, F7\tbuild sheet; gauges and findings
            Ctrl+D\tdark colours
            Ctrl+O, Ctrl+S\topen, save; Ctrl+Shift+S save as
            Ctrl+Z, Ctrl+Shift+Z\tundo, redo
            ↑ ↓ in a field\tmove a value live; with Shift ten times as far
            Enter, Escape in a field\ttake the value, or bring the old one back
            F1, Shift+F1\tthese keys; about and caution""";

    private Keys() {}

    static void install(Scene scene, Bench bench) {
        scene.addEventFilter(KeyEvent.KEY_PRESSED, event -> {
            if (event.isShortcutDown() || event.isAltDown()) {
                return;
            }
            switch (event.getCode()) {
                case SPACE -> {
                    if (!takesSpace(scene.getFocusOwner())) {
                        bench.playhead().setPlaying(!bench.playhead().playing().get());
                        event.consume();
                    }
                }
                case PAGE_UP -> {
                    step(bench, -1);
                    event.consume();
                }
                case PAGE_DOWN -> {
                    step(bench, 1);
                    event.consume();
                }
                default -> {}
            }
        });
    }

    private static boolean takesSpace(Node focused) {
        return focused instanceof TextInputControl
                || focused instanceof ButtonBase
                || focused instanceof MenuButton
                || focused instanceof ComboBoxBase<?>;
    }

    private static void step(Bench bench, int by) {
        Shown shown = bench.shown().get();
        int count = shown.machine().dutyPoints().size();
        bench.chooseDuty(Math.floorMod(shown.dutyIndex() + by, count));
    }
}
