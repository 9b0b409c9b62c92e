package throwbench.solver.document.json;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonProcessingException;
import java.util.List;

/** The parser's complaints in this program's words; its own speak of its options. */
final class Complaint {

    /**
     * One kind of complaint.
     *
     * @param sign what the parser's message holds
     * @param found empty for the character at the place
     */
    private record Kind(String sign, String found, String wanted) {}

    private static final String WORD = "a word without quotes";
    private static final String VALUE = "a text in double quotes, a number, true or false";

    private static final List<Kind> KINDS = List.of(
            new Kind("nesting depth", "objects and lists nested too deep", "at most " + JsonText.DEEPEST + " levels"),
            new Kind("String value length", "too long a text", "at most " + JsonText.LONGEST_TEXT + " characters"),
            new Kind("Number value length", "too long a number", "at most " + JsonText.LONGEST_NUMBER + " characters"),
            new Kind("Name length", "too long a key", "at most " + JsonText.LONGEST_NAME + " characters"),
            new Kind("surrogate", "half a character", "whole Unicode characters"),
            new Kind("comment", "a comment", "JSON, which has none"),
            new Kind("end-of-input", "the end of the text", "closing quotes and brackets first"),
            new Kind("close marker", "", "the bracket that closes what was opened last"),
            new Kind("double-quote to start field name", "", "a key in double quotes"),
            new Kind("expecting a colon", "", "a colon behind the key"),
            new Kind("expecting comma", "", "a comma or a closing bracket"),
            new Kind("unquoted character", "a line break or control character in a text", "\\n, \\t or the like"),
            new Kind("escape", "an escape that JSON does not know", "\\n, \\\", \\\\, \\u00e9 or the like"),
            new Kind("recognized token", WORD, VALUE),
            new Kind("standard token", WORD, VALUE),
            new Kind("umeric value", "a number that JSON does not know", "a number as 12.5, -3 or 1e6"),
            new Kind("", "", VALUE));

    private Complaint() {}

    static Flaw flaw(String text, JsonProcessingException broken) {
        JsonLocation location = broken.getLocation();
        boolean placed = location != null && location.getCharOffset() >= 0;
        int offset = placed ? (int) Math.min(location.getCharOffset(), text.length()) : text.length();
        String message = broken.getOriginalMessage();
        for (Kind kind : KINDS) {
            if (message.contains(kind.sign)) {
                String found = kind.found.isEmpty() ? character(text, offset) : kind.found;
                return new Flaw(offset, Flaw.place(text, offset), found, kind.wanted);
            }
        }
        throw new IllegalStateException("the last kind fits all", broken);
    }

    private static String character(String text, int offset) {
        return offset < text.length() ? "'" + text.charAt(offset) + "'" : "the end of the text";
    }
}
