package throwbench.solver.document.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.List;
import org.junit.jupiter.api.Test;

class QuantityTextTest {

    private static final double AMBIENT = 101_325;

    private static Quantity quantity(String text, Dimension dimension) {
        return assertInstanceOf(Quantity.class, QuantityText.read(text, dimension, AMBIENT), text);
    }

    private static Refusal refusal(String text, Dimension dimension) {
        return assertInstanceOf(Refusal.class, QuantityText.read(text, dimension, AMBIENT), text);
    }

    @Test
    void oneSpaceOrNoneStandsBeforeTheUnit() {
        assertEquals(0.075, quantity("75 mm", Dimension.LENGTH).value());
        assertEquals(0.075, quantity("75mm", Dimension.LENGTH).value());
        assertEquals(2400, quantity("2.4kN m", Dimension.TORQUE).value());
        for (String text : List.of("75  mm", " 75 mm", "75 mm ", "75\tmm", "75 m m", "7 5 mm")) {
            refusal(text, Dimension.LENGTH);
        }
    }

    @Test
    void numbersAreDecimalWithAPoint() {
        assertEquals(-0.075, quantity("-7.5e1 mm", Dimension.LENGTH).value());
        assertEquals(75_000, quantity("75E+6 mm", Dimension.LENGTH).value());
        for (String text :
                List.of("75. mm", ".5 mm", "+75 mm", "75,5 mm", "0x1 mm", "1e mm", "NaN mm", "∞ mm", "७५ mm", "")) {
            refusal(text, Dimension.LENGTH);
        }
    }

    @Test
    void unitsAreSpelledToTheLetter() {
        for (String text : List.of("75 MM", "75 inch", "75 \"", "75 m2", "75 kg", "75", "75 %", "75 mm a")) {
            refusal(text, Dimension.LENGTH);
        }
        assertEquals(1e-6, quantity("1 \u00b5m", Dimension.LENGTH).value(), "micro sign");
        assertEquals(1e-6, quantity("1 \u03bcm", Dimension.LENGTH).value(), "Greek mu");
    }

    @Test
    void gaugePressuresCountFromTheAmbientPressureOfTheSite() {
        assertEquals(
                4.1e5 + AMBIENT, quantity("4.1 bar g", Dimension.GAS_PRESSURE).value(), 1e-9);
        assertEquals(4.1e5, quantity("4.1 bar a", Dimension.GAS_PRESSURE).value(), 1e-9);
        Quantity high = (Quantity) QuantityText.read("0 psi g", Dimension.GAS_PRESSURE, 80_000);
        assertEquals(80_000, high.value());
        assertEquals(PressureMark.GAUGE, high.mark());
    }

    @Test
    void pressureWithoutMarkIsRefusedUnlessItIsADifferenceOrAStress() {
        assertEquals(
                new Refusal(
                        "\"4.1 bar\" without a or g", "\"4.1 bar a\" if it is absolute, \"4.1 bar g\" if it is gauge"),
                refusal("4.1 bar", Dimension.GAS_PRESSURE));
        assertEquals(20_000, quantity("0.2 bar", Dimension.PRESSURE_DIFFERENCE).value());
        assertEquals(2.2e9, quantity("2.2 GPa", Dimension.STRESS).value());
        refusal("0.2 bar g", Dimension.PRESSURE_DIFFERENCE);
        refusal("2.2 GPa a", Dimension.STRESS);
        refusal("4.1 bar x", Dimension.GAS_PRESSURE);
        refusal("4.1 barg", Dimension.GAS_PRESSURE);
    }

    @Test
    void toleranceIsADifferenceInAnyUnitOfTheDimension() {
        assertEquals(1e-4, quantity("75 mm ± 0.1 mm", Dimension.LENGTH).tolerance());
        assertEquals(1e-4, quantity("75 mm +/- 100 µm", Dimension.LENGTH).tolerance());
        assertEquals(1e-4, quantity("75mm±0.1mm", Dimension.LENGTH).tolerance());
        assertEquals(5, quantity("90 degF ± 9 degF", Dimension.TEMPERATURE).tolerance(), 1e-14);
        assertEquals(2, quantity("32 degC ± 2 K", Dimension.TEMPERATURE).tolerance());
        assertEquals(305.15, quantity("32 degC ± 2 K", Dimension.TEMPERATURE).value());
        assertEquals(
                1e4, quantity("4.1 bar g ± 0.1 bar", Dimension.GAS_PRESSURE).tolerance());
        assertEquals(0.01, quantity("14 % ± 1 %", Dimension.SHARE).tolerance());
        assertEquals(0.02, quantity("1.29 ± 0.02", Dimension.NUMBER).tolerance());
        assertEquals(0, quantity("75 mm", Dimension.LENGTH).tolerance());
        for (String text : List.of(
                "75 mm ±",
                "75 mm ± 0.1",
                "75 ± 0.1 mm",
                "75 mm ± 1 kg",
                "± 1 mm",
                "75 mm ± 1 mm ± 1 mm",
                "75 mm ± 1 %")) {
            refusal(text, Dimension.LENGTH);
        }
    }

    @Test
    void sharesAndNumbersAreNumbersOrPercentages() {
        assertEquals(0.14, quantity("14 %", Dimension.SHARE).value());
        assertEquals(0.14, quantity("14%", Dimension.SHARE).value());
        assertEquals(0.14, quantity("0.14", Dimension.SHARE).value());
        assertEquals(1.29, quantity("129 %", Dimension.NUMBER).value());
        refusal("14 %%", Dimension.SHARE);
        refusal("0.14 ", Dimension.SHARE);
    }

    @Test
    void keepsTheTextAsItWasWritten() {
        Quantity quantity = quantity("75.00 mm +/- 0.1mm", Dimension.LENGTH);
        assertEquals("75.00 mm +/- 0.1mm", quantity.text());
        assertEquals("80.1 mm", quantity.rewritten(0.0801, AMBIENT, 6));
        assertEquals("5 bar g", quantity("4.1 bar g", Dimension.GAS_PRESSURE).rewritten(5e5 + AMBIENT, AMBIENT, 6));
    }

    @Test
    void veryLongTextIsRefusedUnread() {
        refusal("1".repeat(100_000) + " mm", Dimension.LENGTH);
    }

    @Test
    void exactTextIsInTheCoherentUnit() {
        assertEquals("0.075 m", QuantityText.exact(0.075, Dimension.LENGTH));
        assertEquals("511325 Pa a", QuantityText.exact(511_325, Dimension.GAS_PRESSURE));
        assertEquals("0.1 Pa", QuantityText.exact(0.1, Dimension.PRESSURE_DIFFERENCE));
        assertEquals("0.14", QuantityText.exact(0.14, Dimension.SHARE));
        assertEquals("305.15 K", QuantityText.exact(305.15, Dimension.TEMPERATURE));
    }
}
