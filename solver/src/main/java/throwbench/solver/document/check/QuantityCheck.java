package throwbench.solver.document.check;

import throwbench.solver.document.json.Node;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.Quantity;
import throwbench.solver.document.quantity.QuantityReading;
import throwbench.solver.document.quantity.QuantityText;
import throwbench.solver.document.quantity.Refusal;
import throwbench.solver.document.schema.Key;
import throwbench.solver.document.schema.Kind;

/** One quantity by itself: unit, mark, range. */
final class QuantityCheck {

    private QuantityCheck() {}

    static void check(Key key, Node node, Checked checked) {
        boolean text = node.type() == Node.Type.TEXT;
        boolean number = node.type() == Node.Type.NUMBER;
        if (text && !key.words().isEmpty() && key.words().contains(node.text())) {
            return;
        }
        if (!text && !number) {
            checked.flaws().add(node, Said.node(node), key.wanted());
            return;
        }
        Dimension dimension = dimension(key, node);
        if (number && !dimension.isDimensionless()) {
            checked.flaws().add(node, node.text() + " without a unit", key.wanted());
            return;
        }
        QuantityReading reading = QuantityText.read(node.text(), dimension, checked.ambientPressure());
        if (reading instanceof Quantity quantity) {
            take(key, node, quantity, checked);
        } else if (reading instanceof Refusal refusal) {
            String wanted = key.kind() == Kind.CLEARANCE ? key.wanted() : refusal.wanted();
            checked.flaws().add(node, refusal.found(), wanted);
        }
    }

    private static void take(Key key, Node node, Quantity quantity, Checked checked) {
        if (key.range().contains(quantity.value())) {
            checked.measure(node, quantity);
        } else {
            checked.flaws().add(node, Said.node(node), key.wanted());
        }
    }

    /** Of a clearance, a share where it is written as one. */
    private static Dimension dimension(Key key, Node node) {
        if (key.kind() != Kind.CLEARANCE) {
            return key.dimension().orElseThrow();
        }
        boolean share = QuantityText.read(node.text(), Dimension.SHARE, 0) instanceof Quantity;
        return share ? Dimension.SHARE : Dimension.VOLUME;
    }
}
