package throwbench.solver.document;

import java.util.ArrayList;
import java.util.List;
import throwbench.solver.document.check.Checked;
import throwbench.solver.document.json.Node;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.Quantity;
import throwbench.solver.document.schema.Key;

/**
 * A number that a machine file holds.
 *
 * @param path where
 * @param dimension what it measures; of a clearance, the share or volume as which it is written
 * @param quantity its SI value, tolerance, unit and text
 */
public record NumericKey(KeyPath path, Dimension dimension, Quantity quantity) {

    static List<NumericKey> collect(Node root, Checked checked) {
        List<NumericKey> found = new ArrayList<>();
        collect(root, KeyPath.ROOT, checked, found);
        return found;
    }

    private static void collect(Node nest, KeyPath path, Checked checked, List<NumericKey> found) {
        for (Node node : nest.members()) {
            if (node.isRepeated()) {
                continue;
            }
            KeyPath own = nest.type() == Node.Type.LIST ? path.item(node.place()) : path.key(node.name());
            Key key = checked.key(node);
            Quantity quantity = checked.quantity(node).orElse(null);
            if (quantity != null && key != null) {
                // a clearance is a share or a volume, as its unit says
                Dimension dimension = key.dimension().orElse(Dimension.SHARE);
                found.add(
                        new NumericKey(own, dimension.holds(quantity.unit()) ? dimension : Dimension.VOLUME, quantity));
            }
            collect(node, own, checked, found);
        }
    }
}
