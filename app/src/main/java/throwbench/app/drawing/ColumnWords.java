package throwbench.app.drawing;

import throwbench.solver.revolution.Column;

/** Names of the columns in words, and the colour of what each means. */
public final class ColumnWords {

    private ColumnWords() {}

    /** The name of a column in words, without its unit. */
    public static String title(Column column) {
        return switch (column) {
            case CRANK_ANGLE -> "crank angle";
            case TRAVEL -> "piston travel";
            case VELOCITY -> "piston speed";
            case ACCELERATION -> "piston acceleration";
            case ROD_ANGLE -> "rod angle";
            case ROD_VELOCITY -> "rod angular velocity";
            case ROD_ACCELERATION -> "rod angular acceleration";
            case GAS_LOAD -> "gas load";
            case INERTIA_LOAD -> "inertia load";
            case ROD_LOAD -> "rod load";
            case PISTON_ROD_LOAD -> "piston rod load";
            case GUIDE_FORCE -> "guide force";
            case CROSSHEAD_PIN_X -> "crosshead pin x";
            case CROSSHEAD_PIN_Y -> "crosshead pin y";
            case CRANK_PIN_X -> "crank pin x";
            case CRANK_PIN_Y -> "crank pin y";
            case MAIN_BEARING_X -> "main bearing x";
            case MAIN_BEARING_Y -> "main bearing y";
            case THROW_TORQUE -> "throw torque";
            case SHAFT_TORQUE -> "shaft torque";
            case SHAFT_SPEED -> "shaft speed";
            case SHAKING_FORCE_X -> "shaking force x";
            case SHAKING_FORCE_Y -> "shaking force y";
            case SHAKING_COUPLE_X -> "shaking couple x";
            case SHAKING_COUPLE_Y -> "shaking couple y";
        };
    }

    static int colour(Column column, Palette.Loads loads) {
        return switch (column) {
            case CRANK_ANGLE, TRAVEL, VELOCITY, ACCELERATION, ROD_ANGLE, ROD_VELOCITY, ROD_ACCELERATION, SHAFT_SPEED ->
                loads.motion();
            case GAS_LOAD -> loads.gas();
            case INERTIA_LOAD, SHAKING_FORCE_X, SHAKING_FORCE_Y, SHAKING_COUPLE_X, SHAKING_COUPLE_Y -> loads.inertia();
            case ROD_LOAD, PISTON_ROD_LOAD -> loads.rod();
            case GUIDE_FORCE -> loads.guide();
            case CROSSHEAD_PIN_X, CROSSHEAD_PIN_Y, CRANK_PIN_X, CRANK_PIN_Y, MAIN_BEARING_X, MAIN_BEARING_Y ->
                loads.pin();
            case THROW_TORQUE, SHAFT_TORQUE -> loads.torque();
        };
    }
}
