package throwbench.solver.map;

/** Follows a long study from outside, and may end it. */
public interface Watch {

    /** Nobody watches. */
    Watch NONE = new Watch() {};

    /**
     * So many parts of the study are done. Called from the study's threads, never by two at once, with rising numbers.
     *
     * @param total of all parts
     */
    default void done(int parts, int total) {}

    /** Whether the study is no longer wanted; asked before every part, by any thread. */
    default boolean cancelled() {
        return false;
    }
}
