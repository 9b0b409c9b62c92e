package throwbench.app.bench;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class PlayheadTest {

    private final Playhead playhead = new Playhead();

    @Test
    void aSecondAtASixtiethOfTheSpeedTurnsThatPartOfIt() {
        playhead.setShownSpeed(1.0 / 60);
        playhead.setPlaying(true);
        for (int i = 0; i < 50; i++) {
            playhead.advance(0.02, 77);
        }
        assertEquals(77.0 / 60, playhead.crankAngle().get(), 1e-12);
    }

    @Test
    void aHeldCrankStays() {
        playhead.turnTo(1.25);
        playhead.advance(0.02, 77);
        assertEquals(1.25, playhead.crankAngle().get());
    }

    @Test
    void anotherSpeedGoesOnFromTheSameAngle() {
        playhead.setPlaying(true);
        playhead.turnTo(2);
        playhead.setShownSpeed(0.001);
        assertEquals(2, playhead.crankAngle().get());
        playhead.advance(0, 1000);
        assertEquals(2, playhead.crankAngle().get());
    }

    @Test
    void aLongPauseOfTheClockDoesNotMakeTheCrankJump() {
        playhead.setShownSpeed(1.0 / 100);
        playhead.setPlaying(true);
        playhead.advance(30, 100);
        assertEquals(0.1, playhead.crankAngle().get(), 1e-12);
    }

    @Test
    void anglesAreTakenIntoOneTurn() {
        playhead.turnTo(-Math.PI / 2);
        assertEquals(1.5 * Math.PI, playhead.crankAngle().get(), 1e-15);
    }

    @Test
    void shownSpeedStaysBetweenAThousandthAndRealTime() {
        playhead.setShownSpeed(7);
        assertEquals(1, playhead.shownSpeed().get());
        playhead.setShownSpeed(0);
        assertEquals(0.001, playhead.shownSpeed().get());
    }
}
