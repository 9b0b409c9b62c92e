package throwbench.solver.document.quantity;

import java.util.List;
import org.jspecify.annotations.Nullable;

/** Values as the machine file writes them, read to the letter and written again. */
public final class QuantityText {

    /** Longest text that can be a quantity; a longer one is refused unread. */
    static final int LONGEST = 120;

    private static final int QUOTED = 60;

    private final String text;
    private final Dimension dimension;
    private final double ambientPressure;

    private QuantityText(String text, Dimension dimension, double ambientPressure) {
        this.text = text;
        this.dimension = dimension;
        this.ambientPressure = ambientPressure;
    }

    /**
     * Reads a value with its unit, and its tolerance where it has one.
     *
     * @param ambientPressure of the site, Pa absolute: where gauge pressures count from
     */
    public static QuantityReading read(String text, Dimension dimension, double ambientPressure) {
        if (text.length() > LONGEST) {
            return new Refusal(quoted(text), dimension.wanted());
        }
        return new QuantityText(text, dimension, ambientPressure).read();
    }

    /** A text in quotes for a message, cut where it is long. */
    public static String quoted(String text) {
        return '"' + (text.length() <= QUOTED ? text : text.substring(0, QUOTED) + "…") + '"';
    }

    /** A value in its coherent SI unit that reads back as the very same double: "0.075 m", "513325 Pa a", "0.14". */
    public static String exact(double si, Dimension dimension) {
        PressureMark mark = dimension == Dimension.GAS_PRESSURE ? PressureMark.ABSOLUTE : PressureMark.NONE;
        return write(si, dimension.coherentUnit(), mark, 0, 17);
    }

    /**
     * A value in a unit of choice.
     *
     * @param ambientPressure of the site, Pa absolute
     * @param digits significant digits, 1 to 17
     */
    public static String write(double si, Unit unit, PressureMark mark, double ambientPressure, int digits) {
        String number = NumberText.write(unit.fromSi(si - mark.zero(ambientPressure)), digits);
        return unit == Unit.ONE ? number : number + ' ' + mark.behind(unit.symbol());
    }

    private QuantityReading read() {
        int sign = text.indexOf('±');
        int behind = sign + 1;
        if (sign < 0) {
            sign = text.indexOf("+/-");
            behind = sign + 3;
        }
        if (sign < 0) {
            return value(text.length(), 0);
        }
        int valueEnd = sign > 0 && text.charAt(sign - 1) == ' ' ? sign - 1 : sign;
        int from = behind < text.length() && text.charAt(behind) == ' ' ? behind + 1 : behind;
        int numberEnd = NumberText.end(text, from);
        Unit unit = unitBetween(numberEnd, text.length());
        if (numberEnd == from || unit == null || text.charAt(from) == '-') {
            return new Refusal(quoted(text), "a tolerance behind ± that is a difference of 0 or more with its unit");
        }
        return value(valueEnd, unit.differenceToSi(Double.parseDouble(text.substring(from, numberEnd))));
    }

    private QuantityReading value(int end, double tolerance) {
        int numberEnd = NumberText.end(text, 0);
        if (numberEnd == 0 || numberEnd > end) {
            return new Refusal(quoted(text), dimension.wanted());
        }
        PressureMark mark = markBefore(end);
        if (mark != PressureMark.NONE && dimension != Dimension.GAS_PRESSURE) {
            return new Refusal(quoted(text), dimension.said() + " without a or g, as \"" + dimension.example() + '"');
        }
        Unit unit = unitBetween(numberEnd, mark == PressureMark.NONE ? end : end - 2);
        if (unit == null) {
            return unknownUnit(numberEnd);
        }
        if (mark == PressureMark.NONE && dimension == Dimension.GAS_PRESSURE) {
            String bare = text.substring(0, end);
            return new Refusal(
                    quoted(text) + " without a or g",
                    "\"" + bare + " a\" if it is absolute, \"" + bare + " g\" if it is gauge");
        }
        double number = Double.parseDouble(text.substring(0, numberEnd));
        double si = unit.toSi(number) + mark.zero(ambientPressure);
        if (!(Math.abs(si) <= Double.MAX_VALUE && tolerance <= Double.MAX_VALUE)) {
            return new Refusal(quoted(text) + ", which is out of any range", dimension.wanted());
        }
        return new Quantity(si, tolerance, text, unit, mark);
    }

    private PressureMark markBefore(int end) {
        if (end < 2 || text.charAt(end - 2) != ' ' || !holdsPressure()) {
            return PressureMark.NONE;
        }
        char last = text.charAt(end - 1);
        return last == 'a' ? PressureMark.ABSOLUTE : last == 'g' ? PressureMark.GAUGE : PressureMark.NONE;
    }

    private boolean holdsPressure() {
        return dimension.holds(Unit.PASCAL);
    }

    /** The unit written from {@code numberEnd}, behind at most one space, or null. */
    private @Nullable Unit unitBetween(int numberEnd, int end) {
        if (numberEnd > end) {
            return null;
        }
        int from = numberEnd < end && text.charAt(numberEnd) == ' ' ? numberEnd + 1 : numberEnd;
        List<Unit> units = dimension.units();
        for (int i = 0; i < units.size(); i++) {
            Unit unit = units.get(i);
            if (isAt(unit.symbol(), from, end) && (unit != Unit.ONE || from == numberEnd)) {
                return unit;
            }
        }
        // the Greek letter looks the same as the micro sign
        return dimension.holds(Unit.MICROMETRE) && isAt("μm", from, end) ? Unit.MICROMETRE : null;
    }

    private boolean isAt(String symbol, int from, int end) {
        return symbol.length() == end - from && text.startsWith(symbol, from);
    }

    private Refusal unknownUnit(int numberEnd) {
        String rest = text.substring(numberEnd).strip();
        if (rest.startsWith(",")) {
            return new Refusal(quoted(text) + " with a comma", dimension.said() + " with a decimal point");
        }
        String why = rest.isEmpty() ? " without a unit" : "";
        return new Refusal(quoted(text) + why, dimension.wanted());
    }
}
