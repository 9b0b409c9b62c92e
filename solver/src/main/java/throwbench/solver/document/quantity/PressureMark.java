package throwbench.solver.document.quantity;

/** What stands behind a pressure's unit: from where the pressure counts. */
public enum PressureMark {
    /** Not a gas pressure: nothing stands there. */
    NONE(""),
    /** From vacuum. */
    ABSOLUTE("a"),
    /** From the site's ambient pressure. */
    GAUGE("g");

    private final String text;

    PressureMark(String text) {
        this.text = text;
    }

    /** The letter of the machine file, or nothing. */
    public String text() {
        return text;
    }

    /** A unit with this mark behind it: "bar g". */
    public String behind(String unit) {
        return this == NONE ? unit : unit + ' ' + text;
    }

    /** The pressure (Pa absolute) from which values with this mark count. */
    public double zero(double ambientPressure) {
        return this == GAUGE ? ambientPressure : 0;
    }
}
