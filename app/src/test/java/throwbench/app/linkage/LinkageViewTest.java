package throwbench.app.linkage;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import javafx.geometry.Point2D;
import javafx.scene.Scene;
import javafx.scene.canvas.Canvas;
import javafx.scene.control.CheckBox;
import javafx.scene.control.CustomMenuItem;
import javafx.scene.control.MenuItem;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.scene.input.ScrollEvent;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.framework.junit5.Stop;
import throwbench.app.bench.Playhead;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.Fonts;
import throwbench.app.linkage.force.ArrowPlaces;
import throwbench.app.linkage.force.ForceKind;
import throwbench.solver.machine.Machine;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;

/** Hands on the view in a real scene without a display. */
@ExtendWith(ApplicationExtension.class)
class LinkageViewTest {

    private final Playhead playhead = new Playhead();
    private final List<Column> picked = new ArrayList<>();
    private final List<Integer> chambers = new ArrayList<>();
    private Stage stage;
    private LinkageView view;
    private Instant instant;

    @Start
    void start(Stage s) {
        Fonts.load();
        stage = s;
        view = new LinkageView(playhead);
        view.onPick(picked::add);
        view.onPickChamber(chambers::add);
        stage.setScene(new Scene(view, 1000, 460));
        stage.show();
        take(Machines.booster());
        playhead.turnTo(Math.toRadians(60));
        frame();
    }

    @Stop
    void stop() {
        stage.hide();
    }

    private void take(Machine machine) {
        Shown shown = Machines.shown(machine, 0);
        instant = new Instant(shown.running(), 0);
        view.show(shown);
    }

    /** What the window's clock does. */
    private void frame() {
        instant.turnTo(playhead.crankAngle().get());
        view.draw(instant);
    }

    private void frame(FxRobot robot) {
        robot.interact(() -> frame());
    }

    private Framing framing() {
        return view.picture().orElseThrow().framing();
    }

    private Linkage linkage() {
        return view.picture().orElseThrow().shown().shownThrow().linkage();
    }

    /** A place in throw axes of a horizontal throw, on the screen. */
    private Point2D on(double x, double y) {
        Framing f = framing();
        return view.localToScreen(f.originX() + f.scale() * x, f.originY() - f.scale() * y);
    }

    private Point2D pin(double theta) {
        double r = linkage().crankRadius();
        return on(r * Math.cos(theta), r * Math.sin(theta));
    }

    private double degrees() {
        return Math.toDegrees(playhead.crankAngle().get());
    }

    /** A pointer stands on whole points: on a pin's path of some 60 points' radius that is about a degree. */
    private double pointing() {
        return Math.toDegrees(1 / (linkage().crankRadius() * framing().scale()));
    }

    @Test
    void draggingTheCrankPinTurnsItToThePointedAngle(FxRobot robot) {
        double before = playhead.crankAngle().get();
        robot.drag(pin(before), MouseButton.PRIMARY);
        for (double to : new double[] {75, 100, 200, 310}) {
            robot.moveTo(pin(Math.toRadians(to)));
            assertEquals(to, degrees(), 2 * pointing());
        }
        robot.drop();
        assertTrue(picked.isEmpty(), "a drag is no click");
    }

    @Test
    void aClockwiseCrankFollowsThePointerToo(FxRobot robot) {
        robot.interact(() -> {
            take(Machines.offset());
            frame();
        });
        double head = linkage().headEndAngle();
        double theta = head - playhead.crankAngle().get();
        robot.drag(pin(theta), MouseButton.PRIMARY);
        double wanted = Math.toRadians(130);
        robot.moveTo(pin(head - wanted));
        robot.drop();
        assertEquals(130, degrees(), 2 * pointing());
    }

    @Test
    void draggingTakesTheCrankFromTheClock(FxRobot robot) {
        robot.interact(() -> playhead.setPlaying(true));
        double theta = playhead.crankAngle().get();
        robot.drag(pin(theta), MouseButton.PRIMARY);
        robot.moveTo(pin(theta + 0.5));
        robot.drop();
        assertFalse(playhead.playing().get());
    }

    @Test
    void draggingTheCrossheadKeepsTheStroke(FxRobot robot) {
        for (double from : new double[] {60, 285}) {
            robot.interact(() -> playhead.turnTo(Math.toRadians(from)));
            frame(robot);
            double x = linkage().reach(Math.toRadians(from));
            double beside = 0.9
                    * MachineLayout.of(view.picture().orElseThrow().shown().machine())
                            .of(0)
                            .gear()
                            .slider()
                            .halfHeight();
            robot.drag(on(x + 0.03, beside), MouseButton.PRIMARY);
            robot.moveTo(on(x, beside));
            robot.drop();
            double travel = linkage().greatestReach() - (x - 0.03);
            Linkage.TravelAngles angles =
                    linkage().anglesAtTravel(travel, throwbench.solver.mechanism.Rotation.COUNTER_CLOCKWISE);
            double wanted = from < 180 ? angles.inward() : angles.outward();
            assertEquals(Math.toDegrees(wanted), degrees(), 2 * pointing());
        }
    }

    @Test
    void pullingBeyondTheStrokeStopsAtItsDeadCentre(FxRobot robot) {
        double x = linkage().reach(Math.toRadians(60));
        double piston = x
                + MachineLayout.of(view.picture().orElseThrow().shown().machine())
                        .of(0)
                        .line()
                        .pistons()
                        .get(0)
                        .crankFace()
                + 0.02;
        robot.drag(on(piston, 0.1), MouseButton.PRIMARY);
        robot.moveTo(on(piston - 0.3, 0.1));
        robot.drop();
        assertEquals(180, degrees(), 1e-6);
    }

    @Test
    void theWheelZoomsAboutThePointer(FxRobot robot) {
        Point2D at = on(0.4, 0.05);
        Point2D inView = view.screenToLocal(at);
        Framing before = framing();
        // two notches within one frame
        robot.interact(() -> {
            view.fireEvent(wheel(inView, at));
            view.fireEvent(wheel(inView, at));
        });
        frame(robot);
        // e^(0.0015 · 80) to a part in a thousand: ln 1.0015 is 0.0015 less a millionth
        assertEquals(Math.exp(0.0015 * 80), framing().scale() / before.scale(), 1e-3);
        Point2D now = on(0.4, 0.05);
        // the toolkit hands pointers over as floats
        assertEquals(at.getX(), now.getX(), 1e-3);
        assertEquals(at.getY(), now.getY(), 1e-3);
    }

    private static ScrollEvent wheel(Point2D inView, Point2D onScreen) {
        return new ScrollEvent(
                ScrollEvent.SCROLL,
                inView.getX(),
                inView.getY(),
                onScreen.getX(),
                onScreen.getY(),
                false,
                false,
                false,
                false,
                false,
                false,
                0,
                40,
                0,
                40,
                ScrollEvent.HorizontalTextScrollUnits.NONE,
                0,
                ScrollEvent.VerticalTextScrollUnits.NONE,
                0,
                0,
                null);
    }

    @Test
    void draggingTheGroundPansAndTheKeyFramesAll(FxRobot robot) {
        Framing before = framing();
        Point2D ground = view.localToScreen(320, 80);
        robot.drag(ground, MouseButton.PRIMARY);
        robot.moveTo(ground.add(-120, 60));
        robot.drop();
        frame(robot);
        assertEquals(before.originX() - 120, framing().originX(), 0.5);
        assertEquals(before.originY() + 60, framing().originY(), 0.5);
        assertEquals(before.scale(), framing().scale());
        robot.press(KeyCode.F).release(KeyCode.F);
        frame(robot);
        assertEquals(before, framing());
    }

    @Test
    void clickingAPartAsksForItsColumn(FxRobot robot) {
        robot.clickOn(pin(playhead.crankAngle().get()));
        assertEquals(List.of(Column.CRANK_PIN_X, Column.CRANK_PIN_Y), picked);
        picked.clear();
        double wrist = linkage().reach(playhead.crankAngle().get());
        robot.clickOn(on(wrist, 0));
        assertEquals(List.of(Column.CROSSHEAD_PIN_X, Column.CROSSHEAD_PIN_Y), picked);
    }

    @Test
    void clickingAnArrowAsksForItsColumn(FxRobot robot) {
        MovingPainter painted = view.picture().orElseThrow().moving();
        ArrowPlaces places = painted.places();
        for (int i = 0; i < places.size(); i++) {
            ForceKind kind = painted.arrowSet().arrows().get(i).kind();
            double length = Math.hypot(places.tipX(i) - places.tailX(i), places.tipY(i) - places.tailY(i));
            if (kind != ForceKind.TORQUE && kind != ForceKind.CRANK_PIN && length > 8) {
                picked.clear();
                robot.clickOn(view.localToScreen(
                        (places.tailX(i) + places.tipX(i)) / 2, (places.tailY(i) + places.tipY(i)) / 2));
                assertEquals(kind.columns(), picked, kind.label());
            }
        }
    }

    @Test
    void clickingALabelAsksForItsArrowsColumn(FxRobot robot) {
        MovingPainter painted = view.picture().orElseThrow().moving();
        for (int i = 0; i < painted.arrowSet().size(); i++) {
            picked.clear();
            Label label = painted.plan().arrows().get(i).orElseThrow();
            robot.clickOn(view.localToScreen(
                    label.box().x() + label.box().width() / 2,
                    label.box().y() + label.box().height() / 2));
            assertEquals(painted.arrowSet().arrows().get(i).kind().columns(), picked);
        }
    }

    @Test
    void clickingAChamberAsksForItsPressure(FxRobot robot) {
        MachineLayout layout =
                MachineLayout.of(view.picture().orElseThrow().shown().machine());
        double cover =
                layout.of(0).line().barrels().get(0).headCover().orElseThrow().face();
        robot.clickOn(on(cover - 0.01, 0.1));
        assertEquals(List.of(0), chambers);
        assertTrue(picked.isEmpty());
    }

    @Test
    void hoveringNamesAPartWithItsValueAndStandsStill(FxRobot robot) {
        double wrist = linkage().reach(playhead.crankAngle().get());
        robot.moveTo(on(wrist, 0));
        HoverLabel label = view.hoverLabel();
        assertTrue(label.isVisible());
        assertTrue(label.getText().startsWith("crosshead pin"), label.getText());
        double force = Math.hypot(instant.at(Column.CROSSHEAD_PIN_X), instant.at(Column.CROSSHEAD_PIN_Y));
        double said = Double.parseDouble(label.getText().replaceAll("[^0-9.]", ""));
        assertEquals(force / 1000, said, 0.051, label.getText());
        double x = label.getLayoutX();
        robot.moveBy(3, 2);
        assertEquals(x, label.getLayoutX(), "it stays while the pointer rests on the same part");
        robot.moveTo(view.localToScreen(320, 80));
        assertFalse(label.isVisible());
    }

    @Test
    void pausedItSaysAngleAndLoad(FxRobot robot) {
        assertTrue(view.getAccessibleText().contains("60.0 degrees"), view.getAccessibleText());
        robot.interact(() -> {
            playhead.setPlaying(true);
            playhead.turnTo(1);
        });
        frame(robot);
        assertTrue(view.getAccessibleText().contains("60.0 degrees"), "silent while it runs");
        robot.interact(() -> playhead.setPlaying(false));
        frame(robot);
        assertTrue(view.getAccessibleText().contains("57.3 degrees"), view.getAccessibleText());
    }

    @Test
    void kindsAreSwitchedOnAndOff(FxRobot robot) {
        robot.interact(() -> view.kinds().set(EnumSet.of(ForceKind.GUIDE)));
        frame(robot);
        assertEquals(1, view.picture().orElseThrow().moving().arrowSet().size());
    }

    @Test
    void theMenuOffersEveryKindAndTheThrows(FxRobot robot) {
        LinkageMenu menu = robot.lookup("#linkage-menu").queryAs(LinkageMenu.class);
        List<CheckBox> boxes = menu.getItems().stream()
                .filter(CustomMenuItem.class::isInstance)
                .map(i -> ((CustomMenuItem) i).getContent())
                .filter(CheckBox.class::isInstance)
                .map(CheckBox.class::cast)
                .toList();
        for (ForceKind kind : ForceKind.values()) {
            CheckBox box = boxes.stream()
                    .filter(b -> b.getText().equals(kind.label()))
                    .findFirst()
                    .orElseThrow();
            boolean before = view.kinds().get().contains(kind);
            assertEquals(before, box.isSelected(), kind.label());
            robot.interact(box::fire);
            assertEquals(!before, view.kinds().get().contains(kind), kind.label());
        }
        robot.interact(() -> boxes.get(boxes.size() - 1).fire());
        assertTrue(view.alone().get());
        robot.interact(() -> menu.getItems().stream()
                .filter(i -> "longer arrows".equals(i.getText()))
                .forEach(MenuItem::fire));
        assertEquals(1.25, view.arrowFactor().get());
    }

    @Test
    void theLastKindMayBeSwitchedOff(FxRobot robot) {
        robot.interact(() -> view.kinds().set(EnumSet.noneOf(ForceKind.class)));
        frame(robot);
        assertEquals(0, view.picture().orElseThrow().moving().arrowSet().size());
        assertEquals(0, view.picture().orElseThrow().forceScale().bar());
    }

    @Test
    void aFrameRepaintsLessThanTheView(FxRobot robot) {
        robot.interact(() -> stage.setHeight(900));
        frame(robot);
        Canvas still = (Canvas) view.getChildrenUnmodifiable().get(0);
        Canvas moving = (Canvas) view.getChildrenUnmodifiable().get(1);
        assertEquals(view.getHeight(), still.getHeight());
        assertTrue(moving.getHeight() < 0.75 * still.getHeight(), moving.getHeight() + " of " + still.getHeight());
    }

    @Test
    void aFrameMakesHardlyAnyGarbage(FxRobot robot) {
        LinkagePicture picture = view.picture().orElseThrow();
        NoPen pen = new NoPen();
        robot.interact(() -> {
            // once around fills what is kept: number texts
            long first = paint(picture, pen);
            long second = paint(picture, pen);
            assertTrue(second <= first, second + " after " + first);
            // what is left: numbers that no longer stand in their slot
            assertTrue(second / 360 < 320, second / 360 + " bytes a frame");
        });
    }

    private long paint(LinkagePicture picture, NoPen pen) {
        com.sun.management.ThreadMXBean threads =
                (com.sun.management.ThreadMXBean) java.lang.management.ManagementFactory.getThreadMXBean();
        long id = Thread.currentThread().getId();
        long before = threads.getThreadAllocatedBytes(id);
        for (int degrees = 0; degrees < 360; degrees++) {
            instant.turnTo(Math.toRadians(degrees));
            picture.paintMoving(pen, instant);
            picture.paintHeadline(pen, instant);
        }
        return threads.getThreadAllocatedBytes(id) - before;
    }
}
