package throwbench.solver.document.quantity;

import java.util.List;

/** What a quantity measures. Some share their units: they differ in how they are written or shown. */
public enum Dimension {
    LENGTH("a length", "75 mm"),
    /** Length of a pipe, or a head of liquid: shown in m or ft. */
    HEAD("a length", "6.5 m"),
    AREA("an area", "26 cm2"),
    VOLUME("a volume", "1.2 L"),
    MASS("a mass", "38 kg"),
    /** Mass times lever. */
    STATIC_MOMENT("a static moment", "2.1 kg m"),
    INERTIA("a moment of inertia", "1.35 kg m2"),
    ROTATION_SPEED("a speed of rotation", "740 rpm"),
    ANGLE("an angle", "15 deg"),
    /** Pressure in a line or chamber: always says {@code a} or {@code g}; absolute inside. */
    GAS_PRESSURE("a pressure", "4.1 bar g"),
    /** Loss or other difference: never says {@code a} or {@code g}. */
    PRESSURE_DIFFERENCE("a pressure difference", "0.2 bar"),
    /** Stress, strength, modulus or bearing pressure: never says {@code a} or {@code g}. */
    STRESS("a stress", "550 MPa"),
    FORCE("a force", "120 kN"),
    TORQUE("a torque", "2.4 kN m"),
    TEMPERATURE("a temperature", "32 degC"),
    MOLAR_MASS("a molar mass", "27.2 g/mol"),
    DENSITY("a density", "1025 kg/m3"),
    TIME("a time", "2 s"),
    SPEED("a speed", "4.2 m/s"),
    MASS_FLOW("a mass flow", "0.42 kg/s"),
    VOLUME_FLOW("a volume flow", "120 m3/h"),
    POWER("a power", "250 kW"),
    /** Dimensionless, shown in percent. */
    SHARE("a share", "14 %"),
    /** Dimensionless, shown as a number. */
    NUMBER("a number", "1.29");

    private final String said;
    private final String example;

    Dimension(String said, String example) {
        this.said = said;
        this.example = example;
    }

    /** With its article, for sentences: "a length". */
    public String said() {
        return said;
    }

    /** A value as a machine file would write it. */
    public String example() {
        return example;
    }

    /** What a reader should have found: {@code a length, as "75 mm"}. */
    public String wanted() {
        return said + ", as " + (isDimensionless() ? example : '"' + example + '"');
    }

    /** Whether its values are plain numbers or percentages. */
    public boolean isDimensionless() {
        return this == SHARE || this == NUMBER;
    }

    /** Whether a unit measures it. */
    public boolean holds(Unit unit) {
        return unit.dimension() == unitBearer();
    }

    /** Its units in the order of {@link Unit}. */
    public List<Unit> units() {
        return Unit.measuring(this);
    }

    /** The unit in which SI values count: m, Pa, K, rad/s … */
    public Unit coherentUnit() {
        for (Unit unit : units()) {
            if (unit.isCoherent()) {
                return unit;
            }
        }
        throw new IllegalStateException(this + " has no coherent unit");
    }

    private Dimension unitBearer() {
        return switch (this) {
            case HEAD -> LENGTH;
            case GAS_PRESSURE, PRESSURE_DIFFERENCE -> STRESS;
            case SHARE -> NUMBER;
            default -> this;
        };
    }
}
