package throwbench.solver.revolution;

/**
 * A reason why a valid machine cannot be solved.
 *
 * @param path key path of the place in the machine file
 */
public record Refusal(String path, String sentence) {}
