package throwbench.solver.document.result;

import com.fasterxml.jackson.core.JsonEncoding;
import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** Writes JSON with the checks and the forms that every result shares; all of it is made before any of it leaves. */
final class Json {

    private final ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    private final JsonGenerator generator;

    Json() throws IOException {
        generator = new JsonFactory().createGenerator(bytes, JsonEncoding.UTF8);
        generator.setPrettyPrinter(new DefaultPrettyPrinter().withObjectIndenter(new DefaultIndenter("  ", "\n")));
    }

    /** Hands the whole text over. */
    void finish(OutputStream out) throws IOException {
        generator.writeRaw('\n');
        generator.close();
        bytes.writeTo(out);
    }

    void begin() throws IOException {
        generator.writeStartObject();
    }

    void begin(String key) throws IOException {
        generator.writeObjectFieldStart(key);
    }

    void end() throws IOException {
        generator.writeEndObject();
    }

    void beginList(String key) throws IOException {
        generator.writeArrayFieldStart(key);
    }

    void endList() throws IOException {
        generator.writeEndArray();
    }

    void text(String key, String value) throws IOException {
        generator.writeStringField(key, value);
    }

    void text(String key, Optional<String> value) throws IOException {
        if (value.isPresent()) {
            generator.writeStringField(key, value.get());
        } else {
            generator.writeNullField(key);
        }
    }

    void textItem(String value) throws IOException {
        generator.writeString(value);
    }

    void whole(String key, int value) throws IOException {
        generator.writeNumberField(key, value);
    }

    void number(String key, double value) throws IOException {
        generator.writeNumberField(key, RevolutionTable.finite(value, key));
    }

    void number(String key, OptionalDouble value) throws IOException {
        if (value.isPresent()) {
            number(key, value.getAsDouble());
        } else {
            generator.writeNullField(key);
        }
    }

    void numberItem(double value) throws IOException {
        generator.writeNumber(RevolutionTable.finite(value, "an item"));
    }

    /** An angle in rad, written in degrees. */
    void degrees(String key, OptionalDouble angle) throws IOException {
        number(key, angle.isPresent() ? OptionalDouble.of(Math.toDegrees(angle.getAsDouble())) : angle);
    }

    void degrees(String key, double angle) throws IOException {
        number(key, Math.toDegrees(angle));
    }

    void numbers(String key, Map<String, Double> byName) throws IOException {
        begin(key);
        for (Map.Entry<String, Double> entry : byName.entrySet()) {
            number(entry.getKey(), entry.getValue());
        }
        end();
    }

    void optionalNumbers(String key, Map<String, OptionalDouble> byName) throws IOException {
        begin(key);
        for (Map.Entry<String, OptionalDouble> entry : byName.entrySet()) {
            number(entry.getKey(), entry.getValue());
        }
        end();
    }
}
