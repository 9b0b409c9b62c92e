package throwbench.app.strip;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import throwbench.app.bench.Shown;
import throwbench.app.bench.ShownMachines;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.RecordingPen;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Machine;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.revolution.Reversal;

/** The words and pieces of the reversal band against the solver's reversal. */
class BandSpanTest {

    @Test
    void piecesCoverTheTurnWithoutGapAndChangeSignAtTheSignChanges() {
        for (Machine machine : List.of(ShownMachines.booster(), ShownMachines.offset(), ShownMachines.longNames())) {
            Shown shown = ShownMachines.shown(machine, 0);
            List<BandSpan> pieces = BandSpan.of(shown);
            Reversal reversal = shown.summary().reversal();
            assertEquals(reversal.spans().size() + 1, pieces.size(), "one span goes through 360°");
            double at = 0;
            for (int i = 0; i < pieces.size(); i++) {
                assertEquals(at, pieces.get(i).from(), 1e-12);
                at = pieces.get(i).to();
                if (i > 0) {
                    assertEquals(
                            reversal.signChanges().get(i - 1).toTension(),
                            pieces.get(i).inTension());
                }
            }
            assertEquals(Angles.TURN, at, 1e-12);
        }
    }

    @Test
    void theGoverningSpanCarriesItsDegreesAndTheDegreesAsked() {
        Shown shown = ShownMachines.shown(ShownMachines.booster(), 1);
        Reversal.Span governing = shown.summary().reversal().governing().orElseThrow();
        List<BandSpan> spoken = BandSpan.of(shown).stream()
                .filter(b -> b.governing() && !b.words().isEmpty())
                .toList();
        assertEquals(1, spoken.size());
        assertEquals(governing.inTension(), spoken.get(0).inTension());
        String degrees = Math.round(Math.toDegrees(governing.length()) * 10) / 10.0 + "°";
        assertEquals("tension " + degrees, spoken.get(0).words().get(0));
        assertEquals("15° asked", spoken.get(0).asked());
        assertTrue(
                BandSpan.of(shown).stream().filter(b -> !b.governing()).allMatch(b -> b.asked()
                        .isEmpty()),
                "only that span carries what is asked");
    }

    @Test
    void aSpanThatIsTooShortSaysSo() {
        Machine asking = ShownMachines.withLimits(
                ShownMachines.booster(), new Limits(Map.of(LimitKey.REVERSAL_DURATION, Math.toRadians(62.5))));
        BandSpan governing = BandSpan.of(ShownMachines.shown(asking, 1)).stream()
                .filter(b -> b.governing() && !b.words().isEmpty())
                .findFirst()
                .orElseThrow();
        assertEquals("62.5° asked, not met", governing.asked());
    }

    @Test
    void aRodThatOnlyPushesSaysThatItNeverReverses() {
        List<BandSpan> pieces = BandSpan.of(ShownMachines.shown(ShownMachines.neverReversing(), 0));
        assertEquals(1, pieces.size());
        assertEquals(0, pieces.get(0).from());
        assertEquals(Angles.TURN, pieces.get(0).to());
        assertEquals(
                "compression all round: the rod load never reverses",
                pieces.get(0).words().get(0));
        assertEquals("15° asked, not met", pieces.get(0).asked());
    }

    @Test
    void theWordsAreWrittenInsideTheirSpan() {
        for (double width = 500; width <= 1400; width += 90) {
            Shown shown = ShownMachines.shown(ShownMachines.booster(), 1);
            StripPlot plot = new StripPlot(shown, Lanes.of(shown.shownThrow(), List.of()), width, 330);
            RecordingPen pen = new RecordingPen();
            new BandPainter().paint(pen, plot, Palette.LIGHT);
            for (RecordingPen.Written text : pen.texts) {
                assertTrue(
                        plot.band().stream()
                                .anyMatch(b -> plot.layout().x(b.from()) <= text.left()
                                        && text.right() <= plot.layout().x(b.to())),
                        text::toString);
            }
        }
    }
}
