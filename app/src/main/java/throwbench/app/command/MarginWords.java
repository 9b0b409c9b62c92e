package throwbench.app.command;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import throwbench.solver.finding.Finding;

/**
 * Margins of one finding for people: shares of the limit in percent, or, against a limit of 0, differences in the finding's
 * unit.
 */
record MarginWords(Finding finding) {

    private static final MathContext THREE_DIGITS = new MathContext(3, RoundingMode.HALF_EVEN);

    /** Below it lies rounding, and nothing that an input does. */
    static final double NOTHING = 1e-9;

    private boolean difference() {
        return finding.limit().orElse(1) == 0;
    }

    /** A margin with its sign. */
    String margin(double margin) {
        return difference() ? inUnit(margin) : ShownValue.percent(margin);
    }

    /** A change of the margin with its sign, to three digits. */
    String change(double change) {
        if (Math.abs(change) < NOTHING) {
            return "0";
        }
        if (difference()) {
            return inUnit(change);
        }
        BigDecimal percent = BigDecimal.valueOf(100 * change).round(THREE_DIGITS);
        String plain = Math.abs(change) < 1e6 ? percent.toPlainString() : percent.toString();
        return (percent.signum() > 0 ? "+" : "") + plain + " %";
    }

    private String inUnit(double difference) {
        // a difference of temperatures has no zero to count from
        String unit = finding.criterion().unit();
        ShownValue shown = unit.equals("K")
                ? new ShownValue(
                        BigDecimal.valueOf(difference).round(THREE_DIGITS).toPlainString(), "K")
                : ShownValue.of(difference, unit, difference);
        return (difference > 0 ? "+" : "") + (shown.number() + " " + shown.unit()).strip();
    }
}
