package throwbench.app.command;

/** What the process returns. */
public enum ExitCode {
    /** The job is done; of {@code check}, every judged finding is met. */
    DONE(0),
    /** {@code check} is done and some finding is not met. */
    NOT_MET(1),
    /** The command or its input was wrong. */
    REFUSED(2),
    /** The program failed. */
    FAILED(3);

    private final int number;

    ExitCode(int number) {
        this.number = number;
    }

    /** The number of the process's exit status. */
    public int number() {
        return number;
    }
}
