package throwbench.app.command;

/** Every option that some command takes; each stands before its value, or is joined to it by an equals sign. */
enum Option {
    DUTY("--duty", "NAME"),
    THROW("--throw", "NAME"),
    STATIONS("--stations", "N"),
    FORMAT("--format", "FORMAT"),
    OUT("--out", "FILE"),
    ACROSS("--across", "KEY=FROM..TO:N"),
    UP("--up", "KEY=FROM..TO:N"),
    OF("--of", "RESULT"),
    VARY("--vary", "KEY=FROM..TO"),
    UNTIL("--until", "ID"),
    /** Of {@code sensitivity}, which asks for a finding and not for any result. */
    OF_FINDING("--of", "ID"),
    SAMPLES("--samples", "N"),
    SEED("--seed", "N");

    private final String word;
    private final String value;

    Option(String word, String value) {
        this.word = word;
        this.value = value;
    }

    /** The word with its dashes. */
    String word() {
        return word;
    }

    /** What stands for its value in help and messages. */
    String value() {
        return value;
    }
}
