package throwbench.app.linkage.parts;

import throwbench.app.drawing.Palette;

/**
 * How parts are drawn.
 *
 * @param thin width of a part's edge, points
 * @param strong width of the edge of what carries load, points
 * @param solid whether faces are filled and details drawn; else outlines alone
 * @param edge colour of edges, 0xRRGGBB
 */
public record Look(Palette palette, double thin, double strong, boolean solid, int edge) {

    /** The throw shown, in full. */
    public static Look full(Palette palette, double weight) {
        return new Look(
                palette, 1.1 * weight, 1.7 * weight, true, palette.parts().edge());
    }

    /** Another throw, in outline. */
    public static Look outline(Palette palette, double weight) {
        int pale = Palette.mix(palette.ground().surface(), palette.parts().edge(), 0.38);
        return new Look(palette, 0.9 * weight, 0.9 * weight, false, pale);
    }

    /** A held design under the present one. */
    public static Look held(Palette palette, double weight) {
        return new Look(palette, weight, weight, false, palette.verdicts().held());
    }
}
