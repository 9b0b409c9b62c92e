package throwbench.solver.document.json;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Objects;

/** Edits of a parsed text: each gives the new text, in which nothing changed but what was asked for. */
public final class TextEdit {

    private static final String USUAL_INDENT = "  ";

    private final String text;

    /** Edits of the text from which the nodes were parsed. */
    public TextEdit(String text) {
        this.text = text;
    }

    /** The text with another value in place of one. */
    public String replace(Node value, String json) {
        return splice(value.start(), value.end(), placed(json, indentAt(value.memberStart())));
    }

    /** The text with other values in place of several, each of one line; none of them lies in another. */
    public String replace(Map<Node, String> jsonByValue) {
        List<Node> values = new ArrayList<>(jsonByValue.keySet());
        values.sort(Comparator.comparingInt(Node::start));
        StringBuilder edited = new StringBuilder(text.length() + text.length() / 8);
        int kept = 0;
        for (Node value : values) {
            edited.append(text, kept, value.start()).append(jsonByValue.get(value));
            kept = value.end();
        }
        return edited.append(text, kept, text.length()).toString();
    }

    /** The text with another key before a value. */
    public String rename(Node member, String key) {
        return splice(member.memberStart(), JsonText.quoteEnd(text, member.memberStart()), quoted(key));
    }

    /** The text without a member or element, and without the comma that it needed. */
    public String remove(Node member) {
        Node nest = Objects.requireNonNull(member.parent());
        List<Node> members = nest.members();
        int place = member.place();
        if (place + 1 < members.size()) {
            return splice(member.memberStart(), members.get(place + 1).memberStart(), "");
        }
        int from = place > 0 ? members.get(place - 1).end() : nest.start() + 1;
        return splice(from, place > 0 ? member.end() : nest.end() - 1, "");
    }

    /**
     * The text with one more element of a list.
     *
     * @param place index that it will have
     * @param json the element, lines after its first indented from 0
     */
    public String insertItem(Node list, int place, String json) {
        return insert(list, place, "", json);
    }

    /** The text with one more member of an object; see {@link #insertItem}. */
    public String insertMember(Node object, int place, String key, String json) {
        return insert(object, place, quoted(key) + ": ", json);
    }

    private String insert(Node nest, int place, String before, String json) {
        List<Node> members = nest.members();
        if (members.isEmpty()) {
            return fill(nest, before, json);
        }
        String gap = gap(nest);
        String item = before + placed(json, indentIn(gap, nest));
        if (place < members.size()) {
            int at = members.get(place).memberStart();
            return splice(at, at, item + ',' + gap);
        }
        int at = members.get(members.size() - 1).end();
        return splice(at, at, ',' + gap + item);
    }

    /** The first member of an empty nest: on its own line where it has lines itself or stands at the very top. */
    private String fill(Node nest, String before, String json) {
        boolean object = nest.type() == Node.Type.OBJECT;
        if (json.indexOf('\n') < 0 && nest.parent() != null) {
            String space = object ? " " : "";
            return splice(nest.start() + 1, nest.end() - 1, space + before + json + space);
        }
        String outer = indentAt(nest.start());
        String inner = outer + indent();
        String lines = lineEnd() + inner + before + placed(json, inner) + lineEnd() + outer;
        return splice(nest.start() + 1, nest.end() - 1, lines);
    }

    /** The text with a member or element moved to another place among its neighbours. */
    public String move(Node member, int place) {
        List<Node> members = Objects.requireNonNull(member.parent()).members();
        Objects.checkIndex(place, members.size());
        StringBuilder moved = new StringBuilder(text.length());
        int kept = 0;
        for (int slot = 0; slot < members.size(); slot++) {
            Node there = members.get(slot);
            Node mover = members.get(source(slot, member.place(), place));
            moved.append(text, kept, there.memberStart()).append(text, mover.memberStart(), mover.end());
            kept = there.end();
        }
        return moved.append(text, kept, text.length()).toString();
    }

    private static int source(int slot, int from, int to) {
        if (slot == to) {
            return from;
        }
        if (from < to) {
            return slot >= from && slot < to ? slot + 1 : slot;
        }
        return slot > to && slot <= from ? slot - 1 : slot;
    }

    /** A value's own characters, its lines indented from 0, ready to be inserted elsewhere. */
    public String json(Node value) {
        String own = text.substring(value.start(), value.end()).replace("\r\n", "\n");
        return own.replace('\n' + indentAt(value.memberStart()), "\n");
    }

    /** What parts two members, without the comma: from the last two, or from what stands before an only one. */
    private String gap(Node nest) {
        List<Node> members = nest.members();
        int last = members.size() - 1;
        int start = members.get(last).memberStart();
        if (last > 0) {
            String between = text.substring(members.get(last - 1).end(), start);
            return between.substring(between.indexOf(',') + 1);
        }
        String before = text.substring(nest.start() + 1, start);
        return before.indexOf('\n') >= 0 ? before : " ";
    }

    private String indentIn(String gap, Node nest) {
        int line = gap.lastIndexOf('\n');
        return line >= 0 ? gap.substring(line + 1) : indentAt(nest.start());
    }

    /** The white space at the beginning of the line of a character. */
    private String indentAt(int offset) {
        int line = text.lastIndexOf('\n', offset - 1) + 1;
        int end = line;
        while (end < offset && (text.charAt(end) == ' ' || text.charAt(end) == '\t')) {
            end++;
        }
        return text.substring(line, end);
    }

    /** One step of indentation: that of the first indented line. */
    private String indent() {
        for (int line = text.indexOf('\n') + 1; line > 0; line = text.indexOf('\n', line) + 1) {
            int end = line;
            while (end < text.length() && (text.charAt(end) == ' ' || text.charAt(end) == '\t')) {
                end++;
            }
            if (end > line) {
                return text.substring(line, end);
            }
        }
        return USUAL_INDENT;
    }

    private String lineEnd() {
        return text.contains("\r\n") ? "\r\n" : "\n";
    }

    private String placed(String json, String indent) {
        return json.indexOf('\n') < 0 ? json : json.replace("\r\n", "\n").replace("\n", lineEnd() + indent);
    }

    private String splice(int from, int to, String between) {
        return text.substring(0, from) + between + text.substring(to);
    }

    /** A text as a JSON string literal. */
    public static String quoted(String text) {
        StringBuilder literal = new StringBuilder(text.length() + 2).append('"');
        for (int at = 0; at < text.length(); at++) {
            char c = text.charAt(at);
            switch (c) {
                case '"', '\\' -> literal.append('\\').append(c);
                case '\n' -> literal.append("\\n");
                case '\r' -> literal.append("\\r");
                case '\t' -> literal.append("\\t");
                default -> {
                    if (c < ' ') {
                        literal.append("\\u00")
                                .append(Character.forDigit(c >> 4, 16))
                                .append(Character.forDigit(c & 15, 16));
                    } else {
                        literal.append(c);
                    }
                }
            }
        }
        return literal.append('"').toString();
    }
}
