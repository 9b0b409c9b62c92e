package throwbench.app.strip;

import java.util.ArrayList;
import java.util.List;
import throwbench.solver.revolution.Column;

/** Traces that share one scale, zero line and unit. */
public record Lane(Kind kind, List<StripTrace> traces) {

    /** What lanes there are, from top to bottom. */
    public enum Kind {
        LOADS("loads", 2.4),
        FORCES("forces", 1.5),
        PRESSURE("pressure", 1.4),
        TORQUE("torque", 1),
        COUPLE("couples", 1),
        SPEED("speed", 0.9),
        TRAVEL("travel", 0.9),
        ACCELERATION("acceleration", 0.9),
        ROD_ANGLE("rod angle", 0.9),
        ANGULAR_VELOCITY("turning", 0.9),
        ANGULAR_ACCELERATION("angular acc.", 0.9);

        private final String title;
        private final double weight;

        Kind(String title, double weight) {
            this.title = title;
            this.weight = weight;
        }

        public String title() {
            return title;
        }

        /** Whether zero must be on the scale: not for absolute pressures and what hardly leaves its mean. */
        boolean showsZero() {
            return this != PRESSURE && this != ANGULAR_VELOCITY;
        }

        /** The lane of a column; the crank angle has none: it is the axis. */
        public static Kind of(Column column) {
            return switch (column) {
                case CRANK_ANGLE -> throw new IllegalArgumentException("the crank angle is the strip's axis, no trace");
                case GAS_LOAD, INERTIA_LOAD, ROD_LOAD, PISTON_ROD_LOAD -> LOADS;
                case GUIDE_FORCE,
                        CROSSHEAD_PIN_X,
                        CROSSHEAD_PIN_Y,
                        CRANK_PIN_X,
                        CRANK_PIN_Y,
                        MAIN_BEARING_X,
                        MAIN_BEARING_Y,
                        SHAKING_FORCE_X,
                        SHAKING_FORCE_Y -> FORCES;
                case THROW_TORQUE, SHAFT_TORQUE -> TORQUE;
                case SHAKING_COUPLE_X, SHAKING_COUPLE_Y -> COUPLE;
                case VELOCITY -> SPEED;
                case TRAVEL -> TRAVEL;
                case ACCELERATION -> ACCELERATION;
                case ROD_ANGLE -> ROD_ANGLE;
                case ROD_VELOCITY, SHAFT_SPEED -> ANGULAR_VELOCITY;
                case ROD_ACCELERATION -> ANGULAR_ACCELERATION;
            };
        }
    }

    public Lane {
        traces = List.copyOf(traces);
    }

    /** Its share of the height: more traces need more room. */
    double weight() {
        return kind.weight * (1 + 0.12 * Math.max(0, traces.size() - 3));
    }

    Lane with(StripTrace trace) {
        List<StripTrace> more = new ArrayList<>(traces);
        more.add(trace);
        return new Lane(kind, more);
    }
}
