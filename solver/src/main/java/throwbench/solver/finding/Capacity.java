package throwbench.solver.finding;

import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.machine.StageConditions;
import throwbench.solver.revolution.Summary.StageFlows;

/**
 * Mass that all chambers of a stage take in together, kg/s, flow allowances taken off. No default limit; reported without one. The
 * note gives the volume at inlet conditions, which is known without a suction temperature too.
 */
public final class Capacity implements StageCriterion {

    private static final Statement STATEMENT = Statement.atLeast(LimitKey.CAPACITY, "kg/s", "capacity")
            .is("mass taken in by the stage's chambers in a turn × turns a second")
            .from("what the process wants; of an ideal cycle by its volumetric efficiency: P. K. Nag, Basic and Applied"
                    + " Thermodynamics (2006), ch. 19");

    @Override
    public Statement statement() {
        return STATEMENT;
    }

    @Override
    public Optional<Found> find(JudgedDuty duty, String stage) {
        StageFlows flow = duty.means().flow();
        OptionalDouble mass = flow.capacity().getOrDefault(stage, OptionalDouble.empty());
        OptionalDouble volume = flow.inletVolume().getOrDefault(stage, OptionalDouble.empty());
        String atInlet = volume.isPresent()
                ? String.format(Locale.ROOT, "%.4g m3/s at inlet conditions", volume.getAsDouble())
                : "";
        if (mass.isPresent()) {
            return Optional.of(Found.of(mass.getAsDouble()).noting(atInlet));
        }
        if (volume.isEmpty()) {
            return Optional.of(Found.none("a pressure is recorded, so what the stage passes is not known"));
        }
        StageConditions lines = duty.running().dutyPoint().stages().get(stage);
        boolean cold = lines == null || lines.suctionTemperature().isEmpty();
        String why =
                cold ? "stages." + stage + ".suctionTemperature is missing at the duty point" : "its mass is not known";
        return Optional.of(Found.none(why + "; " + atInlet));
    }
}
