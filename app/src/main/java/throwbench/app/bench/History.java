package throwbench.app.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import throwbench.solver.document.MachineDocument;

/**
 * Every document of this sitting, with the name of the edit that made it. Documents are immutable, so going back is taking
 * an earlier one.
 */
final class History {

    /** @param path key path that was edited, for joining a run of live changes into one step; empty for other edits */
    private record Step(MachineDocument document, String name, String path) {}

    private final List<Step> steps = new ArrayList<>();
    private int at;

    History(MachineDocument first) {
        steps.add(new Step(first, "", ""));
    }

    MachineDocument present() {
        return steps.get(at).document();
    }

    /** Adds an edit after the present one; what was undone before is gone. */
    void add(MachineDocument next, String name, String path, boolean joins) {
        while (steps.size() > at + 1) {
            steps.remove(steps.size() - 1);
        }
        boolean joined =
                joins && at > 0 && !path.isEmpty() && steps.get(at).path().equals(path);
        if (joined) {
            steps.set(at, new Step(next, name, path));
        } else {
            steps.add(new Step(next, name, path));
            at++;
        }
    }

    Optional<String> undoName() {
        return at > 0 ? Optional.of(steps.get(at).name()) : Optional.empty();
    }

    Optional<String> redoName() {
        return at + 1 < steps.size() ? Optional.of(steps.get(at + 1).name()) : Optional.empty();
    }

    MachineDocument undo() {
        at = Math.max(0, at - 1);
        return present();
    }

    MachineDocument redo() {
        at = Math.min(steps.size() - 1, at + 1);
        return present();
    }
}
