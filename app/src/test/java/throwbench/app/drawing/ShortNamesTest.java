package throwbench.app.drawing;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;

class ShortNamesTest {

    @Test
    void whatNamesBeginWithTogetherIsTakenOffByWholeWords() {
        assertEquals(List.of("head", "crank"), ShortNames.of(List.of("A head", "A crank")));
        assertEquals(
                List.of("head end", "crank end"),
                ShortNames.of(List.of("north cylinder, head end", "north cylinder, crank end")));
        assertEquals(List.of("1", "10"), ShortNames.of(List.of("pump plunger 1", "pump plunger 10")));
    }

    @Test
    void aNameAloneOrWithoutSharedWordStays() {
        assertEquals(List.of("A head"), ShortNames.of(List.of("A head")));
        assertEquals(List.of("headward", "header"), ShortNames.of(List.of("headward", "header")));
        assertEquals(List.of(), ShortNames.of(List.of()));
    }

    @Test
    void nothingIsLeftEmpty() {
        assertEquals(List.of("A", "A head"), ShortNames.of(List.of("A", "A head")));
    }

    @Test
    void aTextThatDoesNotFitLosesItsMiddle() {
        RecordingPen pen = new RecordingPen();
        pen.font(10, false);
        assertEquals("first", TextFit.elide(pen, "first", 29));
        assertEquals("fir…nd", TextFit.elide(pen, "first end", 36));
        assertEquals("", TextFit.elide(pen, "first end", 3));
        assertEquals("head", TextFit.name(pen, "first head", "head", 30));
    }
}
