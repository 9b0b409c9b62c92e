package throwbench.solver.finding;

import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.machine.BearingPart;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.machine.Parts;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extreme;

/**
 * The greatest force on a pin or journal over its projected area, diameter · length, Pa. The force is the size of the vector,
 * found between stations. No default limit: the customary figures differ by a factor of ten from machine to machine.
 */
public final class BearingPressure implements ThrowCriterion {

    /** R on the crosshead pin; customary 7.0 MPa in compressors (Khurmi and Gupta, Machine Design; from memory). */
    public static final BearingPressure CROSSHEAD_PIN = new BearingPressure(
            LimitKey.CROSSHEAD_PIN_PRESSURE,
            "crosshead pin",
            new Size("crossheadPart", "pinDiameter", "pinLength"),
            Column.CROSSHEAD_PIN_X,
            Column.CROSSHEAD_PIN_Y);

    /** C on the crank pin; customary 4.2 MPa in compressors (the same). */
    public static final BearingPressure CRANK_PIN = new BearingPressure(
            LimitKey.CRANK_PIN_PRESSURE,
            "crank pin",
            new Size("crankPinPart", "diameter", "length"),
            Column.CRANK_PIN_X,
            Column.CRANK_PIN_Y);

    /** B, this throw's share of the main bearings' load; customary 1.75 MPa in compressors (the same). */
    public static final BearingPressure MAIN_BEARING = new BearingPressure(
            LimitKey.MAIN_BEARING_PRESSURE,
            "main bearing",
            new Size("mainBearingPart", "diameter", "length"),
            Column.MAIN_BEARING_X,
            Column.MAIN_BEARING_Y);

    private static final BearingPart NOTHING = new BearingPart(OptionalDouble.empty(), OptionalDouble.empty());

    private final Statement statement;
    private final Size size;
    private final Column x;
    private final Column y;

    /** The machine file's keys of a bearing's size. */
    private record Size(String part, String diameter, String length) {}

    private BearingPressure(LimitKey key, String bearing, Size size, Column x, Column y) {
        this.statement = Statement.atMost(key, "Pa", bearing + " pressure")
                .is("greatest force on the " + bearing + " / (diameter × length)")
                .from("the manufacturer's rating; on the projected area as the customary pressures in Khurmi and Gupta,"
                        + " Machine Design, journal bearings (from memory)");
        this.size = size;
        this.x = x;
        this.y = y;
    }

    @Override
    public Statement statement() {
        return statement;
    }

    @Override
    public Found find(JudgedDuty duty, int throwIndex) {
        BearingPart part = part(duty.described(throwIndex).parts());
        Optional<String> missing = new Needs(size.part())
                .value(size.diameter(), part.diameter())
                .value(size.length(), part.length())
                .missing();
        if (missing.isPresent()) {
            return Found.none(missing.get());
        }
        Extreme peak = duty.greatestSize(throwIndex, x, y);
        double area = part.diameter().orElseThrow() * part.length().orElseThrow();
        return Found.at(peak, peak.value() / area);
    }

    private BearingPart part(Parts parts) {
        Optional<BearingPart> part =
                switch (limitKey()) {
                    case CRANK_PIN_PRESSURE -> parts.crankPin();
                    case MAIN_BEARING_PRESSURE -> parts.mainBearing();
                    default -> parts.crosshead().map(c -> new BearingPart(c.pinDiameter(), c.pinLength()));
                };
        return part.orElse(NOTHING);
    }
}
