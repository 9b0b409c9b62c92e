package throwbench.app.findings;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import javafx.scene.Scene;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.StackPane;
import javafx.stage.Stage;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.framework.junit5.Stop;
import org.testfx.util.WaitForAsyncUtils;
import throwbench.app.bench.Shown;
import throwbench.app.bench.ShownMachines;
import throwbench.app.drawing.Fonts;
import throwbench.solver.finding.Finding;
import throwbench.solver.revolution.Instant;

/** Chooses and opens findings in a real scene, without a display. */
@ExtendWith(ApplicationExtension.class)
class FindingsPanelTest {

    private final Shown shown = ShownMachines.shown(ShownMachines.booster(), 0);
    private final Instant instant = new Instant(shown.running(), 0);
    private final List<Finding> chosen = new ArrayList<>();
    private FindingsPanel panel;
    private Stage stage;

    @Start
    void start(Stage s) {
        Fonts.load();
        stage = s;
        panel = new FindingsPanel(chosen::add);
        panel.show(shown);
        s.setScene(new Scene(new StackPane(panel), 330, 700));
        s.show();
    }

    @BeforeEach
    void drawOnce(FxRobot robot) {
        robot.interact(() -> panel.draw(instant));
        WaitForAsyncUtils.waitForFxEvents();
    }

    @Stop
    void stop() {
        stage.hide();
    }

    private static List<String> texts(FxRobot robot, String style) {
        return robot.lookup(style).queryAllAs(Label.class).stream()
                .filter(l -> l.getScene() != null && l.isVisible())
                .map(Label::getText)
                .toList();
    }

    @Test
    void arrowKeysChooseTheWorstAndThenTheNext(FxRobot robot) {
        robot.clickOn(robot.lookup(".finding-title")
                .queryAllAs(Label.class)
                .iterator()
                .next());
        robot.type(KeyCode.DOWN);
        List<FindingLine> lines = new FindingLines().of(shown.findings());
        assertEquals(List.of(lines.get(0).finding(), lines.get(1).finding()), chosen);
    }

    @Test
    void aNewStateKeepsTheChoiceAndReportsNothing(FxRobot robot) {
        robot.clickOn(robot.lookup(".finding-title")
                .queryAllAs(Label.class)
                .iterator()
                .next());
        robot.type(KeyCode.DOWN);
        int reported = chosen.size();
        Shown next = ShownMachines.shown(ShownMachines.booster(), 1);
        robot.interact(() -> {
            panel.show(next);
            panel.draw(instant);
        });
        assertEquals(reported, chosen.size());
        ListView<?> list = robot.lookup("#findings-list").queryListView();
        FindingLine selected = (FindingLine) list.getSelectionModel().getSelectedItem();
        assertEquals(FindingLine.Key.of(chosen.get(1)), selected.key());
    }

    @Test
    void enterOpensFormulaInputsAndSource(FxRobot robot) throws Exception {
        robot.clickOn(robot.lookup(".finding-title")
                .queryAllAs(Label.class)
                .iterator()
                .next());
        robot.type(KeyCode.ENTER);
        WaitForAsyncUtils.waitFor(10, TimeUnit.SECONDS, () -> !robot.lookup(".finding-detail")
                .queryAll()
                .isEmpty());
        List<String> details = texts(robot, ".finding-detail");
        Finding finding = chosen.get(0);
        assertEquals(finding.criterion().formula(), details.get(0));
        assertTrue(details.contains(finding.criterion().source()), details::toString);
        assertTrue(details.stream().anyMatch(d -> d.startsWith("speed ")), details::toString);
    }

    @Test
    void rightListsTheOtherDutyPointsAndLeftHidesThem(FxRobot robot) {
        ListView<?> list = robot.lookup("#findings-list").queryListView();
        int heads = list.getItems().size();
        robot.clickOn(robot.lookup(".finding-title")
                .queryAllAs(Label.class)
                .iterator()
                .next());
        robot.type(KeyCode.RIGHT);
        String first = shown.findings().get(0).criterion().id();
        long others = shown.findings().stream()
                        .filter(f -> f.criterion().id().equals(first))
                        .count()
                - 1;
        assertEquals(heads + others, list.getItems().size());
        robot.type(KeyCode.LEFT);
        assertEquals(heads, list.getItems().size());
    }

    @Test
    void rowsSayVerdictLimitAndMarginInWords(FxRobot robot) {
        FindingWords words = new FindingWords(shown.units());
        Finding worst = shown.findings().get(0);
        assertEquals("met · " + words.held(worst), texts(robot, ".finding-held").get(0));
        assertEquals(worst.criterion().title(), texts(robot, ".finding-title").get(0));
    }

    @Test
    void nothingJudgedIsSaidInWords(FxRobot robot) {
        Shown none = new Shown(
                shown.document(),
                shown.machine(),
                shown.dutyIndex(),
                shown.throwIndex(),
                shown.summary(),
                List.of(),
                shown.units(),
                0);
        robot.interact(() -> {
            panel.show(none);
            panel.draw(instant);
        });
        assertEquals(
                List.of("Nothing is judged: no duty point of this machine could be solved."),
                texts(robot, ".findings-empty"));
    }
}
