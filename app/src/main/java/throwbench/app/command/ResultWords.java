package throwbench.app.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import throwbench.solver.machine.Machine;
import throwbench.solver.map.Choice;
import throwbench.solver.map.FindingResult;
import throwbench.solver.map.Result;

/** Results by the words of an option; for a word that is none, those there are. */
final class ResultWords {

    private ResultWords() {}

    /** The result of {@code map}; empty, and said, where there is none. */
    static Optional<Result> result(Option option, String word, Machine machine, Terminal terminal) {
        Choice<Result> choice = Result.find(machine, word);
        if (choice.chosen().isEmpty()) {
            List<String> known = new ArrayList<>();
            for (String id : Result.findings()) {
                known.add(id);
                known.add(id + ".margin");
            }
            for (String column : Result.columns(machine)) {
                known.add(column + ".max");
                known.add(column + ".min");
            }
            refuse(option, word, choice.fault(), known, terminal);
            list(option, "ID and ID.margin", Result.findings(), terminal);
            list(option, "COLUMN.max and COLUMN.min", Result.columns(machine), terminal);
        }
        return choice.chosen();
    }

    /** The finding of {@code limit} and {@code sensitivity}; empty, and said, where there is none. */
    static Optional<FindingResult> margin(Option option, String word, Terminal terminal) {
        Choice<FindingResult> choice = Result.findMargin(word);
        if (choice.chosen().isEmpty()) {
            refuse(option, word, choice.fault(), Result.findings(), terminal);
            list(option, "ID", Result.findings(), terminal);
        }
        return choice.chosen();
    }

    private static void refuse(Option option, String word, String fault, List<String> known, Terminal terminal) {
        List<String> near = NearWords.of(word, known);
        String perhaps = near.isEmpty() ? "" : "; perhaps " + near.get(0);
        terminal.complain("throwbench", option.word(), fault + " \"" + word + "\"" + perhaps);
    }

    private static void list(Option option, String what, List<String> known, Terminal terminal) {
        terminal.complain("throwbench", option.word(), what + " of " + String.join(", ", known));
    }
}
