package throwbench.app.linkage;

import javafx.scene.control.Label;
import throwbench.app.drawing.Fonts;
import throwbench.app.drawing.Palette;

/** Names what the pointer rests on. It stays where it appeared until something else is pointed at. */
final class HoverLabel extends Label {

    private static final double BESIDE = 14;

    HoverLabel() {
        getStyleClass().add("linkage-hover");
        setManaged(false);
        setMouseTransparent(true);
        setVisible(false);
        setFont(Fonts.of(12.5, false));
        wear(Palette.LIGHT);
    }

    void wear(Palette palette) {
        setStyle("-fx-background-color: %s; -fx-text-fill: %s; -fx-background-radius: 4; -fx-padding: 3 8 3 8;"
                .formatted(css(palette.ground().ink()), css(palette.ground().surface())));
    }

    private static String css(int rgb) {
        return "#%06x".formatted(rgb);
    }

    /** Appears beside a point, inside an area of this size. */
    void appear(double x, double y, double width, double height, String text) {
        setText(text);
        setVisible(true);
        autosize();
        double right = x + BESIDE + getWidth();
        double atX = right <= width ? x + BESIDE : Math.max(0, x - BESIDE - getWidth());
        double atY = y - BESIDE - getHeight() >= 0 ? y - BESIDE - getHeight() : y + BESIDE;
        relocate(atX, Math.max(0, Math.min(height - getHeight(), atY)));
    }

    /** Says something else in the same place. */
    void say(String text) {
        if (!text.equals(getText())) {
            setText(text);
            // it only grows while it stands: a label that breathes flickers
            resize(Math.max(getWidth(), prefWidth(-1)), prefHeight(-1));
        }
    }

    void vanish() {
        setVisible(false);
    }
}
