package throwbench.solver.chamber.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;

class RepeatSearchTest {

    private static int turns(RepeatSearch search, UnaryOperator<double[]> turn) {
        for (int i = 1; i < 1000; i++) {
            double[] end = turn.apply(new double[] {search.first(), search.second()});
            double first = search.first();
            double second = search.second();
            if (search.ended(end[0], end[1]) < 1e-10) {
                assertEquals(end[0], first, 1e-10);
                assertEquals(end[1], second, 1e-10);
                return i;
            }
        }
        return 1000;
    }

    @Test
    void turnsThatForgetQuicklyNeedFew() {
        RepeatSearch search = new RepeatSearch(1, 2);
        assertTrue(turns(search, x -> new double[] {3 + 0.1 * (x[0] - 3), 4 + 0.02 * (x[0] - 3)}) <= 8);
    }

    @Test
    void turnsThatForgetOneInAThousandthPartNeedFewMore() {
        RepeatSearch search = new RepeatSearch(0, 0);
        int turns = turns(search, x -> new double[] {
            x[0] - 0.001 * Math.sinh(x[0] - 2) + 0.0005 * (x[1] - 1), x[1] - 0.002 * (x[1] - 1 + 0.3 * (x[0] - 2))
        });
        assertTrue(turns <= 30, "turns " + turns);
    }

    @Test
    void aValveThatBeginsToOpenOnTheWayDoesNotMislead() {
        // beyond 1.5 a second way out opens; the balance lies just beyond it
        RepeatSearch search = new RepeatSearch(0, 0);
        int turns = turns(search, x -> new double[] {
            x[0] + 0.01 * (2 - x[0]) - 0.3 * Math.sqrt(Math.max(0, x[0] - 1.5)) * 0.05, 0.5 * x[1] + 0.01 * x[0]
        });
        assertTrue(turns <= 40, "turns " + turns);
    }
}
