package throwbench.solver.machine;

import java.util.List;
import java.util.Map;
import throwbench.solver.fluid.Fluid;

/**
 * One machine, whole. Lists keep the order of the file.
 *
 * @param fluids name → fluid
 * @param throwsInOrder the throws, at least one; the first one's crank angle is the machine's
 * @param dutyPoints at least one; the first is the default
 */
public record Machine(
        String name,
        String notes,
        Site site,
        Drive drive,
        Map<String, Fluid> fluids,
        List<Stage> stages,
        List<Throw> throwsInOrder,
        List<DutyPoint> dutyPoints,
        Limits limits,
        List<LoadStep> loadSteps,
        Ranges ranges,
        List<Bookmark> bookmarks) {

    public Machine {
        fluids = Map.copyOf(fluids);
        stages = List.copyOf(stages);
        throwsInOrder = List.copyOf(throwsInOrder);
        dutyPoints = List.copyOf(dutyPoints);
        loadSteps = List.copyOf(loadSteps);
        bookmarks = List.copyOf(bookmarks);
        if (throwsInOrder.isEmpty() || dutyPoints.isEmpty()) {
            throw new IllegalArgumentException("a machine has at least one throw and one duty point");
        }
    }

    /** The stage of this name. */
    public Stage stage(String stageName) {
        return stages.stream()
                .filter(s -> s.name().equals(stageName))
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException("no stage \"" + stageName + "\""));
    }

    /** The fluid of a stage. */
    public Fluid fluidOf(String stageName) {
        Fluid fluid = fluids.get(stage(stageName).fluid());
        if (fluid == null) {
            throw new IllegalArgumentException("stage \"" + stageName + "\" has no fluid");
        }
        return fluid;
    }
}
