package throwbench.app.linkage;

import java.util.EnumSet;
import java.util.Set;
import throwbench.app.linkage.force.ForceKind;

/**
 * What the user chose to see.
 *
 * @param kinds of arrows
 * @param arrowFactor length of arrows over their usual length, above 0
 * @param alone whether only the shown throw is drawn
 * @param typeScale size of type and lines over the usual one, above 0
 * @param hint whether a line says how the view is used
 */
public record LinkageChoice(Set<ForceKind> kinds, double arrowFactor, boolean alone, double typeScale, boolean hint) {

    public LinkageChoice {
        kinds = Set.copyOf(kinds);
    }

    /** The usual arrows, every throw, no hint: for pictures and pages. */
    public static LinkageChoice usual() {
        return new LinkageChoice(EnumSet.copyOf(ForceKind.usual()), 1, false, 1, false);
    }
}
