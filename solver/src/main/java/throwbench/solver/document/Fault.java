package throwbench.solver.document;

/**
 * One thing that is wrong in a machine file.
 *
 * @param path key path of the place, or "line 3, column 14"; empty for the file as a whole
 * @param found what stands there
 * @param wanted what should
 */
public record Fault(String path, String found, String wanted) {

    /** One line: {@code path: found, wanted …}. */
    public String line() {
        return (path.isEmpty() ? "" : path + ": ") + found + ", wanted " + wanted;
    }
}
