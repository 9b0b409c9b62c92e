package throwbench.app.linkage;

import java.util.List;
import throwbench.solver.revolution.Column;

/**
 * What the pointer is on.
 *
 * @param part what it is
 * @param index of an arrow or a chamber space; else −1
 * @param columns whose traces a click asks for
 */
record Target(Part part, int index, List<Column> columns) {

    enum Part {
        ARROW("", false),
        CRANK_PIN("crank pin", true),
        CROSSHEAD_PIN("crosshead pin", true),
        CRANK("crank web", true),
        CONNECTING_ROD("connecting rod", false),
        CROSSHEAD("crosshead", true),
        PISTON_ROD("piston rod", true),
        PISTON("piston", true),
        CHAMBER("", false),
        GUIDE("guide", false);

        private final String text;
        private final boolean turns;

        Part(String text, boolean turns) {
            this.text = text;
            this.turns = turns;
        }

        String text() {
            return text;
        }

        /** Whether dragging it turns the crank. */
        boolean turns() {
            return turns;
        }
    }

    /** Whether it is dragged about the crank centre, and not along the line of stroke. */
    boolean onCrank() {
        return part == Part.CRANK_PIN || part == Part.CRANK;
    }

    boolean same(Target other) {
        return part == other.part && index == other.index;
    }
}
