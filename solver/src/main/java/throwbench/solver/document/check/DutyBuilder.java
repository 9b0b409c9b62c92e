package throwbench.solver.document.check;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import throwbench.solver.chamber.ChamberCondition;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.document.json.Node;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.LoadStep;
import throwbench.solver.machine.Ranges;
import throwbench.solver.machine.StageConditions;

/** Makes duty points, load steps and ranges of a file without faults. */
final class DutyBuilder {

    private final double driveSpeed;

    /** For a drive of this speed, rad/s: that of a duty point which names none. */
    DutyBuilder(double driveSpeed) {
        this.driveSpeed = driveSpeed;
    }

    List<DutyPoint> points(List<Fields> written) {
        List<DutyPoint> points = new ArrayList<>();
        for (Fields point : written) {
            Map<String, StageConditions> stages = new LinkedHashMap<>();
            point.items("stages").forEach(stage -> stages.put(stage.name(), conditions(stage)));
            double speed = point.number("speed").orElse(driveSpeed);
            points.add(new DutyPoint(point.text("name"), speed, stages, chambers(point)));
        }
        return points;
    }

    List<LoadStep> loadSteps(List<Fields> written) {
        List<LoadStep> steps = new ArrayList<>();
        written.forEach(step -> steps.add(new LoadStep(step.text("name"), chambers(step))));
        return steps;
    }

    private static StageConditions conditions(Fields stage) {
        return new StageConditions(
                stage.number("suctionPressure"), stage.number("suctionTemperature"), stage.number("dischargePressure"));
    }

    private static Map<String, ChamberCondition> chambers(Fields point) {
        Map<String, ChamberCondition> chambers = new LinkedHashMap<>();
        for (Fields chamber : point.items("chambers")) {
            ChamberState state = state(chamber.text("state"));
            boolean failed = state == ChamberState.FAILED_SUCTION || state == ChamberState.FAILED_DISCHARGE;
            double leak = failed ? chamber.value("leakArea") : 0;
            chambers.put(
                    chamber.name(),
                    new ChamberCondition(state, leak, ThrowBuilder.clearance(chamber, "addedClearance")));
        }
        return chambers;
    }

    private static ChamberState state(String word) {
        for (ChamberState state : ChamberState.values()) {
            if (state.text().equals(word)) {
                return state;
            }
        }
        throw new IllegalStateException("no chamber state " + word);
    }

    static Ranges ranges(Fields ranges) {
        if (!ranges.isThere()) {
            return Ranges.NONE;
        }
        Map<String, Ranges.StageRange> stages = new LinkedHashMap<>();
        for (Fields stage : ranges.items("stages")) {
            stages.put(
                    stage.name(),
                    new Ranges.StageRange(
                            range(stage, "suctionPressure"),
                            range(stage, "suctionTemperature"),
                            range(stage, "dischargePressure"),
                            stage.quantity("reliefPressure").map(q -> q.value())));
        }
        return new Ranges(range(ranges, "speed"), stages);
    }

    private static Optional<Ranges.Range> range(Fields fields, String name) {
        List<Node> ends = fields.values(name);
        return ends.isEmpty()
                ? Optional.empty()
                : Optional.of(new Ranges.Range(
                        fields.checked().quantity(ends.get(0)).orElseThrow().value(),
                        fields.checked().quantity(ends.get(1)).orElseThrow().value()));
    }
}
