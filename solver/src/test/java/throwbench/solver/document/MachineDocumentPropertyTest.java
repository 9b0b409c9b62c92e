package throwbench.solver.document;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.stream.Collectors;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.IntRange;

class MachineDocumentPropertyTest {

    private static final MachineDocument EVERY_KEY = Samples.document(Samples.everyKey());
    private static final List<NumericKey> NUMBERS = EVERY_KEY.numericKeys();
    private static final Map<KeyPath, String> TEXTS = NUMBERS.stream()
            .collect(Collectors.toMap(
                    NumericKey::path, number -> number.quantity().text()));

    @Provide
    Arbitrary<NumericKey> numbers() {
        return Arbitraries.of(NUMBERS);
    }

    @Provide
    Arbitrary<KeyPath> places() {
        List<KeyPath> places = new ArrayList<>();
        for (NumericKey key : NUMBERS) {
            for (KeyPath path = key.path(); !path.isRoot(); path = path.parent()) {
                places.add(path);
            }
        }
        return Arbitraries.of(places);
    }

    @Property
    void editChangesOneValueAndItsUndoGivesTheSameBytes(
            @ForAll("numbers") NumericKey key, @ForAll @IntRange(min = 1, max = 999) int thousandths) {
        double wanted = key.quantity().value() * (1 + thousandths / 1e3);
        String text = key.quantity().rewritten(wanted, EVERY_KEY.ambientPressure(), 9);
        MachineDocument changed = EVERY_KEY.with(key.path(), text);
        for (NumericKey other : changed.numericKeys()) {
            String before = Objects.requireNonNull(TEXTS.get(other.path()), "a new number");
            boolean same = other.path().equals(key.path());
            assertEquals(same ? text : before, other.quantity().text());
            if (same) {
                // nine digits of what is written, which for gauge pressures is less than what it means
                assertEquals(wanted, other.quantity().value(), 1e-8 * Math.abs(wanted) + 1e-8 * 98_500);
            }
        }
        assertEquals(
                EVERY_KEY.text(),
                changed.with(key.path(), key.quantity().text()).text());
    }

    @Property
    void whatStandsOutsideAnEditStaysCharacterByCharacter(@ForAll("numbers") NumericKey key, @ForAll String text) {
        boolean whole = text.chars().noneMatch(c -> Character.isSurrogate((char) c));
        if (!whole) {
            return;
        }
        MachineDocument changed = EVERY_KEY.with(key.path(), text);
        assertEquals(text, changed.valueText(key.path()).orElseThrow());
        String before = EVERY_KEY.text();
        String after = changed.text();
        int head = 0;
        while (head < Math.min(before.length(), after.length()) && before.charAt(head) == after.charAt(head)) {
            head++;
        }
        int tail = 0;
        while (tail < Math.min(before.length(), after.length()) - head
                && before.charAt(before.length() - 1 - tail) == after.charAt(after.length() - 1 - tail)) {
            tail++;
        }
        assertTrue(before.length() - head - tail <= key.quantity().text().length() + 2, "changed more than the value");
    }

    @Property
    void removedPlaceIsGoneAndTheRestReadsAsBefore(@ForAll("places") KeyPath place) {
        MachineDocument less = EVERY_KEY.without(place);
        boolean listed = place.last().isIndex();
        assertEquals(listed ? EVERY_KEY.size(place.parent()) - 1 : 0, listed ? less.size(place.parent()) : 0);
        assertTrue(listed || !less.has(place));
        List<String> left =
                less.numericKeys().stream().map(k -> k.quantity().text()).toList();
        List<String> expected = NUMBERS.stream()
                .filter(k -> !k.path()
                        .steps()
                        .subList(
                                0,
                                Math.min(place.steps().size(), k.path().steps().size()))
                        .equals(place.steps()))
                .map(k -> k.quantity().text())
                .toList();
        // what an unknown kind holds, and a pair that has lost an end, is read no more
        boolean unreadable =
                place.toString().endsWith(".kind") || place.toString().startsWith("ranges.");
        if (!unreadable) {
            assertEquals(expected, left);
        }
    }

    @Property
    void movingThereAndBackGivesTheSameBytes(
            @ForAll("places") KeyPath place, @ForAll @IntRange(min = 0, max = 20) int wish) {
        int count = place.last().isIndex()
                ? EVERY_KEY.size(place.parent())
                : EVERY_KEY.names(place.parent()).size();
        int from = place.last().isIndex()
                ? place.last().index()
                : EVERY_KEY.names(place.parent()).indexOf(place.last().key());
        int to = wish % count;
        MachineDocument moved = EVERY_KEY.move(place, to);
        KeyPath there = place.last().isIndex() ? place.parent().item(to) : place;
        assertEquals(
                EVERY_KEY.json(place).map(MachineDocumentPropertyTest::squeezed),
                moved.json(there).map(MachineDocumentPropertyTest::squeezed));
        assertEquals(EVERY_KEY.text(), moved.move(there, from).text());
    }

    private static String squeezed(String json) {
        return json.replace(" ", "").replace("\n", "");
    }
}
