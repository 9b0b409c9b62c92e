package throwbench.app.window;

import atlantafx.base.theme.PrimerDark;
import atlantafx.base.theme.PrimerLight;
import java.net.URL;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import java.util.List;
import java.util.Objects;
import javafx.application.Application;
import javafx.scene.Scene;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.PaletteStyle;

/** Light or dark: the theme's sheets for controls, our palette's roles over them, the palette itself for what is drawn. */
enum Theme {
    LIGHT(new PrimerLight().getUserAgentStylesheet(), Palette.LIGHT),
    DARK(new PrimerDark().getUserAgentStylesheet(), Palette.DARK);

    private final String userAgentStylesheet;

    @SuppressWarnings("ImmutableEnumChecker") // a record of numbers
    private final Palette palette;

    Theme(String userAgentStylesheet, Palette palette) {
        this.userAgentStylesheet = userAgentStylesheet;
        this.palette = palette;
    }

    Palette palette() {
        return palette;
    }

    void apply(Scene scene) {
        Application.setUserAgentStylesheet(userAgentStylesheet);
        scene.getStylesheets().setAll(sheets());
    }

    /** Every style sheet of a window or dialog. */
    List<String> sheets() {
        return List.of(roles(), sheet("controlsfx-bridge.css"), sheet("bench.css"));
    }

    /** The palette as a sheet of looked-up colours: menus and tooltips, which have roots of their own, find them too. */
    private String roles() {
        String text = ".root { " + PaletteStyle.of(palette) + "}";
        String encoded = Base64.getEncoder().encodeToString(text.getBytes(StandardCharsets.UTF_8));
        return "data:text/css;charset=utf-8;base64," + encoded;
    }

    private static String sheet(String name) {
        URL url = Objects.requireNonNull(Theme.class.getResource(name), name);
        return url.toExternalForm();
    }
}
