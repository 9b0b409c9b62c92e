package throwbench.solver.document.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class TypedValueTest {

    private static QuantityReading typed(String text, Dimension dimension, String present) {
        Optional<Quantity> there = present == null || present.isEmpty()
                ? Optional.empty()
                : Optional.of((Quantity) QuantityText.read(present, dimension, 101_325));
        return TypedValue.read(text, dimension, there, 101_325);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            ignoreLeadingAndTrailingWhitespace = true,
            value = {
                "8.5 in            | LENGTH         |            | 8.5 in",
                "8,5 mm            | LENGTH         |            | 8.5 mm",
                "0,125in           | LENGTH         |            | 0.125 in",
                "150/2 mm          | LENGTH         |            | 75 mm",
                "(3 + 4)*2,5 mm    | LENGTH         |            | 17.5 mm",
                "0.1+0.2 mm        | LENGTH         |            | 0.3 mm",
                "1 - -2 mm         | LENGTH         |            | 3 mm",
                "10/3 mm           | LENGTH         |            | 3.33333333333 mm",
                "-(2*3) mm         | LENGTH         |            | -6 mm",
                "1e3 mm            | LENGTH         |            | 1e3 mm",
                "75.00   mm        | LENGTH         |            | 75.00 mm",
                "80                | LENGTH         | 75 mm      | 80 mm",
                "160/2             | LENGTH         | 3 in       | 80 in",
                "3 μm              | LENGTH         |            | 3 µm",
                "75±0,1 mm         | LENGTH         |            | 75 mm ± 0.1 mm",
                "75 mm +/- 0.1     | LENGTH         | 75 mm      | 75 mm ± 0.1 mm",
                "120 psi g         | GAS_PRESSURE   |            | 120 psi g",
                "120 psig          | GAS_PRESSURE   |            | 120 psi g",
                "4.1barg           | GAS_PRESSURE   |            | 4.1 bar g",
                "5                 | GAS_PRESSURE   | 4.1 bar g  | 5 bar g",
                "5 ± 0.1 bar       | PRESSURE_DIFFERENCE |       | 5 bar ± 0.1 bar",
                "2,4kNm            | TORQUE         |            | 2.4 kN m",
                "2.4 kN·m          | TORQUE         |            | 2.4 kN m",
                "38 kg·m²          | INERTIA        |            | 38 kg m2",
                "38 kg m^2         | INERTIA        |            | 38 kg m2",
                "4 in²             | AREA           |            | 4 in2",
                "32 °C             | TEMPERATURE    |            | 32 degC",
                "90°F              | TEMPERATURE    |            | 90 degF",
                "15°               | ANGLE          |            | 15 deg",
                "14                | SHARE          | 12 %       | 14 %",
                "14%               | SHARE          | 0.12       | 14 %",
                "0,14              | SHARE          |            | 0.14",
                "1/8               | NUMBER         |            | 0.125",
                "−3 mm             | LENGTH         |            | -3 mm",
                "27.2 g/mol        | MOLAR_MASS     |            | 27.2 g/mol"
            })
    void typedTextBecomesWhatTheFileHolds(String typed, Dimension dimension, String present, String canonical) {
        Quantity quantity = assertInstanceOf(Quantity.class, typed(typed, dimension, present), typed);
        assertEquals(canonical, quantity.text());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            ignoreLeadingAndTrailingWhitespace = true,
            quoteCharacter = '`',
            value = {
                "1,200 rpm    | ROTATION_SPEED | \"1,200\" can be read in two ways; wanted 1.2 or 1200.",
                "75           | LENGTH         | \"75\" without a unit; wanted a length, as \"75 mm\".",
                "75 kg        | LENGTH         | \"75 kg\"; wanted a length, as \"75 mm\".",
                "3² mm        | LENGTH         | \"3² mm\"; wanted a length, as \"75 mm\".",
                "2^3 mm       | LENGTH         | \"2^3 mm\"; wanted a length, as \"75 mm\".",
                "(1 mm        | LENGTH         | \"(1 mm\"; wanted a length, as \"75 mm\".",
                "1/0 mm       | LENGTH         | \"1/0 mm\"; wanted a length, as \"75 mm\".",
                "1 200 mm     | LENGTH         | \"1 200 mm\"; wanted a length, as \"75 mm\".",
                "1.2.3 mm     | LENGTH         | \"1.2.3 mm\"; wanted a length, as \"75 mm\".",
                "2 mW         | POWER          | \"2 mW\"; wanted a power, as \"250 kW\".",
                "120 psi      | GAS_PRESSURE   | \"120 psi\" without a or g; wanted \"120 psi a\" if it is absolute, \"120 psi g\" if it is gauge.",
                "0.2 bar g    | PRESSURE_DIFFERENCE | \"0.2 bar g\"; wanted a pressure difference without a or g, as \"0.2 bar\"."
            })
    void wrongTextGivesASentence(String typed, Dimension dimension, String sentence) {
        Refusal refusal = assertInstanceOf(Refusal.class, typed(typed, dimension, ""), typed);
        assertEquals(sentence, refusal.sentence());
    }

    @Test
    void deepParenthesesAreRefusedNotFollowed() {
        assertInstanceOf(Refusal.class, typed("(".repeat(60) + "1" + ")".repeat(50) + " mm", Dimension.LENGTH, ""));
        assertInstanceOf(Refusal.class, typed("-".repeat(100_000) + "1 mm", Dimension.LENGTH, ""));
    }
}
