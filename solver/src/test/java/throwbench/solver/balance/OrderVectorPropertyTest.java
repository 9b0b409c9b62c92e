package throwbench.solver.balance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.SingularValueDecomposition;
import throwbench.solver.mechanism.Rotation;

/** The ellipse of one order, against singular values of a general library. */
class OrderVectorPropertyTest {

    /** Second method: singular values of [[a_X, b_X], [a_Y, b_Y]], and the first left singular vector for the direction. */
    @Property
    void halfAxesAreTheSingularValues(
            @ForAll @DoubleRange(min = -9, max = 9) double ax,
            @ForAll @DoubleRange(min = -9, max = 9) double bx,
            @ForAll @DoubleRange(min = -9, max = 9) double ay,
            @ForAll @DoubleRange(min = -9, max = 9) double by) {
        OrderVector vector = new OrderVector(new Harmonic(2, ax, bx), new Harmonic(2, ay, by));
        SingularValueDecomposition parts =
                new SingularValueDecomposition(MatrixUtils.createRealMatrix(new double[][] {{ax, bx}, {ay, by}}));
        double[] values = parts.getSingularValues();
        assertEquals(values[0], vector.size(), 1e-12);
        assertEquals(values[1], vector.leastSize(), 1e-12);
        if (values[0] - values[1] > 1e-3) {
            double axis = Math.atan2(parts.getU().getEntry(1, 0), parts.getU().getEntry(0, 0));
            double direction = vector.direction().orElseThrow();
            assertTrue(direction >= 0 && direction < Math.PI);
            assertEquals(0, Math.sin(axis - direction), 1e-9);
        }
    }

    @Property
    void sumOfBothTurningPartsIsTheVector(
            @ForAll @DoubleRange(min = -9, max = 9) double ax,
            @ForAll @DoubleRange(min = -9, max = 9) double bx,
            @ForAll @DoubleRange(min = -9, max = 9) double ay,
            @ForAll @DoubleRange(min = -9, max = 9) double by,
            @ForAll @DoubleRange(min = 0, max = 6.28) double angle) {
        OrderVector vector = new OrderVector(new Harmonic(3, ax, bx), new Harmonic(3, ay, by));
        double x = 0;
        double y = 0;
        for (Rotation sense : Rotation.values()) {
            double turned = vector.angle(sense) + sense.sign() * 3 * angle;
            x += vector.length(sense) * Math.cos(turned);
            y += vector.length(sense) * Math.sin(turned);
        }
        assertEquals(vector.x().at(angle), x, 1e-12);
        assertEquals(vector.y().at(angle), y, 1e-12);
    }

    @Example
    void vectorOfConstantLengthHasNoDirection() {
        OrderVector circle = new OrderVector(new Harmonic(1, 3, 4), new Harmonic(1, -4, 3));
        assertEquals(5, circle.size(), 1e-15);
        assertEquals(5, circle.leastSize(), 1e-15);
        assertTrue(circle.direction().isEmpty());
    }

    @Example
    void twoOrdersMakeNoVector() {
        IllegalArgumentException refused = assertThrows(
                IllegalArgumentException.class, () -> new OrderVector(new Harmonic(1, 3, 4), new Harmonic(2, -4, 3)));
        assertEquals("orders 1 and 2", refused.getMessage());
    }
}
