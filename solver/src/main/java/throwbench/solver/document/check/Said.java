package throwbench.solver.document.check;

import throwbench.solver.document.json.Node;
import throwbench.solver.document.quantity.QuantityText;
import throwbench.solver.document.schema.Key;
import throwbench.solver.document.schema.Kind;

/** How messages say what stands somewhere and what should. */
final class Said {

    private Said() {}

    /** A text in quotes, a number as it is, else what it is. */
    static String node(Node node) {
        return switch (node.type()) {
            case TEXT -> QuantityText.quoted(node.text());
            case NUMBER -> node.text();
            default -> node.type().said();
        };
    }

    /** What a key takes. */
    static String wanted(Key key) {
        String range = key.range().said().isEmpty() ? "" : ", " + key.range().said();
        if (key.kind() == Kind.QUANTITY) {
            String words = key.words().isEmpty() ? "" : ", or " + String.join(", ", key.words());
            return key.dimension().orElseThrow().wanted() + range + words;
        }
        if (key.kind() == Kind.CLEARANCE) {
            return key.kind().said() + range;
        }
        return key.words().isEmpty() ? key.kind().said() : "one of " + String.join(", ", key.words());
    }
}
