package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import throwbench.solver.document.MachineFile;
import throwbench.solver.document.Reading;
import throwbench.solver.document.attached.AttachedFiles;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.Quantity;
import throwbench.solver.document.quantity.QuantityText;
import throwbench.solver.map.Crossing;
import throwbench.solver.map.LimitSearch;
import throwbench.solver.map.Outcome;
import throwbench.solver.map.Result;
import throwbench.solver.map.Subject;
import throwbench.solver.map.Variable;

/** Words for crossings of every kind, whatever machine would have them. */
class LimitTextTest {

    private static final double RPM = Math.PI / 30;

    @TempDir
    Path folder;

    private static Quantity rpm(String text) {
        return (Quantity) QuantityText.read(text, Dimension.ROTATION_SPEED, 0);
    }

    @Test
    void aStepShowsTheMarginOnBothSides() throws IOException {
        Reading reading = MachineFile.read(Run.machine(folder));
        Subject subject = new Subject(
                reading.document().orElseThrow(), reading.machine().orElseThrow(), AttachedFiles.NONE, 0, 0);
        Variable speed = Variable.find(subject.document(), subject.machine(), "drive.speed")
                .chosen()
                .orElseThrow();
        List<Crossing> crossings = List.of(
                new Crossing(Crossing.Kind.STEP, 700 * RPM, Outcome.of(0.125), Outcome.of(-1)),
                new Crossing(Crossing.Kind.EDGE, 950.5 * RPM, Outcome.of(-1), Outcome.impossible("the shaft is gone")));
        LimitSearch search =
                new LimitSearch(600 * RPM, 1000 * RPM, Collections.nCopies(201, Outcome.of(0.25)), crossings);
        LimitText text = new LimitText(
                subject,
                new Stretch(speed, rpm("600 rpm"), rpm("1000 rpm"), 2),
                Result.findMargin("reversal-duration").chosen().orElseThrow(),
                search);
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        text.writeTo(out);

        assertEquals("""
                Saltmarsh biogas booster at "normal", throw A
                reversal, span over drive.speed from 600 rpm to 1000 rpm

                  steps at       700 rpm  met (+12.5 %) below, not met (-100.0 %) above
                  ends at      950.5 rpm  not met below; not possible above: the shaft is gone

                Margin +25.0 % at 600 rpm and +25.0 % at 1000 rpm.
                """, out.toString(StandardCharsets.UTF_8));
    }
}
