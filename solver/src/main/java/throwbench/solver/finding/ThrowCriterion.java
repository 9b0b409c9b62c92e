package throwbench.solver.finding;

import java.util.ArrayList;
import java.util.List;

/** Judges every throw by itself. */
interface ThrowCriterion extends StatedCriterion {

    /** What is found of one throw. */
    Found find(JudgedDuty duty, int throwIndex);

    @Override
    default List<Finding> judge(JudgedDuty duty) {
        List<Finding> findings = new ArrayList<>();
        for (int i = 0; i < duty.throwCount(); i++) {
            findings.add(duty.held(this, duty.place(i), find(duty, i)));
        }
        return findings;
    }
}
