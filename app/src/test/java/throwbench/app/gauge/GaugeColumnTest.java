package throwbench.app.gauge;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import javafx.scene.Scene;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.StackPane;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.framework.junit5.Stop;
import throwbench.app.bench.Shown;
import throwbench.app.bench.ShownMachines;
import throwbench.app.drawing.Fonts;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;

/** The gauge column in a real scene, without a display. */
@ExtendWith(ApplicationExtension.class)
class GaugeColumnTest {

    private final Shown shown = ShownMachines.shown(ShownMachines.booster(), 0);
    private final Instant instant = new Instant(shown.running(), 0);
    private GaugeColumn column;
    private Stage stage;

    @Start
    void start(Stage s) {
        Fonts.load();
        stage = s;
        column = new GaugeColumn();
        column.show(shown);
        s.setScene(new Scene(new StackPane(column), 320, 330));
        // the tests share one stage: it may come at another size
        s.setMaximized(false);
        s.sizeToScene();
        s.show();
    }

    @Stop
    void stop() {
        stage.hide();
    }

    private double contentHeight(FxRobot robot) {
        robot.interact(() -> {
            column.draw(instant);
            column.layout();
        });
        ScrollPane scroll = robot.from(column).lookup(".scroll-pane").queryAs(ScrollPane.class);
        return scroll.getContent().prefHeight(-1);
    }

    private static void assertFits(double height) {
        assertTrue(height <= 330, "needs " + height);
    }

    @Test
    void gaugesFitWithoutScrollingUntilThereAreTooMany(FxRobot robot) {
        assertFits(contentHeight(robot));
        robot.interact(() -> {
            column.pick(Column.CRANK_PIN_X, true);
            column.pick(Column.CRANK_PIN_Y, true);
            column.pick(Column.SHAFT_TORQUE, true);
        });
        assertTrue(contentHeight(robot) > 330);
        robot.interact(() -> {
            column.pick(Column.CRANK_PIN_X, false);
            column.pick(Column.CRANK_PIN_Y, false);
            column.pick(Column.SHAFT_TORQUE, false);
        });
        assertFits(contentHeight(robot));
    }

    @Test
    void aMovingCrankRedrawsNoScale(FxRobot robot) {
        robot.interact(() -> {
            column.draw(instant.turnTo(0));
            long before = column.stillDrawings();
            for (int i = 0; i < 20; i++) {
                column.draw(instant.turnTo(0.1 * i));
            }
            assertEquals(before, column.stillDrawings());
        });
    }
}
