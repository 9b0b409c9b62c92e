package throwbench.solver.document.json;

/**
 * What is wrong with a text as JSON.
 *
 * @param offset of its first character
 * @param path key path where the text can be followed that far, else "line 3, column 14"
 */
public record Flaw(int offset, String path, String found, String wanted) {

    /** Line and column, from 1, of a character; a line ends with LF, CR LF or CR. */
    static String place(String text, int offset) {
        int line = 1;
        int lineStart = 0;
        for (int at = 0; at < Math.min(offset, text.length()); at++) {
            char c = text.charAt(at);
            boolean beforeLineFeed = at + 1 < text.length() && text.charAt(at + 1) == '\n';
            if (c == '\n' || (c == '\r' && !beforeLineFeed)) {
                line++;
                lineStart = at + 1;
            }
        }
        return "line " + line + ", column " + (offset - lineStart + 1);
    }
}
