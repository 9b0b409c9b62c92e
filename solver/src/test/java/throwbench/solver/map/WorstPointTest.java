package throwbench.solver.map;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import throwbench.solver.document.KeyPath;

class WorstPointTest {

    private static final double AMBIENT = 101_325;

    private static WorstPoint worst(Subject subject, String id, long seed, int threads) {
        return WorstPoint.of(subject, Boosters.margin(id), seed, threads, Watch.NONE)
                .orElseThrow();
    }

    /** Closed form: mean piston speed is worst at the greatest speed, whatever the pressures. */
    @Test
    void monotoneMarginIsWorstAtItsEnd() {
        WorstPoint worst = worst(Boosters.subject(), "mean-piston-speed", 1, 2);

        assertEquals("dutyPoints[0].speed", worst.settings().get(0).variable().toString());
        assertEquals(900 * Boosters.RPM, worst.settings().get(0).value(), 1e-12);
        assertEquals(0, worst.margin().value().getAsDouble(), 1e-12);
    }

    /** Second method: a grid of its own over the box. */
    @Test
    void nothingInTheBoxIsWorse() {
        Subject subject = Boosters.subject();
        KeyPath stage = subject.dutyPath().key("stages").key("first");
        for (String id : List.of("rod-load-tension", "reversal-duration", "reversal-ratio")) {
            WorstPoint worst = worst(subject, id, 1, 2);
            double least = worst.margin().value().getAsDouble();
            assertTrue(least <= worst.grid().value().getAsDouble());
            for (double discharge : new double[] {10e5, 10.9e5, 11.3e5, 12e5}) {
                Subject at = Boosters.subject(
                        subject.document()
                                .withNumber(stage.key("dischargePressure"), discharge + AMBIENT)
                                .text(),
                        0,
                        0);
                DutyMap map = new MapRun(
                                at,
                                new Axis(
                                        Boosters.variable(at, Boosters.SPEED),
                                        600 * Boosters.RPM,
                                        900 * Boosters.RPM,
                                        17),
                                new Axis(Boosters.variable(at, Boosters.SUCTION), 3.5e5 + AMBIENT, 4.6e5 + AMBIENT, 11),
                                Boosters.margin(id))
                        .fill(2, Watch.NONE);
                assertTrue(
                        least <= map.least().getAsDouble() + 1e-6, () -> id + ": " + least + " above " + map.least());
            }
        }
    }

    /** Identity: the margin is that of the file with the numbers of the worst point. */
    @Test
    void theWorstPointIsAPointOfTheMachine() {
        Subject subject = Boosters.subject();
        WorstPoint worst = worst(subject, "rod-load-compression", 1, 2);

        assertEquals(
                worst.margin(),
                subject.with(worst.settings())
                        .ask(Boosters.margin("rod-load-compression").probe(0)));
    }

    @Test
    void aSeedFindsTheSamePointOnAnyNumberOfThreads() {
        Subject subject = Boosters.subject();

        assertEquals(worst(subject, "reversal-ratio", 5, 1), worst(subject, "reversal-ratio", 5, 3));
    }

    @Test
    void oneSideIsABoxToo() {
        String text = Boosters.text();
        int from = text.indexOf(",\n              \"stages\": { \"first\": { \"suctionPressure\": [");
        Subject subject = Boosters.subject(text.substring(0, from) + " }\n}\n", 0, 0);
        WorstPoint worst = worst(subject, "mean-piston-speed", 1, 1);

        assertEquals(1, worst.settings().size());
        assertEquals(0, worst.margin().value().getAsDouble(), 1e-12);
    }

    @Test
    void withoutRangesThereIsNoBox() {
        String text = Boosters.text();
        Subject subject = Boosters.subject(text.substring(0, text.indexOf(",\n  \"ranges\"")) + "\n}\n", 0, 0);

        assertEquals(Optional.empty(), WorstPoint.of(subject, Boosters.margin("reversal-ratio"), 1, 1, Watch.NONE));
    }
}
