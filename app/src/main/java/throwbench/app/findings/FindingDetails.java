package throwbench.app.findings;

import java.util.ArrayList;
import java.util.List;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.layout.Region;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.Readout;
import throwbench.solver.finding.Finding;

/** What a finding opens to: formula, where it happens, inputs, source and note. */
final class FindingDetails {

    private FindingDetails() {}

    static List<Node> of(Finding finding, Shown shown) {
        List<Node> rows = new ArrayList<>();
        add(rows, "formula", finding.criterion().formula());
        if (finding.angle().isPresent()) {
            add(
                    rows,
                    "at",
                    "crank angle " + Readout.angle().text(finding.angle().getAsDouble()));
        }
        List<String> inputs = new FindingInputs(shown.machine(), shown.units()).of(finding);
        if (!inputs.isEmpty()) {
            add(rows, "inputs", String.join("\n", inputs));
        }
        add(rows, "source", finding.criterion().source());
        if (!finding.note().isEmpty()) {
            add(rows, "note", finding.note());
        }
        return rows;
    }

    private static void add(List<Node> rows, String name, String words) {
        Label head = new Label(name);
        head.getStyleClass().add("finding-detail-name");
        Label body = new Label(words);
        body.getStyleClass().add("finding-detail");
        body.setWrapText(true);
        body.setMinHeight(Region.USE_PREF_SIZE);
        rows.add(head);
        rows.add(body);
    }
}
