package throwbench.app.window;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import javafx.application.Platform;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.framework.junit5.Stop;
import org.testfx.util.WaitForAsyncUtils;
import throwbench.app.Samples;
import throwbench.app.bench.Bench;
import throwbench.app.bench.Opened;
import throwbench.app.drawing.Fonts;
import throwbench.solver.revolution.Column;

/** A person at the real window, without a display. */
@ExtendWith(ApplicationExtension.class)
class BenchWindowTest {

    private static final Opened SAMPLE =
            Opened.of(Samples.read(Samples.DEFAULT)).opened().orElseThrow();

    private final ExecutorService worker = Executors.newSingleThreadExecutor();
    private final FakeDialogs dialogs = new FakeDialogs();
    private Stage stage;
    private Bench bench;

    @Start
    void start(Stage given) {
        stage = given;
        bench = new Bench(SAMPLE, worker, Platform::runLater);
        Fonts.load();
        new BenchWindow(stage, bench, dialogs).show();
    }

    @Stop
    void stop() {
        stage.hide();
        worker.shutdownNow();
    }

    private static void until(Callable<Boolean> condition) throws TimeoutException {
        WaitForAsyncUtils.waitFor(20, TimeUnit.SECONDS, condition);
    }

    private double angle() {
        return Math.toDegrees(bench.playhead().crankAngle().get());
    }

    private String status(FxRobot robot) {
        return robot.lookup("#status").queryAs(Label.class).getText();
    }

    private static TextField field(FxRobot robot, String path) {
        return robot.lookup(n -> path.equals(n.getId())).queryAs(TextField.class);
    }

    private static void type(FxRobot robot, String path, String text) {
        TextField field = field(robot, path);
        robot.interact(() -> {
            field.requestFocus();
            field.selectAll();
        });
        robot.write(text);
        robot.type(KeyCode.ENTER);
    }

    @Test
    void playTurnsTheCrankAndSpaceHoldsIt(FxRobot robot) throws TimeoutException {
        robot.interact(() -> bench.playhead().setPlaying(false));
        double before = angle();
        robot.clickOn("#play");
        until(() -> Math.abs(angle() - before) > 2);
        robot.interact(() -> stage.getScene().lookup("#strip").requestFocus());
        robot.type(KeyCode.SPACE);
        until(() -> !bench.playhead().playing().get());
    }

    @Test
    void arrowKeysScrubInDegreesTenthsAndTens(FxRobot robot) {
        robot.interact(() -> {
            bench.playhead().setPlaying(false);
            bench.playhead().turnTo(Math.toRadians(40));
            stage.getScene().lookup("#strip").requestFocus();
        });
        robot.type(KeyCode.RIGHT);
        assertEquals(41, angle(), 1e-9);
        robot.press(KeyCode.SHIFT).type(KeyCode.RIGHT).release(KeyCode.SHIFT);
        assertEquals(51, angle(), 1e-9);
        robot.press(KeyCode.CONTROL).type(KeyCode.LEFT).release(KeyCode.CONTROL);
        assertEquals(50.9, angle(), 1e-9);
        robot.type(KeyCode.END);
        assertEquals(180, angle(), 1e-9);
        robot.type(KeyCode.HOME);
        assertEquals(0, angle(), 1e-9);
    }

    @Test
    void anEditedMassReachesResultsWhileTheCrankKeepsTurning(FxRobot robot) throws TimeoutException {
        robot.interact(() -> bench.playhead().setPlaying(true));
        double before = bench.shown()
                .get()
                .summary()
                .extremes(Column.ROD_LOAD)
                .greatest()
                .value();
        type(robot, "throws[0].masses.piston", "60,5 kg");
        until(() -> bench.shown().get().shownThrow().masses().piston() == 60.5);
        double after = bench.shown()
                .get()
                .summary()
                .extremes(Column.ROD_LOAD)
                .greatest()
                .value();
        assertTrue(Math.abs(after - before) > 1000, "22 kg more at 450 m/s2 are 10 kN");
        assertEquals("60.5 kg", field(robot, "throws[0].masses.piston").getText());
        double angle = angle();
        until(() -> Math.abs(angle() - angle) > 1);
    }

    @Test
    void aWrongValueIsSaidUnderItsFieldAndTheMachineStays(FxRobot robot) throws TimeoutException {
        type(robot, "throws[0].crankRadius", "500 mm");
        Label wrong = robot.lookup(n -> "throws[0].crankRadius-wrong".equals(n.getId()))
                .queryAs(Label.class);
        until(() -> wrong.isVisible() && !wrong.getText().isEmpty());
        assertEquals(0.075, bench.shown().get().shownThrow().linkage().crankRadius());
        assertEquals("500 mm", field(robot, "throws[0].crankRadius").getText());
        type(robot, "throws[0].crankRadius", "80 mm");
        until(() -> bench.shown().get().shownThrow().linkage().crankRadius() == 0.08);
        assertFalse(wrong.isVisible());
    }

    @Test
    void arrowKeysInAFieldMoveTheValueLive(FxRobot robot) throws TimeoutException {
        TextField field = field(robot, "drive.speed");
        robot.interact(field::requestFocus);
        robot.type(KeyCode.UP).type(KeyCode.UP);
        until(() -> field.getText().equals("742 rpm"));
        until(() -> Math.abs(bench.shown().get().running().meanSpeed() - 742 * Math.PI / 30) < 1e-9);
        robot.press(KeyCode.CONTROL).type(KeyCode.Z).release(KeyCode.CONTROL);
        until(() -> field.getText().equals("740 rpm"));
    }

    @Test
    void pageDownShowsTheNextDutyPoint(FxRobot robot) throws TimeoutException {
        robot.type(KeyCode.PAGE_DOWN);
        until(() -> bench.shown().get().dutyName().equals("low suction"));
        robot.type(KeyCode.PAGE_UP).type(KeyCode.PAGE_UP);
        until(() -> bench.shown().get().dutyName().equals("crank ends unloaded"));
    }

    @Test
    void aBrokenFileIsSaidInTheStatusLine(FxRobot robot, @TempDir Path folder) throws IOException, TimeoutException {
        Path file = folder.resolve("broken.json");
        Files.writeString(file, "{ \"throwbench\": 1,");
        dialogs.open = Optional.of(file);
        robot.press(KeyCode.CONTROL).type(KeyCode.O).release(KeyCode.CONTROL);
        until(() -> status(robot).startsWith("broken.json: line 1"));
        assertEquals("Saltmarsh biogas booster", bench.shown().get().machine().name());
    }

    @Test
    void savingWritesTheFileAndTheMarkOfEditingGoes(FxRobot robot, @TempDir Path folder)
            throws IOException, TimeoutException {
        type(robot, "drive.speed", "730 rpm");
        Label edited = robot.lookup("#edited").queryAs(Label.class);
        until(edited::isVisible);
        Path file = folder.resolve("saved.json");
        dialogs.save = Optional.of(file);
        robot.press(KeyCode.CONTROL).type(KeyCode.S).release(KeyCode.CONTROL);
        until(() -> !edited.isVisible());
        assertTrue(Files.readString(file).contains("\"730 rpm\""));
    }

    @Test
    void closingWithUnsavedChangesAsksOnceAndMayBeTakenBack(FxRobot robot) throws TimeoutException {
        type(robot, "drive.speed", "730 rpm");
        until(bench::edited);
        dialogs.unsaved = Dialogs.Unsaved.STAY;
        robot.press(KeyCode.CONTROL).type(KeyCode.Q).release(KeyCode.CONTROL);
        WaitForAsyncUtils.waitForFxEvents();
        assertTrue(stage.isShowing());
        assertEquals(1, dialogs.asked);
    }
}
