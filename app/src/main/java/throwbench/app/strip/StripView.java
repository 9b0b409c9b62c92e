package throwbench.app.strip;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import javafx.scene.AccessibleRole;
import javafx.scene.canvas.Canvas;
import javafx.scene.control.Label;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.Region;
import org.jspecify.annotations.Nullable;
import throwbench.app.bench.Playhead;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.ColumnMenu;
import throwbench.app.drawing.FxPen;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.PaletteStyle;
import throwbench.app.drawing.Readout;
import throwbench.app.drawing.View;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;

/**
 * The revolution strip on the screen. Three layers: what stands still, the present values, the cursor; a moving crank only
 * redraws the last two. Pressing and dragging anywhere in the plot, keys and a typed place turn the crank.
 */
public final class StripView extends Region implements View {

    /** Width of the button from which traces are added. */
    private static final double MENU = 26;

    private final Playhead playhead;
    private final Canvas still = new Canvas();
    private final Canvas values = new Canvas();
    private final Canvas cursor = new Canvas();
    private final FxPen stillPen = new FxPen(still.getGraphicsContext2D());
    private final FxPen valuePen = new FxPen(values.getGraphicsContext2D());
    private final FxPen cursorPen = new FxPen(cursor.getGraphicsContext2D());
    private final Region focusFrame = new Region();
    private final Label hint = new Label();
    private final ColumnMenu menu;
    private final StripHands hands;
    private final PlaceField place;
    private final StripPainter painter = new StripPainter();
    private final CursorPainter cursorPainter = new CursorPainter();
    private final List<Column> added = new ArrayList<>();
    private Optional<Shown> shown = Optional.empty();
    private Palette palette = Palette.LIGHT;
    private @Nullable StripPlot plot;
    private boolean stale = true;
    private double drawnAngle = Double.NaN;
    private long stillDrawings;

    public StripView(Playhead playhead) {
        this.playhead = playhead;
        this.hands = new StripHands(this, playhead, hint);
        this.place = new PlaceField(this::read, hands::stopAt, this::requestFocus);
        this.menu = new ColumnMenu("Add traces or take them off", Lanes.ADDABLE, this::isAdded, this::trace);
        setId("revolution-strip");
        getStyleClass().add("revolution-strip");
        getStylesheets()
                .add(Objects.requireNonNull(StripView.class.getResource("strip.css"))
                        .toExternalForm());
        focusFrame.getStyleClass().add("strip-focus");
        focusFrame.visibleProperty().bind(focusVisibleProperty());
        focusFrame.setMouseTransparent(true);
        getChildren().addAll(still, values, cursor, focusFrame, hint, menu, place);
        setFocusTraversable(true);
        setAccessibleRole(AccessibleRole.SLIDER);
        setAccessibleText("Revolution strip");
        setAccessibleHelp(
                "Arrows turn the crank by 1 degree, with Shift 10, with Control 0.1. Home and End go to the dead"
                        + " centres, N and B to the next event and the one before.");
        setMinSize(420, 180);
        setPrefSize(900, 330);
        wear(palette);
    }

    @Override
    public void show(Shown next) {
        shown = Optional.of(next);
        stale = true;
    }

    @Override
    public void wear(Palette next) {
        palette = next;
        stale = true;
        setStyle(PaletteStyle.of(next));
    }

    /** Adds the trace of a column to the lane it belongs to; a column that is shown already stays as it is. */
    public void addTrace(Column column) {
        Lane.Kind.of(column);
        if (!Lanes.USUAL.contains(column) && !added.contains(column)) {
            added.add(column);
            stale = true;
        }
    }

    /** Takes a trace that was added off again. */
    public void removeTrace(Column column) {
        stale |= added.remove(column);
    }

    private boolean isAdded(Column column) {
        return added.contains(column);
    }

    private void trace(Column column, boolean on) {
        if (on) {
            addTrace(column);
        } else {
            removeTrace(column);
        }
    }

    /** The columns that were added, in that order. */
    public List<Column> addedTraces() {
        return List.copyOf(added);
    }

    /**
     * Turns the crank by a key, wherever in the window it was pressed; a key that belongs to a text or turns nothing is left
     * alone.
     */
    public void scrub(KeyEvent event) {
        hands.key(event);
    }

    private TypedPlace read(String text) {
        Shown now = shown.orElseThrow();
        return TypedPlace.read(text, now.shownThrow().linkage(), now.running().rotation(), now.units());
    }

    /** What was drawn last. */
    @Nullable
    StripPlot plot() {
        return plot;
    }

    /** Puts the keyboard into the field for an angle or a travel. */
    public void typePlace() {
        place.take();
    }

    @Override
    public void draw(Instant instant) {
        if (shown.isEmpty() || getWidth() < 1 || getHeight() < 1) {
            return;
        }
        if (stale) {
            drawStill(shown.get());
        }
        StripPlot drawn = Objects.requireNonNull(plot);
        double angle = Angles.wrap(instant.crankAngle());
        if (stale || angle != drawnAngle) {
            drawMoving(drawn, instant, angle);
        }
        stale = false;
        drawnAngle = angle;
    }

    /** How often what stands still was drawn: the cost that a moving crank must not have. */
    long stillDrawings() {
        return stillDrawings;
    }

    private void drawStill(Shown state) {
        stillDrawings++;
        List<Lane> lanes = Lanes.of(state.shownThrow(), added);
        StripPlot known = plot;
        if (known == null) {
            known = new StripPlot(state, lanes, getWidth(), getHeight());
            plot = known;
        }
        known.update(state, lanes, getWidth(), getHeight());
        size(still, getWidth(), getHeight());
        size(values, LegendPainter.VALUE + 4, getHeight());
        size(cursor, 2 * CursorPainter.REACH, getHeight());
        values.setLayoutX(known.layout().left() - LegendPainter.VALUE - 10);
        stillPen.clear(still.getWidth(), still.getHeight());
        painter.paint(stillPen, known, palette);
        requestLayout();
    }

    private static void size(Canvas canvas, double width, double height) {
        canvas.setWidth(Math.ceil(width));
        canvas.setHeight(Math.ceil(height));
    }

    private void drawMoving(StripPlot drawn, Instant instant, double angle) {
        double x = Math.floor(drawn.layout().x(angle) - CursorPainter.REACH);
        cursor.setTranslateX(x);
        cursorPen.clear(cursor.getWidth(), cursor.getHeight());
        cursorPen.from(-x, 0);
        cursorPainter.paint(cursorPen, drawn, palette, instant);
        valuePen.clear(values.getWidth(), values.getHeight());
        valuePen.from(-values.getLayoutX(), 0);
        cursorPainter.values(valuePen, drawn, palette, instant);
        if (!playhead.playing().get()) {
            setAccessibleText("Revolution strip, crank angle " + Readout.angle().text(angle));
        }
    }

    @Override
    protected void layoutChildren() {
        StripPlot drawn = plot;
        if (drawn == null) {
            return;
        }
        StripLayout layout = drawn.layout();
        double fieldHeight = place.prefHeight(-1);
        place.resizeRelocate(
                8, Math.rint(layout.band().middle() - fieldHeight / 2), layout.left() - 24 - MENU, fieldHeight);
        menu.resizeRelocate(layout.left() - 12 - MENU, place.getLayoutY(), MENU, fieldHeight);
        focusFrame.resizeRelocate(
                layout.left() - 4,
                2,
                layout.right() - layout.left() + 8,
                layout.axis().bottom() - 2);
    }

    @Override
    protected void setWidth(double width) {
        // parents resize at every layout, mostly to the size it has
        stale |= width != getWidth();
        super.setWidth(width);
    }

    @Override
    protected void setHeight(double height) {
        stale |= height != getHeight();
        super.setHeight(height);
    }
}
