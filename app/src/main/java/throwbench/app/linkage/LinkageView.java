package throwbench.app.linkage;

import java.util.EnumSet;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.IntConsumer;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleDoubleProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.AccessibleRole;
import javafx.scene.canvas.Canvas;
import javafx.scene.layout.Region;
import org.jspecify.annotations.Nullable;
import throwbench.app.bench.Playhead;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.FxPen;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.View;
import throwbench.app.linkage.force.ForceKind;
import throwbench.app.linkage.force.LabelPlacer.Box;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;

/**
 * The linkage view. Three layers: a still one as large as the view, a moving one as large as what moves, and the headline;
 * a frame repaints no more than the last two.
 */
public final class LinkageView extends Region implements View {

    private final Canvas stillCanvas = new Canvas();
    private final Canvas movingCanvas = new Canvas();
    private final Canvas headlineCanvas = new Canvas();
    private final FxPen stillPen = new FxPen(stillCanvas.getGraphicsContext2D());
    private final FxPen movingPen = new FxPen(movingCanvas.getGraphicsContext2D());
    private final FxPen headlinePen = new FxPen(headlineCanvas.getGraphicsContext2D());
    private final HoverLabel hoverLabel = new HoverLabel();
    private final LinkageMenu menu;
    private final Playhead playhead;
    private final ObjectProperty<EnumSet<ForceKind>> kinds =
            new SimpleObjectProperty<>(this, "kinds", ForceKind.usual());
    private final DoubleProperty arrowFactor = new SimpleDoubleProperty(this, "arrowFactor", 1);
    private final DoubleProperty typeScale = new SimpleDoubleProperty(this, "typeScale", 1);
    private final BooleanProperty alone = new SimpleBooleanProperty(this, "alone");
    private Palette palette = Palette.LIGHT;
    private @Nullable Shown shown;
    private @Nullable LinkagePicture picture;
    private Optional<Framing> ownFraming = Optional.empty();
    private Optional<Shown> held = Optional.empty();
    private boolean stale = true;
    private double drawnAngle = Double.NaN;
    private boolean unspoken = true;

    public LinkageView(Playhead playhead) {
        this.playhead = playhead;
        getStyleClass().add("linkage-view");
        menu = new LinkageMenu(this);
        getChildren().addAll(stillCanvas, movingCanvas, headlineCanvas, menu, hoverLabel);
        setMinSize(120, 90);
        setFocusTraversable(true);
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        setAccessibleText("Linkage view");
        stillCanvas.setMouseTransparent(true);
        movingCanvas.setMouseTransparent(true);
        headlineCanvas.setMouseTransparent(true);
        // the layers are placed by what they show, not by a layout
        stillCanvas.setManaged(false);
        movingCanvas.setManaged(false);
        headlineCanvas.setManaged(false);
        kinds.addListener(o -> spoil());
        arrowFactor.addListener(o -> spoil());
        typeScale.addListener(o -> spoil());
        alone.addListener(o -> spoil());
        widthProperty().addListener(o -> spoil());
        heightProperty().addListener(o -> spoil());
        hands = new LinkageHands(this, playhead);
    }

    private final LinkageHands hands;

    private void spoil() {
        stale = true;
    }

    /** The kinds of arrows shown; set a new set to change it. */
    public ObjectProperty<EnumSet<ForceKind>> kinds() {
        return kinds;
    }

    /** Length of arrows over their usual length, above 0. */
    public DoubleProperty arrowFactor() {
        return arrowFactor;
    }

    /** Size of type and lines over the usual one, above 0: larger on a review screen. */
    public DoubleProperty typeScale() {
        return typeScale;
    }

    /** Whether only the shown throw is drawn. */
    public BooleanProperty alone() {
        return alone;
    }

    /** Takes what is told which column's trace was asked for by a click on an arrow or a part. */
    public void onPick(Consumer<Column> listener) {
        hands.onPick(listener);
    }

    /** Takes what is told which chamber's pressure was asked for, by its index in the shown throw. */
    public void onPickChamber(IntConsumer listener) {
        hands.onPickChamber(listener);
    }

    /** Shows the whole machine again after zooming and panning. */
    public void frameAll() {
        ownFraming = Optional.empty();
        picture = null;
        spoil();
    }

    /** Draws a held design as a ghost under the present one, or none. */
    public void hold(Optional<Shown> design) {
        held = design;
        spoil();
    }

    @Override
    public void show(Shown state) {
        if (shown != null
                && (shown.throwIndex() != state.throwIndex()
                        || !shown.machine().name().equals(state.machine().name()))) {
            ownFraming = Optional.empty();
        }
        shown = state;
        spoil();
    }

    @Override
    public void wear(Palette colours) {
        palette = colours;
        hoverLabel.wear(colours);
        spoil();
    }

    @Override
    public void draw(Instant instant) {
        double width = getWidth();
        double height = getHeight();
        Shown state = shown;
        if (state == null || width < 1 || height < 1) {
            return;
        }
        boolean all = stale;
        LinkagePicture drawn = picture;
        if (all || drawn == null) {
            drawn = settle(state, width, height);
        }
        boolean turned = all || instant.crankAngle() != drawnAngle;
        if (turned) {
            clear(movingCanvas);
            drawn.paintMoving(movingPen, instant);
            clear(headlineCanvas);
            drawn.paintHeadline(headlinePen, instant);
            drawnAngle = instant.crankAngle();
            hands.follow();
        }
        unspoken |= turned;
        // who cannot see hears the angle and the load once the crank stands still
        if (unspoken && !playhead.playing().get()) {
            unspoken = false;
            setAccessibleText("Linkage view. " + drawn.spoken(instant));
        }
    }

    private LinkagePicture settle(Shown state, double width, double height) {
        menu.stand(width, height, PictureSize.of(width, height, typeScale.get()).border());
        LinkageChoice choice = new LinkageChoice(kinds.get(), arrowFactor.get(), alone.get(), typeScale.get(), true);
        LinkagePicture next = new LinkagePicture(
                state,
                palette,
                choice,
                PictureSize.of(width, height, choice.typeScale()),
                stillPen,
                new LinkagePicture.Standing(
                        ownFraming,
                        Optional.ofNullable(picture).filter(p -> follows(p, state)),
                        held,
                        Optional.of(menuBox())));
        picture = next;
        place(stillCanvas, new Box(0, 0, width, height));
        clear(stillCanvas);
        next.paintStill(stillPen);
        place(movingCanvas, next.movingBox());
        place(headlineCanvas, next.headlineBox());
        stale = false;
        return next;
    }

    /** Where the menu stands: no label goes there. */
    private Box menuBox() {
        return new Box(menu.getLayoutX(), menu.getLayoutY(), menu.getWidth(), menu.getHeight());
    }

    /** Whether a state is another one of the same throw, whose drawing had better not jump. */
    private static boolean follows(LinkagePicture before, Shown state) {
        return before.shown().throwIndex() == state.throwIndex()
                && before.shown().machine().throwsInOrder().size()
                        == state.machine().throwsInOrder().size();
    }

    /** Puts a layer where its part of the picture is; its pen keeps counting from the view's corner. */
    private static void place(Canvas canvas, Box box) {
        if (canvas.getWidth() != box.width() || canvas.getHeight() != box.height()) {
            canvas.setWidth(box.width());
            canvas.setHeight(box.height());
        }
        canvas.relocate(box.x(), box.y());
        canvas.getGraphicsContext2D().setTransform(1, 0, 0, 1, -box.x(), -box.y());
    }

    private static void clear(Canvas canvas) {
        canvas.getGraphicsContext2D()
                .clearRect(canvas.getLayoutX(), canvas.getLayoutY(), canvas.getWidth(), canvas.getHeight());
    }

    Optional<LinkagePicture> picture() {
        return Optional.ofNullable(picture);
    }

    HoverLabel hoverLabel() {
        return hoverLabel;
    }

    /** The user's framing, drawn or not yet. */
    Optional<Framing> framing() {
        return ownFraming;
    }

    /** Lets the user's framing go before the one that shows all. */
    void frame(Framing framing) {
        ownFraming = Optional.of(framing);
        spoil();
    }

    @Override
    protected double computePrefWidth(double height) {
        return 860;
    }

    @Override
    protected double computePrefHeight(double width) {
        return 380;
    }
}
