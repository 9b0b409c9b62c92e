package throwbench.app.buildsheet;

import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.ScrollEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;

/**
 * One row of the sheet: name, field, the other system beside, and below it what is wrong. Enter or leaving the field takes
 * the value, Escape brings the old one back, arrow keys and the wheel over a focused field move it live.
 */
final class InputField extends VBox {

    private static final double FIELD_WIDTH = 92;
    private static final double BESIDE_WIDTH = 76;

    private final FieldInput input;
    private final TextField field = new TextField();
    private final Label beside = new Label();
    private final Label wrong = new Label();
    private final Label name = new Label();

    InputField(FieldInput input) {
        this.input = input;
        String path = input.entry().path();
        name.setText(input.entry().label());
        name.getStyleClass().add("name");
        name.setLabelFor(field);
        name.setMinWidth(92);
        name.setMaxWidth(Double.MAX_VALUE);
        HBox.setHgrow(name, Priority.ALWAYS);
        field.setId(path);
        field.setPrefWidth(FIELD_WIDTH);
        field.setMinWidth(FIELD_WIDTH);
        field.setMaxWidth(FIELD_WIDTH);
        field.setAccessibleText(input.entry().label());
        field.setTooltip(new Tooltip(input.meaning() + "\n" + path));
        beside.getStyleClass().add("other");
        beside.setMinWidth(BESIDE_WIDTH);
        beside.setPrefWidth(BESIDE_WIDTH);
        wrong.getStyleClass().add("wrong");
        wrong.setId(path + "-wrong");
        HBox row = new HBox(6, name, field, beside);
        row.setAlignment(Pos.CENTER_LEFT);
        getChildren().addAll(row, wrong);
        say("");
        field.focusedProperty().addListener((o, before, now) -> {
            if (!now) {
                commit();
            }
        });
        field.setOnAction(e -> commit());
        field.addEventFilter(KeyEvent.KEY_PRESSED, this::key);
        field.addEventFilter(ScrollEvent.SCROLL, this::wheel);
        refresh();
    }

    FieldInput input() {
        return input;
    }

    private void key(KeyEvent event) {
        if (event.getCode() == KeyCode.ESCAPE) {
            say("");
            refresh();
            event.consume();
        } else if (event.getCode() == KeyCode.UP || event.getCode() == KeyCode.DOWN) {
            double sense = event.getCode() == KeyCode.UP ? 1 : -1;
            step(event.isShiftDown() ? 10 * sense : sense);
            event.consume();
        } else if (event.isShortcutDown()
                && event.getCode() == KeyCode.Z
                && field.getText().equals(lastShown)) {
            // nothing typed that the field's own undo could take back: the machine's is meant
            input.undo(event.isShiftDown());
            event.consume();
        }
    }

    private void wheel(ScrollEvent event) {
        if (field.isFocused() && event.getDeltaY() != 0) {
            step(Math.signum(event.getDeltaY()) * (event.isShiftDown() ? 10 : 1));
            event.consume();
        }
    }

    private void step(double steps) {
        say(input.step(steps));
        refreshIfValid();
    }

    private void commit() {
        if (!field.getText().equals(input.text())) {
            say(input.commit(field.getText()));
            refreshIfValid();
        } else {
            say("");
        }
    }

    private void refreshIfValid() {
        if (wrong.getText().isEmpty()) {
            refresh();
        }
    }

    private void say(String sentence) {
        wrong.setText(sentence);
        wrong.setVisible(!sentence.isEmpty());
        wrong.setManaged(!sentence.isEmpty());
        field.getStyleClass().remove("wrong-value");
        if (!sentence.isEmpty()) {
            field.getStyleClass().add("wrong-value");
        }
        field.setAccessibleHelp(sentence);
    }

    /** Shows what the machine holds, unless the user is at a value that is wrong or not yet taken. */
    void follow() {
        boolean untouched = wrong.getText().isEmpty()
                && !(field.isFocused() && !field.getText().equals(lastShown));
        if (untouched) {
            refresh();
        }
    }

    private String lastShown = "";

    private void refresh() {
        String text = input.text();
        if (!field.getText().equals(text)) {
            field.setText(text);
        }
        lastShown = text;
        String otherwise = input.otherwise();
        field.setPromptText(text.isEmpty() ? otherwise : "");
        beside.setText(input.beside());
    }
}
