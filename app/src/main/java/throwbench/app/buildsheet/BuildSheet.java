package throwbench.app.buildsheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import javafx.geometry.Insets;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TextField;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import throwbench.app.bench.Bench;
import throwbench.app.bench.Shown;

/** The inputs of what is shown, in groups, with a search over their names. */
public final class BuildSheet extends VBox {

    private final Bench bench;
    private final VBox groups = new VBox(14);
    private final TextField search = new TextField();
    private final List<InputField> fields = new ArrayList<>();
    private List<SheetGroup> contents = List.of();

    public BuildSheet(Bench bench) {
        this.bench = bench;
        getStyleClass().addAll("panel", "build-sheet");
        setPadding(new Insets(12, 6, 8, 14));
        setSpacing(10);
        Label heading = new Label("Build sheet");
        heading.getStyleClass().add("heading");
        heading.setMinWidth(USE_PREF_SIZE);
        search.setPromptText("find an input");
        search.setId("find-input");
        search.setAccessibleText("find an input");
        search.getStyleClass().add("search");
        search.setPrefWidth(120);
        search.textProperty().addListener((o, before, now) -> arrange());
        HBox.setHgrow(search, Priority.ALWAYS);
        HBox top = new HBox(12, heading, search);
        top.setPadding(new Insets(0, 10, 0, 0));
        top.getStyleClass().add("heading-row");
        ScrollPane scroll = new ScrollPane(groups);
        scroll.setFitToWidth(true);
        scroll.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        groups.setPadding(new Insets(0, 10, 10, 0));
        VBox.setVgrow(scroll, Priority.ALWAYS);
        getChildren().addAll(top, scroll);
        bench.shown().addListener((o, before, now) -> take(now));
        take(bench.shown().get());
    }

    private void take(Shown shown) {
        List<SheetGroup> next = SheetContents.of(shown);
        if (next.equals(contents)) {
            fields.forEach(InputField::follow);
        } else {
            contents = next;
            arrange();
        }
    }

    private void arrange() {
        String sought = search.getText().strip().toLowerCase(Locale.ROOT);
        fields.clear();
        List<Node> boxes = new ArrayList<>();
        for (SheetGroup group : contents) {
            boolean whole = group.title().toLowerCase(Locale.ROOT).contains(sought);
            VBox box = new VBox(5);
            Label title = new Label(group.title());
            title.getStyleClass().add("group");
            box.getChildren().add(title);
            for (SheetEntry entry : group.entries()) {
                if (whole
                        || entry.label().contains(sought)
                        || entry.path().toLowerCase(Locale.ROOT).contains(sought)) {
                    InputField field = new InputField(new FieldInput(bench, entry));
                    fields.add(field);
                    box.getChildren().add(field);
                }
            }
            if (box.getChildren().size() > 1) {
                boxes.add(box);
            }
        }
        if (boxes.isEmpty()) {
            Label none = new Label("no input is called that");
            none.getStyleClass().add("soft");
            boxes.add(none);
        }
        groups.getChildren().setAll(boxes);
    }
}
