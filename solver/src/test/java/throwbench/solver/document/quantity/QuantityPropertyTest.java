package throwbench.solver.document.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.Optional;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.StringLength;

/** Round trips, and that no text whatever is more than a reason. */
class QuantityPropertyTest {

    private static PressureMark mark(Dimension dimension) {
        return dimension == Dimension.GAS_PRESSURE ? PressureMark.GAUGE : PressureMark.NONE;
    }

    @Property
    void writtenQuantityReadsBackInEveryUnit(
            @ForAll Dimension dimension, @ForAll @DoubleRange(min = -1e9, max = 1e9) double value) {
        for (Unit unit : dimension.units()) {
            double si = unit.toSi(value);
            String text = QuantityText.write(si, unit, mark(dimension), 101_325, 17);
            Quantity back = assertInstanceOf(Quantity.class, QuantityText.read(text, dimension, 101_325), text);
            assertEquals(unit, back.unit());
            // zero points and gauge pressures cost the digits of what they shift
            assertEquals(si, back.value(), 1e-15 * Math.abs(si) + 1e-10, text);
        }
    }

    @Property
    void exactTextReadsBackAsTheVeryDouble(@ForAll Dimension dimension, @ForAll double si) {
        String text = QuantityText.exact(si, dimension);
        Quantity back = assertInstanceOf(Quantity.class, QuantityText.read(text, dimension, 101_325), text);
        assertEquals(si, back.value(), text);
    }

    @Property
    void anyTextIsAQuantityOrAReason(@ForAll @StringLength(max = 40) String text, @ForAll Dimension dimension) {
        QuantityReading strict = QuantityText.read(text, dimension, 101_325);
        QuantityReading typed = TypedValue.read(text, dimension, Optional.empty(), 101_325);
        if (strict instanceof Quantity quantity) {
            assertEquals(text, quantity.text());
            Quantity again = assertInstanceOf(Quantity.class, typed, text);
            assertEquals(quantity.value(), again.value(), text);
        }
    }

    @Property
    void whatIsTypedInTheFilesOwnWayMeansTheSame(
            @ForAll Dimension dimension, @ForAll @DoubleRange(min = -1e6, max = 1e6) double value) {
        for (Unit unit : dimension.units()) {
            String text = QuantityText.write(unit.toSi(value), unit, mark(dimension), 101_325, 9);
            Quantity typed =
                    assertInstanceOf(Quantity.class, TypedValue.read(text, dimension, Optional.empty(), 101_325), text);
            assertEquals(text, typed.text());
        }
    }
}
