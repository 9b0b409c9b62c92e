package throwbench.solver.document.schema;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.machine.LimitKey;

/** The limits of the findings, and the levels at which each may be set: its own scope and every wider one. */
final class LimitKeys {

    private static final Set<LimitKey> OF_CHAMBERS = EnumSet.of(LimitKey.DISCHARGE_TEMPERATURE);

    private static final Set<LimitKey> OF_STAGES =
            EnumSet.of(LimitKey.SUCTION_HEAD, LimitKey.FLOW_VARIATION, LimitKey.CAPACITY, LimitKey.STAGE_FLOW_MISMATCH);

    private static final Set<LimitKey> OF_THE_MACHINE = EnumSet.of(
            LimitKey.SPEED_FLUCTUATION,
            LimitKey.PEAK_TO_MEAN_TORQUE,
            LimitKey.INDICATED_POWER,
            LimitKey.SHAFT_POWER,
            LimitKey.SHAKING_FORCE_PRIMARY,
            LimitKey.SHAKING_FORCE_SECONDARY,
            LimitKey.SHAKING_COUPLE_PRIMARY,
            LimitKey.SHAKING_COUPLE_SECONDARY);

    private LimitKeys() {}

    static Key ofMachine() {
        return limits("Limits of the findings.", EnumSet.allOf(LimitKey.class));
    }

    static Key ofThrow() {
        Set<LimitKey> keys = EnumSet.allOf(LimitKey.class);
        keys.removeAll(OF_STAGES);
        keys.removeAll(OF_THE_MACHINE);
        return limits("Limits of this throw, before the machine's.", keys);
    }

    static Key ofStage() {
        Set<LimitKey> keys = EnumSet.copyOf(OF_STAGES);
        keys.addAll(OF_CHAMBERS);
        return limits("Limits of this stage, before the machine's.", keys);
    }

    static Key ofChamber() {
        return limits("Limits of this chamber, before all others.", OF_CHAMBERS);
    }

    private static Key limits(String meaning, Set<LimitKey> keys) {
        List<Key> children = new ArrayList<>();
        for (LimitKey key : keys) {
            Key limit = Key.quantity(key.text(), dimension(key), meaning(key));
            children.add(limit.in(range(key)).otherwiseSaid(otherwise(key)));
        }
        return Key.object("limits", meaning, children.toArray(Key[]::new));
    }

    private static Range range(LimitKey key) {
        return switch (key) {
            case SUCTION_HEAD -> Range.ANY;
            case DISCHARGE_TEMPERATURE -> Range.above(0);
            default -> Range.from(0);
        };
    }

    private static Dimension dimension(LimitKey key) {
        return switch (key) {
            case GAS_TENSION,
                    GAS_COMPRESSION,
                    ROD_TENSION,
                    ROD_COMPRESSION,
                    SHAKING_FORCE_PRIMARY,
                    SHAKING_FORCE_SECONDARY -> Dimension.FORCE;
            case SHAKING_COUPLE_PRIMARY, SHAKING_COUPLE_SECONDARY -> Dimension.TORQUE;
            case REVERSAL_DURATION -> Dimension.ANGLE;
            case REVERSAL_RATIO, SPEED_FLUCTUATION, FLOW_VARIATION, STAGE_FLOW_MISMATCH -> Dimension.SHARE;
            case DISCHARGE_TEMPERATURE -> Dimension.TEMPERATURE;
            case MEAN_PISTON_SPEED -> Dimension.SPEED;
            case ROD_TO_CRANK_RATIO, PEAK_TO_MEAN_TORQUE, PISTON_ROD_FATIGUE, PISTON_ROD_BUCKLING -> Dimension.NUMBER;
            case CROSSHEAD_PIN_PRESSURE, CRANK_PIN_PRESSURE, MAIN_BEARING_PRESSURE, GUIDE_PRESSURE, PISTON_ROD_STRESS ->
                Dimension.STRESS;
            case SUCTION_HEAD -> Dimension.HEAD;
            case CAPACITY -> Dimension.MASS_FLOW;
            case INDICATED_POWER, SHAFT_POWER -> Dimension.POWER;
        };
    }

    private static String otherwise(LimitKey key) {
        return switch (key) {
            case REVERSAL_DURATION -> "15 deg";
            case REVERSAL_RATIO -> "3 %";
            case DISCHARGE_TEMPERATURE -> "150 degC; 135 degC for a gas of at most 12 g/mol";
            case PISTON_ROD_STRESS -> "the rod's yield strength";
            case PISTON_ROD_FATIGUE -> "1";
            case SUCTION_HEAD -> "0 m";
            default -> "none";
        };
    }

    private static String meaning(LimitKey key) {
        return switch (key) {
            case GAS_TENSION -> "Greatest gas load in tension.";
            case GAS_COMPRESSION -> "Greatest gas load in compression.";
            case ROD_TENSION -> "Greatest rod load in tension.";
            case ROD_COMPRESSION -> "Greatest rod load in compression.";
            case REVERSAL_DURATION -> "Shortest reversal of the rod load.";
            case REVERSAL_RATIO -> "Least ratio of the smaller to the larger peak of the rod load.";
            case DISCHARGE_TEMPERATURE -> "Greatest discharge temperature.";
            case MEAN_PISTON_SPEED -> "Greatest mean piston speed.";
            case ROD_TO_CRANK_RATIO -> "Least ratio of connecting rod length to crank radius.";
            case CROSSHEAD_PIN_PRESSURE -> "Greatest pressure on the crosshead pin's projected area.";
            case CRANK_PIN_PRESSURE -> "Greatest pressure on the crank pin's projected area.";
            case MAIN_BEARING_PRESSURE -> "Greatest pressure on the main bearing's projected area.";
            case GUIDE_PRESSURE -> "Greatest pressure on the crosshead shoe.";
            case PISTON_ROD_STRESS -> "Greatest stress of the piston rod.";
            case PISTON_ROD_FATIGUE -> "Greatest fatigue use of the piston rod's thread root.";
            case PISTON_ROD_BUCKLING -> "Least safety of the piston rod against buckling.";
            case SPEED_FLUCTUATION -> "Greatest fluctuation coefficient of the speed.";
            case PEAK_TO_MEAN_TORQUE -> "Greatest ratio of peak to mean torque of the shaft.";
            case SUCTION_HEAD -> "Least head left above the liquid's vapour pressure.";
            case FLOW_VARIATION -> "Greatest variation of the stage's delivery over its mean.";
            case CAPACITY -> "Least mass flow of the stage.";
            case STAGE_FLOW_MISMATCH -> "Greatest relative difference to the mass flow of the stage it follows.";
            case INDICATED_POWER -> "Greatest indicated power.";
            case SHAFT_POWER -> "Greatest shaft power.";
            case SHAKING_FORCE_PRIMARY -> "Greatest shaking force of first order.";
            case SHAKING_FORCE_SECONDARY -> "Greatest shaking force of second order.";
            case SHAKING_COUPLE_PRIMARY -> "Greatest shaking couple of first order.";
            case SHAKING_COUPLE_SECONDARY -> "Greatest shaking couple of second order.";
        };
    }
}
