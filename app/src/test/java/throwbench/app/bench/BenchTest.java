package throwbench.app.bench;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import throwbench.app.Samples;
import throwbench.solver.document.Fault;
import throwbench.solver.document.MachineFile;
import throwbench.solver.document.quantity.UnitSystem;
import throwbench.solver.finding.Finding;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;

/** The bench without a window: its worker and its window are this thread. */
class BenchTest {

    private static final Opened SAMPLE =
            Opened.of(Samples.read(Samples.DEFAULT)).opened().orElseThrow();

    private final Bench bench = new Bench(SAMPLE, Runnable::run, Runnable::run);

    private double rodTension() {
        return bench.shown()
                .get()
                .summary()
                .extremes(Column.ROD_LOAD)
                .greatest()
                .value();
    }

    @Test
    void anEditReachesResultsFindingsAndTextTogether() {
        double before = rodTension();
        assertEquals(List.of(), bench.edit("throws[0].masses.piston", "58 kg", "piston", false));
        Shown shown = bench.shown().get();
        assertEquals(58, shown.shownThrow().masses().piston());
        assertTrue(rodTension() > before + 1000 || rodTension() < before - 1000, "20 kg at 450 m/s2 are 9 kN");
        assertTrue(shown.document().text().contains("\"piston\": \"58 kg\""));
        Finding tension = shown.findings().stream()
                .filter(f -> f.criterion().id().equals("rod-load-tension"))
                .filter(f -> f.where().equals(Finding.Place.ofThrow("normal", "A")))
                .findFirst()
                .orElseThrow();
        assertEquals(rodTension(), tension.value().orElseThrow(), 1e-6);
    }

    @Test
    void anImpossibleValueIsRefusedAtItsPathAndNothingChanges() {
        Shown before = bench.shown().get();
        List<Fault> faults = bench.edit("throws[0].rodLength", "70 mm", "rod length", false);
        assertEquals("throws[0].rodLength", faults.get(0).path());
        assertSame(before, bench.shown().get());
        assertEquals(SAMPLE.document().text(), bench.document().text());
        assertTrue(bench.undoName().isEmpty());
    }

    @Test
    void undoAndRedoGiveBackEveryByte() {
        bench.edit("drive.speed", "700 rpm", "speed 740 rpm → 700 rpm", false);
        String edited = bench.document().text();
        assertEquals("speed 740 rpm → 700 rpm", bench.undoName().orElseThrow());
        bench.undo();
        assertEquals(SAMPLE.document().text(), bench.document().text());
        assertFalse(bench.edited());
        bench.redo();
        assertEquals(edited, bench.document().text());
        assertEquals(Math.PI * 700 / 30, bench.shown().get().running().meanSpeed(), 1e-12);
    }

    @Test
    void aRunOfLiveEditsOfOneValueIsOneStepBack() {
        bench.edit("drive.speed", "741 rpm", "speed", true);
        bench.edit("drive.speed", "742 rpm", "speed", true);
        bench.edit("drive.speed", "743 rpm", "speed", true);
        bench.undo();
        assertEquals(SAMPLE.document().text(), bench.document().text());
    }

    @Test
    void anotherThrowIsShownOfTheSameStandingMachine() {
        bench.playhead().turnTo(0.7);
        Instant before = new Instant(bench.shown().get().running(), 0).turnTo(0.7);
        bench.chooseThrow(1);
        Shown shown = bench.shown().get();
        assertEquals(1, shown.throwIndex());
        Instant after = new Instant(shown.running(), 1)
                .turnTo(bench.playhead().crankAngle().get());
        assertEquals(before.sinPin(0), after.sinPin(0), 1e-12);
        assertEquals(before.at(1, Column.ROD_LOAD), after.at(1, Column.ROD_LOAD), 1e-6);
    }

    @Test
    void anotherDutyPointKeepsTheAngle() {
        bench.playhead().turnTo(1.9);
        bench.chooseDuty(3);
        assertEquals("crank ends unloaded", bench.shown().get().dutyName());
        assertEquals(1.9, bench.playhead().crankAngle().get());
    }

    @Test
    void aChosenFindingIsGoneTo() {
        Finding finding = bench.shown().get().findings().stream()
                .filter(f -> f.where().duty().equals("relief valve blows"))
                .filter(f -> f.where().throwName().orElse("").equals("B"))
                .filter(f -> f.angle().isPresent())
                .findFirst()
                .orElseThrow();
        bench.playhead().setPlaying(true);
        bench.goTo(finding);
        assertEquals("relief valve blows", bench.shown().get().dutyName());
        assertEquals("B", bench.shown().get().shownThrow().name());
        assertEquals(
                finding.angle().orElseThrow(), bench.playhead().crankAngle().get(), 1e-12);
        assertFalse(bench.playhead().playing().get());
    }

    @Test
    void unitsChangeWhatIsShownAndNotTheMachine() {
        bench.chooseUnits(UnitSystem.US);
        assertEquals(UnitSystem.US, bench.shown().get().units());
        assertFalse(bench.edited());
    }

    @Test
    void aSavedMachineReadsBackTheSame(@TempDir Path folder) {
        bench.edit("throws[1].masses.crosshead", "40.5 kg", "crosshead", false);
        assertTrue(bench.edited());
        Path file = folder.resolve("saved.json");
        assertTrue(bench.save(file));
        assertFalse(bench.edited());
        assertEquals(
                bench.shown().get().machine(), MachineFile.read(file).machine().orElseThrow());
    }

    @Test
    void whatCannotBeSavedIsSaidAndStaysEdited(@TempDir Path folder) {
        bench.edit("drive.speed", "700 rpm", "speed", false);
        assertFalse(bench.save(folder.resolve("no such folder").resolve("x.json")));
        assertTrue(bench.status().get().trouble());
        assertTrue(bench.edited());
    }

    @Test
    void aFaultyFileIsRefusedInTheStatusLineAndTheMachineStays(@TempDir Path folder) throws IOException {
        Path file = folder.resolve("broken.json");
        Files.writeString(file, SAMPLE.document().text().replace("\"75 mm\"", "\"75 mW\""));
        Shown before = bench.shown().get();
        bench.open(file);
        assertSame(before, bench.shown().get());
        assertTrue(bench.status().get().trouble());
        assertTrue(bench.status().get().text().startsWith("broken.json: throws[0].crankRadius: "));
    }

    @Test
    void anOpenedFileTakesThePlaceOfTheOldOne(@TempDir Path folder) throws IOException {
        Path file = folder.resolve("other.json");
        Files.writeString(file, SAMPLE.document().text().replace("Saltmarsh biogas booster", "Another"));
        bench.edit("drive.speed", "700 rpm", "speed", false);
        bench.open(file);
        assertEquals("Another", bench.shown().get().machine().name());
        assertTrue(bench.undoName().isEmpty());
        assertFalse(bench.edited());
    }
}
