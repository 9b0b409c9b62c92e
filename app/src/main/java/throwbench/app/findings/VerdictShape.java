package throwbench.app.findings;

import javafx.scene.layout.StackPane;
import javafx.scene.shape.SVGPath;
import throwbench.solver.finding.Verdict;

/** The verdict as a shape: a filled triangle not met, a ring met, an empty square not judged. */
final class VerdictShape extends StackPane {

    private final SVGPath path = new SVGPath();

    VerdictShape() {
        getStyleClass().add("verdict");
        getChildren().add(path);
        setMinSize(18, 18);
        setMaxSize(18, 18);
    }

    void show(Verdict verdict) {
        path.setContent(
                switch (verdict) {
                    case NOT_MET -> "M0 1 L14 1 L7 13 Z";
                    case MET -> "M1 6 A5 5 0 1 0 11 6 A5 5 0 1 0 1 6 Z";
                    case NOT_JUDGED -> "M0 0 L10 0 L10 10 L0 10 Z";
                });
        path.getStyleClass().setAll("verdict-" + verdict.text());
    }
}
