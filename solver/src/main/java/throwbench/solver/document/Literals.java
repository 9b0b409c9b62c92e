package throwbench.solver.document;

import org.jspecify.annotations.Nullable;
import throwbench.solver.document.json.Node;
import throwbench.solver.document.json.TextEdit;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.NumberText;
import throwbench.solver.document.schema.Key;
import throwbench.solver.document.schema.Kind;

/** How a value's text is written in JSON: numbers and flags bare where the key takes them so, all else in quotes. */
final class Literals {

    private Literals() {}

    /** The JSON of a text at a key; of a key that the page does not know, as the present value is written. */
    static String json(String value, @Nullable Key key, @Nullable Node present) {
        boolean flag = value.equals("true") || value.equals("false");
        if (flag && (key == null ? isFlag(present) : key.kind() == Kind.FLAG)) {
            return value;
        }
        boolean bare = key == null ? present != null && present.type() == Node.Type.NUMBER : takesNumber(key);
        return bare && isJsonNumber(value) ? value : TextEdit.quoted(value);
    }

    private static boolean isFlag(@Nullable Node present) {
        return present != null && (present.type() == Node.Type.TRUE || present.type() == Node.Type.FALSE);
    }

    private static boolean takesNumber(Key key) {
        return key.kind() == Kind.VERSION
                || key.kind() == Kind.CLEARANCE
                || key.dimension().map(Dimension::isDimensionless).orElse(false);
    }

    private static boolean isJsonNumber(String value) {
        int first = value.startsWith("-") ? 1 : 0;
        boolean leadingZero =
                value.length() > first + 1 && value.charAt(first) == '0' && Character.isDigit(value.charAt(first + 1));
        return !leadingZero && NumberText.isNumber(value);
    }
}
