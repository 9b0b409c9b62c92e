package throwbench.app.findings;

import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Consumer;
import javafx.css.PseudoClass;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.PaletteStyle;
import throwbench.app.drawing.View;
import throwbench.solver.finding.Finding;
import throwbench.solver.revolution.Instant;

/**
 * The findings on the screen, worst first: for every criterion its worst duty point, the others on demand. Choosing one by
 * mouse or arrow keys reports it; Enter or the arrow at its right opens it, Right and Left list and hide the others.
 */
public final class FindingsPanel extends VBox implements View {

    static final PseudoClass UNDER = PseudoClass.getPseudoClass("under");

    private final ListView<FindingLine> list = new ListView<>();
    private final Label empty = new Label();
    private final FindingLines lines = new FindingLines();
    private final Consumer<Finding> onChoose;
    private Optional<Shown> shown = Optional.empty();
    private boolean stale;
    private boolean refreshing;

    /** @param onChoose takes the finding that was chosen */
    public FindingsPanel(Consumer<Finding> onChoose) {
        this.onChoose = onChoose;
        setId("findings");
        getStyleClass().add("findings");
        getStylesheets()
                .add(Objects.requireNonNull(FindingsPanel.class.getResource("findings.css"))
                        .toExternalForm());
        Label heading = new Label("Findings");
        heading.getStyleClass().add("findings-heading");
        Label order = new Label("worst first · all duty points");
        order.getStyleClass().add("findings-order");
        Region between = new Region();
        HBox.setHgrow(between, Priority.ALWAYS);
        HBox head = new HBox(heading, between, order);
        head.getStyleClass().add("findings-head");
        head.setAlignment(Pos.BASELINE_LEFT);
        empty.getStyleClass().add("findings-empty");
        empty.setWrapText(true);
        list.setId("findings-list");
        list.setAccessibleText("Findings, worst first");
        list.setCellFactory(view -> new FindingCell(this, line -> toggleOpen(line), line -> toggleOthers(line)));
        list.setPlaceholder(new StackPane(empty));
        VBox.setVgrow(list, Priority.ALWAYS);
        list.getSelectionModel().selectedItemProperty().addListener((p, before, now) -> {
            if (!refreshing && now != null) {
                this.onChoose.accept(now.finding());
            }
        });
        list.addEventFilter(KeyEvent.KEY_PRESSED, this::key);
        getChildren().addAll(head, list);
        setMinSize(210, 120);
        setPrefSize(320, 420);
        wear(Palette.LIGHT);
    }

    @Override
    public void show(Shown next) {
        shown = Optional.of(next);
        stale = true;
    }

    @Override
    public void wear(Palette palette) {
        setStyle(PaletteStyle.of(palette));
    }

    @Override
    public void draw(Instant instant) {
        if (stale) {
            stale = false;
            list();
        }
    }

    /** The state that the cells tell of. */
    Shown shown() {
        return shown.orElseThrow(() -> new IllegalStateException("no state taken yet"));
    }

    private void list() {
        List<FindingLine> next = lines.of(shown().findings());
        FindingLine chosen = list.getSelectionModel().getSelectedItem();
        int focused = list.getFocusModel().getFocusedIndex();
        refreshing = true;
        list.getItems().setAll(next);
        empty.setText("Nothing is judged: no duty point of this machine could be solved.");
        if (chosen != null) {
            for (int i = 0; i < next.size(); i++) {
                if (next.get(i).key().equals(chosen.key())) {
                    list.getSelectionModel().select(i);
                    focused = i;
                }
            }
        }
        list.getFocusModel().focus(Math.min(focused, next.size() - 1));
        refreshing = false;
    }

    private void toggleOpen(FindingLine line) {
        lines.toggleOpen(line.finding());
        list();
    }

    private void toggleOthers(FindingLine line) {
        lines.toggleSpread(line.finding().criterion().id());
        list();
    }

    private void key(KeyEvent event) {
        FindingLine line = list.getSelectionModel().getSelectedItem();
        if (line == null) {
            return;
        }
        boolean spread = lines.isSpread(line.finding().criterion().id());
        switch (event.getCode()) {
            case ENTER, SPACE -> {
                toggleOpen(line);
                event.consume();
            }
            case RIGHT, LEFT -> {
                if ((event.getCode() == KeyCode.RIGHT) != spread) {
                    toggleOthers(line);
                }
                event.consume();
            }
            default -> {}
        }
    }
}
