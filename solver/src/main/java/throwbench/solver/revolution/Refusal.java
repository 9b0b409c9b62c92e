package throwbench.solver.revolution;

/**
 * A reason why a valid machine cannot be solved.
 *
 * @param path key path of the place in the machine file
 * @param failed true when the description is in order but the solver did not get there: the program's failure
 */
public record Refusal(String path, String sentence, boolean failed) {

    /** What is asked for is not possible. */
    public Refusal(String path, String sentence) {
        this(path, sentence, false);
    }
}
