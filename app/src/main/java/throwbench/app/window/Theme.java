package throwbench.app.window;

import atlantafx.base.theme.PrimerDark;
import atlantafx.base.theme.PrimerLight;
import java.net.URL;
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
        // the roles first: the sheets look them up
        scene.getRoot().setStyle(PaletteStyle.of(palette));
        Application.setUserAgentStylesheet(userAgentStylesheet);
        scene.getStylesheets().setAll(sheet("controlsfx-bridge.css"), sheet("bench.css"));
    }

    private static String sheet(String name) {
        URL url = Objects.requireNonNull(Theme.class.getResource(name), name);
        return url.toExternalForm();
    }
}
