package throwbench.app.command;

import java.util.ArrayList;
import java.util.List;

/** Lays text out in a page of fixed width, counted in characters. */
final class TextColumns {

    /** Width of the page. */
    static final int PAGE = 100;

    private static final String CUT = "...";

    private TextColumns() {}

    static int width(String text) {
        return text.codePointCount(0, text.length());
    }

    /** The text with blanks behind it. */
    static String left(String text, int width) {
        return text + " ".repeat(Math.max(0, width - width(text)));
    }

    /** The text with blanks before it. */
    static String right(String text, int width) {
        return " ".repeat(Math.max(0, width - width(text))) + text;
    }

    /** The text, its middle left out where it is longer than the width; line breaks become blanks. */
    static String cut(String text, int width) {
        int[] letters =
                text.codePoints().map(c -> Character.isISOControl(c) ? ' ' : c).toArray();
        if (letters.length <= width) {
            return new String(letters, 0, letters.length);
        }
        int end = Math.max(0, (width - CUT.length()) / 2);
        int start = Math.max(0, width - CUT.length() - end);
        return new String(letters, 0, start) + CUT + new String(letters, letters.length - end, end);
    }

    /** The text in lines that fit the page behind an indent, broken at blanks, and inside a word where none is left. */
    static List<String> wrap(String text, int indent) {
        int room = PAGE - indent;
        List<String> lines = new ArrayList<>();
        StringBuilder line = new StringBuilder();
        for (String word : text.split(" ", -1)) {
            String rest = word;
            if (line.length() > 0 && width(line.toString()) + 1 + width(rest) > room) {
                lines.add(" ".repeat(indent) + line);
                line.setLength(0);
            }
            while (width(rest) > room) {
                int end = rest.offsetByCodePoints(0, room);
                lines.add(" ".repeat(indent) + rest.substring(0, end));
                rest = rest.substring(end);
            }
            line.append(line.length() > 0 ? " " : "").append(rest);
        }
        lines.add(" ".repeat(indent) + line);
        return lines;
    }
}
