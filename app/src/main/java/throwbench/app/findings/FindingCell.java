package throwbench.app.findings;

import java.util.function.Consumer;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.Label;
import javafx.scene.control.Labeled;
import javafx.scene.control.ListCell;
import javafx.scene.control.OverrunStyle;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import javafx.scene.shape.SVGPath;
import throwbench.app.bench.Shown;
import throwbench.solver.finding.Finding;

/** A line of the panel as two rows of text, with what it opens to under them. */
final class FindingCell extends ListCell<FindingLine> {

    private final VerdictShape shape = new VerdictShape();
    private final Label title = label("finding-title");
    private final Label value = label("finding-value");
    private final Label held = label("finding-held");
    private final Label where = label("finding-where");
    private final Button open = new Button();
    private final Button others = new Button();
    private final SVGPath arrow = new SVGPath();
    private final VBox details = new VBox();
    private final HBox place;
    private final VBox text;
    private final HBox face;
    private final FindingsPanel panel;

    FindingCell(FindingsPanel panel, Consumer<FindingLine> toggleOpen, Consumer<FindingLine> toggleOthers) {
        this.panel = panel;
        getStyleClass().add("finding");
        setContentDisplay(ContentDisplay.GRAPHIC_ONLY);
        arrow.getStyleClass().add("finding-arrow");
        open.setGraphic(arrow);
        open.getStyleClass().setAll("finding-open");
        open.setFocusTraversable(false);
        open.setOnAction(e -> toggleOpen.accept(getItem()));
        others.getStyleClass().setAll("finding-others");
        others.setFocusTraversable(false);
        others.setOnAction(e -> toggleOthers.accept(getItem()));
        details.getStyleClass().add("finding-details");
        where.setTextOverrun(OverrunStyle.CENTER_ELLIPSIS);
        title.setMinWidth(60);
        where.setMinWidth(40);
        value.setMinWidth(Region.USE_PREF_SIZE);
        others.setMinWidth(Region.USE_PREF_SIZE);
        place = row(where, others);
        text = new VBox(1, row(title, value), held);
        HBox.setHgrow(text, Priority.ALWAYS);
        text.setMinWidth(0);
        face = new HBox(8, shape, text, open);
        face.setAlignment(Pos.TOP_LEFT);
        // the list gives the width: long names are shortened, not the list widened
        face.setMinWidth(0);
        setPrefWidth(0);
    }

    private static Label label(String style) {
        Label label = new Label();
        label.getStyleClass().add(style);
        return label;
    }

    private static HBox row(Label left, Labeled right) {
        Region between = new Region();
        HBox.setHgrow(between, Priority.ALWAYS);
        between.setMinWidth(8);
        HBox row = new HBox(left, between, right);
        row.setAlignment(Pos.BASELINE_LEFT);
        row.setMinWidth(0);
        return row;
    }

    @Override
    protected void updateItem(FindingLine line, boolean empty) {
        super.updateItem(line, empty);
        if (empty || line == null) {
            setGraphic(null);
            setAccessibleText("");
            return;
        }
        Shown shown = panel.shown();
        Finding finding = line.finding();
        FindingWords words = new FindingWords(shown.units());
        shape.show(finding.verdict());
        title.setText(line.head() ? finding.criterion().title() : place(finding, shown));
        value.setText(words.value(finding));
        value.getStyleClass()
                .setAll("label", "finding-value", "value-" + finding.verdict().text());
        String verdict = FindingWords.verdict(finding.verdict());
        held.setText(verdict + " · " + words.held(finding));
        where.setText(place(finding, shown));
        pseudoClassStateChanged(FindingsPanel.UNDER, !line.head());
        arrow.setContent(line.open() ? "M0 0 L8 0 L4 5 Z" : "M0 0 L5 4 L0 8 Z");
        open.setAccessibleText((line.open() ? "Hide" : "Show") + " formula and source");
        text.getChildren().remove(2, text.getChildren().size());
        if (line.head()) {
            others.setText(line.spread() ? "fewer" : line.others() + " more");
            others.setVisible(line.others() > 0);
            text.getChildren().add(place);
        }
        if (line.open()) {
            details.getChildren().setAll(FindingDetails.of(finding, shown));
            text.getChildren().add(details);
        }
        setAccessibleText(finding.criterion().title() + ", " + value.getText() + ", " + held.getText() + ", "
                + place(finding, shown));
        setGraphic(face);
    }

    /** The duty point, and what of the machine where there are several. */
    static String place(Finding finding, Shown shown) {
        StringBuilder words = new StringBuilder(finding.where().duty());
        if (shown.machine().throwsInOrder().size() > 1) {
            finding.where().throwName().ifPresent(name -> words.append(" · throw ")
                    .append(name));
        }
        finding.where().chamber().ifPresent(name -> words.append(" · ").append(name));
        if (shown.machine().stages().size() > 1) {
            finding.where().stage().ifPresent(name -> words.append(" · stage ").append(name));
        }
        return words.toString();
    }
}
