package throwbench.app.strip;

import java.util.function.DoubleConsumer;
import java.util.function.Function;
import javafx.css.PseudoClass;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.VBox;

/**
 * The field in which a crank angle or a piston travel is typed, with what must be told under it. A travel is passed twice a
 * turn: Enter goes to the inward stroke, Enter again to the outward one.
 */
final class PlaceField extends VBox {

    private static final PseudoClass WRONG = PseudoClass.getPseudoClass("wrong");
    private static final double MESSAGE_WIDTH = 230;
    private static final String HELP = "An angle as 37.5, a travel as 25 % or 40 mm. Enter turns the crank there.";

    private final TextField field = new TextField();
    private final Label message = new Label();
    private final Function<String, TypedPlace> reading;
    private final DoubleConsumer turn;
    private String lastText = "";
    private int lastChoice;

    /**
     * @param reading of a typed text
     * @param turn turns the crank to an angle, rad
     * @param leave gives the keyboard back to the strip
     */
    PlaceField(Function<String, TypedPlace> reading, DoubleConsumer turn, Runnable leave) {
        this.reading = reading;
        this.turn = turn;
        getStyleClass().add("strip-place");
        field.setId("strip-place");
        field.setPromptText("angle or travel");
        field.setAccessibleText("Crank angle or piston travel to turn to");
        field.setAccessibleHelp(HELP);
        message.setId("strip-place-message");
        message.getStyleClass().add("strip-message");
        message.setWrapText(true);
        message.setManaged(false);
        message.setVisible(false);
        getChildren().addAll(field, message);
        field.setOnAction(e -> enter());
        field.textProperty().addListener((p, before, now) -> tell("", false));
        field.focusedProperty().addListener((p, before, now) -> {
            if (!now) {
                tell("", false);
            }
        });
        field.setOnKeyPressed(e -> {
            if (e.getCode() == KeyCode.ESCAPE) {
                field.clear();
                leave.run();
                e.consume();
            }
        });
    }

    /** Takes the keyboard. */
    void take() {
        field.requestFocus();
        field.selectAll();
    }

    private void enter() {
        String text = field.getText();
        TypedPlace place = reading.apply(text);
        if (place.angles().isEmpty()) {
            tell(place.sentence(), true);
            return;
        }
        boolean again = place.onBothStrokes() && text.equals(lastText);
        lastChoice = again ? 1 - lastChoice : 0;
        lastText = text;
        turn.accept(place.angles().get(lastChoice));
        tell(place.sentence(), false);
        field.selectAll();
    }

    private void tell(String sentence, boolean wrong) {
        message.setText(sentence);
        message.setVisible(!sentence.isEmpty());
        field.pseudoClassStateChanged(WRONG, wrong);
        message.pseudoClassStateChanged(WRONG, wrong);
        field.setAccessibleHelp(sentence.isEmpty() ? HELP : sentence);
        requestLayout();
    }

    @Override
    protected void layoutChildren() {
        super.layoutChildren();
        if (message.isVisible()) {
            double width = Math.max(getWidth(), MESSAGE_WIDTH);
            message.resizeRelocate(0, field.getHeight() + 4, width, message.prefHeight(width));
        }
    }
}
