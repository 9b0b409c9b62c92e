package throwbench.app.linkage.parts;

/**
 * Drawn sizes of crank, connecting rod and crosshead of one throw, m.
 *
 * @param slider crosshead, or the trunk piston's skirt
 */
public record GearShape(Crank crank, Rod rod, Slider slider) {

    /**
     * Crank web seen along the shaft.
     *
     * @param journal radius of the main journal
     * @param hub radius of the web round the journal
     * @param pin radius of the crank pin
     * @param pinEnd radius of the web round the pin
     * @param counterweight radius of the sector opposite the pin
     */
    public record Crank(double journal, double hub, double pin, double pinEnd, double counterweight) {}

    /**
     * Connecting rod.
     *
     * @param bigEye outer radius at the crank pin
     * @param smallEye outer radius at the crosshead pin
     * @param wristPin radius of the crosshead pin
     * @param shankBig half the shank's height at the big end
     * @param shankSmall half its height at the small end
     */
    public record Rod(double bigEye, double smallEye, double wristPin, double shankBig, double shankSmall) {}

    /**
     * What slides, and what it slides on; along x relative to the crosshead pin, except the guide.
     *
     * @param trunk whether the pin sits inside a piston that guides itself
     * @param back how far it reaches behind the pin
     * @param front how far it reaches in front of the pin
     * @param halfHeight of the body, shoes included; of a trunk piston its radius
     * @param shoe thickness of a shoe; of a trunk piston its wall
     * @param guide the bars, where there are any
     */
    public record Slider(boolean trunk, double back, double front, double halfHeight, double shoe, Guide guide) {}

    /**
     * Guide bars, fixed.
     *
     * @param from x at which they begin
     * @param to x at which they end
     * @param bar thickness; 0 without a guide
     */
    public record Guide(double from, double to, double bar) {}

    /** The greatest distance from the crank centre that crank and big end reach. */
    public double sweep(double crankRadius) {
        double bigEnd = crankRadius + Math.max(rod.bigEye() * CAP, crank.pinEnd());
        return Math.max(bigEnd, crank.counterweight());
    }

    /** Bolts and cap of the big end stand out of its eye by this factor. */
    static final double CAP = 1.16;
}
