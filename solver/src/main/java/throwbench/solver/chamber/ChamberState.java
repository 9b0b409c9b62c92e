package throwbench.solver.chamber;

/** How a chamber works at a duty point. */
public enum ChamberState {
    WORKING("working"),
    HELD_OPEN("held-open"),
    FAILED_SUCTION("failed-suction"),
    FAILED_DISCHARGE("failed-discharge");

    private final String text;

    ChamberState(String text) {
        this.text = text;
    }

    /** The word of the machine file. */
    public String text() {
        return text;
    }
}
