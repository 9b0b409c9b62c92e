package throwbench.solver.published;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** A number with its unit as a source prints it. Kept apart from the machine file's units, so that neither checks itself. */
record PrintedQuantity(double number, String unit) {

    private static final Pattern QUANTITY =
            Pattern.compile("(-?[0-9.]+)(?:/([0-9.]+))?(?: ?([A-Za-z%][A-Za-z0-9/]*))?");

    private static final double INCH = 0.0254;
    private static final double POUND = 0.45359237;
    private static final double POUND_FORCE = POUND * 9.80665;

    /** SI values of one of each unit; exact by definition (inch, pound, standard gravity). */
    private static final Map<String, Double> SI = Map.ofEntries(
            Map.entry("", 1.0),
            Map.entry("-", 1.0),
            Map.entry("length", 1.0),
            Map.entry("length/s", 1.0),
            Map.entry("m", 1.0),
            Map.entry("mm", 1e-3),
            Map.entry("in", INCH),
            Map.entry("ft", 12 * INCH),
            Map.entry("cm3", 1e-6),
            Map.entry("m3", 1.0),
            Map.entry("m3/s", 1.0),
            Map.entry("m3/min", 1.0 / 60),
            Map.entry("s", 1.0),
            Map.entry("swings", 1.0),
            Map.entry("deg", Math.PI / 180),
            Map.entry("rpm", Math.PI / 30),
            Map.entry("rad/s", 1.0),
            Map.entry("rad/s2", 1.0),
            Map.entry("m/s", 1.0),
            Map.entry("m/s2", 1.0),
            Map.entry("ft/s", 12 * INCH),
            Map.entry("ft/s2", 12 * INCH),
            Map.entry("ft/min", 12 * INCH / 60),
            Map.entry("kg", 1.0),
            Map.entry("kg m2", 1.0),
            Map.entry("J", 1.0),
            Map.entry("kJ", 1e3),
            Map.entry("lb", POUND),
            Map.entry("N", 1.0),
            Map.entry("kN", 1e3),
            Map.entry("lbf", POUND_FORCE),
            Map.entry("N m", 1.0),
            Map.entry("kN m", 1e3),
            Map.entry("lbf ft", POUND_FORCE * 12 * INCH),
            Map.entry("kPa", 1e3),
            Map.entry("MPa", 1e6),
            Map.entry("bar", 1e5),
            Map.entry("psi", POUND_FORCE / (INCH * INCH)),
            Map.entry("K", 1.0),
            Map.entry("kg/s", 1.0),
            Map.entry("kg/min", 1.0 / 60),
            Map.entry("kW", 1e3),
            Map.entry("J/kg", 1.0),
            Map.entry("J/mol", 1.0),
            Map.entry("kJ/kg", 1e3),
            Map.entry("%", 0.01),
            Map.entry("per", 1.0),
            Map.entry("rev/s", 2 * Math.PI));

    /** Every number of a text, with the unit behind it. */
    static List<PrintedQuantity> allIn(String text) {
        List<PrintedQuantity> found = new ArrayList<>();
        Matcher matcher = QUANTITY.matcher(text);
        while (matcher.find()) {
            double over = matcher.group(2) == null ? 1 : Double.parseDouble(matcher.group(2));
            String unit = matcher.group(3) == null ? "" : matcher.group(3);
            found.add(new PrintedQuantity(Double.parseDouble(matcher.group(1)) / over, unit));
        }
        return found;
    }

    double si() {
        return number * factor(unit);
    }

    /** SI value of one of a unit. */
    static double factor(String unit) {
        Double factor = SI.get(unit);
        if (factor == null) {
            throw new IllegalArgumentException("no factor for \"" + unit + "\"");
        }
        return factor;
    }

    /** An SI value as a source prints it. */
    static double printed(double si, String unit) {
        return unit.equals("degC") ? si - 273.15 : si / factor(unit);
    }
}
