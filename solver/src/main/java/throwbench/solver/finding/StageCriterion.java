package throwbench.solver.finding;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Judges every stage that has chambers. */
interface StageCriterion extends StatedCriterion {

    /** What is found of one stage; empty where the question does not arise, as the suction head of a gas. */
    Optional<Found> find(JudgedDuty duty, String stage);

    @Override
    default List<Finding> judge(JudgedDuty duty) {
        List<Finding> findings = new ArrayList<>();
        for (String stage : duty.stages()) {
            find(duty, stage)
                    .map(found -> duty.held(this, Finding.Place.ofStage(duty.name(), stage), found))
                    .ifPresent(findings::add);
        }
        return findings;
    }
}
