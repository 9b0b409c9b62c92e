package throwbench.solver.document.quantity;

import java.math.BigDecimal;
import java.math.MathContext;

/** Decimal numbers as text, with a point whatever the locale. */
public final class NumberText {

    // beyond these powers of ten a number is written with an exponent
    private static final int LONGEST_PLAIN = 15;

    private NumberText() {}

    /** Where the number ends that begins at {@code from}, or {@code from} where none begins: -12.5e-3. */
    static int end(String text, int from) {
        int at = from < text.length() && text.charAt(from) == '-' ? from + 1 : from;
        int whole = digits(text, at);
        if (whole == at) {
            return from;
        }
        at = whole;
        if (at < text.length() && text.charAt(at) == '.') {
            int fraction = digits(text, at + 1);
            if (fraction == at + 1) {
                return from;
            }
            at = fraction;
        }
        return exponentEnd(text, at);
    }

    private static int exponentEnd(String text, int from) {
        if (from >= text.length() || (text.charAt(from) != 'e' && text.charAt(from) != 'E')) {
            return from;
        }
        int sign = from + 1;
        int first = sign < text.length() && (text.charAt(sign) == '-' || text.charAt(sign) == '+') ? sign + 1 : sign;
        int end = digits(text, first);
        return end == first ? from : end;
    }

    static int digits(String text, int from) {
        int at = from;
        while (at < text.length() && text.charAt(at) >= '0' && text.charAt(at) <= '9') {
            at++;
        }
        return at;
    }

    /** Whether the whole text is one number. */
    public static boolean isNumber(String text) {
        return !text.isEmpty() && end(text, 0) == text.length();
    }

    /**
     * A number rounded to so many significant digits, without zeros at its end.
     *
     * @param value finite
     * @param digits 1 to 17; 17 gives back the very double when read
     */
    public static String write(double value, int digits) {
        if (value == 0) {
            return "0";
        }
        BigDecimal shortest = new BigDecimal(Double.toString(value));
        BigDecimal rounded = shortest.round(new MathContext(digits)).stripTrailingZeros();
        int power = rounded.precision() - rounded.scale();
        return power > LONGEST_PLAIN || power < -LONGEST_PLAIN / 2 ? rounded.toString() : rounded.toPlainString();
    }
}
