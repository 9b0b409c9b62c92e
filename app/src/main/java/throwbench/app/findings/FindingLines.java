package throwbench.app.findings;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import throwbench.solver.finding.Finding;

/** Which lines the panel lists: for every criterion its worst finding, and the others where the user spread them. */
final class FindingLines {

    private final Set<String> spread = new HashSet<>();
    private final Set<FindingLine.Key> open = new HashSet<>();

    /** Lists or hides the other findings of a criterion. */
    void toggleSpread(String criterion) {
        if (!spread.remove(criterion)) {
            spread.add(criterion);
        }
    }

    /** Whether the other findings of a criterion are listed. */
    boolean isSpread(String criterion) {
        return spread.contains(criterion);
    }

    /** Opens or shuts a finding's formula, inputs and source. */
    void toggleOpen(Finding finding) {
        FindingLine.Key key = FindingLine.Key.of(finding);
        if (!open.remove(key)) {
            open.add(key);
        }
    }

    /** The lines of these findings, which come worst first. */
    List<FindingLine> of(List<Finding> findings) {
        Map<String, List<Finding>> byCriterion = new LinkedHashMap<>();
        for (Finding finding : findings) {
            byCriterion
                    .computeIfAbsent(finding.criterion().id(), id -> new ArrayList<>())
                    .add(finding);
        }
        List<FindingLine> lines = new ArrayList<>();
        byCriterion.forEach((criterion, group) -> {
            boolean listed = spread.contains(criterion);
            for (int i = 0; i < (listed ? group.size() : 1); i++) {
                Finding finding = group.get(i);
                boolean head = i == 0;
                lines.add(new FindingLine(
                        finding,
                        head,
                        head ? group.size() - 1 : 0,
                        listed,
                        open.contains(FindingLine.Key.of(finding))));
            }
        });
        return lines;
    }
}
