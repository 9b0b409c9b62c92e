package throwbench.app.drawing;

/**
 * Colours by role, 0xRRGGBB: one palette a theme, the same roles in every view, picture and page. No other hue stands on
 * the screen.
 */
public record Palette(Ground ground, Parts parts, Loads loads, Verdicts verdicts) {

    /**
     * What everything stands on.
     *
     * @param window behind the panels
     * @param surface of a panel
     * @param edge of panels and fields
     * @param grid faint lines inside drawings
     * @param ink first text
     * @param soft second text
     * @param accent focus, links, the play button
     * @param onAccent text on accent, tension, compression and ink
     */
    public record Ground(int window, int surface, int edge, int grid, int ink, int soft, int accent, int onAccent) {}

    /**
     * The machine's parts.
     *
     * @param face of a part
     * @param shade of a part's darker face
     * @param edge line round a part
     * @param steel pins, rings, shoes
     */
    public record Parts(int face, int shade, int edge, int steel) {}

    /** One hue a meaning. Gas fills chambers from a light tint to this colour. */
    public record Loads(
            int tension, int compression, int gas, int inertia, int rod, int pin, int guide, int torque, int motion) {}

    /** Judgement, and what belongs to it. */
    public record Verdicts(int met, int notMet, int notJudged, int limit, int held) {}

    public static final Palette LIGHT = new Palette(
            new Ground(0xf2f1ed, 0xfefefd, 0xd9d7d0, 0xe6e4de, 0x1d232b, 0x5b636c, 0x0b5c6b, 0xffffff),
            new Parts(0xe8e5dc, 0xd3cfc3, 0x474d54, 0x474d54),
            new Loads(0xb35c00, 0x3a41a6, 0x167f7a, 0x87307e, 0x2a3441, 0x2a3441, 0x637414, 0x7d4a2e, 0x0b5c6b),
            new Verdicts(0x256b3c, 0xa8152b, 0x5b636c, 0xa8152b, 0x8a8f96));

    public static final Palette DARK = new Palette(
            new Ground(0x14181d, 0x1c2127, 0x363d46, 0x2b323a, 0xeceae5, 0xa6adb5, 0x58b9c6, 0x10151a),
            new Parts(0x3b4149, 0x2d333a, 0xaeb4bb, 0xb9bfc6),
            new Loads(0xf0a04b, 0x98a2ff, 0x4cc0b5, 0xd98bd0, 0xdfe3e8, 0xdfe3e8, 0xb4c75a, 0xd29d7c, 0x62bccb),
            new Verdicts(0x74c48d, 0xff8088, 0xa6adb5, 0xff8088, 0x868d95));

    /** The colour of the rod at a load: tension or compression. */
    public int rodLoad(double load) {
        return load >= 0 ? loads.tension() : loads.compression();
    }

    /** A colour between two, 0 the first, 1 the second. */
    public static int mix(int from, int to, double share) {
        int red = channel(from >> 16, to >> 16, share);
        int green = channel(from >> 8, to >> 8, share);
        return red << 16 | green << 8 | channel(from, to, share);
    }

    private static int channel(int from, int to, double share) {
        int a = from & 0xff;
        int b = to & 0xff;
        return (int) Math.round(a + (b - a) * Math.max(0, Math.min(1, share)));
    }

    /** The fill of a chamber at a share (0 … 1) of the way from the least to the greatest pressure shown. */
    public int pressure(double share) {
        return mix(mix(ground.surface(), loads.gas(), 0.10), mix(ground.surface(), loads.gas(), 0.62), share);
    }
}
