package throwbench.solver.pump;

import java.util.OptionalDouble;
import throwbench.solver.chamber.PressureCurve;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.RunningThrow;

/**
 * Volume passed in a turn, measured in the suction line, over the volume swept; flow allowances are taken off. (On the volume
 * in the discharge line a compressible liquid's efficiency is less: figures of that kind are not comparable.)
 */
public final class VolumetricEfficiency {

    private VolumetricEfficiency() {}

    /** Of one chamber; empty where its flow is not known. */
    public static OptionalDouble ofChamber(RunningThrow running, int chamber) {
        PressureCurve curve = running.curves().get(chamber);
        return curve.flowKnown()
                ? OptionalDouble.of(curve.inletVolumePerTurn()
                        / running.volumes().get(chamber).swept())
                : OptionalDouble.empty();
    }

    /** Of a stage, all its chambers together; empty where it has none or the flow of one is not known. */
    public static OptionalDouble ofStage(RunningMachine running, String stage) {
        return StageTurn.of(running, stage)
                .map(turn -> OptionalDouble.of(turn.passed() / turn.swept()))
                .orElse(OptionalDouble.empty());
    }
}
