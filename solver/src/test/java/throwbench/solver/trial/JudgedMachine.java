package throwbench.solver.trial;

import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;
import java.util.Scanner;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.Reading;
import throwbench.solver.document.attached.AttachedFiles;
import throwbench.solver.finding.Finding;
import throwbench.solver.finding.JudgedPoints;
import throwbench.solver.finding.Judgement;
import throwbench.solver.machine.Machine;

/** A machine file whose text a test changes before it is judged. */
public record JudgedMachine(String text) {

    /** Two throws, two stages of gas in series, sizes of parts on the first throw alone. */
    public static JudgedMachine twoStages() {
        String resource = "/throwbench/solver/finding/two-stages.json";
        InputStream in = Objects.requireNonNull(JudgedMachine.class.getResourceAsStream(resource), resource);
        try (Scanner whole = new Scanner(in, StandardCharsets.UTF_8).useDelimiter("\\A")) {
            return new JudgedMachine(whole.next());
        }
    }

    /** With a piece of its text, which must be there, put for another, at every place. */
    public JudgedMachine with(String piece, String other) {
        if (!text.contains(piece)) {
            throw new IllegalArgumentException("the machine file has no " + piece);
        }
        return new JudgedMachine(text.replace(piece, other));
    }

    /** With more keys at the end of the machine. */
    public JudgedMachine and(String keys) {
        int end = text.lastIndexOf('}');
        return new JudgedMachine(text.substring(0, end) + ", " + keys + " }");
    }

    public Machine machine() {
        Reading reading = MachineDocument.read(text, AttachedFiles.NONE);
        return reading.machine()
                .orElseThrow(() -> new AssertionError(reading.faults().toString()));
    }

    /** Judged at every duty point that there is. */
    public List<Finding> findings() {
        Machine machine = machine();
        Judgement judgement = Judgement.of(machine, JudgedPoints.of(machine).points());
        if (!judgement.refusals().isEmpty()) {
            throw new AssertionError(judgement.refusals().toString());
        }
        return judgement.findings();
    }

    /** The one finding of an id about a throw, stage or chamber of this name; about the machine where it is empty. */
    public Finding finding(String id, String about) {
        List<Finding> found = findings().stream()
                .filter(f -> f.criterion().id().equals(id))
                .filter(f -> about.equals(f.where()
                        .chamber()
                        .or(f.where()::throwName)
                        .or(f.where()::stage)
                        .orElse("")))
                .toList();
        if (found.size() != 1) {
            throw new AssertionError(id + " of " + about + ": " + found);
        }
        return found.get(0);
    }

    public double value(String id, String about) {
        Finding finding = finding(id, about);
        return finding.value().orElseThrow(() -> new AssertionError(finding.note()));
    }
}
