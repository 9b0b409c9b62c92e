package throwbench.solver.finding;

/** The outcome of a judgement. */
public enum Verdict {
    MET("met"),
    NOT_MET("not-met"),
    NOT_JUDGED("not-judged");

    private final String text;

    Verdict(String text) {
        this.text = text;
    }

    /** The word written. */
    public String text() {
        return text;
    }
}
