package throwbench.app.drawing;

import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.PressureMark;
import throwbench.solver.document.quantity.Unit;
import throwbench.solver.document.quantity.UnitSystem;
import throwbench.solver.revolution.Column;

/**
 * How one quantity is shown: its unit, and as many decimals as its peak needs for three figures, so that a running number
 * keeps its width and its decimal point its place. Immutable.
 */
public final class Readout {

    /** The sign for negative numbers: an en dash, longer than the hyphen; the bundled font has no U+2212. */
    private static final char MINUS = '\u2013';

    private static final double FEET = 0.3048;

    private final double scale;
    private final double zero;
    private final String unit;
    private final int decimals;

    private Readout(double scale, double zero, String unit, double peak) {
        this.scale = scale;
        this.zero = zero;
        this.unit = unit;
        double shown = Math.abs(peak * scale);
        this.decimals = shown > 0 && Double.isFinite(shown)
                ? Math.max(0, Math.min(6, 2 - (int) Math.floor(Math.log10(shown) + 1e-9)))
                : 1;
    }

    /**
     * A quantity of this dimension; pressures are shown absolute.
     *
     * @param peak the greatest magnitude that will be shown, SI
     */
    public static Readout of(UnitSystem system, Dimension dimension, double peak) {
        Unit unit = system.unit(dimension);
        boolean small = system == UnitSystem.SI && Math.abs(unit.fromSi(peak)) < 1;
        if (dimension == Dimension.FORCE && small) {
            unit = Unit.NEWTON;
        } else if (dimension == Dimension.TORQUE && small) {
            unit = Unit.NEWTON_METRE;
        }
        double zero = unit.fromSi(0);
        double scale = unit.fromSi(1) - zero;
        PressureMark mark = dimension == Dimension.GAS_PRESSURE ? PressureMark.ABSOLUTE : PressureMark.NONE;
        return new Readout(scale, zero, mark.behind(unit.display()), peak + zero / scale);
    }

    /** A quantity of a column's kind. */
    public static Readout of(UnitSystem system, Column.Kind kind, double peak) {
        boolean si = system == UnitSystem.SI;
        return switch (kind) {
            case ANGLE -> angle();
            case LENGTH -> of(system, Dimension.LENGTH, peak);
            case VELOCITY -> of(system, Dimension.SPEED, peak);
            case ACCELERATION -> new Readout(si ? 1 : 1 / FEET, 0, si ? "m/s²" : "ft/s²", peak);
            case ANGULAR_VELOCITY -> new Readout(1, 0, "rad/s", peak);
            case ANGULAR_ACCELERATION -> new Readout(1, 0, "rad/s²", peak);
            case FORCE -> of(system, Dimension.FORCE, peak);
            case TORQUE -> of(system, Dimension.TORQUE, peak);
        };
    }

    /** Angles, to a tenth of a degree whatever their peak. */
    public static Readout angle() {
        // three figures of 99.9 leave one decimal
        return new Readout(Math.toDegrees(1), 0, "°", Math.toRadians(99.9));
    }

    /** The unit as the SI writes it. */
    public String unit() {
        return unit;
    }

    /** Digits behind the point. */
    public int decimals() {
        return decimals;
    }

    /** The value in the unit shown, of an SI value. */
    public double inUnit(double si) {
        return si * scale + zero;
    }

    /** The number alone. */
    public String number(double si) {
        return fixed(inUnit(si), decimals);
    }

    /** Number and unit. */
    public String text(double si) {
        return unit.equals("°") ? number(si) + unit : number(si) + ' ' + unit;
    }

    /** A number with so many digits behind the point; a zero never has a sign. */
    public static String fixed(double value, int decimals) {
        long power = 1;
        for (int i = 0; i < decimals; i++) {
            power *= 10;
        }
        long scaled = Math.round(Math.abs(value) * power);
        StringBuilder text = new StringBuilder(12);
        if (value < 0 && scaled > 0) {
            text.append(MINUS);
        }
        text.append(scaled / power);
        if (decimals > 0) {
            text.append('.');
            long rest = scaled % power;
            for (long place = power / 10; place > 0; place /= 10) {
                text.append((char) ('0' + rest / place % 10));
            }
        }
        return text.toString();
    }
}
