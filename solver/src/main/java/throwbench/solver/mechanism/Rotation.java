package throwbench.solver.mechanism;

/** The sense in which the shaft turns, seen along machine Z. It changes no axis and no angle's meaning. */
public enum Rotation {
    COUNTER_CLOCKWISE("counter-clockwise", 1),
    CLOCKWISE("clockwise", -1);

    private final String text;
    private final int sign;

    Rotation(String text, int sign) {
        this.text = text;
        this.sign = sign;
    }

    /** The word of the machine file. */
    public String text() {
        return text;
    }

    /** σ: +1 counter-clockwise, −1 clockwise. */
    public int sign() {
        return sign;
    }
}
