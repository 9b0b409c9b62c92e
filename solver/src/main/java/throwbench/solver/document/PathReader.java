package throwbench.solver.document;

import org.jspecify.annotations.Nullable;
import throwbench.solver.document.json.Node;
import throwbench.solver.document.schema.Key;
import throwbench.solver.document.schema.Kind;
import throwbench.solver.document.schema.Schema;

/** Finds places: spelled paths against the file and the page, paths in the file, paths on the page. */
final class PathReader {

    private PathReader() {}

    /** The node at a path, or null. */
    static @Nullable Node node(KeyPath path, Node root) {
        Node node = root;
        for (KeyPath.Step step : path.steps()) {
            node = step(node, step);
            if (node == null) {
                return null;
            }
        }
        return node;
    }

    private static @Nullable Node step(Node node, KeyPath.Step step) {
        if (!step.isIndex()) {
            return node.member(step.key());
        }
        boolean there =
                node.type() == Node.Type.LIST && step.index() < node.members().size();
        return there ? node.members().get(step.index()) : null;
    }

    /** What the page says of a path, given what the file holds there (kinds choose keys); or null. */
    static @Nullable Key key(KeyPath path, Node root) {
        Key key = Schema.root();
        Node node = root;
        for (KeyPath.Step step : path.steps()) {
            key = key == null ? null : child(key, node, step);
            node = node == null ? null : step(node, step);
        }
        return key;
    }

    private static @Nullable Key child(Key key, @Nullable Node node, KeyPath.Step step) {
        return switch (key.kind()) {
            case LIST, PAIR -> step.isIndex() ? key.item() : null;
            case MAP -> step.isIndex() ? null : key.item();
            case OBJECT, VARIANT -> step.isIndex() ? null : field(key, node, step.key());
            default -> null;
        };
    }

    private static @Nullable Key field(Key object, @Nullable Node node, String name) {
        String word = node != null && object.kind() == Kind.VARIANT ? node.text("kind") : "";
        if (object.variants().contains(word)) {
            return object.children(word).get(name);
        }
        // no kind yet: the first that knows the key
        for (String other : object.variants()) {
            Key key = object.children(other).get(name);
            if (key != null) {
                return key;
            }
        }
        return null;
    }

    /** The path that a text spells; what the page does not know follows the file, then dots and brackets. */
    static KeyPath read(String spelled, Node root) {
        KeyPath path = read(spelled, Schema.root(), root, KeyPath.ROOT);
        return path != null ? path : follow(spelled, root, KeyPath.ROOT);
    }

    private static @Nullable KeyPath read(String rest, Key key, @Nullable Node node, KeyPath above) {
        if (rest.isEmpty()) {
            return above;
        }
        return switch (key.kind()) {
            case LIST, PAIR -> readItem(rest, key, node, above);
            case MAP -> readMember(afterDot(rest), key, node, above);
            case OBJECT, VARIANT -> readField(above.isRoot() ? rest : afterDot(rest), key, node, above);
            default -> null;
        };
    }

    private static String afterDot(String rest) {
        return rest.startsWith(".") ? rest.substring(1) : rest;
    }

    private static @Nullable KeyPath readItem(String rest, Key list, @Nullable Node node, KeyPath above) {
        int close = rest.indexOf(']');
        int index = rest.startsWith("[") && close > 0 ? index(rest.substring(1, close)) : -1;
        if (index < 0) {
            return null;
        }
        KeyPath path = above.item(index);
        Node item = node == null ? null : step(node, path.last());
        return read(rest.substring(close + 1), list.item(), item, path);
    }

    private static int index(String digits) {
        boolean number = !digits.isEmpty() && digits.length() < 8;
        for (int at = 0; at < digits.length(); at++) {
            number &= digits.charAt(at) >= '0' && digits.charAt(at) <= '9';
        }
        return number ? Integer.parseInt(digits) : -1;
    }

    private static @Nullable KeyPath readField(String rest, Key object, @Nullable Node node, KeyPath above) {
        int end = 0;
        while (end < rest.length() && rest.charAt(end) != '.' && rest.charAt(end) != '[') {
            end++;
        }
        String name = rest.substring(0, end);
        Key child = field(object, node, name);
        if (child == null) {
            return null;
        }
        Node value = node == null ? null : node.member(name);
        return read(rest.substring(end), child, value, above.key(name));
    }

    /** A name that the file has goes before one that it might have; of several, the longest. */
    private static @Nullable KeyPath readMember(String rest, Key map, @Nullable Node node, KeyPath above) {
        for (int end = rest.length(); end > 0; end = rest.lastIndexOf('.', end - 1)) {
            String name = rest.substring(0, end);
            Node value = node == null ? null : node.member(name);
            KeyPath path = value == null ? null : read(rest.substring(end), map.item(), value, above.key(name));
            if (path != null) {
                return path;
            }
        }
        for (int end = rest.indexOf('.'); end > 0; end = rest.indexOf('.', end + 1)) {
            KeyPath path = read(rest.substring(end), map.item(), null, above.key(rest.substring(0, end)));
            if (path != null) {
                return path;
            }
        }
        return hasPrefix(node, rest) ? null : above.key(rest);
    }

    /** Whether the text goes on behind the name of a member that is there. */
    private static boolean hasPrefix(@Nullable Node node, String rest) {
        for (int end = rest.indexOf('.'); node != null && end > 0; end = rest.indexOf('.', end + 1)) {
            if (node.member(rest.substring(0, end)) != null) {
                return true;
            }
        }
        return false;
    }

    private static KeyPath follow(String rest, Node node, KeyPath above) {
        String spelled = afterDot(rest);
        for (int end = spelled.length(); end > 0; end--) {
            boolean ends = end == spelled.length() || spelled.charAt(end) == '.' || spelled.charAt(end) == '[';
            Node member = ends ? node.member(spelled.substring(0, end)) : null;
            if (member != null) {
                return follow(spelled.substring(end), member, above.key(spelled.substring(0, end)));
            }
        }
        int close = spelled.indexOf(']');
        int index = spelled.startsWith("[") && close > 0 ? index(spelled.substring(1, close)) : -1;
        Node item = index < 0 ? null : step(node, KeyPath.ROOT.item(index).last());
        return item != null ? follow(spelled.substring(close + 1), item, above.item(index)) : plain(spelled, above);
    }

    private static KeyPath plain(String spelled, KeyPath above) {
        KeyPath path = above;
        for (String part : spelled.isEmpty() ? new String[0] : spelled.split("\\.", -1)) {
            int open = part.indexOf('[');
            path = open == 0 ? path : path.key(open < 0 ? part : part.substring(0, open));
            while (open >= 0 && part.indexOf(']', open) > 0) {
                int close = part.indexOf(']', open);
                int index = index(part.substring(open + 1, close));
                path = index < 0 ? path.key(part.substring(open, close + 1)) : path.item(index);
                open = part.indexOf('[', close);
            }
        }
        return path;
    }
}
