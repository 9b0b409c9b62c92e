package throwbench.solver.revolution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.TimeUnit;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.Reading;
import throwbench.solver.document.attached.AttachedFiles;
import throwbench.solver.machine.Machine;
import throwbench.solver.trial.MachineText;

/**
 * Random machines of every kind, from their file to the summary: whatever comes out is a finite number, or a sentence that
 * says why there is none. {@code -Dthrowbench.machines=100000} tries that many; {@code -Dthrowbench.firstMachine} starts
 * elsewhere.
 */
class ManyMachinesTest {

    private static final long COUNT = Long.getLong("throwbench.machines", 300);
    private static final long FIRST = Long.getLong("throwbench.firstMachine", 0);

    /** What became of one machine. */
    private record Fate(long number, boolean invalid, boolean refused, String trouble) {}

    @Test
    @Timeout(value = 12, unit = TimeUnit.HOURS)
    void everyMachineGivesFiniteNumbersOrASentence() {
        List<Fate> fates = LongStream.range(FIRST, FIRST + COUNT)
                .parallel()
                .mapToObj(ManyMachinesTest::fate)
                .toList();
        List<String> troubles = fates.stream()
                .filter(f -> !f.trouble().isEmpty())
                .map(f -> "machine " + f.number() + ": " + f.trouble())
                .toList();
        assertEquals(List.of(), troubles);
        long invalid = fates.stream().filter(Fate::invalid).count();
        long refused = fates.stream().filter(Fate::refused).count();
        assertTrue(invalid < 0.15 * COUNT + 5, invalid + " of " + COUNT + " are not valid: too few are tried");
        assertTrue(refused < 0.15 * COUNT + 5, refused + " of " + COUNT + " are refused: too few are tried");
    }

    private static Fate fate(long number) {
        Reading reading = MachineDocument.read(MachineText.of(number), AttachedFiles.NONE);
        if (reading.machine().isEmpty()) {
            boolean told = reading.faults().stream()
                    .allMatch(f -> !f.path().isEmpty() && !f.line().contains("NaN"));
            return new Fate(number, true, false, told ? "" : "unclear faults " + reading.faults());
        }
        Machine machine = reading.machine().get();
        Settling settling = RunningMachine.settle(machine, machine.dutyPoints().get(0));
        if (settling.running().isEmpty()) {
            boolean told = settling.refusals().stream()
                    .allMatch(r -> r.sentence().length() > 10 && !r.sentence().contains("NaN"));
            return new Fate(number, false, true, told ? "" : "unclear refusals " + settling.refusals());
        }
        List<String> wrong = new ArrayList<>();
        for (int t = 0; t < machine.throwsInOrder().size(); t++) {
            judge(Summary.of(settling.get(), t, Optional.empty()), wrong);
        }
        return new Fate(number, false, false, wrong.isEmpty() ? "" : String.join(", ", wrong.subList(0, 1)));
    }

    private static void judge(Summary summary, List<String> wrong) {
        Revolution revolution = summary.revolution();
        for (Column column : Column.values()) {
            for (int i = 0; i < revolution.count(); i++) {
                finite(column.fileName() + " at station " + i, revolution.at(column, i), wrong);
            }
        }
        summary.extremes().forEach((column, e) -> {
            finite("least " + column, e.least().value(), wrong);
            finite("greatest " + column, e.greatest().value(), wrong);
        });
        for (int c = 0; c < summary.pressures().size(); c++) {
            double least = summary.pressures().get(c).least().value();
            finite("pressure", least, wrong);
            finite("pressure", summary.pressures().get(c).greatest().value(), wrong);
        }
        Reversal reversal = summary.reversal();
        double turn =
                reversal.spans().stream().mapToDouble(Reversal.Span::length).sum();
        if (Math.abs(turn - 2 * Math.PI) > 1e-9 || reversal.signChanges().size() % 2 != 0) {
            wrong.add("spans " + reversal);
        }
        finite("mean torque", summary.meanShaftTorque(), wrong);
        finite("fluctuation", summary.speedFluctuation(), wrong);
        finite("power", summary.machineFlow().totalPower(), wrong);
        for (OptionalDouble mass : summary.machineFlow().capacity().values()) {
            mass.ifPresent(m -> finite("capacity", m, wrong));
        }
    }

    private static void finite(String what, double value, List<String> wrong) {
        if (!Double.isFinite(value)) {
            wrong.add(what + " is " + value);
        }
    }
}
