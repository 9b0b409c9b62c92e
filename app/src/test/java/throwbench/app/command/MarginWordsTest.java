package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import throwbench.solver.finding.Criterion;
import throwbench.solver.finding.Finding;
import throwbench.solver.finding.Judgement;

class MarginWordsTest {

    private static MarginWords words(String id, double limit) {
        Criterion criterion = Judgement.CRITERIA.stream()
                .filter(c -> c.id().equals(id))
                .findFirst()
                .orElseThrow();
        Finding.Place where = Finding.Place.ofThrow("normal", "A");
        return new MarginWords(
                Finding.judged(criterion, where, 1, OptionalDouble.of(limit), OptionalDouble.empty(), ""));
    }

    @Test
    void marginsAreSharesOfTheLimit() {
        MarginWords words = words("rod-load-tension", 12e3);

        assertEquals("+12.5 %", words.margin(0.125));
        assertEquals("-0.00123 %", words.change(-0.0000123));
        assertEquals("+1.67 %", words.change(0.016666));
        assertEquals("+145 %", words.change(1.4512));
        assertEquals("0", words.change(1e-13));
    }

    @Test
    void againstALimitOfZeroTheyAreDifferences() {
        assertEquals("+2.5 kN", words("rod-load-tension", 0).margin(2500));
        assertEquals("-40 N", words("rod-load-tension", 0).change(-40));
        assertEquals("-0.25 m", words("suction-head", 0).margin(-0.25));
        assertEquals("-3.46 K", words("discharge-temperature", 0).change(-3.456));
        assertEquals("0 m", words("suction-head", 0).margin(0));
    }
}
