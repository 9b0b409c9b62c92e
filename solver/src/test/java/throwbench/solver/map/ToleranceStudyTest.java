package throwbench.solver.map;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import throwbench.solver.document.NumericKey;

class ToleranceStudyTest {

    private static final int SAMPLES = 4000;

    /** Standard errors that a right study stays within for all but one seed in fifteen thousand. */
    private static final double SURE = 4;

    private static ToleranceStudy study(Subject subject, int samples, long seed, int threads) {
        return ToleranceStudy.of(subject, Boosters.running(subject.document()), samples, seed, threads, Watch.NONE)
                .orElseThrow();
    }

    private static ToleranceStudy.Spread spread(ToleranceStudy study, String id) {
        return study.spreads().stream()
                .filter(s -> s.nominal().criterion().id().equals(id))
                .findFirst()
                .orElseThrow();
    }

    /**
     * Closed form: the margin of the mean piston speed is straight in the speed, which is uniform from 720 to 760 rpm; the limit
     * lies at 750 rpm.
     */
    @Test
    void straightMarginIsSpreadInClosedForm() {
        String text = Boosters.with("\"740 rpm\"", "\"740 rpm ± 20 rpm\"").replace("4.5 m/s", "3.75 m/s");
        ToleranceStudy study = study(Boosters.subject(text, 0, 0), SAMPLES, 7, 2);
        ToleranceStudy.Spread spread = spread(study, "mean-piston-speed");

        double shareError = Math.sqrt(0.75 * 0.25 / SAMPLES);
        assertEquals(0.75, study.shareMet(spread), SURE * shareError);
        // 5 % of the machines run faster than 758 rpm, 5 % slower than 722 rpm
        double percentileError = Math.sqrt(0.05 * 0.95 / SAMPLES) * 40 / 750;
        assertEquals(1 - 758.0 / 750, spread.low().getAsDouble(), SURE * percentileError);
        assertEquals(1 - 722.0 / 750, spread.high().getAsDouble(), SURE * percentileError);
        assertEquals(1 - 740.0 / 750, spread.nominal().margin().getAsDouble(), 1e-12);
    }

    @Test
    void aSeedGivesTheSameStudyOnAnyNumberOfThreads() {
        String text = Boosters.with("\"740 rpm\"", "\"740 rpm ± 20 rpm\"")
                .replace("\"38 kg\"", "\"38 kg ± 2 kg\"")
                .replace("\"11.5 bar g\"", "\"11.5 bar g ± 0.3 bar\"");
        Subject subject = Boosters.subject(text, 0, 0);
        ToleranceStudy one = study(subject, 60, 3, 1);

        assertEquals(one, study(subject, 60, 3, 2));
        assertEquals(one, study(subject, 60, 3, 5));
        double other =
                spread(study(subject, 60, 4, 2), "rod-load-tension").low().getAsDouble();
        assertTrue(other != spread(one, "rod-load-tension").low().getAsDouble());
    }

    @Test
    void onlyTolerancesOfTheDutyPointCount() {
        String text = Boosters.with("\"600 rpm\",", "\"600 rpm ± 5 rpm\",").replace("\"75 mm\"", "\"75 mm ± 0.1 mm\"");
        Subject subject = Boosters.subject(text, 0, 0);

        assertEquals(
                List.of("throws[0].crankRadius", "throws[1].crankRadius"),
                ToleranceStudy.toleranced(subject).stream()
                        .map(NumericKey::path)
                        .map(Object::toString)
                        .toList());
    }

    /** Identity: gauge pressures follow the ambient one, so a tolerance of nearly nothing changes nearly nothing. */
    @Test
    void gaugePressuresCountFromTheDrawnAmbientPressure() {
        String text = Boosters.with("\"101.325 kPa a\"", "\"101.325 kPa a ± 8 kPa\"");
        String drawn = text.replace("\"4.1 bar g\"", "\"4.1 bar g ± 0.0001 mbar\"");
        ToleranceStudy.Spread free = spread(study(Boosters.subject(text, 0, 0), 300, 1, 2), "discharge-temperature");
        ToleranceStudy.Spread follows =
                spread(study(Boosters.subject(drawn, 0, 0), 300, 1, 2), "discharge-temperature");

        // the ambient pressure stands first in the file and is drawn first: both studies have the same ones
        assertEquals(free.low().getAsDouble(), follows.low().getAsDouble(), 1e-7);
        assertEquals(free.high().getAsDouble(), follows.high().getAsDouble(), 1e-7);
    }

    /** Closed form: a rod uniform from 25 to 775 mm turns over a crank of 75 mm where it is longer. */
    @Test
    void machinesThatCannotRunMeetNothing() {
        String text = Boosters.with("\"rodLength\": \"400 mm\"", "\"rodLength\": \"400 mm ± 375 mm\"")
                .replace("\"massCentreFromCrankPin\": \"130 mm\"", "\"massCentreFromCrankPin\": \"10 mm\"");
        Subject subject = Boosters.subject(text, 0, 0);
        ToleranceStudy study = study(subject, 600, 2, 2);

        // two rods, each with its own draw
        double turning = Math.pow(700.0 / 750, 2);
        double error = Math.sqrt(turning * (1 - turning) / 600);
        assertEquals(1 - turning, study.impossible() / 600.0, SURE * error);
        assertTrue(study.reason().contains("does not turn"), study.reason());
        assertTrue(study.meetingAll() <= 600 - study.impossible());
    }

    @Test
    void aStudyHasSamples() {
        Subject subject = Boosters.subject(Boosters.with("\"75 mm\"", "\"75 mm ± 0.1 mm\""), 0, 0);

        assertThrows(IllegalArgumentException.class, () -> study(subject, 0, 1, 1));
    }
}
