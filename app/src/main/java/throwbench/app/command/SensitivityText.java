package throwbench.app.command;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import throwbench.solver.document.result.Written;
import throwbench.solver.finding.Finding;
import throwbench.solver.map.Outcome;
import throwbench.solver.map.Sensitivity;
import throwbench.solver.map.Sensitivity.Influence;
import throwbench.solver.map.Subject;

/** Numbers of the machine file by their influence on a margin, a row a number. */
final class SensitivityText implements Written {

    private static final int CHANGE = 10;
    private static final int GAP = 2;
    private static final int KEY = 2 * (GAP + CHANGE) + GAP;

    private final Subject subject;
    private final MarginWords words;
    private final Sensitivity sensitivity;

    SensitivityText(Subject subject, Finding finding, Sensitivity sensitivity) {
        this.subject = subject;
        this.words = new MarginWords(finding);
        this.sensitivity = sensitivity;
    }

    @Override
    public void writeTo(OutputStream out) throws IOException {
        Finding finding = words.finding();
        List<String> lines = new ArrayList<>(TextColumns.wrap(StudyHeading.of(subject, finding), 0));
        lines.add(finding.criterion().title() + ": margin " + words.margin(sensitivity.margin()));
        lines.add("");
        lines.add("Change of the margin when a number changes by 1 % of its SI value, an angle by 1 deg:");
        lines.add("");
        lines.add(row("up", "down", "number"));
        int idle = 0;
        for (Influence influence : sensitivity.influences()) {
            boolean moves = influence.size() >= MarginWords.NOTHING || !isWhole(influence);
            idle += moves ? 0 : 1;
            if (moves) {
                add(influence, lines);
            }
        }
        if (idle > 0) {
            lines.add("");
            lines.add(idle == 1 ? "1 other number changes nothing." : idle + " other numbers change nothing.");
        }
        out.write((String.join("\n", lines) + "\n").getBytes(StandardCharsets.UTF_8));
    }

    private static boolean isWhole(Influence influence) {
        return influence.raised().isPossible() && influence.lowered().isPossible();
    }

    private void add(Influence influence, List<String> lines) {
        String key = influence.number().path().toString();
        String value = influence.number().quantity().text();
        int room = TextColumns.PAGE - KEY - GAP - TextColumns.width(value);
        lines.add(row(
                change(influence.raised()),
                change(influence.lowered()),
                TextColumns.cut(key, room) + " ".repeat(GAP) + value));
        addReason("up", influence.raised(), lines);
        addReason("down", influence.lowered(), lines);
    }

    private String change(Outcome change) {
        return change.isPossible() ? words.change(change.value().getAsDouble()) : "impossible";
    }

    private static void addReason(String way, Outcome change, List<String> lines) {
        if (!change.isPossible()) {
            lines.addAll(TextColumns.wrap(way + ": " + change.reason(), KEY));
        }
    }

    private static String row(String raised, String lowered, String rest) {
        String gap = " ".repeat(GAP);
        return gap + TextColumns.right(raised, CHANGE) + gap + TextColumns.right(lowered, CHANGE) + gap + rest;
    }
}
