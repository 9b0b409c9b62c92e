package throwbench.app.window;

import javafx.animation.KeyFrame;
import javafx.animation.Timeline;
import javafx.scene.control.Label;
import javafx.scene.control.OverrunStyle;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.util.Duration;
import throwbench.app.bench.Bench;
import throwbench.app.bench.Status;
import throwbench.app.drawing.Readout;

/** The caution, until there is something to say; at the right how long solving takes and how many frames come. */
final class StatusLine extends HBox {

    static final String CAUTION =
            "Results support, and do not replace, the manufacturer’s limits, local codes and a licensed engineer’s judgement.";

    private final Bench bench;
    private final Label said = new Label(CAUTION);
    private final Label measured = new Label();

    StatusLine(Bench bench) {
        this.bench = bench;
        getStyleClass().add("status-line");
        said.setId("status");
        said.setTextOverrun(OverrunStyle.ELLIPSIS);
        said.setMinWidth(0);
        measured.setMinWidth(Region.USE_PREF_SIZE);
        Region spring = new Region();
        HBox.setHgrow(spring, Priority.ALWAYS);
        getChildren().addAll(said, spring, measured);
        bench.status().addListener((o, before, now) -> say(now));
        say(bench.status().get());
    }

    private void say(Status status) {
        said.setText(status.text().isEmpty() ? CAUTION : status.text());
        said.setAccessibleText(said.getText());
        said.getStyleClass().remove("trouble");
        if (status.trouble()) {
            said.getStyleClass().add("trouble");
        }
    }

    /** Starts telling, once a second. */
    Timeline measure(FrameTimes times) {
        Timeline second = new Timeline(new KeyFrame(
                Duration.seconds(1),
                e -> measured.setText("solved in "
                        + Readout.fixed(bench.shown().get().solveMillis(), 1)
                        + " ms · "
                        + Readout.fixed(times.perSecond(), 0)
                        + " frames/s")));
        second.setCycleCount(Timeline.INDEFINITE);
        second.play();
        return second;
    }
}
