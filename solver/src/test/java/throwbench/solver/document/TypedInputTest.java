package throwbench.solver.document;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import throwbench.solver.document.quantity.Refusal;

/** What is typed in the fields of a machine, by key. */
class TypedInputTest {

    private static final MachineDocument EVERY_KEY = Samples.document(Samples.everyKey());

    private static TypedInput typed(String path, String text) {
        return EVERY_KEY.typed(EVERY_KEY.path(path), text);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "throws[0].crankRadius                      | 150/2         | 75 mm",
                "throws[0].crankRadius                      | 3 in          | 3 in",
                "throws[0].crankPhase                       | 12,5°         | 12.5 deg",
                "throws[1].guideOffset                      | 4             | 4 mm",
                "throws[0].chambers[0].clearance            | 15            | 15 %",
                "throws[0].chambers[0].clearance            | 1,2 L         | 1.2 L",
                "throws[0].chambers[1].clearance            | 1.3           | 1.3 L",
                "throws[0].chambers[1].clearance            | 15 %          | 15 %",
                "throws[0].chambers[0].flowAllowance        | 5             | 5 %",
                "dutyPoints[0].stages.lift.suctionPressure  | 0.3           | 0.3 bar g",
                "dutyPoints[0].stages.low.dischargePressure | 3 bar a       | 3 bar a",
                "dutyPoints[0].stages.low.dischargePressure | Balanced      | balanced",
                "drive.rotation                             | Clockwise     | clockwise",
                "throws[0].chambers[0].side                 | crank         | crank",
                "site.gravity                               | TRUE          | true",
                "name                                       | Two words     | Two words",
                "stages.low.fluid                           | dry air       | dry air",
                "limits.shaftPower                          | 300           | 300 kW"
            })
    void typedTextBecomesWhatTheFileHolds(String path, String text, String canonical) {
        assertEquals(Optional.of(canonical), typed(path, text).text(), () -> typed(path, text)
                .toString());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "throws[0].crankRadius | 0 | \"0\"; wanted a length, as \"75 mm\", above 0.",
                "throws[0].crankRadius | 75 kg | \"75 kg\"; wanted a length, as \"75 mm\".",
                "throws[0].chambers[0].clearance | 3 kg | \"3 kg\"; wanted a share of the swept volume, as \"14 %\", or a volume, as \"1.2 L\", above 0.",
                "drive.rotation | left | \"left\"; wanted one of counter-clockwise, clockwise.",
                "site.gravity | maybe | \"maybe\"; wanted true or false.",
                "throws | two | \"two\"; wanted a list [ … ].",
                "dutyPoints[0].stages.low.dischargePressure | 3 bar | \"3 bar\" without a or g; wanted \"3 bar a\" if it is absolute, \"3 bar g\" if it is gauge."
            })
    void wrongTextGivesASentence(String path, String text, String sentence) {
        assertEquals(Optional.of(sentence), typed(path, text).refusal().map(Refusal::sentence));
    }

    @Test
    void blankNameIsRefusedAndBlankNoteIsNot() {
        assertEquals(
                Optional.of("\" \"; wanted a name."),
                typed("throws[0].name", " ").refusal().map(Refusal::sentence));
        assertEquals(Optional.of(" "), typed("notes", " ").text());
    }

    @Test
    void keyThatThePageDoesNotKnowIsAProgrammersMistake() {
        assertThrows(IllegalArgumentException.class, () -> typed("throws[0].colour", "red"));
    }

    @Test
    void presentQuantityIsTheWrittenOneOrTheDefault() {
        assertEquals(
                "76 mm",
                EVERY_KEY
                        .quantity(EVERY_KEY.path("throws[0].crankRadius"))
                        .orElseThrow()
                        .text());
        assertEquals(
                0,
                EVERY_KEY
                        .quantity(EVERY_KEY.path("throws[1].guideOffset"))
                        .orElseThrow()
                        .value());
        assertEquals(
                100_500,
                EVERY_KEY
                        .quantity(EVERY_KEY.path("site.framePressure"))
                        .orElseThrow()
                        .value());
        assertEquals(Optional.empty(), EVERY_KEY.quantity(EVERY_KEY.path("limits.rodTension")));
        assertEquals(Optional.empty(), EVERY_KEY.quantity(EVERY_KEY.path("name")));
    }
}
