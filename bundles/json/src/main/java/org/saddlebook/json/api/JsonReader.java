package org.saddlebook.json.api;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParseException;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import com.fasterxml.jackson.core.io.JsonEOFException;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CoderResult;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;

/**
 * Reads JSON strictly: RFC 8259 without extensions, UTF-8, no duplicate keys, nothing after the value, numbers within
 * the range of a double. A byte order mark is skipped.
 */
public final class JsonReader {
    /** The deepest nesting that is read. */
    public static final int MAX_DEPTH = 200;

    /** The longest document that is read, in bytes. */
    public static final int MAX_BYTES = 256 << 20;

    private static final JsonFactory FACTORY = JsonFactory.builder()
            .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
            .streamReadConstraints(StreamReadConstraints.builder()
                    .maxNestingDepth(MAX_DEPTH)
                    .maxStringLength(MAX_BYTES)
                    .build())
            .build();

    private final String name;

    private JsonReader(String name) {
        this.name = name;
    }

    /**
     * Reads a document.
     *
     * @param name file name for messages
     * @param utf8 the whole document
     * @throws InputException with code {@code broken-json}, {@code wrong-encoding} or {@code too-large}, and the line
     */
    public static JsonValue read(String name, byte[] utf8) throws InputException {
        return new JsonReader(name).read(utf8);
    }

    /** The parser behind {@link #read}, for those who look for a line in a document that was read before. */
    static JsonParser parser(char[] text, int length) throws IOException {
        return FACTORY.createParser(text, 0, length);
    }

    private JsonValue read(byte[] utf8) throws InputException {
        if (utf8.length > MAX_BYTES) {
            throw problem(
                    "too-large",
                    Place.of(name),
                    utf8.length + " bytes",
                    "a JSON document of at most " + MAX_BYTES + " bytes",
                    "Check that this is the file you meant.");
        }
        CharBuffer text = decode(utf8);
        try (JsonParser parser = parser(text.array(), text.limit())) {
            JsonToken first = parser.nextToken();
            if (first == null) {
                throw problem(
                        "broken-json",
                        Place.of(name),
                        "an empty file",
                        "a JSON document",
                        "Check that this is the file you meant and that it was copied completely.");
            }
            JsonValue value = value(parser, first);
            if (parser.nextToken() != null) {
                throw broken(parser.currentTokenLocation().getLineNr(), "more text after the end of the JSON document");
            }
            return value;
        } catch (StreamConstraintsException e) {
            throw problem(
                    "too-large",
                    at(e.getLocation() == null ? 0 : e.getLocation().getLineNr()),
                    e.getOriginalMessage(),
                    "a JSON document nested at most " + MAX_DEPTH + " deep, with numbers of at most 1000 digits",
                    "Check that this is the file you meant.");
        } catch (JsonEOFException e) {
            throw broken(e.getLocation().getLineNr(), "the file ends in the middle of a JSON document");
        } catch (JsonParseException e) {
            throw broken(e.getLocation() == null ? 0 : e.getLocation().getLineNr(), e.getOriginalMessage());
        } catch (IOException e) {
            throw new UncheckedIOException(e); // the parser reads from memory
        }
    }

    private CharBuffer decode(byte[] utf8) throws InputException {
        ByteBuffer bytes = ByteBuffer.wrap(utf8);
        if (utf8.length >= 3 && utf8[0] == (byte) 0xEF && utf8[1] == (byte) 0xBB && utf8[2] == (byte) 0xBF) {
            bytes.position(3);
        }
        CharBuffer text = CharBuffer.allocate(bytes.remaining());
        CoderResult result = StandardCharsets.UTF_8.newDecoder().decode(bytes, text, true);
        text.flip();
        if (result.isError()) {
            try {
                result.throwException();
            } catch (CharacterCodingException e) {
                int line = 1;
                for (int i = 0; i < bytes.position(); i++) {
                    line += utf8[i] == '\n' ? 1 : 0;
                }
                throw problem(
                        "wrong-encoding",
                        Place.of(name, line),
                        "bytes that are not UTF-8",
                        "a JSON document in UTF-8",
                        "Save the file again as UTF-8.");
            }
        }
        return text;
    }

    private JsonValue value(JsonParser parser, JsonToken token) throws IOException, InputException {
        return switch (token) {
            case START_OBJECT -> object(parser);
            case START_ARRAY -> array(parser);
            case VALUE_STRING -> string(parser);
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> number(parser);
            case VALUE_TRUE -> new JsonBoolean(true);
            case VALUE_FALSE -> new JsonBoolean(false);
            case VALUE_NULL -> new JsonNull();
            default -> throw new IllegalStateException("unexpected token " + token);
        };
    }

    private JsonValue object(JsonParser parser) throws IOException, InputException {
        Map<String, JsonValue> members = new LinkedHashMap<>();
        while (parser.nextToken() != JsonToken.END_OBJECT) {
            String key = encodable(parser, parser.currentName());
            members.put(key, value(parser, parser.nextToken()));
        }
        return new JsonObject(members);
    }

    private JsonValue array(JsonParser parser) throws IOException, InputException {
        List<JsonValue> items = new ArrayList<>();
        for (JsonToken token = parser.nextToken(); token != JsonToken.END_ARRAY; token = parser.nextToken()) {
            items.add(value(parser, token));
        }
        return new JsonArray(items);
    }

    private JsonValue string(JsonParser parser) throws IOException, InputException {
        return new JsonString(encodable(parser, parser.getText()));
    }

    private String encodable(JsonParser parser, String text) throws InputException {
        if (JsonString.loneSurrogate(text) >= 0) {
            throw broken(parser.currentTokenLocation().getLineNr(), "a string with half of a surrogate pair");
        }
        return text;
    }

    private JsonValue number(JsonParser parser) throws IOException, InputException {
        // Double.parseDouble rounds correctly on every Java version; the parser's own conversions are not used.
        String text = parser.getText();
        double value = Double.parseDouble(text);
        if (!Double.isFinite(value)) {
            throw broken(
                    parser.currentTokenLocation().getLineNr(), "the number " + text + ", beyond the range of a double");
        }
        return new JsonNumber(value);
    }

    private Place at(int line) {
        return line > 0 ? Place.of(name, line) : Place.of(name);
    }

    private InputException broken(int line, String found) {
        return problem(
                "broken-json",
                at(line),
                found,
                "JSON as RFC 8259 defines it, each key once",
                "Mend the file at this line, or take an unchanged copy of it.");
    }

    private static InputException problem(String code, Place place, String found, String expected, String remedy) {
        return new InputException(new Problem(code, place, found, expected, remedy));
    }
}
