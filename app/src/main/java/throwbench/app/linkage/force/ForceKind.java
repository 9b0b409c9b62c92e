package throwbench.app.linkage.force;

import java.util.EnumSet;
import java.util.List;
import throwbench.app.drawing.Palette;
import throwbench.solver.revolution.Column;

/** The kinds of arrows; each has a shape of its own beside its colour and label. */
public enum ForceKind {
    /** Pressure on each chamber's piston face. */
    GAS("gas", List.of(Column.GAS_LOAD)),
    /** Inertia of all that reciprocates. */
    INERTIA("inertia", List.of(Column.INERTIA_LOAD)),
    /** Inertia of the connecting rod at its mass centre. */
    ROD_INERTIA("connecting rod inertia", List.of(Column.ROD_ACCELERATION)),
    /** Gas load and inertia load together. */
    ROD("rod load", List.of(Column.ROD_LOAD)),
    /** Force of the connecting rod on the crosshead. */
    CROSSHEAD_PIN("crosshead pin", List.of(Column.CROSSHEAD_PIN_X, Column.CROSSHEAD_PIN_Y)),
    /** Force of the crank pin on the connecting rod's big end. */
    CRANK_PIN("crank pin", List.of(Column.CRANK_PIN_X, Column.CRANK_PIN_Y)),
    /** Force of the guide on the crosshead. */
    GUIDE("guide", List.of(Column.GUIDE_FORCE)),
    /** Torque that the driver must deliver to the throw. */
    TORQUE("torque", List.of(Column.THROW_TORQUE));

    private final String label;
    private final List<Column> columns;

    ForceKind(String label, List<Column> columns) {
        this.label = label;
        this.columns = columns;
    }

    public String label() {
        return label;
    }

    /** The columns that hold it, or for the connecting rod's inertia the motion that causes it. */
    public List<Column> columns() {
        return columns;
    }

    /** The kinds shown at first: enough to follow the load from piston to crank, calm enough to read. */
    public static EnumSet<ForceKind> usual() {
        return EnumSet.of(GAS, INERTIA, ROD, GUIDE, CRANK_PIN, TORQUE);
    }

    public int colour(Palette palette) {
        Palette.Loads loads = palette.loads();
        return switch (this) {
            case GAS -> loads.gas();
            case INERTIA, ROD_INERTIA -> loads.inertia();
            case ROD -> loads.rod();
            case CROSSHEAD_PIN, CRANK_PIN -> loads.pin();
            case GUIDE -> loads.guide();
            case TORQUE -> loads.torque();
        };
    }
}
