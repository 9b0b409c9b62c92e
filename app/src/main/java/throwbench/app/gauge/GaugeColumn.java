package throwbench.app.gauge;

import java.util.EnumSet;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import javafx.scene.canvas.Canvas;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.Pane;
import javafx.scene.layout.Region;
import org.jspecify.annotations.Nullable;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.ColumnMenu;
import throwbench.app.drawing.FxPen;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.PaletteStyle;
import throwbench.app.drawing.Signal;
import throwbench.app.drawing.View;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;

/** The gauge column on the screen. A moving crank redraws bars and values only. */
public final class GaugeColumn extends Region implements View {

    private static final double SCROLL_BAR = 14;
    private static final double MENU = 30;

    private final Canvas still = new Canvas();
    private final Canvas moving = new Canvas();
    private final FxPen stillPen = new FxPen(still.getGraphicsContext2D());
    private final FxPen movingPen = new FxPen(moving.getGraphicsContext2D());
    private final Pane face = new Pane(still, moving);
    private final ScrollPane scroll = new ScrollPane(face);
    private final GaugePainter painter = new GaugePainter();
    private final Set<Column> picked = EnumSet.copyOf(Gauges.USUAL);
    private final ColumnMenu menu =
            new ColumnMenu("Choose gauges", Gauges.ALL, picked::contains, (column, on) -> pick(column, on));
    private Optional<Shown> shown = Optional.empty();
    private Palette palette = Palette.LIGHT;
    private List<Gauge> gauges = List.of();
    private @Nullable GaugeLayout layout;
    private boolean stale = true;
    private double drawnAngle = Double.NaN;
    private long stillDrawings;

    public GaugeColumn() {
        setId("gauge-column");
        getStyleClass().add("gauge-column");
        getStylesheets()
                .add(Objects.requireNonNull(GaugeColumn.class.getResource("gauge.css"))
                        .toExternalForm());
        scroll.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        scroll.setFitToWidth(true);
        scroll.setAccessibleText("Present values at this crank angle");
        getChildren().addAll(scroll, menu);
        setMinSize(210, 120);
        setPrefSize(320, 340);
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

    /** Gives a column a gauge or takes its gauge away; chamber pressures always have theirs. */
    public void pick(Column column, boolean on) {
        if (column == Column.CRANK_ANGLE) {
            throw new IllegalArgumentException("the crank angle has no extremes and no gauge");
        }
        stale |= on ? picked.add(column) : picked.remove(column);
    }

    @Override
    public void draw(Instant instant) {
        if (shown.isEmpty() || getWidth() < 1 || getHeight() < 1) {
            return;
        }
        if (stale) {
            drawStill(shown.get());
        }
        double angle = Angles.wrap(instant.crankAngle());
        if (stale || angle != drawnAngle) {
            movingPen.clear(moving.getWidth(), moving.getHeight());
            painter.moving(movingPen, gauges, Objects.requireNonNull(layout), palette, instant);
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
        List<Signal> signals = Gauges.of(state.shownThrow(), picked);
        gauges = signals.stream().map(s -> Gauge.of(s, state)).toList();
        GaugeLayout fitted = GaugeLayout.of(getWidth(), getHeight(), gauges.size());
        boolean scrolls = fitted.height() > getHeight();
        GaugeLayout placed = scrolls ? GaugeLayout.of(getWidth() - SCROLL_BAR, getHeight(), gauges.size()) : fitted;
        layout = placed;
        double width = Math.ceil(getWidth() - (scrolls ? SCROLL_BAR : 0));
        for (Canvas canvas : List.of(still, moving)) {
            canvas.setWidth(width);
            canvas.setHeight(Math.ceil(placed.height()));
        }
        face.setMinHeight(Math.ceil(placed.height()));
        stillPen.clear(still.getWidth(), still.getHeight());
        painter.still(stillPen, gauges, placed, palette);
    }

    @Override
    protected void layoutChildren() {
        scroll.resizeRelocate(0, 0, getWidth(), getHeight());
        menu.resizeRelocate(getWidth() - MENU - SCROLL_BAR, 7, MENU, 21);
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
