package throwbench.app.strip;

import java.util.List;
import java.util.Optional;
import throwbench.app.drawing.Readout;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.Quantity;
import throwbench.solver.document.quantity.TypedValue;
import throwbench.solver.document.quantity.UnitSystem;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;

/**
 * A crank position as typed: an angle ("37.5", "37,5 deg", "1.2 rad") or a travel from head-end dead centre ("25 %",
 * "40 mm", "1.5 in").
 *
 * @param angles crank angles that are meant, rad: none where the text says nothing, one for an angle, for a travel the one on
 *     the inward stroke and the one on the outward stroke
 * @param sentence what is wrong, or what besides the angle must be told; may be empty
 */
record TypedPlace(List<Double> angles, String sentence) {

    /** More turns than this are a slip of the keyboard. */
    private static final double MOST_TURNS = 100;

    private static final String WANTED = "type an angle as 37.5 or a travel as 25 % or 40 mm";

    /** Readings need a site's ambient pressure for gauge pressures; neither angles nor lengths do. */
    private static final double NO_AMBIENT = 0;

    TypedPlace {
        angles = List.copyOf(angles);
    }

    /** Reads a typed text for a linkage that turns this way. */
    static TypedPlace read(String text, Linkage linkage, Rotation rotation, UnitSystem units) {
        String typed = text.strip();
        if (typed.isEmpty()) {
            return new TypedPlace(List.of(), WANTED);
        }
        if (typed.endsWith("%")) {
            Optional<Double> share = number(typed.substring(0, typed.length() - 1) + " deg", Dimension.ANGLE)
                    .map(Math::toDegrees);
            return share.map(s -> travel(s / 100 * linkage.stroke(), linkage, rotation, units))
                    .orElseGet(() -> wrong(typed));
        }
        Optional<Double> angle = number(typed, Dimension.ANGLE);
        if (angle.isEmpty()) {
            angle = number(typed + " deg", Dimension.ANGLE);
        }
        if (angle.isPresent()) {
            return angle(angle.get());
        }
        return number(typed, Dimension.LENGTH)
                .map(s -> travel(s, linkage, rotation, units))
                .orElseGet(() -> wrong(typed));
    }

    private static Optional<Double> number(String text, Dimension dimension) {
        return TypedValue.read(text, dimension, Optional.empty(), NO_AMBIENT) instanceof Quantity quantity
                ? Optional.of(quantity.value())
                : Optional.empty();
    }

    private static TypedPlace wrong(String typed) {
        String found = typed.length() > 24 ? typed.substring(0, 24) + "…" : typed;
        return new TypedPlace(List.of(), "\"" + found + "\" is neither an angle nor a travel; " + WANTED);
    }

    private static TypedPlace angle(double angle) {
        if (!(Math.abs(angle) <= MOST_TURNS * 2 * Math.PI)) {
            return new TypedPlace(List.of(), "an angle of more than 100 turns; " + WANTED);
        }
        return new TypedPlace(List.of(angle), "");
    }

    private static TypedPlace travel(double travel, Linkage linkage, Rotation rotation, UnitSystem units) {
        double stroke = linkage.stroke();
        // 100 % and a stroke typed as shown may miss the last bit
        double close = Math.abs(travel - stroke) < 1e-9 * stroke ? stroke : travel;
        if (!(close >= 0 && close <= stroke)) {
            Readout length = Readout.of(units, Dimension.LENGTH, stroke);
            return new TypedPlace(
                    List.of(),
                    "the travel is " + length.number(0) + " to " + length.text(stroke) + " (0 to 100 %), "
                            + length.text(travel) + " lies outside it");
        }
        Linkage.TravelAngles both = linkage.anglesAtTravel(close, rotation);
        Readout angle = Readout.angle();
        return new TypedPlace(
                List.of(both.inward(), both.outward()),
                angle.text(both.inward()) + " on the inward stroke; Enter again: " + angle.text(both.outward())
                        + " on the outward stroke");
    }

    /** Whether both strokes pass the place. */
    boolean onBothStrokes() {
        return angles.size() == 2;
    }
}
