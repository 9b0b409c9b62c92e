package throwbench.app.drawing;

import java.util.Locale;

/**
 * The palette for style sheets: an inline style that defines one looked-up colour a role ({@code -tb-ink},
 * {@code -tb-met} …) for a node and all below it.
 */
public final class PaletteStyle {

    private PaletteStyle() {}

    /** The definitions, to be set as a node's style. */
    public static String of(Palette palette) {
        Palette.Ground ground = palette.ground();
        Palette.Verdicts verdicts = palette.verdicts();
        return colour("window", ground.window())
                + colour("surface", ground.surface())
                + colour("edge", ground.edge())
                + colour("grid", ground.grid())
                + colour("ink", ground.ink())
                + colour("soft", ground.soft())
                + colour("accent", ground.accent())
                + colour("on-accent", ground.onAccent())
                + colour("chosen", Palette.mix(ground.surface(), ground.accent(), 0.09))
                + colour("hover", Palette.mix(ground.surface(), ground.accent(), 0.035))
                + colour("met", verdicts.met())
                + colour("not-met", verdicts.notMet())
                + colour("not-judged", verdicts.notJudged());
    }

    private static String colour(String role, int rgb) {
        return "-tb-" + role + ": " + String.format(Locale.ROOT, "#%06x", rgb) + "; ";
    }
}
