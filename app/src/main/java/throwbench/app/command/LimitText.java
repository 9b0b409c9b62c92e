package throwbench.app.command;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.document.result.Written;
import throwbench.solver.finding.Finding;
import throwbench.solver.map.Crossing;
import throwbench.solver.map.FindingResult;
import throwbench.solver.map.LimitSearch;
import throwbench.solver.map.Outcome;
import throwbench.solver.map.Setting;
import throwbench.solver.map.Subject;

/** What was found between two values of a number: where the limit is just met, and how the margin runs. */
final class LimitText implements Written {

    private static final int GAP = 2;

    private final Subject subject;
    private final Stretch stretch;
    private final FindingResult result;
    private final LimitSearch search;

    LimitText(Subject subject, Stretch stretch, FindingResult result, LimitSearch search) {
        this.subject = subject;
        this.stretch = stretch;
        this.result = result;
        this.search = search;
    }

    @Override
    public void writeTo(OutputStream out) throws IOException {
        MarginWords words = new MarginWords(someFinding());
        List<String> lines = new ArrayList<>();
        lines.addAll(TextColumns.wrap(StudyHeading.of(subject, words.finding()), 0));
        String range = words.finding().criterion().title() + " over " + stretch.variable() + " from "
                + said(search.from()) + " to " + said(search.to());
        lines.addAll(TextColumns.wrap(range, 0));
        lines.add("");
        addCrossings(words, lines);
        lines.add("");
        ends(words).forEach(end -> lines.addAll(TextColumns.wrap(end, 0)));
        out.write((String.join("\n", lines) + "\n").getBytes(StandardCharsets.UTF_8));
    }

    /** The finding at the first value where it has a margin; the search has made sure that there is one. */
    private Finding someFinding() {
        for (int i = 0; i < search.scan().size(); i++) {
            if (search.scan().get(i).isPossible()) {
                Optional<Finding> finding = subject.with(List.of(new Setting(stretch.variable(), search.at(i))))
                        .running()
                        .flatMap(running -> result.finding(running, subject.shownThrow()));
                if (finding.isPresent()) {
                    return finding.get();
                }
            }
        }
        throw new IllegalStateException("no margin of " + result.text() + " anywhere");
    }

    private String said(double value) {
        return stretch.said(value, subject.document().ambientPressure());
    }

    private void addCrossings(MarginWords words, List<String> lines) {
        if (search.crossings().isEmpty()) {
            boolean met = search.scan().get(0).value().orElse(0) >= 0;
            lines.add("  nowhere just met: " + (met ? "met" : "not met") + " all the way");
            return;
        }
        int width = 0;
        for (Crossing crossing : search.crossings()) {
            width = Math.max(width, TextColumns.width(said(crossing.at())));
        }
        int indent = 2 + "just met at".length() + GAP + width + GAP;
        for (Crossing crossing : search.crossings()) {
            String kind =
                    switch (crossing.kind()) {
                        case ZERO -> "just met at";
                        case STEP -> "steps at";
                        case EDGE -> "ends at";
                    };
            String start = "  " + TextColumns.left(kind, "just met at".length() + GAP)
                    + TextColumns.right(said(crossing.at()), width) + " ".repeat(GAP);
            List<String> details = TextColumns.wrap(details(crossing, words), indent);
            lines.add(start + details.get(0).substring(indent));
            lines.addAll(details.subList(1, details.size()));
        }
    }

    private static String details(Crossing crossing, MarginWords words) {
        Outcome below = crossing.below();
        Outcome above = crossing.above();
        if (!below.isPossible()) {
            return verdict(above) + " above; not possible below: " + below.reason();
        }
        if (!above.isPossible()) {
            return verdict(below) + " below; not possible above: " + above.reason();
        }
        boolean step = crossing.kind() == Crossing.Kind.STEP;
        return verdict(below) + (step ? " (" + margin(below, words) + ")" : "") + " below, " + verdict(above)
                + (step ? " (" + margin(above, words) + ")" : "") + " above";
    }

    private static String verdict(Outcome outcome) {
        return outcome.value().orElse(0) >= 0 ? "met" : "not met";
    }

    private static String margin(Outcome outcome, MarginWords words) {
        return words.margin(outcome.value().orElse(0));
    }

    /** The margin at both ends and where it is least. */
    private List<String> ends(MarginWords words) {
        int least = -1;
        int last = search.scan().size() - 1;
        for (int i = 0; i <= last; i++) {
            OptionalDouble margin = search.scan().get(i).value();
            boolean less = margin.isPresent()
                    && (least < 0
                            || margin.getAsDouble()
                                    < search.scan().get(least).value().getAsDouble());
            least = less ? i : least;
        }
        String ends = "Margin " + at(0, words) + " and " + at(last, words);
        return List.of(ends + (least > 0 && least < last ? "; least, " + at(least, words) : "") + ".");
    }

    private String at(int place, MarginWords words) {
        OptionalDouble margin = search.scan().get(place).value();
        return (margin.isPresent() ? words.margin(margin.getAsDouble()) : "none") + " at " + said(search.at(place));
    }
}
