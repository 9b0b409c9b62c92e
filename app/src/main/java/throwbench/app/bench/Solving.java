package throwbench.app.bench;

import java.util.List;
import java.util.Optional;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.finding.Finding;
import throwbench.solver.finding.Judgement;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.revolution.Refusal;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Settling;
import throwbench.solver.revolution.Summary;

/** Turns a wish into a state to show: settles, solves and judges. Keeps geometry from one state to the next. */
final class Solving {

    private Optional<Summary> earlier = Optional.empty();
    private Optional<Judged> judged = Optional.empty();

    /** The last judgement, which holds as long as the machine is the same one. */
    private record Judged(MachineDocument document, List<Finding> findings) {}

    /** What came of a wish: a state to show, or why its machine cannot be solved. */
    record Outcome(Wish wish, Optional<Shown> shown, List<Refusal> refusals) {}

    Outcome solve(Wish wish) {
        long start = System.nanoTime();
        Wish.Choice choice = wish.choice().within(wish.machine());
        DutyPoint duty = wish.machine().dutyPoints().get(choice.dutyIndex());
        Settling settling = RunningMachine.settle(wish.machine(), duty);
        if (settling.running().isEmpty()) {
            return new Outcome(wish, Optional.empty(), settling.refusals());
        }
        Summary summary = Summary.of(settling.get(), choice.throwIndex(), earlier);
        earlier = Optional.of(summary);
        double solveMillis = (System.nanoTime() - start) / 1e6;
        Shown shown = new Shown(
                wish.document(),
                wish.machine(),
                choice.dutyIndex(),
                choice.throwIndex(),
                summary,
                findings(wish),
                choice.units(),
                solveMillis);
        return new Outcome(wish, Optional.of(shown), List.of());
    }

    private List<Finding> findings(Wish wish) {
        Optional<Judged> known = judged.filter(j -> j.document().equals(wish.document()));
        if (known.isPresent()) {
            return known.get().findings();
        }
        List<Finding> findings =
                Judgement.of(wish.machine(), wish.machine().dutyPoints()).findings();
        judged = Optional.of(new Judged(wish.document(), findings));
        return findings;
    }
}
