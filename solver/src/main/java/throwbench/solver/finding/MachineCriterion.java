package throwbench.solver.finding;

import java.util.List;

/** Judges the machine as a whole. */
interface MachineCriterion extends StatedCriterion {

    Found find(JudgedDuty duty);

    @Override
    default List<Finding> judge(JudgedDuty duty) {
        return List.of(duty.held(this, Finding.Place.ofMachine(duty.name()), find(duty)));
    }
}
