package throwbench.app.linkage.force;

import java.util.EnumSet;
import java.util.List;
import throwbench.app.drawing.Palette;
import throwbench.solver.revolution.Column;

/** The kinds of arrows; each has a shape of its own beside its colour and label. */
public enum ForceKind {
    /** Pressure on each chamber's piston face. */
    GAS("gas"),
    /** Inertia of all that reciprocates. */
    INERTIA("inertia"),
    /** Inertia of the connecting rod at its mass centre. */
    ROD_INERTIA("connecting rod inertia"),
    /** Gas load and inertia load together. */
    ROD("rod load"),
    /** Force of the connecting rod on the crosshead. */
    CROSSHEAD_PIN("crosshead pin"),
    /** Force of the crank pin on the connecting rod's big end. */
    CRANK_PIN("crank pin"),
    /** Force of the guide on the crosshead. */
    GUIDE("guide"),
    /** Torque that the driver must deliver to the throw. */
    TORQUE("torque");

    private final String label;

    ForceKind(String label) {
        this.label = label;
    }

    public String label() {
        return label;
    }

    /** The columns that hold it, or for the connecting rod's inertia the motion that causes it. */
    public List<Column> columns() {
        return switch (this) {
            case GAS -> List.of(Column.GAS_LOAD);
            case INERTIA -> List.of(Column.INERTIA_LOAD);
            case ROD_INERTIA -> List.of(Column.ROD_ACCELERATION);
            case ROD -> List.of(Column.ROD_LOAD);
            case CROSSHEAD_PIN -> List.of(Column.CROSSHEAD_PIN_X, Column.CROSSHEAD_PIN_Y);
            case CRANK_PIN -> List.of(Column.CRANK_PIN_X, Column.CRANK_PIN_Y);
            case GUIDE -> List.of(Column.GUIDE_FORCE);
            case TORQUE -> List.of(Column.THROW_TORQUE);
        };
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
