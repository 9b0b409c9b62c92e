package throwbench.solver.chamber;

/**
 * The volume of a chamber over the travel.
 *
 * @param area A, m², above 0
 * @param stroke m, above 0
 * @param clearance volume left at its dead centre, open pockets included, m³, ≥ 0; 0 stands for not known, beside a
 *     recorded pressure, which needs none
 */
public record ChamberVolume(Side side, double area, double stroke, double clearance) {

    public ChamberVolume {
        if (!(area > 0 && stroke > 0 && clearance >= 0)) {
            throw new IllegalArgumentException(
                    "chamber of area " + area + " m2, stroke " + stroke + " m, clearance " + clearance + " m3");
        }
    }

    /** V_min, m³. */
    public double least() {
        return clearance;
    }

    /** V_max, m³. */
    public double greatest() {
        return clearance + swept();
    }

    /** A · stroke, m³. */
    public double swept() {
        return area * stroke;
    }

    /** V at a travel s (m), m³. */
    public double at(double travel) {
        return clearance + area * (side == Side.HEAD ? travel : stroke - travel);
    }

    /** The travel (m) at which it has a volume (m³) between least and greatest. */
    public double travelAt(double volume) {
        double moved = (volume - clearance) / area;
        double within = Math.max(0, Math.min(stroke, moved));
        return side == Side.HEAD ? within : stroke - within;
    }

    /** Whether it grows on the inward stroke, or on the outward one. */
    public boolean growsOn(boolean inward) {
        return inward == (side == Side.HEAD);
    }
}
