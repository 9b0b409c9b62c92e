package throwbench.solver.trial;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;

/** Values from outside the program, kept as rows of data. */
public final class CheckRows {

    private CheckRows() {}

    /**
     * One value.
     *
     * @param quantity what is compared; the test knows how it is computed
     * @param tolerance relative, or in the unit where absolute
     * @param why why that tolerance
     * @param status verified, from memory or derived
     */
    public record Row(
            String id,
            String quantity,
            Map<String, String> inputs,
            String unit,
            double value,
            double tolerance,
            boolean absolute,
            String why,
            String source,
            String status) {

        public double number(String input) {
            return Double.parseDouble(text(input));
        }

        public String text(String input) {
            return cell(inputs, input);
        }

        /** How far a computed value is off, in the measure of the tolerance. */
        public double error(double computed) {
            return Math.abs(absolute ? computed - value : computed / value - 1);
        }

        @Override
        public String toString() {
            return id + ": " + quantity + " " + inputs + " = " + value + " " + unit + " (" + source + ")";
        }
    }

    /** All rows of a resource. */
    public static List<Row> of(String resource) throws IOException {
        List<Row> rows = new ArrayList<>();
        try (InputStream file = CheckRows.class.getResourceAsStream(resource);
                JsonParser parser = new JsonFactory().createParser(file)) {
            parser.nextToken();
            while (parser.nextToken() == JsonToken.START_OBJECT) {
                rows.add(row(parser));
            }
        }
        return rows;
    }

    private static Row row(JsonParser parser) throws IOException {
        Map<String, String> inputs = Map.of();
        Map<String, String> cells = new HashMap<>();
        while (parser.nextToken() == JsonToken.FIELD_NAME) {
            String key = parser.currentName();
            if (parser.nextToken() == JsonToken.START_OBJECT) {
                inputs = texts(parser);
            } else {
                cells.put(key, parser.getText());
            }
        }
        return new Row(
                cell(cells, "id"),
                cell(cells, "quantity"),
                inputs,
                cell(cells, "unit"),
                Double.parseDouble(cell(cells, "value")),
                Double.parseDouble(cell(cells, "tolerance")),
                cells.containsKey("absolute"),
                cell(cells, "why"),
                cell(cells, "source"),
                cell(cells, "status"));
    }

    private static Map<String, String> texts(JsonParser parser) throws IOException {
        Map<String, String> texts = new HashMap<>();
        while (parser.nextToken() == JsonToken.FIELD_NAME) {
            String key = parser.currentName();
            parser.nextToken();
            texts.put(key, parser.getText());
        }
        return Map.copyOf(texts);
    }

    private static String cell(Map<String, String> cells, String key) {
        return Objects.requireNonNull(cells.get(key), key);
    }
}
