package throwbench.app.command;

/** What the process returns. */
public enum ExitCode {
    /** The job is done; of {@code check}, every judged finding is met. */
    DONE,
    /** {@code check} is done and some finding is not met. */
    NOT_MET,
    /** The command or its input was wrong. */
    REFUSED,
    /** The program failed. */
    FAILED;

    /** The number of the process's exit status. */
    public int number() {
        return ordinal();
    }
}
