package throwbench.app.strip;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import throwbench.solver.document.quantity.UnitSystem;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;

/** Typed angles and travels, for an in-line throw of 150 mm stroke. */
class TypedPlaceTest {

    private static final Linkage LINKAGE = new Linkage(0.075, 0.4, 0);

    private static TypedPlace read(String text) {
        return TypedPlace.read(text, LINKAGE, Rotation.COUNTER_CLOCKWISE, UnitSystem.SI);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "37.5      | 37.5",
                "37,5 deg  | 37.5",
                "37.5°     | 37.5",
                "0         | 0",
                "360       | 360",
                "-30       | -30",
                "400       | 400",
                "90/2      | 45",
                "0.5 rad   | 28.647889756541161"
            })
    void anAngleMeansOneCrankAngle(String text, double degrees) {
        TypedPlace place = read(text);
        assertEquals(1, place.angles().size(), place::sentence);
        assertEquals(degrees, Math.toDegrees(place.angles().get(0)), 1e-9);
        assertEquals("", place.sentence());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "25 %    | 37.5",
                "25%     | 37.5",
                "12,5 %  | 18.75",
                "0 %     | 0",
                "100 %   | 150",
                "40 mm   | 40",
                "4 cm    | 40",
                "1.5 in  | 38.1",
                "150 mm  | 150"
            })
    void aTravelMeansTheCrankAnglesOfBothStrokes(String text, double millimetres) {
        TypedPlace place = read(text);
        assertEquals(2, place.angles().size(), place::sentence);
        assertTrue(place.onBothStrokes());
        for (double angle : place.angles()) {
            // second method: travel at the angle, which the reading inverts
            assertEquals(millimetres, 1000 * LINKAGE.travel(angle, Rotation.COUNTER_CLOCKWISE), 1e-9);
        }
        assertTrue(place.angles().get(0) <= Math.PI && place.angles().get(1) >= Math.PI, "inward first");
    }

    /** By hand: 75 (1 − cos 55.6°) + 400 − √(400² − (75 sin 55.6°)²) = 37.5 mm, a quarter of the stroke. */
    @Test
    void aTravelSaysBothAnglesAndWhatEnterDoesNext() {
        assertEquals(
                "55.6° on the inward stroke; Enter again: 304.4° on the outward stroke",
                read("25 %").sentence());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "160 mm | the travel is 0 to 150 mm (0 to 100 %), 160 mm lies outside it",
                "-5 %   | the travel is 0 to 150 mm (0 to 100 %), –8 mm lies outside it",
                "120 %  | the travel is 0 to 150 mm (0 to 100 %), 180 mm lies outside it"
            })
    void aTravelOutsideTheStrokeIsRefusedWithTheStroke(String text, String sentence) {
        assertEquals(sentence, read(text).sentence());
        assertEquals(0, read(text).angles().size());
    }

    @ParameterizedTest
    @ValueSource(strings = {"abc", "12 kN", "37.5.2", "%", "1e999", "NaN", "5 5", "1,500"})
    void nonsenseIsNamedWithWhatIsWanted(String text) {
        TypedPlace place = read(text);
        assertEquals(0, place.angles().size());
        assertEquals(
                "\"" + text + "\" is neither an angle nor a travel; type an angle as 37.5 or a travel as 25 % or 40 mm",
                place.sentence());
    }

    @Test
    void nothingTypedAndAngleBeyondReasonAreToldApart() {
        assertEquals(
                "type an angle as 37.5 or a travel as 25 % or 40 mm", read("  ").sentence());
        assertEquals(
                "an angle of more than 100 turns; type an angle as 37.5 or a travel as 25 % or 40 mm",
                read("1000000").sentence());
    }

    @Test
    void aLongTextIsQuotedInPart() {
        assertTrue(read("x".repeat(500)).sentence().startsWith("\"" + "x".repeat(24) + "…\" is neither"));
    }
}
