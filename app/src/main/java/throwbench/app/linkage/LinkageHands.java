package throwbench.app.linkage;

import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.IntConsumer;
import javafx.scene.Cursor;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.input.ScrollEvent;
import org.jspecify.annotations.Nullable;
import throwbench.app.bench.Playhead;
import throwbench.app.linkage.parts.Pose;
import throwbench.app.linkage.parts.ThrowAxes;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.revolution.Column;

/**
 * The pointer and the keys of the linkage view: dragging the crank or what slides turns the crank, dragging the ground
 * moves the machine, the wheel zooms, a click asks for a trace.
 */
final class LinkageHands {

    /** A press that moves less than this is a click, points. */
    private static final double CLICK = 3;

    private static final double ZOOM_STEP = 1.0015;
    private static final double LEAST_ZOOM = 20;
    private static final double MOST_ZOOM = 200_000;

    private final LinkageView view;
    private final Playhead playhead;
    private Consumer<Column> pick = c -> {};
    private IntConsumer pickChamber = c -> {};
    private @Nullable Target pressed;
    private @Nullable Target hovered;
    private @Nullable Framing pressedFraming;
    private boolean dragging;
    private double pressX;
    private double pressY;
    private double turnOffset;
    private double pressTravel;
    private boolean pressInward;

    LinkageHands(LinkageView view, Playhead playhead) {
        this.view = view;
        this.playhead = playhead;
        view.addEventHandler(MouseEvent.MOUSE_PRESSED, this::press);
        view.addEventHandler(MouseEvent.MOUSE_DRAGGED, this::drag);
        view.addEventHandler(MouseEvent.MOUSE_RELEASED, this::release);
        view.addEventHandler(MouseEvent.MOUSE_MOVED, this::move);
        view.addEventHandler(MouseEvent.MOUSE_EXITED, e -> leave());
        view.addEventHandler(ScrollEvent.SCROLL, this::zoom);
        view.addEventHandler(KeyEvent.KEY_PRESSED, this::key);
    }

    void onPick(Consumer<Column> listener) {
        pick = listener;
    }

    void onPickChamber(IntConsumer listener) {
        pickChamber = listener;
    }

    private void press(MouseEvent e) {
        view.requestFocus();
        Optional<LinkagePicture> picture = view.picture();
        boolean held = e.getButton() == MouseButton.PRIMARY || e.getButton() == MouseButton.MIDDLE;
        if (picture.isEmpty() || !held) {
            return;
        }
        MovingPainter painted = picture.get().moving();
        pressed = e.getButton() == MouseButton.PRIMARY
                ? new Pointing(painted).at(e.getX(), e.getY()).orElse(null)
                : null;
        pressX = e.getX();
        pressY = e.getY();
        pressedFraming = picture.get().framing();
        dragging = false;
        Pose pose = painted.pose();
        ThrowAxes axes = painted.scene().axes();
        double pointer = Math.atan2(axes.y(pressX, pressY), axes.x(pressX, pressY));
        turnOffset = Math.atan2(pose.sinPin(), pose.cosPin()) - pointer;
        Linkage linkage = painted.scene().own().linkage();
        pressTravel = linkage.greatestReach() - pose.wristX();
        pressInward = playhead.crankAngle().get() < linkage.crankEndDeadCentre(rotation(painted));
        e.consume();
    }

    private static Rotation rotation(MovingPainter painted) {
        return painted.scene().shown().machine().drive().rotation();
    }

    private void drag(MouseEvent e) {
        Framing from = pressedFraming;
        Optional<LinkagePicture> picture = view.picture();
        if (from == null || picture.isEmpty()) {
            return;
        }
        if (!dragging && Math.hypot(e.getX() - pressX, e.getY() - pressY) < CLICK) {
            return;
        }
        dragging = true;
        Target target = pressed;
        if (target == null || !target.part().turns()) {
            view.setCursor(Cursor.CLOSED_HAND);
            view.frame(from.moved(e.getX() - pressX, e.getY() - pressY));
        } else {
            playhead.setPlaying(false);
            MovingPainter painted = picture.get().moving();
            playhead.turnTo(target.onCrank() ? pointedAngle(painted, e) : slidAngle(painted, e));
        }
        e.consume();
    }

    /** φ at which the pin stands under the pointer, but for where on the crank it was taken hold of. */
    private double pointedAngle(MovingPainter painted, MouseEvent e) {
        ThrowAxes axes = painted.scene().axes();
        double theta = Math.atan2(axes.y(e.getX(), e.getY()), axes.x(e.getX(), e.getY())) + turnOffset;
        return rotation(painted).sign()
                * (theta - painted.scene().own().linkage().headEndAngle());
    }

    /** φ at which the piston stands under the pointer, on the stroke it was on. */
    private double slidAngle(MovingPainter painted, MouseEvent e) {
        ThrowAxes axes = painted.scene().axes();
        Linkage linkage = painted.scene().own().linkage();
        double moved = axes.x(e.getX(), e.getY()) - axes.x(pressX, pressY);
        double travel = Math.max(0, Math.min(linkage.stroke(), pressTravel - moved));
        Linkage.TravelAngles angles = linkage.anglesAtTravel(travel, rotation(painted));
        return pressInward ? angles.inward() : angles.outward();
    }

    private void release(MouseEvent e) {
        Target target = pressed;
        boolean click = !dragging && pressedFraming != null;
        pressed = null;
        pressedFraming = null;
        dragging = false;
        view.setCursor(null);
        if (click && target != null) {
            picked(target);
        }
        e.consume();
    }

    private void picked(Target target) {
        if (target.part() == Target.Part.CHAMBER) {
            view.picture()
                    .ifPresent(p -> pickChamber.accept(p.moving()
                            .plan()
                            .chambers()
                            .get(target.index())
                            .space()
                            .chamber()));
        } else {
            target.columns().forEach(pick);
        }
    }

    private void move(MouseEvent e) {
        Optional<LinkagePicture> picture = view.picture();
        if (picture.isEmpty()) {
            return;
        }
        Pointing pointing = new Pointing(picture.get().moving());
        Optional<Target> target = pointing.at(e.getX(), e.getY());
        Target before = hovered;
        hovered = target.orElse(null);
        if (target.isEmpty()) {
            view.hoverLabel().vanish();
            view.setCursor(null);
        } else if (before == null || !before.same(target.get())) {
            view.setCursor(target.get().part().turns() ? Cursor.OPEN_HAND : Cursor.HAND);
            picture.get().moving().instant().ifPresent(i -> view.hoverLabel()
                    .appear(e.getX(), e.getY(), view.getWidth(), view.getHeight(), pointing.say(target.get(), i)));
        }
    }

    private void leave() {
        hovered = null;
        view.hoverLabel().vanish();
    }

    /** Keeps what the label says up to date while the crank runs. */
    void follow() {
        Target target = hovered;
        if (target == null) {
            return;
        }
        view.picture().map(LinkagePicture::moving).ifPresent(painted -> {
            if (target.part() == Target.Part.ARROW
                    && target.index() >= painted.arrowSet().size()) {
                leave();
                return;
            }
            painted.instant().ifPresent(i -> view.hoverLabel().say(new Pointing(painted).say(target, i)));
        });
    }

    private void zoom(ScrollEvent e) {
        view.picture().ifPresent(picture -> {
            Framing now = picture.framing();
            double scale = Math.max(LEAST_ZOOM, Math.min(MOST_ZOOM, now.scale() * Math.pow(ZOOM_STEP, e.getDeltaY())));
            view.frame(now.zoomed(scale / now.scale(), e.getX(), e.getY()));
        });
        e.consume();
    }

    private void key(KeyEvent e) {
        boolean plain = !e.isShortcutDown() && !e.isAltDown() && !e.isShiftDown();
        if (plain && e.getCode() == KeyCode.F) {
            view.frameAll();
            e.consume();
        }
    }
}
