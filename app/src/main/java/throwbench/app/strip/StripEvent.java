package throwbench.app.strip;

/**
 * Something that happens at a crank angle of the shown throw.
 *
 * @param angle φ, rad, in [0, 2π)
 * @param name with its value, as "most tension 47.4 kN"
 * @param shortName where the name finds no room
 * @param chamber index of the chamber whose valve moves, -1 for anything else
 */
public record StripEvent(double angle, Kind kind, String name, String shortName, int chamber) {

    /** What happens; the first ones are named first where names find no room. */
    public enum Kind {
        SIGN_CHANGE,
        PEAK,
        BOOKMARK,
        DEAD_CENTRE,
        VALVE_OPENS,
        VALVE_SHUTS;

        /** Whether a valve moves. */
        public boolean ofValve() {
            return this == VALVE_OPENS || this == VALVE_SHUTS;
        }
    }
}
