package throwbench.solver.finding;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.LoadStep;
import throwbench.solver.machine.Machine;
import throwbench.solver.revolution.Refusal;

/**
 * The duty points that a machine is judged at: the written ones, and after them every load step at every corner of the ranges and,
 * with a discharge at its relief pressure, at every suction corner. What the ranges leave open is as at the first written duty
 * point; without load steps its chambers' states are those of the corners, without ranges its conditions are the one corner.
 *
 * @param points the written ones first, then by load step, speed and stages in the order of the file, least ends first
 * @param refusals why some are not to be judged: the places of ranges that make no sense there
 */
public record JudgedPoints(List<DutyPoint> points, List<Refusal> refusals) {

    /** More than this nobody reads; a machine of so many ranges wants fewer. */
    static final int MOST = 20_000;

    public JudgedPoints {
        points = List.copyOf(points);
        refusals = List.copyOf(refusals);
    }

    /** All duty points of a machine. */
    public static JudgedPoints of(Machine machine) {
        List<DutyPoint> points = new ArrayList<>(machine.dutyPoints());
        Corners corners = new Corners(machine);
        if (machine.loadSteps().isEmpty() && corners.none()) {
            return new JudgedPoints(points, List.of());
        }
        DutyPoint base = machine.dutyPoints().get(0);
        List<LoadStep> steps = machine.loadSteps().isEmpty()
                ? List.of(new LoadStep(base.name(), base.chambers()))
                : machine.loadSteps();
        double count = corners.count() * steps.size();
        if (count > MOST) {
            String sentence = String.format(
                    Locale.ROOT,
                    "load steps and corners make %.0f duty points (%d × %.0f), at most %d are judged",
                    count,
                    steps.size(),
                    corners.count(),
                    MOST);
            return new JudgedPoints(points, List.of(new Refusal("ranges", sentence)));
        }
        List<Corners.Corner> all = corners.all();
        for (LoadStep step : steps) {
            for (Corners.Corner corner : all) {
                boolean asWritten = corner.label().isEmpty();
                if (!asWritten || !machine.loadSteps().isEmpty()) {
                    String name = step.name() + Corners.APART + (asWritten ? base.name() : corner.label());
                    points.add(new DutyPoint(name, corner.speed(), corner.stages(), step.chambers()));
                }
            }
        }
        return new JudgedPoints(points, corners.refusals());
    }

    /** The duty point of this name. */
    public Optional<DutyPoint> named(String name) {
        return points.stream().filter(point -> point.name().equals(name)).findFirst();
    }
}
