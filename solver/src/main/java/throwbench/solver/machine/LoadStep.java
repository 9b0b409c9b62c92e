package throwbench.solver.machine;

import java.util.Map;
import throwbench.solver.chamber.ChamberCondition;

/** A named set of chamber conditions, judged at every corner of the ranges. */
public record LoadStep(String name, Map<String, ChamberCondition> chambers) {

    public LoadStep {
        chambers = Map.copyOf(chambers);
    }
}
