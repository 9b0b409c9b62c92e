package throwbench.solver.document.json;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonFactoryBuilder;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** Parses JSON, keeping where every value stands. */
public final class JsonText {

    /** Longest text, in characters, and largest file, in bytes: a machine of a thousand throws fits in. */
    public static final int LARGEST = 4 * 1024 * 1024;

    /** Deepest nesting of objects and lists; the page needs seven. */
    public static final int DEEPEST = 32;

    static final int LONGEST_TEXT = 200_000;
    static final int LONGEST_NUMBER = 100;
    static final int LONGEST_NAME = 1_000;

    private static final String BEHIND = "something behind the object";
    private static final String THE_END = "the end of the text";

    private static final JsonFactory FACTORY = new JsonFactoryBuilder()
            .disable(JsonFactory.Feature.INTERN_FIELD_NAMES)
            .streamReadConstraints(StreamReadConstraints.builder()
                    .maxNestingDepth(DEEPEST)
                    .maxDocumentLength(LARGEST)
                    .maxStringLength(LONGEST_TEXT)
                    .maxNumberLength(LONGEST_NUMBER)
                    .maxNameLength(LONGEST_NAME)
                    .build())
            .build();

    private final String text;
    private final List<Flaw> flaws = new ArrayList<>();
    private @Nullable Node root;
    private @Nullable Node open;
    private int count;

    private JsonText(String text) {
        this.text = text;
    }

    /** Parses a text; a byte order mark before it is kept. */
    public static Parsed parse(String text) {
        JsonText parsing = new JsonText(text);
        parsing.run();
        return new Parsed(Optional.ofNullable(parsing.root), parsing.count, parsing.flaws);
    }

    private void run() {
        if (text.length() > LARGEST) {
            flaws.add(new Flaw(0, "", text.length() + " characters", "at most " + LARGEST));
            return;
        }
        if (hasBrokenCharacter(text)) {
            flaws.add(at(brokenCharacter(text), "half a character", "whole Unicode characters"));
            return;
        }
        char[] characters = text.toCharArray();
        if (characters.length > 0 && characters[0] == '\ufeff') {
            characters[0] = ' ';
        }
        try (JsonParser parser = FACTORY.createParser(characters)) {
            follow(parser);
        } catch (JsonProcessingException broken) {
            boolean complete = root != null && open == null;
            Flaw flaw = Complaint.flaw(text, broken);
            refuse(complete ? at(flaw.offset(), BEHIND, THE_END) : flaw);
        } catch (IOException impossible) {
            throw new UncheckedIOException("reading characters in memory", impossible);
        }
    }

    private void refuse(Flaw flaw) {
        root = null;
        flaws.clear();
        flaws.add(flaw);
    }

    private void follow(JsonParser parser) throws IOException {
        JsonToken first = parser.nextToken();
        if (first == null) {
            flaws.add(at(0, "an empty text", "a JSON object { … }"));
            return;
        }
        if (first != JsonToken.START_OBJECT) {
            flaws.add(at(offset(parser), "no object", "a JSON object { … }"));
            return;
        }
        String name = "";
        int keyStart = offset(parser);
        for (JsonToken token = first; token != null; token = parser.nextToken()) {
            if (root != null && open == null) {
                refuse(at(offset(parser), BEHIND, THE_END));
                return;
            }
            if (token == JsonToken.FIELD_NAME) {
                name = parser.currentName();
                keyStart = offset(parser);
            } else if (token.isStructEnd()) {
                close(offset(parser) + 1);
            } else {
                boolean member = open != null && open.type() == Node.Type.OBJECT;
                take(parser, token, member ? name : "", member ? keyStart : offset(parser));
            }
        }
    }

    private void take(JsonParser parser, JsonToken token, String name, int keyStart) throws IOException {
        int start = offset(parser);
        Node.Type type = type(token);
        String value = type == Node.Type.OBJECT || type == Node.Type.LIST ? "" : parser.getText();
        Node node = new Node(type, open, name, count++, keyStart, start, end(type, start, value), value);
        if (node.isRepeated()) {
            flaws.add(new Flaw(keyStart, node.path(), "the key a second time", "each key once in an object"));
        }
        if (hasBrokenCharacter(value) || hasBrokenCharacter(name)) {
            flaws.add(new Flaw(keyStart, node.path(), "half a character", "whole Unicode characters"));
        }
        if (node.isNest()) {
            root = root == null ? node : root;
            open = node;
        }
    }

    private void close(int end) {
        Node closed = Objects.requireNonNull(open);
        closed.close(end);
        open = closed.parent();
    }

    private static int offset(JsonParser parser) {
        return (int) parser.currentTokenLocation().getCharOffset();
    }

    private int end(Node.Type type, int start, String value) {
        return type == Node.Type.TEXT ? quoteEnd(text, start) : start + value.length();
    }

    /** Behind the closing quote of the string literal that begins at {@code start}. */
    static int quoteEnd(String text, int start) {
        int at = start + 1;
        while (text.charAt(at) != '"') {
            at += text.charAt(at) == '\\' ? 2 : 1;
        }
        return at + 1;
    }

    private static Node.Type type(JsonToken token) {
        return switch (token) {
            case START_OBJECT -> Node.Type.OBJECT;
            case START_ARRAY -> Node.Type.LIST;
            case VALUE_STRING -> Node.Type.TEXT;
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> Node.Type.NUMBER;
            case VALUE_TRUE -> Node.Type.TRUE;
            case VALUE_FALSE -> Node.Type.FALSE;
            case VALUE_NULL -> Node.Type.NULL;
            default -> throw new IllegalStateException("token " + token);
        };
    }

    private static boolean hasBrokenCharacter(String value) {
        return brokenCharacter(value) >= 0;
    }

    /** Where half a surrogate pair stands alone, or -1. */
    private static int brokenCharacter(String value) {
        for (int at = 0; at < value.length(); at++) {
            char c = value.charAt(at);
            if (Character.isHighSurrogate(c)
                    && at + 1 < value.length()
                    && Character.isLowSurrogate(value.charAt(at + 1))) {
                at++;
            } else if (Character.isSurrogate(c)) {
                return at;
            }
        }
        return -1;
    }

    private Flaw at(int offset, String found, String wanted) {
        return new Flaw(offset, Flaw.place(text, offset), found, wanted);
    }
}
