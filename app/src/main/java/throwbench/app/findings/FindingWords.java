package throwbench.app.findings;

import java.util.Locale;
import java.util.OptionalDouble;
import java.util.Set;
import throwbench.app.drawing.Readout;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.PressureMark;
import throwbench.solver.document.quantity.UnitSystem;
import throwbench.solver.finding.Finding;
import throwbench.solver.finding.Verdict;

/** Value, limit, margin and verdict of a finding in words. */
public final class FindingWords {

    /** Fractions that people read as percentages; other numbers without a unit are read as they are. */
    private static final Set<String> SHARES =
            Set.of("reversal-ratio", "speed-fluctuation", "flow-variation", "stage-flow-mismatch");

    private static final String NOTHING = "\u2013";

    private final UnitSystem units;

    public FindingWords(UnitSystem units) {
        this.units = units;
    }

    /** "met", "not met", "not judged". */
    public static String verdict(Verdict verdict) {
        return verdict.text().replace('-', ' ');
    }

    /** The value with its unit to three figures; a dash where there is none. */
    public String value(Finding finding) {
        OptionalDouble value = finding.value();
        if (value.isEmpty()) {
            return NOTHING;
        }
        // a zero is written as its limit would be: 0 kN of 120 kN, not 0.0 N
        double peak =
                value.getAsDouble() != 0 ? value.getAsDouble() : finding.limit().orElse(0);
        return quantity(finding, value.getAsDouble(), peak);
    }

    /** "least 15°", "most 120 kN"; empty without a limit. */
    public String limit(Finding finding) {
        if (finding.limit().isEmpty()) {
            return "";
        }
        return (finding.criterion().limitIsGreatest() ? "most " : "least ")
                + given(finding, finding.limit().getAsDouble());
    }

    /** "margin +405 %"; with a limit of 0 the difference itself, "margin +1.20 m"; empty where not judged. */
    public String margin(Finding finding) {
        if (finding.margin().isEmpty()) {
            return "";
        }
        double margin = finding.margin().getAsDouble();
        String sign = margin > 0 ? "+" : "";
        boolean difference = finding.limit().isPresent() && finding.limit().getAsDouble() == 0;
        if (difference) {
            return "margin " + sign + quantity(finding, margin, margin);
        }
        double percent = 100 * margin;
        return "margin " + sign + Readout.fixed(percent, Math.abs(percent) < 9.95 ? 1 : 0) + " %";
    }

    /** Limit and margin in one line, "least 15° · margin +405 %"; why it is not judged where it is not. */
    public String held(Finding finding) {
        String limit = limit(finding);
        String margin = margin(finding);
        if (margin.isEmpty()) {
            String note = finding.note();
            return note.isEmpty()
                    ? limit
                    : note.substring(note.lastIndexOf(';') + 1).strip();
        }
        return limit + " · " + margin;
    }

    private String quantity(Finding finding, double value, double peak) {
        Dimension dimension = dimension(finding);
        if (dimension == Dimension.ANGLE) {
            return Readout.angle().text(Math.toRadians(value));
        }
        Readout readout = Readout.of(units, dimension, peak);
        return readout.unit().isEmpty() ? readout.number(value) : readout.text(value);
    }

    /** A limit as people give it: no more figures than it has. */
    private String given(Finding finding, double limit) {
        Dimension dimension = dimension(finding);
        if (dimension == Dimension.ANGLE) {
            return UnitSystem.SI.show(limit, Dimension.NUMBER, PressureMark.NONE, 0, 4) + "°";
        }
        return units.show(limit, dimension, PressureMark.NONE, 0, 4)
                .replace("-", Readout.fixed(-1, 0).substring(0, 1));
    }

    private static Dimension dimension(Finding finding) {
        String unit = finding.criterion().unit();
        return switch (unit) {
            case "N" -> Dimension.FORCE;
            case "N m" -> Dimension.TORQUE;
            case "Pa" -> Dimension.STRESS;
            case "K" -> Dimension.TEMPERATURE;
            case "deg" -> Dimension.ANGLE;
            case "m" -> Dimension.HEAD;
            case "m/s" -> Dimension.SPEED;
            case "kg/s" -> Dimension.MASS_FLOW;
            case "W" -> Dimension.POWER;
            case "1" -> SHARES.contains(finding.criterion().id()) ? Dimension.SHARE : Dimension.NUMBER;
            default ->
                throw new IllegalArgumentException(String.format(
                        Locale.ROOT,
                        "%s has the unit \"%s\"",
                        finding.criterion().id(),
                        unit));
        };
    }
}
