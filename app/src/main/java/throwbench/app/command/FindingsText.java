package throwbench.app.command;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import throwbench.solver.document.result.Written;
import throwbench.solver.finding.Criterion;
import throwbench.solver.finding.Finding;
import throwbench.solver.finding.Judgement;
import throwbench.solver.finding.Verdict;
import throwbench.solver.machine.DutyPoint;

/**
 * Findings for people: a row for each criterion and what it judges, with its worst duty point under it, so that many duty
 * points make no more rows; then the answer in one line, and the caution.
 */
final class FindingsText implements Written {

    private static final String CAUTION =
            "Results support, and do not replace, the manufacturer's limits, local codes and"
                    + " the judgement of a licensed engineer.";

    /** Blanks between two columns. */
    private static final int GAP = 2;

    /** The column of {@link Row} that gives way where the page is too narrow. */
    private static final int SUBJECT = 2;

    private static final int VERDICT_WIDTH = 10;

    private final String machineName;
    private final List<DutyPoint> duties;
    private final Judgement judgement;
    private final List<FindingGroup> groups;

    FindingsText(String machineName, List<DutyPoint> duties, Judgement judgement) {
        this.machineName = machineName;
        this.duties = List.copyOf(duties);
        this.judgement = judgement;
        this.groups = FindingGroup.of(judgement.findings());
    }

    @Override
    public void writeTo(OutputStream out) throws IOException {
        List<String> lines = new ArrayList<>();
        lines.addAll(TextColumns.wrap(heading(), 0));
        lines.add("");
        List<Row> rows = new ArrayList<>();
        for (FindingGroup group : groups) {
            rows.add(Row.of(group));
        }
        int[] widths = widths(rows);
        for (int i = 0; i < rows.size(); i++) {
            lines.add(rows.get(i).line(widths));
            addDetails(groups.get(i), widths, lines);
        }
        lines.add("");
        lines.addAll(TextColumns.wrap(answer(), 0));
        lines.addAll(TextColumns.wrap(CAUTION, 0));
        out.write((String.join("\n", lines) + "\n").getBytes(StandardCharsets.UTF_8));
    }

    private String heading() {
        String name = TextColumns.cut(machineName, Integer.MAX_VALUE);
        return duties.size() == 1
                ? name + " at \"" + duties.get(0).name() + "\""
                : name + " at " + duties.size() + " duty points";
    }

    private void addDetails(FindingGroup group, int[] widths, List<String> lines) {
        int indent = VERDICT_WIDTH + GAP;
        String subject = group.subject();
        String whole = TextColumns.width(subject) > widths[SUBJECT] ? subject + "; " : "";
        String details = whole + group.details(duties.size() > 1);
        for (String text : List.of(details, group.spread())) {
            if (!text.isEmpty()) {
                lines.addAll(TextColumns.wrap(TextColumns.cut(text, Integer.MAX_VALUE), indent));
            }
        }
    }

    private static int[] widths(List<Row> rows) {
        int[] widths = new int[Row.COLUMNS];
        int sum = (Row.COLUMNS - 1) * GAP;
        for (int c = 0; c < Row.COLUMNS; c++) {
            for (Row row : rows) {
                widths[c] = Math.max(widths[c], TextColumns.width(row.cell(c)));
            }
            widths[c] = c == 0 ? VERDICT_WIDTH : widths[c];
            sum += widths[c];
        }
        widths[SUBJECT] -= Math.max(0, sum - TextColumns.PAGE);
        return widths;
    }

    private String answer() {
        List<Finding> judged = judgement.findings().stream()
                .filter(f -> f.margin().isPresent())
                .toList();
        if (judged.isEmpty()) {
            return "Nothing is judged: no limit is given for what could be found.";
        }
        long failed =
                judged.stream().filter(f -> f.verdict() == Verdict.NOT_MET).count();
        Finding worst = judged.get(0);
        String before = failed == 0
                ? "All " + judged.size() + " judged findings are met; closest: "
                : failed + " of " + judged.size() + " judged findings " + (failed == 1 ? "is" : "are")
                        + " not met; worst: ";
        String after = ", " + Row.margin(worst) + ".";
        String what = worst.criterion().title() + " of " + FindingGroup.subject(worst.where())
                + (duties.size() > 1 ? " at \"" + worst.where().duty() + "\"" : "");
        return before + TextColumns.cut(what, Integer.MAX_VALUE) + after;
    }

    /** One row's cells. */
    private record Row(List<String> cells) {

        static final int COLUMNS = 7;
        private static final int VALUE = 3;

        static Row of(FindingGroup group) {
            Finding finding = group.shown();
            Criterion criterion = finding.criterion();
            double limit = finding.limit().orElse(0);
            double size = Math.max(Math.abs(limit), Math.abs(finding.value().orElse(0)));
            return new Row(List.of(
                    switch (finding.verdict()) {
                        case MET -> "met";
                        case NOT_MET -> "NOT MET";
                        case NOT_JUDGED -> "not judged";
                    },
                    criterion.title(),
                    TextColumns.cut(group.subject(), Integer.MAX_VALUE),
                    cell(finding.value(), criterion, size),
                    finding.limit().isEmpty() ? "" : criterion.limitIsGreatest() ? "at most" : "at least",
                    finding.limit().isEmpty() ? "" : cell(finding.limit(), criterion, size),
                    margin(finding)));
        }

        private static String cell(OptionalDouble value, Criterion criterion, double size) {
            if (value.isEmpty()) {
                return "-";
            }
            ShownValue read = ShownValue.of(value.getAsDouble(), criterion.unit(), size);
            return (read.number() + " " + read.unit()).strip();
        }

        static String margin(Finding finding) {
            if (finding.margin().isEmpty()) {
                return "";
            }
            double margin = finding.margin().getAsDouble();
            // against a limit of 0 there is no share, the margin is the difference itself
            return finding.limit().orElse(1) == 0
                    ? cell(finding.margin(), finding.criterion(), margin)
                    : ShownValue.percent(margin);
        }

        String cell(int column) {
            return cells.get(column);
        }

        String line(int[] widths) {
            StringBuilder line = new StringBuilder();
            for (int c = 0; c < COLUMNS; c++) {
                String cell = TextColumns.cut(cells.get(c), widths[c]);
                boolean number = c == VALUE || c > VALUE + 1;
                line.append(number ? TextColumns.right(cell, widths[c]) : TextColumns.left(cell, widths[c]));
                line.append(" ".repeat(c + 1 < COLUMNS ? GAP : 0));
            }
            return line.toString().stripTrailing();
        }
    }
}
