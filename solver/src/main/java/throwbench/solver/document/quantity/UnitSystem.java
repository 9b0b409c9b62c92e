package throwbench.solver.document.quantity;

/** The two sets of units in which values are shown. */
public enum UnitSystem {
    SI,
    US;

    /** The unit in which a dimension is shown. */
    public Unit unit(Dimension dimension) {
        return this == SI ? si(dimension) : us(dimension);
    }

    /** The other one. */
    public UnitSystem other() {
        return this == SI ? US : SI;
    }

    /**
     * A value with its unit, as the SI writes it: "59.5 psi g", "2.4 kN·m", "32 °C".
     *
     * @param si value, SI; Pa absolute where the mark is a or g
     * @param ambientPressure of the site, Pa absolute
     * @param digits significant digits
     */
    public String show(double si, Dimension dimension, PressureMark mark, double ambientPressure, int digits) {
        Unit unit = unit(dimension);
        String number = NumberText.write(unit.fromSi(si - mark.zero(ambientPressure)), digits);
        return unit == Unit.ONE ? number : number + ' ' + mark.behind(unit.display());
    }

    private static Unit si(Dimension dimension) {
        return switch (dimension) {
            case LENGTH -> Unit.MILLIMETRE;
            case AREA -> Unit.SQUARE_CENTIMETRE;
            case VOLUME -> Unit.LITRE;
            case ROTATION_SPEED -> Unit.REVOLUTION_PER_MINUTE;
            case ANGLE -> Unit.DEGREE;
            case GAS_PRESSURE, PRESSURE_DIFFERENCE -> Unit.BAR;
            case STRESS -> Unit.MEGAPASCAL;
            case FORCE -> Unit.KILONEWTON;
            case TORQUE -> Unit.KILONEWTON_METRE;
            case TEMPERATURE -> Unit.DEGREE_CELSIUS;
            case MOLAR_MASS -> Unit.GRAM_PER_MOLE;
            case VOLUME_FLOW -> Unit.CUBIC_METRE_PER_HOUR;
            case POWER -> Unit.KILOWATT;
            case SHARE -> Unit.PERCENT;
            default -> dimension.coherentUnit();
        };
    }

    private static Unit us(Dimension dimension) {
        return switch (dimension) {
            case LENGTH -> Unit.INCH;
            case HEAD -> Unit.FOOT;
            case AREA -> Unit.SQUARE_INCH;
            case VOLUME -> Unit.CUBIC_INCH;
            case MASS -> Unit.POUND;
            case STATIC_MOMENT -> Unit.POUND_INCH;
            case INERTIA -> Unit.POUND_SQUARE_FOOT;
            case GAS_PRESSURE, PRESSURE_DIFFERENCE, STRESS -> Unit.POUND_PER_SQUARE_INCH;
            case FORCE -> Unit.POUND_FORCE;
            case TORQUE -> Unit.POUND_FORCE_FOOT;
            case TEMPERATURE -> Unit.DEGREE_FAHRENHEIT;
            case DENSITY -> Unit.POUND_PER_CUBIC_FOOT;
            case SPEED -> Unit.FOOT_PER_MINUTE;
            case MASS_FLOW -> Unit.POUND_PER_HOUR;
            case VOLUME_FLOW -> Unit.CUBIC_FOOT_PER_MINUTE;
            case POWER -> Unit.HORSEPOWER;
            default -> si(dimension);
        };
    }
}
