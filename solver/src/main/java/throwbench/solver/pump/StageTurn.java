package throwbench.solver.pump;

import java.util.Optional;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.RunningThrow;

/**
 * What a stage's chambers together do in a turn.
 *
 * @param swept m³, above 0
 * @param passed at suction line conditions, flow allowances taken off, m³
 */
record StageTurn(double swept, double passed) {

    /** Empty where the stage has no chamber or the flow of one is not known. */
    static Optional<StageTurn> of(RunningMachine running, String stage) {
        double swept = 0;
        double passed = 0;
        for (RunningThrow t : running.throwsInOrder()) {
            for (int c = 0; c < t.chambers().size(); c++) {
                if (t.chambers().get(c).stage().filter(stage::equals).isPresent()) {
                    if (!t.curves().get(c).flowKnown()) {
                        return Optional.empty();
                    }
                    swept += t.volumes().get(c).swept();
                    passed += t.curves().get(c).inletVolumePerTurn();
                }
            }
        }
        return swept > 0 ? Optional.of(new StageTurn(swept, passed)) : Optional.empty();
    }
}
