package throwbench.app.linkage.parts;

import java.util.List;
import java.util.Optional;

/**
 * Everything on the line of stroke beyond the crosshead pin, from the crank outwards. Radii in m about the line of stroke.
 *
 * @param pistons moving bodies with the chambers on their faces
 * @param barrels the fixed cylinder of each piston
 * @param bars what joins them: piston rod, necks between pistons, tail rod
 */
public record RodLine(List<Piston> pistons, List<Barrel> barrels, List<Bar> bars) {

    public RodLine {
        pistons = List.copyOf(pistons);
        barrels = List.copyOf(barrels);
        bars = List.copyOf(bars);
    }

    /**
     * A piston or plunger.
     *
     * @param crankChamber index of the chamber on its crank face; empty where that face is open
     * @param headChamber index of the chamber on its head face
     * @param crankFace x relative to the crosshead pin
     * @param headFace x relative to the crosshead pin
     * @param plunger whether it works through a packing in a wider barrel
     */
    public record Piston(
            Optional<Integer> crankChamber,
            Optional<Integer> headChamber,
            double radius,
            double crankFace,
            double headFace,
            boolean plunger) {}

    /**
     * A cylinder, fixed.
     *
     * @param from x at which the liner begins
     * @param to x at which it ends
     * @param radius inside
     * @param wall thickness
     */
    public record Barrel(
            double from,
            double to,
            double radius,
            double wall,
            Optional<Cover> crankCover,
            Optional<Cover> headCover) {}

    /**
     * An end of a cylinder.
     *
     * @param face x of its inner face
     * @param thickness away from the chamber
     * @param opening radius of what passes through it; 0 closed
     * @param packing length of the packing round what passes
     */
    public record Cover(double face, double thickness, double opening, double packing) {}

    /**
     * A round bar, moving with the crosshead.
     *
     * @param from x relative to the crosshead pin
     * @param to x relative to the crosshead pin
     * @param rod whether it is the piston rod, which carries the whole load
     */
    public record Bar(double from, double to, double radius, boolean rod) {}

    /** x of a piston's middle relative to the crosshead pin. */
    public static double middle(Piston piston) {
        return (piston.crankFace() + piston.headFace()) / 2;
    }
}
