package throwbench.solver.document.quantity;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;

/**
 * What a user types in a field, read with good will: a decimal comma, a sum ("150/2 mm"), a missing or superfluous space,
 * units as the SI writes them ("kN·m", "in²", "°C", "psig"), a number alone for the unit already there.
 */
public final class TypedValue {

    // digits kept of a computed number: more than any drawing has, fewer than rounding errors need
    private static final int COMPUTED_DIGITS = 12;

    private final Dimension dimension;
    private final Optional<Quantity> present;

    private TypedValue(Dimension dimension, Optional<Quantity> present) {
        this.dimension = dimension;
        this.present = present;
    }

    /**
     * Reads a typed value into the text that the file will hold.
     *
     * @param present what the field holds now; its unit stands in for a missing one
     * @param ambientPressure of the site, Pa absolute
     * @return a quantity whose {@code text} is the canonical one, or a sentence that says what is wrong
     */
    public static QuantityReading read(
            String typed, Dimension dimension, Optional<Quantity> present, double ambientPressure) {
        if (typed.length() > QuantityText.LONGEST) {
            return new Refusal(QuantityText.quoted(typed), dimension.wanted());
        }
        String plain = plain(typed);
        String comma = doubtfulComma(plain);
        if (!comma.isEmpty()) {
            String point = comma.replace(',', '.');
            return new Refusal(
                    "\"" + comma + "\" can be read in two ways",
                    NumberText.write(Double.parseDouble(point), 17) + " or " + comma.replace(",", ""));
        }
        TypedValue value = new TypedValue(dimension, present);
        String canonical = value.canonical(plain.replace(',', '.'));
        return QuantityText.read(canonical.isEmpty() ? typed.strip() : canonical, dimension, ambientPressure);
    }

    /** One spelling for signs that look alike. */
    private static String plain(String typed) {
        return unitPowers(typed.strip())
                .replace('\u00a0', ' ')
                .replace('\u202f', ' ')
                .replace('−', '-')
                .replace('×', '*')
                .replace('·', ' ')
                .replace('⋅', ' ')
                .replace('μ', 'µ')
                .replace("+/-", "±")
                .replace("°C", "degC")
                .replace("°F", "degF")
                .replace("°", "deg");
    }

    /** Powers behind a unit's letter, and only there, become the digits of the file: in² and in^2 are in2. */
    private static String unitPowers(String typed) {
        StringBuilder plain = new StringBuilder(typed.length());
        for (int at = 0; at < typed.length(); at++) {
            char c = typed.charAt(at);
            boolean behindLetter = at > 0 && Character.isLetter(typed.charAt(at - 1));
            if (behindLetter && (c == '²' || c == '³')) {
                plain.append(c == '²' ? '2' : '3');
            } else if (!(behindLetter && c == '^')) {
                plain.append(c);
            }
        }
        return plain.toString();
    }

    /** A number such as 1,200 that is either 1.2 or 1200; empty where there is none. */
    private static String doubtfulComma(String text) {
        for (int comma = text.indexOf(','); comma >= 0; comma = text.indexOf(',', comma + 1)) {
            int first = comma;
            while (first > 0 && Character.isDigit(text.charAt(first - 1))) {
                first--;
            }
            int end = NumberText.digits(text, comma + 1);
            boolean groups = comma - first >= 1 && comma - first <= 3 && text.charAt(first) != '0';
            if (groups && end - comma == 4) {
                return text.substring(first, end);
            }
        }
        return "";
    }

    /** The text for the file, or nothing where the typed text makes no value. */
    private String canonical(String plain) {
        int sign = plain.indexOf('±');
        if (sign < 0) {
            return part(plain, "", false);
        }
        String tolerance = plain.substring(sign + 1);
        String unit = tolerance.substring(unitStart(tolerance)).strip();
        String value = part(plain.substring(0, sign), unit, false);
        String band = part(tolerance, "", true);
        return value.isEmpty() || band.isEmpty() ? "" : value + " ± " + band;
    }

    private String part(String text, String unitElsewhere, boolean difference) {
        int unitAt = unitStart(text);
        String number = number(text.substring(0, unitAt).strip());
        String unit = unit(text.substring(unitAt).strip(), unitElsewhere, difference);
        if (number.isEmpty() || unit == null) {
            return "";
        }
        return unit.isEmpty() ? number : number + ' ' + unit;
    }

    /** Where the unit begins: at the first letter or sign that can be no part of a sum. */
    private static int unitStart(String text) {
        for (int at = 0; at < text.length(); at++) {
            char c = text.charAt(at);
            boolean exponent = (c == 'e' || c == 'E')
                    && at > 0
                    && Character.isDigit(text.charAt(at - 1))
                    && at + 1 < text.length()
                    && "+-0123456789".indexOf(text.charAt(at + 1)) >= 0;
            if (!exponent && "0123456789.+-*/() ".indexOf(c) < 0) {
                return at;
            }
        }
        return text.length();
    }

    private static String number(String sum) {
        if (NumberText.isNumber(sum)) {
            return sum;
        }
        OptionalDouble value = Arithmetic.value(sum);
        return value.isPresent() ? NumberText.write(value.getAsDouble(), COMPUTED_DIGITS) : "";
    }

    /** The unit's text for the file; nothing for a plain number; null where no unit can be meant. */
    private @Nullable String unit(String written, String elsewhere, boolean difference) {
        String closed = written.replace(" ", "");
        if (closed.isEmpty() && !elsewhere.isEmpty()) {
            return unit(elsewhere, "", difference);
        }
        if (closed.isEmpty()) {
            return unitAtHand(difference);
        }
        List<Unit> units = dimension.units();
        for (PressureMark mark : PressureMark.values()) {
            for (Unit unit : units) {
                if (closed.equals(unit.symbol().replace(" ", "") + mark.text())
                        && (mark == PressureMark.NONE || dimension == Dimension.GAS_PRESSURE)) {
                    return mark.behind(unit.symbol());
                }
            }
        }
        return null;
    }

    private String unitAtHand(boolean difference) {
        if (dimension.isDimensionless() && present.isEmpty()) {
            return "";
        }
        return present.map(q -> (difference ? PressureMark.NONE : q.mark())
                        .behind(q.unit().symbol()))
                .orElse("");
    }
}
