package throwbench.solver.revolution;

/**
 * Every solved quantity of a throw and of the machine, in the order in which they are written. Chamber pressures stand
 * between {@link #ROD_ACCELERATION} and {@link #GAS_LOAD}, one a chamber, and are read by chamber.
 */
public enum Column {
    CRANK_ANGLE("crank_angle_deg", Kind.ANGLE),
    TRAVEL("travel_m", Kind.LENGTH),
    VELOCITY("velocity_m_s", Kind.VELOCITY),
    ACCELERATION("acceleration_m_s2", Kind.ACCELERATION),
    ROD_ANGLE("rod_angle_deg", Kind.ANGLE),
    ROD_VELOCITY("rod_velocity_rad_s", Kind.ANGULAR_VELOCITY),
    ROD_ACCELERATION("rod_acceleration_rad_s2", Kind.ANGULAR_ACCELERATION),
    GAS_LOAD("gas_load_N", Kind.FORCE),
    INERTIA_LOAD("inertia_load_N", Kind.FORCE),
    ROD_LOAD("rod_load_N", Kind.FORCE),
    PISTON_ROD_LOAD("piston_rod_load_N", Kind.FORCE),
    GUIDE_FORCE("guide_force_N", Kind.FORCE),
    CROSSHEAD_PIN_X("crosshead_pin_x_N", Kind.FORCE),
    CROSSHEAD_PIN_Y("crosshead_pin_y_N", Kind.FORCE),
    CRANK_PIN_X("crank_pin_x_N", Kind.FORCE),
    CRANK_PIN_Y("crank_pin_y_N", Kind.FORCE),
    MAIN_BEARING_X("main_bearing_x_N", Kind.FORCE),
    MAIN_BEARING_Y("main_bearing_y_N", Kind.FORCE),
    THROW_TORQUE("throw_torque_N_m", Kind.TORQUE),
    SHAFT_TORQUE("shaft_torque_N_m", Kind.TORQUE),
    SHAFT_SPEED("shaft_speed_rad_s", Kind.ANGULAR_VELOCITY),
    SHAKING_FORCE_X("shaking_force_x_N", Kind.FORCE),
    SHAKING_FORCE_Y("shaking_force_y_N", Kind.FORCE),
    SHAKING_COUPLE_X("shaking_couple_x_N_m", Kind.TORQUE),
    SHAKING_COUPLE_Y("shaking_couple_y_N_m", Kind.TORQUE);

    /** What kind of quantity a column holds; inside, all of them are SI. */
    public enum Kind {
        ANGLE,
        LENGTH,
        VELOCITY,
        ACCELERATION,
        ANGULAR_VELOCITY,
        ANGULAR_ACCELERATION,
        FORCE,
        TORQUE
    }

    private final String fileName;
    private final Kind kind;

    Column(String fileName, Kind kind) {
        this.fileName = fileName;
        this.kind = kind;
    }

    /** The column's name in tables; it ends in the unit. */
    public String fileName() {
        return fileName;
    }

    public Kind kind() {
        return kind;
    }

    /** A value of this column (SI, rad) as tables have it (degrees). */
    public double inFile(double value) {
        return kind == Kind.ANGLE ? Math.toDegrees(value) : value;
    }

    /** Whether the column is the whole machine's and not one throw's. */
    public boolean ofMachine() {
        return compareTo(SHAFT_TORQUE) >= 0;
    }

    /** The column's name in tables for a chamber's pressure. */
    public static String pressureName(String chamber) {
        return "pressure_Pa[" + chamber + "]";
    }
}
