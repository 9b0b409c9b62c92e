package throwbench.app.window;

import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javafx.animation.Timeline;
import javafx.application.Platform;
import javafx.geometry.Insets;
import javafx.geometry.Orientation;
import javafx.geometry.Rectangle2D;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.SplitPane;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.stage.Screen;
import javafx.stage.Stage;
import throwbench.app.bench.Bench;
import throwbench.app.bench.Status;
import throwbench.app.buildsheet.BuildSheet;
import throwbench.app.drawing.View;
import throwbench.app.findings.FindingsPanel;
import throwbench.app.gauge.GaugeColumn;
import throwbench.app.linkage.LinkageView;
import throwbench.app.strip.StripView;

/** The window: puts the views in their places, gives them one clock, and carries out what menu and keys ask for. */
final class BenchWindow implements MachineMenu.Actions {

    /** On a larger screen the window leaves room beside it. */
    private static final double LARGEST_WIDTH = 1920;

    private static final double LARGEST_HEIGHT = 1080;
    private static final double SHEET_SHARE = 0.165;
    private static final double SHEET_LEAST = 304;
    private static final double SIDE_SHARE = 0.215;
    private static final double SIDE_LEAST = 300;

    private final Stage stage;
    private final Bench bench;
    private final Dialogs dialogs;
    private final MachineMenu menu = new MachineMenu(this);
    private final BuildSheet sheet;
    private final LinkageView linkage;
    private final StripView strip;
    private final GaugeColumn gauges;
    private final FindingsPanel findings;
    private final SplitPane middle;
    private final SplitPane side;
    private final SplitPane all;
    private final Scene scene;
    private final FrameClock clock;
    private final Timeline measuring;

    BenchWindow(Stage stage, Bench bench, Dialogs dialogs) {
        this.stage = stage;
        this.bench = bench;
        this.dialogs = dialogs;
        sheet = new BuildSheet(bench);
        linkage = new LinkageView(bench.playhead());
        strip = new StripView(bench.playhead());
        gauges = new GaugeColumn();
        findings = new FindingsPanel(bench::goTo);
        linkage.onPick(strip::addTrace);
        strip.setId("strip");
        linkage.setId("linkage");
        middle = split(Orientation.VERTICAL, linkage, strip);
        side = split(Orientation.VERTICAL, gauges, findings);
        all = split(Orientation.HORIZONTAL, sheet, middle, side);
        middle.setDividerPositions(0.5);
        side.setDividerPositions(0.45);
        all.setPadding(new Insets(8));
        all.widthProperty().addListener((o, before, now) -> arrange());
        for (Node panel : List.of(linkage, strip, gauges, findings)) {
            panel.getStyleClass().add("panel");
        }
        StatusLine status = new StatusLine(bench);
        BorderPane root = new BorderPane(all, new TopBar(bench, menu), null, status, null);
        root.getStyleClass().add("bench");
        scene = new Scene(root, 1600, 900);
        wear(Theme.LIGHT);
        Keys.install(scene, bench);
        // keys that no control took turn the crank, wherever the keyboard is
        scene.addEventHandler(KeyEvent.KEY_PRESSED, strip::scrub);
        clock = new FrameClock(bench, List.<View>of(linkage, strip, gauges, findings));
        measuring = status.measure(clock.times());
        bench.shown().addListener((o, before, now) -> tellHistory());
        bench.file().addListener((o, before, now) -> tellHistory());
        tellHistory();
    }

    private static SplitPane split(Orientation orientation, Node... parts) {
        SplitPane pane = new SplitPane(parts);
        pane.setOrientation(orientation);
        return pane;
    }

    /** Opens the window, on the whole screen where that is small. */
    void show() {
        stage.setScene(scene);
        stage.setMinWidth(1024);
        stage.setMinHeight(640);
        Rectangle2D screen = Screen.getPrimary().getVisualBounds();
        stage.setX(screen.getMinX());
        stage.setY(screen.getMinY());
        stage.setWidth(Math.min(LARGEST_WIDTH, screen.getWidth()));
        stage.setHeight(Math.min(LARGEST_HEIGHT, screen.getHeight()));
        stage.setMaximized(screen.getWidth() <= LARGEST_WIDTH);
        stage.setOnCloseRequest(event -> {
            if (!mayClose()) {
                event.consume();
            }
        });
        stage.setOnHidden(event -> stop());
        stage.show();
        Platform.runLater(this::arrange);
        linkage.requestFocus();
        clock.start();
        FrameReport.whenAsked(clock.times(), stage::hide);
    }

    /** Places the dividers: the side panels keep their width in points, the views share the rest. */
    private void arrange() {
        double width = Math.max(1, all.getWidth());
        double sheetShare = Math.max(SHEET_SHARE, SHEET_LEAST / width);
        double sideShare = Math.max(SIDE_SHARE, SIDE_LEAST / width);
        boolean withSheet = all.getItems().contains(sheet);
        if (withSheet && all.getItems().contains(side)) {
            all.setDividerPositions(sheetShare, 1 - sideShare);
        } else {
            all.setDividerPositions(withSheet ? sheetShare : 1 - sideShare);
        }
    }

    private void stop() {
        clock.stop();
        measuring.stop();
    }

    private void wear(Theme theme) {
        theme.apply(scene);
        for (View view : List.<View>of(linkage, strip, gauges, findings)) {
            view.wear(theme.palette());
        }
    }

    private void tellHistory() {
        menu.tellHistory(bench.undoName(), bench.redoName());
        stage.setTitle(bench.shown().get().machine().name() + (bench.edited() ? " (edited)" : "") + " – Throwbench");
    }

    /** Something failed that should not have: says so, keeps the window and the work. */
    void failed(Throwable failure) {
        bench.say(
                Status.trouble("Something failed inside (" + failure + "); the machine is as it was. Please save it."));
        System.getLogger("throwbench").log(System.Logger.Level.ERROR, "in the window", failure);
    }

    @Override
    public void open() {
        if (mayClose()) {
            dialogs.fileToOpen().ifPresent(bench::open);
        }
    }

    /** Whether unsaved changes are out of the way: none, saved, or given up. */
    private boolean mayClose() {
        if (!bench.edited()) {
            return true;
        }
        return switch (dialogs.unsavedChanges(bench.shown().get().machine().name())) {
            case SAVE -> saved();
            case DISCARD -> true;
            case STAY -> false;
        };
    }

    private boolean saved() {
        Optional<Path> path = bench.file().get().path();
        return path.map(bench::save).orElseGet(this::savedAs);
    }

    private boolean savedAs() {
        String suggested = bench.shown()
                        .get()
                        .machine()
                        .name()
                        .strip()
                        .toLowerCase(Locale.ROOT)
                        .replace(' ', '-') + ".json";
        return dialogs.fileToSave(suggested).map(bench::save).orElse(false);
    }

    @Override
    public void save() {
        saved();
    }

    @Override
    public void saveAs() {
        savedAs();
    }

    @Override
    public void undo() {
        bench.undo();
    }

    @Override
    public void redo() {
        bench.redo();
    }

    @Override
    public void frameAll() {
        linkage.frameAll();
    }

    @Override
    public void showSheet(boolean show) {
        show(sheet, show, 0);
    }

    @Override
    public void showSide(boolean show) {
        show(side, show, all.getItems().size());
    }

    private void show(Node panel, boolean show, int index) {
        if (!show) {
            all.getItems().remove(panel);
        } else if (!all.getItems().contains(panel)) {
            all.getItems().add(index, panel);
        }
        arrange();
    }

    @Override
    public void dark(boolean dark) {
        wear(dark ? Theme.DARK : Theme.LIGHT);
    }

    @Override
    public void keys() {
        dialogs.tell("Keys", Keys.TEXT);
    }

    @Override
    public void about() {
        dialogs.tell("About Throwbench", About.text());
    }

    @Override
    public void close() {
        if (mayClose()) {
            stage.hide();
        }
    }
}
