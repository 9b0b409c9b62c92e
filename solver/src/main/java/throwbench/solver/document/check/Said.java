package throwbench.solver.document.check;

import throwbench.solver.document.json.Node;
import throwbench.solver.document.quantity.QuantityText;

/** How messages say what stands somewhere. */
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
}
