package throwbench.solver.document.json;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** One value of a parsed text, with the span of its characters. Complete, and then unchanged, once the text is parsed. */
public final class Node {

    /** What a value is in JSON. */
    public enum Type {
        OBJECT("an object"),
        LIST("a list"),
        TEXT("a text"),
        NUMBER("a number"),
        TRUE("true"),
        FALSE("false"),
        NULL("null");

        private final String said;

        Type(String said) {
            this.said = said;
        }

        /** For sentences. */
        public String said() {
            return said;
        }
    }

    // with fewer members a loop is quicker than a map
    private static final int FEW = 12;

    private final Type type;
    private final @Nullable Node parent;
    private final String name;
    private final int place;
    private final int serial;
    private final int keyStart;
    private final int start;
    private int end;
    private final String text;
    private final List<Node> members;
    private @Nullable Map<String, Node> byName;
    private boolean repeated;

    Node(Type type, @Nullable Node parent, String name, int serial, int keyStart, int start, int end, String text) {
        this.type = type;
        this.parent = parent;
        this.name = name;
        this.place = parent == null ? 0 : parent.members.size();
        this.serial = serial;
        this.keyStart = keyStart;
        this.start = start;
        this.end = end;
        this.text = text;
        this.members = isNest() ? new ArrayList<>() : Collections.emptyList();
        if (parent != null) {
            parent.take(this);
        }
    }

    private void take(Node child) {
        if (type == Type.OBJECT) {
            child.repeated = member(child.name) != null;
            if (members.size() == FEW) {
                byName = new HashMap<>();
                members.forEach(this::remember);
            }
            remember(child);
        }
        members.add(child);
    }

    private void remember(Node child) {
        if (byName != null) {
            byName.putIfAbsent(child.name, child);
        }
    }

    void close(int behind) {
        end = behind;
    }

    public Type type() {
        return type;
    }

    /** The object or list in which it stands; null for the whole text. */
    public @Nullable Node parent() {
        return parent;
    }

    /** Its key, unescaped; empty in a list. */
    public String name() {
        return name;
    }

    /** Its index in its object or list. */
    public int place() {
        return place;
    }

    /** Its number in the text, from 0, below {@link Parsed#count}. */
    public int serial() {
        return serial;
    }

    /** Where its key begins, or the value itself in a list. */
    public int memberStart() {
        return keyStart;
    }

    /** Where its value begins. */
    public int start() {
        return start;
    }

    /** Behind its value's last character. */
    public int end() {
        return end;
    }

    /** A text unescaped, a number as it is written, "true", "false" or "null"; empty for an object or list. */
    public String text() {
        return text;
    }

    /** Elements of a list, or members of an object with repeated keys, in the order of the text. */
    public List<Node> members() {
        return Collections.unmodifiableList(members);
    }

    /** Whether an earlier member of the same object has the same key. */
    public boolean isRepeated() {
        return repeated;
    }

    public boolean isNest() {
        return type == Type.OBJECT || type == Type.LIST;
    }

    /** The first member of this key, or null. */
    public @Nullable Node member(String key) {
        if (byName != null) {
            return byName.get(key);
        }
        if (type == Type.OBJECT) {
            for (int i = 0; i < members.size(); i++) {
                if (members.get(i).name.equals(key)) {
                    return members.get(i);
                }
            }
        }
        return null;
    }

    /** The text of a member; empty where there is none, or none that is a text. */
    public String text(String key) {
        Node member = member(key);
        return member != null && member.type == Type.TEXT ? member.text : "";
    }

    /** Its key path: {@code throws[0].chambers[1].bore}. */
    public String path() {
        if (parent == null) {
            return "";
        }
        String above = parent.path();
        if (parent.type == Type.LIST) {
            return above + '[' + place + ']';
        }
        return above.isEmpty() ? name : above + '.' + name;
    }

    /** The key path of a member that it has or should have. */
    public String path(String key) {
        String own = path();
        return own.isEmpty() ? key : own + '.' + key;
    }
}
