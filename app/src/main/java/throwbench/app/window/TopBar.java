package throwbench.app.window;

import java.util.List;
import java.util.function.IntConsumer;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.OverrunStyle;
import javafx.scene.control.Slider;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import throwbench.app.bench.Bench;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.Readout;
import throwbench.solver.document.quantity.UnitSystem;

/** Machine name, duty point, throw and units; play and shown speed. */
final class TopBar extends HBox {

    /** In the order of the choice. */
    private static final List<UnitSystem> UNITS = List.of(UnitSystem.SI, UnitSystem.US);

    private final Bench bench;
    private final Label name = new Label();
    private final Label edited = new Label("edited");
    private final ComboBox<String> duty = new ComboBox<>();
    private final ComboBox<String> shownThrow = new ComboBox<>();
    private final ComboBox<String> units = new ComboBox<>();
    private final Button play = new Button("Play");
    private final Slider shownSpeed = new Slider(-3, 0, Math.log10(1.0 / 60));
    private final Label speedText = new Label();
    private boolean taking;

    TopBar(Bench bench, MachineMenu menu) {
        this.bench = bench;
        getStyleClass().add("top-bar");
        name.getStyleClass().add("machine-name");
        name.setTextOverrun(OverrunStyle.ELLIPSIS);
        name.setMinWidth(60);
        edited.getStyleClass().add("caption");
        edited.setMinWidth(Region.USE_PREF_SIZE);
        edited.setId("edited");
        speedText.getStyleClass().add("caption");
        speedText.setId("shown-speed-text");
        speedText.setMinWidth(150);
        Region left = spring();
        Region right = spring();
        getChildren()
                .addAll(
                        menu,
                        name,
                        edited,
                        choice(duty, "duty", "duty point (Page Up, Page Down)", 230, bench::chooseDuty),
                        choice(shownThrow, "throw", "throw shown in full", 124, bench::chooseThrow),
                        choice(units, "units", "units in which values are shown", 90, this::chooseUnits),
                        left,
                        play(),
                        speed(),
                        speedText,
                        right);
        setAlignment(Pos.CENTER_LEFT);
        units.getItems().setAll("SI", "US");
        bench.shown().addListener((o, before, now) -> take(now));
        bench.file().addListener((o, before, now) -> take(bench.shown().get()));
        bench.playhead().playing().addListener((o, before, now) -> playing(now));
        bench.playhead()
                .shownSpeed()
                .addListener((o, before, now) -> tellSpeed(bench.shown().get()));
        take(bench.shown().get());
        playing(bench.playhead().playing().get());
    }

    private static Region spring() {
        Region spring = new Region();
        HBox.setHgrow(spring, Priority.ALWAYS);
        return spring;
    }

    private ComboBox<String> choice(ComboBox<String> box, String id, String meaning, double width, IntConsumer chosen) {
        box.setId(id);
        box.setAccessibleText(meaning);
        box.setTooltip(new Tooltip(meaning));
        box.setPrefWidth(width);
        box.setMinWidth(64);
        box.getSelectionModel().selectedIndexProperty().addListener((o, before, now) -> {
            if (!taking && now.intValue() >= 0) {
                chosen.accept(now.intValue());
            }
        });
        return box;
    }

    private void chooseUnits(int index) {
        bench.chooseUnits(UNITS.get(index));
    }

    private Button play() {
        play.setId("play");
        play.getStyleClass().add("play");
        play.setTooltip(new Tooltip("turn the crank, or hold it (Space)"));
        play.setOnAction(
                e -> bench.playhead().setPlaying(!bench.playhead().playing().get()));
        return play;
    }

    private Slider speed() {
        shownSpeed.setId("shown-speed");
        shownSpeed.setPrefWidth(120);
        shownSpeed.setMinWidth(70);
        shownSpeed.setTooltip(new Tooltip("how fast the crank is shown turning: real time to a thousandth of it"));
        shownSpeed.setAccessibleText("shown speed");
        shownSpeed.valueProperty().addListener((o, before, now) -> bench.playhead()
                .setShownSpeed(Math.pow(10, now.doubleValue())));
        return shownSpeed;
    }

    private void playing(boolean running) {
        play.setText(running ? "Pause" : "Play");
        play.setAccessibleText(running ? "hold the crank" : "turn the crank");
    }

    private void take(Shown shown) {
        taking = true;
        name.setText(shown.machine().name());
        name.setTooltip(new Tooltip(shown.machine().name()));
        boolean changed = bench.edited();
        edited.setVisible(changed);
        edited.setManaged(changed);
        fill(duty, shown.machine().dutyPoints().stream().map(d -> d.name()).toList(), shown.dutyIndex());
        fill(
                shownThrow,
                shown.machine().throwsInOrder().stream()
                        .map(t -> "throw " + t.name())
                        .toList(),
                shown.throwIndex());
        units.getSelectionModel().select(UNITS.indexOf(shown.units()));
        tellSpeed(shown);
        taking = false;
    }

    private static void fill(ComboBox<String> box, List<String> names, int chosen) {
        if (!box.getItems().equals(names)) {
            box.getItems().setAll(names);
        }
        box.getSelectionModel().select(chosen);
    }

    private void tellSpeed(Shown shown) {
        double share = bench.playhead().shownSpeed().get();
        double rpm = shown.running().turnsPerSecond() * 60;
        String part = share > 0.999 ? "in real time" : "at 1/" + Readout.fixed(1 / share, 0) + " of";
        speedText.setText("shown " + part + " " + Readout.fixed(rpm, rpm < 100 ? 1 : 0) + " rpm");
    }
}
