package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class NearWordsTest {

    @Test
    void distanceCountsEachSlipOfTheFingersOnce() {
        assertEquals(0, NearWords.distance("solve", "Solve"));
        assertEquals(1, NearWords.distance("slve", "solve"));
        assertEquals(1, NearWords.distance("soolve", "solve"));
        assertEquals(1, NearWords.distance("silve", "solve"));
        assertEquals(1, NearWords.distance("sovle", "solve"));
        assertEquals(5, NearWords.distance("", "check"));
        // Levenshtein 1966, the usual example
        assertEquals(3, NearWords.distance("kitten", "sitting"));
    }

    @Test
    void nearWordsComeNearestFirstAndFarOnesNotAtAll() {
        assertEquals(List.of("normal", "normal B"), NearWords.of("normal", List.of("relief", "normal B", "normal")));
    }

    @Test
    void existingNamesBeginWithTheNearOnesAndEndAfterADozen() {
        List<String> names = new ArrayList<>();
        for (int i = 1; i <= 30; i++) {
            names.add("winter " + i);
        }
        names.add("summer");

        assertEquals(
                "\"summer\", \"winter 1\", \"winter 2\", \"winter 3\", \"winter 4\", \"winter 5\", \"winter 6\","
                        + " \"winter 7\", \"winter 8\", \"winter 9\", \"winter 10\", \"winter 11\" and 19 more",
                NearWords.existing("sumer", names));
    }
}
