package throwbench.app.command;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Results as people read them: four significant digits, in a unit of fitting size. */
record ShownValue(String number, String unit) {

    private static final MathContext FOUR_DIGITS = new MathContext(4, RoundingMode.HALF_EVEN);
    private static final double KILO = 1e3;
    private static final double MEGA = 1e6;
    private static final double CELSIUS_ZERO = 273.15;

    /**
     * A value in words.
     *
     * @param unit its unit as results have it: SI, deg or 1
     * @param size a value of the greatest size to be read beside it, which decides between N and kN
     */
    static ShownValue of(double value, String unit, double size) {
        return switch (unit) {
            case "N", "N m", "W" ->
                Math.abs(size) >= KILO
                        ? new ShownValue(digits(value / KILO), "k" + unit)
                        : new ShownValue(digits(value), unit);
            case "Pa" ->
                Math.abs(size) >= MEGA
                        ? new ShownValue(digits(value / MEGA), "MPa")
                        : new ShownValue(digits(value / KILO), "kPa");
            case "K" -> new ShownValue(digits(value - CELSIUS_ZERO), "degC");
            case "1" -> new ShownValue(digits(value), "");
            default -> new ShownValue(digits(value), unit);
        };
    }

    /** An angle in rad as degrees to a tenth. */
    static String degrees(double angle) {
        return BigDecimal.valueOf(Math.toDegrees(angle)).setScale(1, RoundingMode.HALF_EVEN) + " deg";
    }

    /** A margin as a percentage with its sign; the more digits the nearer it comes to nothing. */
    static String percent(double share) {
        double hundredths = 100 * share;
        if (Math.abs(hundredths) > 9999) {
            return (share > 0 ? "> +" : "< -") + "9999 %";
        }
        BigDecimal exact = BigDecimal.valueOf(hundredths);
        BigDecimal tenths = exact.setScale(1, RoundingMode.HALF_EVEN);
        boolean lost = tenths.signum() == 0 && exact.signum() != 0;
        BigDecimal shown = lost ? exact.round(new MathContext(1, RoundingMode.HALF_EVEN)) : tenths;
        return (shown.signum() > 0 ? "+" : "") + shown + " %";
    }

    private static String digits(double value) {
        BigDecimal rounded = BigDecimal.valueOf(value).round(FOUR_DIGITS);
        if (rounded.signum() == 0) {
            return "0";
        }
        boolean plain = Math.abs(value) >= 1e-4 && Math.abs(value) < 1e7;
        return plain ? rounded.stripTrailingZeros().toPlainString() : rounded.toString();
    }
}
