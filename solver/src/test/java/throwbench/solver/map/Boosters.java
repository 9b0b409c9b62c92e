package throwbench.solver.map;

import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Objects;
import java.util.Scanner;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.Reading;
import throwbench.solver.document.attached.AttachedFiles;
import throwbench.solver.revolution.RunningMachine;

/** The machine of these tests, and what single evaluations by the machine file say of it. */
final class Boosters {

    static final String SPEED = "drive.speed";
    static final String SUCTION = "dutyPoints[0].stages.first.suctionPressure";
    static final double RPM = Math.PI / 30;

    private Boosters() {}

    static String text() {
        InputStream in = Objects.requireNonNull(Boosters.class.getResourceAsStream("booster.json"));
        try (Scanner whole = new Scanner(in, StandardCharsets.UTF_8).useDelimiter("\\A")) {
            return whole.next();
        }
    }

    /** The text with one piece replaced, which it must hold. */
    static String with(String piece, String by) {
        if (!text().contains(piece)) {
            throw new IllegalArgumentException("the file does not hold " + piece);
        }
        return text().replace(piece, by);
    }

    static Subject subject() {
        return subject(text(), 0, 0);
    }

    static Subject subject(String text, int duty, int shownThrow) {
        Reading reading = MachineDocument.read(text, AttachedFiles.NONE);
        return new Subject(
                reading.document().orElseThrow(),
                reading.machine().orElseThrow(() -> new AssertionError(reading.faults())),
                AttachedFiles.NONE,
                duty,
                shownThrow);
    }

    static Variable variable(Subject subject, String path) {
        Choice<Variable> choice = Variable.find(subject.document(), subject.machine(), path);
        return choice.chosen().orElseThrow(() -> new AssertionError(path + ": " + choice.fault()));
    }

    static Result result(Subject subject, String text) {
        return Result.find(subject.machine(), text).chosen().orElseThrow();
    }

    static FindingResult margin(String id) {
        return Result.findMargin(id).chosen().orElseThrow();
    }

    /** The machine that a text describes, running at its first duty point. */
    static RunningMachine running(MachineDocument document) {
        Reading reading = document.read(AttachedFiles.NONE);
        return RunningMachine.settle(
                        reading.machine().orElseThrow(),
                        reading.machine().orElseThrow().dutyPoints().get(0))
                .get();
    }

    /** A result of the first throw of one machine, read and solved by itself. */
    static Outcome alone(MachineDocument document, Result result) {
        return result.probe(0).at(running(document));
    }
}
