package throwbench.app.strip;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.OptionalDouble;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import throwbench.app.bench.ShownMachines;

class ScrubKeysTest {

    private final StripEvents events = StripEvents.of(ShownMachines.shown(ShownMachines.booster(), 0));

    @ParameterizedTest
    @CsvSource({
        "RIGHT, false, false, 37.5, 38.5",
        "LEFT,  false, false, 37.5, 36.5",
        "RIGHT, true,  false, 37.5, 47.5",
        "LEFT,  true,  false, 37.5, 27.5",
        "RIGHT, false, true,  37.5, 37.6",
        "LEFT,  false, true,  37.5, 37.4",
        "RIGHT, false, false, 359.5, 0.5",
        "LEFT,  false, false, 0.5, 359.5",
        "HOME,  false, false, 99, 0",
        "END,   false, false, 99, 183.7"
    })
    void keysTurnTheCrank(KeyCode key, boolean coarse, boolean fine, double from, double to) {
        OptionalDouble after = ScrubKeys.after(key, coarse, fine, Math.toRadians(from), Math.toRadians(183.7), events);
        assertEquals(to, Math.toDegrees(after.orElseThrow()), 1e-9);
    }

    @Test
    void aThousandFineStepsEndWhereTheyShould() {
        double angle = 0;
        for (int i = 0; i < 1000; i++) {
            angle = ScrubKeys.after(KeyCode.RIGHT, false, true, angle, Math.PI, events)
                    .orElseThrow();
        }
        assertEquals(100, Math.toDegrees(angle), 1e-9);
    }

    @Test
    void eventKeysGoToTheEventsThemselves() {
        double next =
                ScrubKeys.after(KeyCode.N, false, false, 1, Math.PI, events).orElseThrow();
        assertTrue(events.all().stream().anyMatch(e -> e.angle() == next));
        double before =
                ScrubKeys.after(KeyCode.B, false, false, next, Math.PI, events).orElseThrow();
        assertTrue(before < 1 && events.all().stream().anyMatch(e -> e.angle() == before));
    }

    @Test
    void otherKeysTurnNothing() {
        assertTrue(ScrubKeys.after(KeyCode.X, false, false, 1, Math.PI, events).isEmpty());
    }
}
