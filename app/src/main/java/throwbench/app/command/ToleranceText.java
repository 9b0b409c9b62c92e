package throwbench.app.command;

import java.io.IOException;
import java.io.OutputStream;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import throwbench.solver.document.NumericKey;
import throwbench.solver.document.result.Written;
import throwbench.solver.map.Subject;
import throwbench.solver.map.ToleranceStudy;
import throwbench.solver.map.ToleranceStudy.Spread;

/** What tolerances do to the judged findings, a row a finding. */
final class ToleranceText implements Written {

    private static final int GAP = 2;
    private static final int NUMBER = 9;

    private final Subject subject;
    private final ToleranceStudy study;
    private final long seed;

    ToleranceText(Subject subject, ToleranceStudy study, long seed) {
        this.subject = subject;
        this.study = study;
        this.seed = seed;
    }

    @Override
    public void writeTo(OutputStream out) throws IOException {
        List<String> lines = new ArrayList<>(TextColumns.wrap(StudyHeading.ofMachine(subject), 0));
        List<NumericKey> numbers = ToleranceStudy.toleranced(subject);
        lines.add(study.samples() + (study.samples() == 1 ? " machine" : " machines") + " drawn with seed " + seed
                + " within the tolerances of " + numbers.size()
                + (numbers.size() == 1 ? " quantity:" : " quantities:"));
        for (NumericKey number : numbers) {
            lines.addAll(
                    TextColumns.wrap(number.path() + " " + number.quantity().text(), GAP));
        }
        lines.add("");
        addRows(lines);
        lines.add("");
        answer().forEach(sentence -> lines.addAll(TextColumns.wrap(sentence, 0)));
        out.write((String.join("\n", lines) + "\n").getBytes(StandardCharsets.UTF_8));
    }

    private void addRows(List<String> lines) {
        int title = "finding".length();
        for (Spread spread : study.spreads()) {
            title = Math.max(
                    title, TextColumns.width(spread.nominal().criterion().title()));
        }
        int place = TextColumns.PAGE - title - 4 * NUMBER - 5 * GAP;
        lines.add(line("met by", "finding", title, List.of("margin", "5 %", "95 %"), "", 0));
        for (Spread spread : study.spreads()) {
            MarginWords words = new MarginWords(spread.nominal());
            lines.add(line(
                    share(study.shareMet(spread)),
                    spread.nominal().criterion().title(),
                    title,
                    List.of(
                            words.margin(spread.nominal().margin().orElseThrow()),
                            said(words, spread.low()),
                            said(words, spread.high())),
                    FindingGroup.subject(spread.nominal().where()),
                    place));
        }
    }

    private static String line(
            String share, String finding, int title, List<String> margins, String subject, int room) {
        StringBuilder line = new StringBuilder(TextColumns.right(share, NUMBER));
        line.append(" ".repeat(GAP)).append(TextColumns.left(finding, title));
        for (String margin : margins) {
            line.append(" ".repeat(GAP)).append(TextColumns.right(margin, NUMBER));
        }
        return (line + " ".repeat(GAP) + TextColumns.cut(subject, room)).stripTrailing();
    }

    private static String said(MarginWords words, OptionalDouble margin) {
        return margin.isPresent() ? words.margin(margin.getAsDouble()) : "-";
    }

    /** Never rounded up: all of them is said of all of them alone. */
    private static String share(double share) {
        return BigDecimal.valueOf(100 * share).setScale(2, RoundingMode.DOWN) + " %";
    }

    private List<String> answer() {
        List<String> sentences = new ArrayList<>();
        if (study.spreads().isEmpty()) {
            sentences.add("Nothing is judged: no limit is given for what could be found.");
        } else {
            sentences.add(
                    "5 % and 95 %: the margins that so many of the machines stay below; margin: without tolerances.");
            sentences.add(share((double) study.meetingAll() / study.samples())
                    + " of the machines meet every judged finding.");
        }
        if (study.impossible() > 0) {
            sentences.add(study.impossible() + " of them cannot run and meet nothing; the first: " + study.reason());
        }
        return sentences;
    }
}
