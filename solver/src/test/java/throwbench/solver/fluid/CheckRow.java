package throwbench.solver.fluid;

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

/**
 * One value from outside the program.
 *
 * @param quantity what is compared; {@link FluidCheckValuesTest} knows how each is computed
 * @param tolerance relative, or in the unit where absolute
 * @param why why that tolerance
 * @param status verified, from memory, derived, or an own run of a general-purpose library
 */
record CheckRow(
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

    /** All rows of the resource. */
    static List<CheckRow> all() throws IOException {
        List<CheckRow> rows = new ArrayList<>();
        try (InputStream file = CheckRow.class.getResourceAsStream("fluid-check-values.json");
                JsonParser parser = new JsonFactory().createParser(file)) {
            parser.nextToken();
            while (parser.nextToken() == JsonToken.START_OBJECT) {
                rows.add(row(parser));
            }
        }
        return rows;
    }

    private static CheckRow row(JsonParser parser) throws IOException {
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
        return new CheckRow(
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

    double number(String input) {
        return Double.parseDouble(text(input));
    }

    /** The input "gas" or "liquid" or "mixture" and the like, as text. */
    String text(String input) {
        return cell(inputs, input);
    }

    /** The input "mixture", written as "methane 0.8, ethane 0.2". */
    GasMixture mixture() {
        Map<String, Double> fractions = new HashMap<>();
        for (String part : text("mixture").split(", ", -1)) {
            int space = part.lastIndexOf(' ');
            fractions.put(part.substring(0, space), Double.valueOf(part.substring(space + 1)));
        }
        return new GasMixture(fractions, true);
    }

    /** How far a computed value is off, in the measure of the tolerance. */
    double error(double computed) {
        return absolute ? computed - value : computed / value - 1;
    }

    @Override
    public String toString() {
        return id + ": " + quantity + " " + inputs + " = " + value + " " + unit + " (" + source + ")";
    }
}
