package throwbench.solver.document;

/**
 * One thing that is wrong in a machine file.
 *
 * @param path key path of the place, or "line 3, column 14"; empty for the file as a whole
 * @param found what stands there
 * @param wanted what should
 */
public record Fault(String path, String found, String wanted) {

    /** One line: {@code path: found, wanted …}; control characters of the user's texts are written as escapes. */
    public String line() {
        String line = (path.isEmpty() ? "" : path + ": ") + found + ", wanted " + wanted;
        return line.chars().anyMatch(Character::isISOControl) ? escaped(line) : line;
    }

    private static String escaped(String line) {
        StringBuilder visible = new StringBuilder();
        for (int at = 0; at < line.length(); at++) {
            char c = line.charAt(at);
            if (Character.isISOControl(c)) {
                visible.append("\\u00").append(Character.forDigit(c >> 4, 16)).append(Character.forDigit(c & 15, 16));
            } else {
                visible.append(c);
            }
        }
        return visible.toString();
    }
}
