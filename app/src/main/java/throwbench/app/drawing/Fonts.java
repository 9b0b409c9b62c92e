package throwbench.app.drawing;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import javafx.scene.text.Font;
import javafx.scene.text.Text;

/** The bundled typeface, the same on every machine; its figures are all of one width, so numbers keep their place. */
public final class Fonts {

    /** Family name, for style sheets. */
    public static final String FAMILY = "Noto Sans";

    private static final Map<Double, Font> FONTS = new ConcurrentHashMap<>();

    private Fonts() {}

    /** Loads the typeface; call once before the first scene is styled. */
    public static void load() {
        of(13, false);
        of(13, true);
    }

    /** The font of a size, regular or bold. */
    public static Font of(double size, boolean bold) {
        return FONTS.computeIfAbsent(
                bold ? -size : size, k -> read(bold ? "NotoSans-Bold.ttf" : "NotoSans-Regular.ttf", size));
    }

    private static Font read(String name, double size) {
        try (InputStream in = Fonts.class.getResourceAsStream(name)) {
            Font font = in == null ? null : Font.loadFont(in, size);
            if (font == null) {
                throw new IllegalStateException("the bundled font " + name + " cannot be read");
            }
            return font;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Width of a text. */
    static double width(String text, Font font) {
        Text measure = new Text(text);
        measure.setFont(font);
        return measure.getLayoutBounds().getWidth();
    }
}
