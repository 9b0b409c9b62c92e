package throwbench.app.command;

/** Every option that some command takes; each stands before its value, or is joined to it by an equals sign. */
enum Option {
    DUTY("--duty", "NAME"),
    THROW("--throw", "NAME"),
    STATIONS("--stations", "N"),
    FORMAT("--format", "FORMAT"),
    OUT("--out", "FILE");

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
