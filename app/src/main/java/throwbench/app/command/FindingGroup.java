package throwbench.app.command;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import throwbench.solver.finding.Criterion;
import throwbench.solver.finding.Finding;
import throwbench.solver.finding.Verdict;

/**
 * The findings of one criterion for one throw, stage, chamber or machine, one a duty point, the worst first; for several throws
 * or chambers together where the same input is missing for all of them.
 *
 * @param findings at least one
 */
record FindingGroup(List<Finding> findings) {

    /** More names than this, and the reader is better served by the JSON. */
    private static final int NAMED = 5;

    FindingGroup {
        findings = List.copyOf(findings);
    }

    /** Gathers findings that stand worst first; so do the groups. */
    static List<FindingGroup> of(List<Finding> findings) {
        record Subject(String id, String of) {}
        Map<Subject, List<Finding>> groups = new LinkedHashMap<>();
        for (Finding finding : findings) {
            Subject subject = new Subject(finding.criterion().id(), subject(finding.where()));
            groups.computeIfAbsent(subject, s -> new ArrayList<>()).add(finding);
        }
        return toGroups(gathered(groups.values()));
    }

    /** Lists of one criterion that lack their value for one reason throughout become one list. */
    private static Collection<List<Finding>> gathered(Collection<List<Finding>> lists) {
        record Lack(String id, String note) {}
        Map<Object, List<Finding>> gathered = new LinkedHashMap<>();
        for (List<Finding> list : lists) {
            Finding first = list.get(0);
            boolean lacking =
                    list.stream().allMatch(f -> f.value().isEmpty() && f.note().equals(first.note()));
            Object key = lacking ? new Lack(first.criterion().id(), first.note()) : list;
            gathered.computeIfAbsent(key, k -> new ArrayList<>()).addAll(list);
        }
        return gathered.values();
    }

    private static List<FindingGroup> toGroups(Collection<List<Finding>> lists) {
        return lists.stream().map(FindingGroup::new).toList();
    }

    /** What a finding is about, without its duty point. */
    static String subject(Finding.Place where) {
        return where.chamber()
                .map(name -> "chamber " + name)
                .or(() -> where.throwName().map(name -> "throw " + name))
                .or(() -> where.stage().map(name -> "stage " + name))
                .orElse("machine");
    }

    /** What the findings are about, several of a kind in one: "throw A, B". */
    String subject() {
        List<String> subjects =
                findings.stream().map(f -> subject(f.where())).distinct().toList();
        StringBuilder text = new StringBuilder(subjects.get(0));
        for (String more : subjects.subList(1, subjects.size())) {
            text.append(", ").append(more.substring(more.indexOf(' ') + 1));
        }
        return text.toString();
    }

    Criterion criterion() {
        return findings.get(0).criterion();
    }

    /** The finding to show: the worst one; where none is judged, the one of the greatest size. */
    Finding shown() {
        Finding shown = findings.get(0);
        if (shown.margin().isPresent()) {
            return shown;
        }
        for (Finding finding : findings) {
            if (size(finding) > size(shown)) {
                shown = finding;
            }
        }
        return shown;
    }

    private static double size(Finding finding) {
        return Math.abs(finding.value().orElse(-1));
    }

    /** Where the shown finding stands and what there is to know of it; empty where nothing is. */
    String details(boolean severalDuties) {
        Finding shown = shown();
        List<String> parts = new ArrayList<>();
        List<String> place = new ArrayList<>();
        if (severalDuties && shown.value().isPresent()) {
            String rank = findings.size() == 1 ? "at" : shown.margin().isPresent() ? "worst at" : "greatest at";
            place.add(rank + " \"" + shown.where().duty() + "\"");
        }
        shown.angle().ifPresent(angle -> place.add("crank angle " + ShownValue.degrees(angle)));
        if (!place.isEmpty()) {
            parts.add(String.join(", ", place));
        }
        if (!shown.note().isEmpty()) {
            parts.add(shown.note());
        }
        return String.join("; ", parts);
    }

    /** How the other duty points fare; empty where there is only one. */
    String spread() {
        if (findings.size() == 1) {
            return "";
        }
        List<Finding> failed = with(Verdict.NOT_MET);
        if (!failed.isEmpty()) {
            return "not met at " + failed.size() + " of " + findings.size() + " duty points: " + names(failed);
        }
        List<Finding> open = with(Verdict.NOT_JUDGED);
        if (open.isEmpty()) {
            return "met at all " + findings.size() + " duty points";
        }
        if (open.size() < findings.size()) {
            return "not judged at " + open.size() + " of " + findings.size() + " duty points: " + names(open);
        }
        return least();
    }

    private List<Finding> with(Verdict verdict) {
        return findings.stream().filter(f -> f.verdict() == verdict).toList();
    }

    private static String names(List<Finding> some) {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < some.size() && i < NAMED; i++) {
            text.append(i == 0 ? "\"" : ", \"")
                    .append(some.get(i).where().duty())
                    .append('"');
        }
        return some.size() > NAMED ? text + " and " + (some.size() - NAMED) + " more" : text.toString();
    }

    private String least() {
        Finding least = shown();
        for (Finding finding : findings) {
            if (finding.value().isPresent() && size(finding) < size(least)) {
                least = finding;
            }
        }
        OptionalDouble value = least.value();
        if (value.isEmpty() || least.equals(shown())) {
            return value.isEmpty() ? "" : "the same at all " + findings.size() + " duty points";
        }
        ShownValue read = ShownValue.of(value.getAsDouble(), criterion().unit(), value.getAsDouble());
        return "least of " + findings.size() + " duty points: " + (read.number() + " " + read.unit()).strip() + " at \""
                + least.where().duty() + "\"";
    }
}
