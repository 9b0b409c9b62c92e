package throwbench.solver.document.schema;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class RangeTest {

    @Test
    void endsCountOnlyWhereTheyAreAllowed() {
        Range open = Range.above(0).below(1);
        assertFalse(open.contains(0));
        assertTrue(open.contains(0.5));
        assertFalse(open.contains(1));
        Range closed = Range.from(0).upTo(1);
        assertTrue(closed.contains(0));
        assertTrue(closed.contains(1));
        assertFalse(closed.contains(Math.nextUp(1.0)));
        assertFalse(closed.contains(-Double.MIN_VALUE));
    }

    @Test
    void noRangeHoldsNotANumber() {
        assertFalse(Range.ANY.contains(Double.NaN));
        assertFalse(Range.from(0).contains(Double.NaN));
        assertFalse(Range.ANY.contains(Double.POSITIVE_INFINITY));
    }

    @Test
    void saysItsEnds() {
        assertEquals("", Range.ANY.said());
        assertEquals("above 0", Range.above(0).said());
        assertEquals("1 or more", Range.from(1).said());
        assertEquals("above 0 and below 1", Range.above(0).below(1).said());
        assertEquals("0 or more and at most 1", Range.from(0).upTo(1).said());
    }
}
