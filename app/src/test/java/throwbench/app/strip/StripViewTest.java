package throwbench.app.strip;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import javafx.scene.Scene;
import javafx.scene.control.Label;
import javafx.scene.control.MenuItem;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.scene.layout.StackPane;
import javafx.stage.Stage;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.framework.junit5.Stop;
import throwbench.app.bench.Playhead;
import throwbench.app.bench.Shown;
import throwbench.app.bench.ShownMachines;
import throwbench.app.drawing.ColumnMenu;
import throwbench.app.drawing.Fonts;
import throwbench.app.drawing.Palette;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;

/** Scrubs a strip in a real scene, without a display. The example is offset: crank-end dead centre is not at 180°. */
@ExtendWith(ApplicationExtension.class)
class StripViewTest {

    /** The mouse stands on whole pixels, and here a pixel is 0.55°. */
    private static final double PIXEL = 0.6;

    private final Playhead playhead = new Playhead();
    private final Shown shown = ShownMachines.shown(ShownMachines.offset(), 0);
    private final Instant instant = new Instant(shown.running(), 0);
    private StripView strip;
    private Stage stage;

    @Start
    void start(Stage s) {
        Fonts.load();
        stage = s;
        strip = new StripView(playhead);
        strip.show(shown);
        s.setScene(new Scene(new StackPane(strip), 900, 400));
        s.show();
        strip.requestFocus();
    }

    @BeforeEach
    void drawOnce(FxRobot robot) {
        robot.interact(this::draw);
    }

    @Stop
    void stop() {
        stage.hide();
    }

    private void draw() {
        strip.draw(instant.turnTo(playhead.crankAngle().get()));
        strip.layout();
    }

    private double degrees() {
        return Math.toDegrees(playhead.crankAngle().get());
    }

    private StripLayout layout() {
        return StripLayout.of(strip.getWidth(), strip.getHeight(), Lanes.of(shown.shownThrow(), List.of()), 2);
    }

    private double screenX(double degrees) {
        return strip.localToScreen(layout().x(Math.toRadians(degrees)), 0).getX();
    }

    private double screenY() {
        return strip.localToScreen(0, 200).getY();
    }

    @Test
    void keysScrubByOneTenAndATenthOfADegree(FxRobot robot) {
        robot.type(KeyCode.RIGHT).type(KeyCode.RIGHT);
        assertEquals(2, degrees(), 1e-9);
        robot.press(KeyCode.SHIFT).type(KeyCode.RIGHT).release(KeyCode.SHIFT);
        assertEquals(12, degrees(), 1e-9);
        robot.press(KeyCode.CONTROL).type(KeyCode.LEFT).release(KeyCode.CONTROL);
        assertEquals(11.9, degrees(), 1e-9);
        robot.type(KeyCode.HOME).type(KeyCode.LEFT);
        assertEquals(359, degrees(), 1e-9);
    }

    @Test
    void endGoesToCrankEndDeadCentreAndEventKeysOnFromThere(FxRobot robot) {
        robot.type(KeyCode.END);
        double crankEnd = shown.shownThrow().linkage().crankEndDeadCentre(Rotation.COUNTER_CLOCKWISE);
        assertEquals(crankEnd, playhead.crankAngle().get());
        StripEvents events = StripEvents.of(shown);
        robot.type(KeyCode.N);
        assertEquals(events.next(crankEnd).orElseThrow(), playhead.crankAngle().get());
        robot.type(KeyCode.B).type(KeyCode.B);
        assertEquals(
                events.previous(crankEnd).orElseThrow(), playhead.crankAngle().get());
    }

    @Test
    void pressingAndDraggingTurnsTheCrankThroughTheEnds(FxRobot robot) {
        playhead.setPlaying(true);
        robot.moveTo(screenX(90), screenY()).press(MouseButton.PRIMARY);
        assertEquals(90, degrees(), PIXEL);
        assertEquals(Math.rint(degrees() * 10) / 10, degrees(), 1e-9, "whole tenths of a degree");
        assertFalse(playhead.playing().get(), "who scrubs wants to look");
        robot.moveTo(screenX(300), screenY());
        assertEquals(300, degrees(), PIXEL);
        robot.moveTo(screenX(370), screenY());
        assertEquals(10, degrees(), PIXEL);
        robot.moveTo(screenX(-20), screenY()).release(MouseButton.PRIMARY);
        assertEquals(340, degrees(), PIXEL);
    }

    @Test
    void pressingTheLegendTurnsNothing(FxRobot robot) {
        playhead.turnTo(1);
        robot.moveTo(screenX(0) - 60, screenY()).clickOn(MouseButton.PRIMARY);
        assertEquals(1, playhead.crankAngle().get());
    }

    @Test
    void aTypedTravelGoesToOneStrokeAndThenToTheOther(FxRobot robot) {
        robot.clickOn("#strip-place").write("25 %").type(KeyCode.ENTER);
        Linkage.TravelAngles both = shown.shownThrow()
                .linkage()
                .anglesAtTravel(0.25 * shown.shownThrow().linkage().stroke(), Rotation.COUNTER_CLOCKWISE);
        assertEquals(both.inward(), playhead.crankAngle().get(), 1e-12);
        Label message = robot.lookup("#strip-place-message").queryAs(Label.class);
        assertTrue(message.isVisible() && message.getText().contains("Enter again"), message::getText);
        robot.type(KeyCode.ENTER);
        assertEquals(both.outward(), playhead.crankAngle().get(), 1e-12);
        robot.type(KeyCode.ENTER);
        assertEquals(both.inward(), playhead.crankAngle().get(), 1e-12);
    }

    @Test
    void nonsenseIsToldUnderTheFieldAndTurnsNothing(FxRobot robot) {
        playhead.turnTo(1);
        robot.clickOn("#strip-place").write("quarter").type(KeyCode.ENTER);
        Label message = robot.lookup("#strip-place-message").queryAs(Label.class);
        TextField field = robot.lookup("#strip-place").queryAs(TextField.class);
        robot.interact(this::draw);
        assertTrue(message.isVisible());
        assertTrue(message.getText().startsWith("\"quarter\" is neither an angle nor a travel"), message::getText);
        assertTrue(message.localToScene(0, 0).getY()
                >= field.localToScene(0, field.getHeight()).getY());
        assertEquals(1, playhead.crankAngle().get());
        robot.eraseText(1);
        assertFalse(message.isVisible(), "the next letter takes it away");
        robot.type(KeyCode.ESCAPE);
        assertTrue(strip.isFocused());
    }

    @Test
    void lettersTypedInTheFieldDoNotScrub(FxRobot robot) {
        robot.clickOn("#strip-place").write("n").type(KeyCode.LEFT);
        assertEquals(0, degrees());
    }

    @Test
    void aMovingCrankRedrawsNoTrace(FxRobot robot) {
        robot.interact(() -> {
            long before = strip.stillDrawings();
            for (int i = 0; i < 50; i++) {
                playhead.turnBy(0.1);
                draw();
            }
            assertEquals(before, strip.stillDrawings());
            strip.wear(Palette.DARK);
            draw();
            draw();
            assertEquals(before + 1, strip.stillDrawings());
        });
    }

    @Test
    void theMenuAddsAndTakesOffEveryColumnThatIsNotThereAnyway(FxRobot robot) {
        ColumnMenu menu = robot.lookup(".column-menu").queryAs(ColumnMenu.class);
        assertEquals(
                Arrays.stream(Column.values())
                        .filter(c -> c != Column.CRANK_ANGLE && !Lanes.USUAL.contains(c))
                        .map(c -> "column-" + c.fileName())
                        .toList(),
                menu.getItems().stream().map(MenuItem::getId).toList());
        robot.interact(() -> {
            menu.getItems().forEach(MenuItem::fire);
            draw();
        });
        assertEquals(menu.getItems().size(), strip.addedTraces().size());
        robot.interact(() -> menu.getItems().forEach(MenuItem::fire));
        assertEquals(List.of(), strip.addedTraces());
        assertEquals("Add traces or take them off", menu.getAccessibleText());
    }

    @Test
    void anAddedTraceIsTakenOffByAClickOnItsName(FxRobot robot) {
        robot.interact(() -> {
            strip.addTrace(Column.TRAVEL);
            strip.addTrace(Column.TRAVEL);
            strip.addTrace(Column.ROD_LOAD);
            draw();
        });
        assertEquals(List.of(Column.TRAVEL), strip.addedTraces());
        StripLayout with = StripLayout.of(
                strip.getWidth(), strip.getHeight(), Lanes.of(shown.shownThrow(), List.of(Column.TRAVEL)), 2);
        double y = with.lanes().get(with.lanes().size() - 1).top() + 8;
        robot.moveTo(strip.localToScreen(30, y)).clickOn(MouseButton.PRIMARY);
        assertEquals(List.of(), strip.addedTraces());
    }
}
