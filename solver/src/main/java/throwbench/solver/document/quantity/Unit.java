package throwbench.solver.document.quantity;

import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;

/**
 * Every unit of the machine file. Factors are exact where the unit is defined exactly: international yard and pound
 * (1959), standard acceleration of free fall 9.80665 m/s² in the pound-force, the US liquid gallon of 231 in³, and the
 * mechanical horsepower of 550 ft·lbf/s (NIST SP 811, 2008, appendix B).
 */
public enum Unit {
    METRE(Dimension.LENGTH, "m", 1, 1),
    MILLIMETRE(Dimension.LENGTH, "mm", 1, 1e3),
    CENTIMETRE(Dimension.LENGTH, "cm", 1, 1e2),
    MICROMETRE(Dimension.LENGTH, "µm", 1, 1e6),
    INCH(Dimension.LENGTH, "in", 0.0254, 1),
    FOOT(Dimension.LENGTH, "ft", 0.3048, 1),
    SQUARE_METRE(Dimension.AREA, "m2", 1, 1),
    SQUARE_CENTIMETRE(Dimension.AREA, "cm2", 1, 1e4),
    SQUARE_MILLIMETRE(Dimension.AREA, "mm2", 1, 1e6),
    SQUARE_INCH(Dimension.AREA, "in2", 0.00064516, 1),
    CUBIC_METRE(Dimension.VOLUME, "m3", 1, 1),
    LITRE(Dimension.VOLUME, "L", 1, 1e3),
    CUBIC_CENTIMETRE(Dimension.VOLUME, "cm3", 1, 1e6),
    CUBIC_MILLIMETRE(Dimension.VOLUME, "mm3", 1, 1e9),
    CUBIC_INCH(Dimension.VOLUME, "in3", 0.000016387064, 1),
    KILOGRAM(Dimension.MASS, "kg", 1, 1),
    GRAM(Dimension.MASS, "g", 1, 1e3),
    TONNE(Dimension.MASS, "t", 1e3, 1),
    POUND(Dimension.MASS, "lb", 0.45359237, 1),
    KILOGRAM_METRE(Dimension.STATIC_MOMENT, "kg m", 1, 1),
    KILOGRAM_MILLIMETRE(Dimension.STATIC_MOMENT, "kg mm", 1, 1e3),
    GRAM_MILLIMETRE(Dimension.STATIC_MOMENT, "g mm", 1, 1e6),
    POUND_INCH(Dimension.STATIC_MOMENT, "lb in", 0.011521246198, 1),
    KILOGRAM_SQUARE_METRE(Dimension.INERTIA, "kg m2", 1, 1),
    POUND_SQUARE_FOOT(Dimension.INERTIA, "lb ft2", 0.0421401100938048, 1),
    REVOLUTION_PER_MINUTE(Dimension.ROTATION_SPEED, "rpm", Math.PI, 30),
    RADIAN_PER_SECOND(Dimension.ROTATION_SPEED, "rad/s", 1, 1),
    HERTZ(Dimension.ROTATION_SPEED, "Hz", 2 * Math.PI, 1),
    DEGREE(Dimension.ANGLE, "deg", Math.PI, 180),
    RADIAN(Dimension.ANGLE, "rad", 1, 1),
    PASCAL(Dimension.STRESS, "Pa", 1, 1),
    KILOPASCAL(Dimension.STRESS, "kPa", 1e3, 1),
    MEGAPASCAL(Dimension.STRESS, "MPa", 1e6, 1),
    GIGAPASCAL(Dimension.STRESS, "GPa", 1e9, 1),
    BAR(Dimension.STRESS, "bar", 1e5, 1),
    MILLIBAR(Dimension.STRESS, "mbar", 1e2, 1),
    POUND_PER_SQUARE_INCH(Dimension.STRESS, "psi", 4.4482216152605, 0.00064516),
    NEWTON(Dimension.FORCE, "N", 1, 1),
    KILONEWTON(Dimension.FORCE, "kN", 1e3, 1),
    MEGANEWTON(Dimension.FORCE, "MN", 1e6, 1),
    POUND_FORCE(Dimension.FORCE, "lbf", 4.4482216152605, 1),
    NEWTON_METRE(Dimension.TORQUE, "N m", 1, 1),
    KILONEWTON_METRE(Dimension.TORQUE, "kN m", 1e3, 1),
    POUND_FORCE_FOOT(Dimension.TORQUE, "lbf ft", 4.4482216152605 * 0.3048, 1),
    KELVIN(Dimension.TEMPERATURE, "K", 1, 1),
    DEGREE_CELSIUS(Dimension.TEMPERATURE, "degC", 1, 1, 273.15),
    DEGREE_FAHRENHEIT(Dimension.TEMPERATURE, "degF", 5, 9, 459.67),
    KILOGRAM_PER_MOLE(Dimension.MOLAR_MASS, "kg/mol", 1, 1),
    GRAM_PER_MOLE(Dimension.MOLAR_MASS, "g/mol", 1, 1e3),
    KILOGRAM_PER_KILOMOLE(Dimension.MOLAR_MASS, "kg/kmol", 1, 1e3),
    KILOGRAM_PER_CUBIC_METRE(Dimension.DENSITY, "kg/m3", 1, 1),
    POUND_PER_CUBIC_FOOT(Dimension.DENSITY, "lb/ft3", 0.45359237, 0.028316846592),
    SECOND(Dimension.TIME, "s", 1, 1),
    MINUTE(Dimension.TIME, "min", 60, 1),
    HOUR(Dimension.TIME, "h", 3600, 1),
    METRE_PER_SECOND(Dimension.SPEED, "m/s", 1, 1),
    FOOT_PER_MINUTE(Dimension.SPEED, "ft/min", 0.3048, 60),
    KILOGRAM_PER_SECOND(Dimension.MASS_FLOW, "kg/s", 1, 1),
    KILOGRAM_PER_HOUR(Dimension.MASS_FLOW, "kg/h", 1, 3600),
    POUND_PER_HOUR(Dimension.MASS_FLOW, "lb/h", 0.45359237, 3600),
    CUBIC_METRE_PER_SECOND(Dimension.VOLUME_FLOW, "m3/s", 1, 1),
    CUBIC_METRE_PER_HOUR(Dimension.VOLUME_FLOW, "m3/h", 1, 3600),
    LITRE_PER_MINUTE(Dimension.VOLUME_FLOW, "L/min", 1, 60e3),
    CUBIC_FOOT_PER_MINUTE(Dimension.VOLUME_FLOW, "ft3/min", 0.028316846592, 60),
    GALLON_PER_MINUTE(Dimension.VOLUME_FLOW, "gal/min", 0.003785411784, 60),
    WATT(Dimension.POWER, "W", 1, 1),
    KILOWATT(Dimension.POWER, "kW", 1e3, 1),
    MEGAWATT(Dimension.POWER, "MW", 1e6, 1),
    HORSEPOWER(Dimension.POWER, "hp", 745.6998715822702, 1),
    ONE(Dimension.NUMBER, "", 1, 1),
    PERCENT(Dimension.NUMBER, "%", 1, 100);

    private static final Map<Dimension, List<Unit>> MEASURING = new EnumMap<>(Dimension.class);

    static {
        for (Dimension dimension : Dimension.values()) {
            MEASURING.put(
                    dimension, Arrays.stream(values()).filter(dimension::holds).toList());
        }
    }

    private final Dimension dimension;
    private final String symbol;
    private final String display;
    private final double factor;
    private final double divisor;
    private final double offset;

    Unit(Dimension dimension, String symbol, double factor, double divisor) {
        this(dimension, symbol, factor, divisor, 0);
    }

    // factor over divisor, so that 75 mm is exactly the double nearest to 0.075 m
    Unit(Dimension dimension, String symbol, double factor, double divisor, double offset) {
        this.dimension = dimension;
        this.symbol = symbol;
        this.display = displayOf(symbol);
        this.factor = factor;
        this.divisor = divisor;
        this.offset = offset;
    }

    private static String displayOf(String symbol) {
        return symbol.replace("degC", "°C")
                .replace("degF", "°F")
                .replace("deg", "°")
                .replace(' ', '·')
                .replace('2', '²')
                .replace('3', '³');
    }

    /** The dimension that lists it; {@link Dimension#holds} knows which others use it. */
    public Dimension dimension() {
        return dimension;
    }

    /** As the machine file writes it. */
    public String symbol() {
        return symbol;
    }

    /** As the SI writes it: kN·m, °C, kg·m², in². */
    public String display() {
        return display;
    }

    /** SI value of a value in this unit. */
    public double toSi(double value) {
        return (value + offset) * factor / divisor;
    }

    /** Value in this unit of an SI value. */
    public double fromSi(double si) {
        return si * divisor / factor - offset;
    }

    /** SI value of a difference in this unit: a temperature's zero point plays no part. */
    public double differenceToSi(double difference) {
        return difference * factor / divisor;
    }

    /** A difference in this unit of one in SI. */
    public double differenceFromSi(double si) {
        return si * divisor / factor;
    }

    static List<Unit> measuring(Dimension dimension) {
        return Objects.requireNonNull(MEASURING.get(dimension));
    }

    boolean isCoherent() {
        return factor == 1 && divisor == 1 && offset == 0;
    }
}
