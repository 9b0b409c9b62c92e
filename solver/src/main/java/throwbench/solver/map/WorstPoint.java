package throwbench.solver.map;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.apache.commons.math3.optim.InitialGuess;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.SimpleBounds;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.nonlinear.scalar.ObjectiveFunction;
import org.apache.commons.math3.optim.nonlinear.scalar.noderiv.CMAESOptimizer;
import org.apache.commons.math3.random.MersenneTwister;

/**
 * Where in the box of the machine's ranges a margin is worst: a grid over the box, then an evolution strategy (CMA-ES) from
 * the worst grid points, which finds what lies between them.
 *
 * @param settings the duty variables there
 * @param margin the least margin met anywhere; a reason where no point of the box has one
 * @param grid the least margin of the grid alone
 */
public record WorstPoint(List<Setting> settings, Outcome margin, Outcome grid) {

    /** Grid points in all, about. */
    private static final int GRID = 1000;

    private static final int FINEST_SIDE = 41;
    private static final int STARTS = 3;
    private static final int MOST_EVALUATIONS = 300;

    /** What a point without a margin counts as: worse to go to than any margin, yet finite, as the strategy needs it. */
    private static final double NOWHERE = 1e3;

    public WorstPoint {
        settings = List.copyOf(settings);
    }

    /** A point of the box with its margin. */
    private record Tried(List<Double> place, Outcome margin) {
        double size() {
            return margin.value().orElse(NOWHERE);
        }
    }

    /**
     * Searches the box.
     *
     * @param seed of the evolution strategy: the same seed finds the same point on any number of threads
     * @return empty where the machine has no ranges, or the watch ended the search
     */
    public static Optional<WorstPoint> of(Subject subject, FindingResult finding, long seed, int threads, Watch watch) {
        RangeBox box = RangeBox.of(subject);
        if (box.size() == 0) {
            return Optional.empty();
        }
        int side = (int) Math.min(FINEST_SIDE, Math.max(2, Math.round(Math.pow(GRID, 1.0 / box.size()))));
        Tried[] grid = new Tried[(int) Math.round(Math.pow(side, box.size()))];
        boolean whole = Workers.each(grid.length, threads, watch, () -> {
            Probe probe = finding.probe(subject.shownThrow());
            return i -> grid[i] = tried(subject, probe, box, gridPlace(i, side, box.size()));
        });
        List<Tried> all = new ArrayList<>(whole ? Arrays.asList(grid) : List.of());
        all.sort(Comparator.comparingDouble(Tried::size));
        int starts = Math.min(STARTS, all.size());
        Tried[] ends = new Tried[starts];
        boolean searched = whole
                && Workers.each(starts, threads, watch, () -> {
                    Probe probe = finding.probe(subject.shownThrow());
                    return i -> ends[i] = descend(subject, probe, box, all.get(i), 0.5 / (side - 1), seed + i);
                });
        if (!searched) {
            return Optional.empty();
        }
        Tried worst = IntStream.range(0, starts)
                .mapToObj(i -> ends[i])
                .reduce(all.get(0), (a, b) -> b.size() < a.size() ? b : a);
        return Optional.of(new WorstPoint(
                box.settings(worst.place()), worst.margin(), all.get(0).margin()));
    }

    private static List<Double> gridPlace(int number, int side, int dimensions) {
        List<Double> place = new ArrayList<>();
        int rest = number;
        for (int d = 0; d < dimensions; d++) {
            place.add((double) (rest % side) / (side - 1));
            rest /= side;
        }
        return place;
    }

    private static Tried tried(Subject subject, Probe probe, RangeBox box, List<Double> place) {
        return new Tried(place, subject.with(box.settings(place)).ask(probe));
    }

    private static Tried descend(Subject subject, Probe probe, RangeBox box, Tried start, double spread, long seed) {
        Tried[] least = {start};
        CMAESOptimizer strategy = new CMAESOptimizer(
                MOST_EVALUATIONS,
                Double.NEGATIVE_INFINITY,
                true,
                0,
                1,
                new MersenneTwister(seed),
                false,
                (n, a, b) -> Math.abs(a.getValue() - b.getValue()) < 1e-10 && n > 20);
        int size = box.size();
        double[] sigma = new double[size];
        Arrays.fill(sigma, Math.min(0.3, spread));
        double[] ones = new double[size];
        Arrays.fill(ones, 1);
        strategy.optimize(
                new MaxEval(100 * MOST_EVALUATIONS),
                GoalType.MINIMIZE,
                new ObjectiveFunction(place -> {
                    Tried here = tried(
                            subject, probe, box, Arrays.stream(place).boxed().toList());
                    least[0] = here.size() < least[0].size() ? here : least[0];
                    return here.size();
                }),
                new InitialGuess(start.place().stream().mapToDouble(x -> x).toArray()),
                new SimpleBounds(new double[size], ones),
                new CMAESOptimizer.Sigma(sigma),
                new CMAESOptimizer.PopulationSize(4 + (int) (3 * Math.log(size))));
        return least[0];
    }
}
