package throwbench.solver.map;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.document.KeyPath;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.StageConditions;

/**
 * Numbers of a duty point that can be changed in the described machine itself: the speed, and pressures and temperature of
 * its lines. The machine file need not be read again for them, which is most of the time that a map point takes.
 */
final class DutyQuantity {

    private static final String SPEED = "speed";

    private DutyQuantity() {}

    /**
     * The duty point with another number, where the number is one of these and the result can break no rule of the machine
     * file; else empty, and the file must be read.
     *
     * @param dutyPath where the duty point stands in the file
     * @param ownSpeed whether the file gives it a speed
     */
    static Optional<DutyPoint> change(DutyPoint duty, KeyPath dutyPath, boolean ownSpeed, Setting setting) {
        KeyPath path = setting.variable().path();
        double value = setting.value();
        if (!(value > 0 && value <= Double.MAX_VALUE)) {
            return Optional.empty();
        }
        boolean ofDrive = path.equals(KeyPath.ROOT.key("drive").key(SPEED)) && !ownSpeed;
        if (ofDrive || path.equals(dutyPath.key(SPEED))) {
            return Optional.of(new DutyPoint(duty.name(), value, duty.stages(), duty.chambers()));
        }
        List<KeyPath.Step> steps = path.steps();
        int depth = dutyPath.steps().size();
        boolean ofStage = steps.size() == depth + 3 && path.parent().parent().equals(dutyPath.key("stages"));
        return ofStage
                ? changeStage(
                        duty, steps.get(depth + 1).key(), steps.get(depth + 2).key(), value)
                : Optional.empty();
    }

    private static Optional<DutyPoint> changeStage(DutyPoint duty, String stage, String key, double value) {
        StageConditions old = duty.stages().get(stage);
        Optional<StageConditions> conditions = old == null ? Optional.empty() : change(old, key, value);
        if (conditions.isEmpty()) {
            return Optional.empty();
        }
        Map<String, StageConditions> stages = new HashMap<>(duty.stages());
        stages.put(stage, conditions.get());
        return Optional.of(new DutyPoint(duty.name(), duty.speed(), stages, duty.chambers()));
    }

    /** A number in a number's place only: where the file says "balanced" or nothing, its rules must be asked. */
    private static Optional<StageConditions> change(StageConditions old, String key, double value) {
        OptionalDouble next = OptionalDouble.of(value);
        OptionalDouble suction = old.suctionPressure();
        OptionalDouble temperature = old.suctionTemperature();
        OptionalDouble discharge = old.dischargePressure();
        return switch (key) {
            case "suctionPressure" ->
                suction.isEmpty() ? Optional.empty() : Optional.of(new StageConditions(next, temperature, discharge));
            case "suctionTemperature" ->
                temperature.isEmpty() ? Optional.empty() : Optional.of(new StageConditions(suction, next, discharge));
            case "dischargePressure" ->
                discharge.isEmpty() ? Optional.empty() : Optional.of(new StageConditions(suction, temperature, next));
            default -> Optional.empty();
        };
    }

    /** Whether every pressure is known and rises: losses only widen the difference, so no chamber's rule is broken then. */
    static boolean pressuresRise(DutyPoint duty) {
        for (StageConditions lines : duty.stages().values()) {
            double suction = lines.suctionPressure().orElse(Double.POSITIVE_INFINITY);
            if (!(lines.dischargePressure().orElse(0) > suction)) {
                return false;
            }
        }
        return true;
    }
}
