package throwbench.solver.published;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.OptionalDouble;

/**
 * One printed figure with its inputs as the source has them, and its source.
 *
 * @param exact the same with exact geometry and a rigid rod
 * @param approx the same by the customary short formula, where there is one
 * @param tolerance share of the printed figure that its rounding or drawing accounts for
 */
record PublishedRow(
        String id,
        String quantity,
        Map<String, String> inputs,
        String unit,
        OptionalDouble published,
        double exact,
        OptionalDouble approx,
        double tolerance,
        String source,
        String status,
        String note) {

    /** The rows of one file beside this class. */
    static List<PublishedRow> read(String file) throws IOException {
        try (InputStream in = Objects.requireNonNull(PublishedRow.class.getResourceAsStream(file), file);
                JsonParser json = new JsonFactory().createParser(in)) {
            List<PublishedRow> rows = new ArrayList<>();
            json.nextToken();
            while (json.nextToken() == JsonToken.START_OBJECT) {
                rows.add(row(json));
            }
            return rows;
        }
    }

    private static PublishedRow row(JsonParser json) throws IOException {
        Map<String, String> texts = new LinkedHashMap<>();
        Map<String, String> inputs = new LinkedHashMap<>();
        while (json.nextToken() == JsonToken.FIELD_NAME) {
            String name = json.currentName();
            if (json.nextToken() == JsonToken.START_OBJECT) {
                while (json.nextToken() == JsonToken.FIELD_NAME) {
                    inputs.put(json.currentName(), json.nextTextValue());
                }
            } else {
                texts.put(name, json.getText());
            }
        }
        return new PublishedRow(
                text(texts, "id"),
                text(texts, "quantity"),
                inputs,
                text(texts, "unit"),
                number(text(texts, "published")),
                Double.parseDouble(text(texts, "exact")),
                number(text(texts, "approx")),
                number(text(texts, "tol_published")).orElse(0),
                text(texts, "source"),
                text(texts, "status"),
                text(texts, "note"));
    }

    private static String text(Map<String, String> texts, String key) {
        return Objects.requireNonNull(texts.get(key), key);
    }

    private static OptionalDouble number(String text) {
        return text.equals("null") ? OptionalDouble.empty() : OptionalDouble.of(Double.parseDouble(text));
    }

    boolean has(String input) {
        return inputs.containsKey(input);
    }

    /** The only quantity of an input, SI. */
    double si(String input) {
        return si(input, 0);
    }

    /** The quantity of that place in an input that names several, SI. */
    double si(String input, int place) {
        String text = Objects.requireNonNull(inputs.get(input), () -> this + " has no " + input);
        return PrintedQuantity.allIn(text).get(place).si();
    }

    @Override
    public String toString() {
        return id + " " + quantity + " [" + unit + "], " + source + " (" + status + ")";
    }
}
