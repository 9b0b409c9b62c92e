package throwbench.solver.chamber;

/**
 * A valve opens or shuts.
 *
 * @param crankAngle φ of the chamber's own throw, rad, in [0, 2π)
 */
public record ValveEvent(Valve valve, boolean opens, double crankAngle) {

    /** Which of a chamber's valves. */
    public enum Valve {
        SUCTION("suction"),
        DISCHARGE("discharge");

        private final String text;

        Valve(String text) {
            this.text = text;
        }

        /** The word shown and written. */
        public String text() {
            return text;
        }
    }
}
