package throwbench.app.strip;

import java.util.Optional;
import java.util.OptionalDouble;
import javafx.scene.Cursor;
import javafx.scene.control.Label;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import org.jspecify.annotations.Nullable;
import throwbench.app.bench.Playhead;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.Signal;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.revolution.Column;

/** The mouse and the keys of the strip: pressing and dragging in the plot and keys turn the crank, a rest names events. */
final class StripHands {

    /** Scrubbing by mouse goes to tenths of a degree: what is shown is then exactly where the crank stands. */
    private static final double TENTHS = 10;

    /** Points from an event's mark within which the mouse is on it. */
    private static final double NEAR = 4;

    /** Points beyond the ends of the plot in which a press still counts as one at its end. */
    private static final double BEYOND = 10;

    private final StripView view;
    private final Playhead playhead;
    private final Label hint;
    private boolean scrubbing;

    /** @param hint shown beside the mouse */
    StripHands(StripView view, Playhead playhead, Label hint) {
        this.view = view;
        this.playhead = playhead;
        this.hint = hint;
        hint.setId("strip-hint");
        hint.getStyleClass().add("strip-message");
        hint.setMouseTransparent(true);
        hint.setManaged(false);
        hint.setVisible(false);
        view.addEventHandler(MouseEvent.MOUSE_PRESSED, this::press);
        view.addEventHandler(MouseEvent.MOUSE_DRAGGED, this::drag);
        view.addEventHandler(MouseEvent.MOUSE_RELEASED, e -> scrubbing = false);
        view.addEventHandler(MouseEvent.MOUSE_MOVED, this::hover);
        view.addEventHandler(MouseEvent.MOUSE_EXITED, e -> hint.setVisible(false));
        view.addEventHandler(KeyEvent.KEY_PRESSED, this::key);
    }

    private boolean inPlot(MouseEvent event) {
        StripPlot plot = view.plot();
        return plot != null
                && event.getX() >= plot.layout().left() - BEYOND
                && event.getX() <= plot.layout().right() + BEYOND;
    }

    private Optional<Column> removable(MouseEvent event) {
        StripPlot plot = view.plot();
        return plot == null
                ? Optional.empty()
                : LegendPainter.removable(plot, event.getX(), event.getY())
                        .map(StripTrace::signal)
                        .filter(Signal.OfColumn.class::isInstance)
                        .map(s -> ((Signal.OfColumn) s).column());
    }

    private void press(MouseEvent event) {
        view.requestFocus();
        if (event.getButton() == MouseButton.PRIMARY) {
            removable(event).ifPresent(view::removeTrace);
            scrubbing = inPlot(event);
            drag(event);
        }
    }

    private void drag(MouseEvent event) {
        StripPlot plot = view.plot();
        if (scrubbing && plot != null) {
            double degrees = Math.toDegrees(plot.layout().angle(event.getX()));
            stopAt(Math.toRadians(Math.rint(degrees * TENTHS) / TENTHS));
            event.consume();
        }
    }

    /** Names what stands under the mouse: the events at its angle, or what a click would take off. */
    private void hover(MouseEvent event) {
        StripPlot plot = view.plot();
        boolean plotted = inPlot(event);
        boolean removes = removable(event).isPresent();
        view.setCursor(plotted ? Cursor.H_RESIZE : removes ? Cursor.HAND : Cursor.DEFAULT);
        String words = removes ? "click: take this trace off" : eventsUnder(plotted ? plot : null, event.getX());
        hint.setText(words);
        hint.setVisible(!words.isEmpty());
        if (!words.isEmpty()) {
            hint.autosize();
            double below = event.getY() + 18;
            boolean fits = below + hint.getHeight() <= view.getHeight();
            hint.relocate(
                    Math.min(event.getX() + 14, view.getWidth() - hint.getWidth() - 4),
                    fits ? below : event.getY() - hint.getHeight() - 8);
        }
    }

    private static String eventsUnder(@Nullable StripPlot plot, double x) {
        return plot == null ? "" : plot.eventsAt(x, NEAR);
    }

    /** Turns the crank by a key; a key that belongs to a text or turns nothing is left alone. */
    void key(KeyEvent event) {
        StripPlot plot = view.plot();
        if (event.getTarget() instanceof TextInputControl || event.isAltDown() || plot == null) {
            return;
        }
        Shown shown = plot.shown();
        Linkage linkage = shown.shownThrow().linkage();
        Rotation rotation = shown.running().rotation();
        OptionalDouble turned = ScrubKeys.after(
                event.getCode(),
                event.isShiftDown(),
                event.isShortcutDown() || event.isControlDown(),
                playhead.crankAngle().get(),
                linkage.crankEndDeadCentre(rotation),
                plot.events());
        if (turned.isPresent()) {
            stopAt(turned.getAsDouble());
            event.consume();
        }
    }

    /** Who scrubs wants to look: the crank stops where it was put. */
    void stopAt(double angle) {
        playhead.setPlaying(false);
        playhead.turnTo(angle);
    }
}
