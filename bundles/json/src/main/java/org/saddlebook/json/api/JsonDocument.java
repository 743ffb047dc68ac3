package org.saddlebook.json.api;

import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.OptionalInt;
import org.saddlebook.api.problem.InputException;

/** A JSON document that was read, and the way back from a value in it to its line. */
public final class JsonDocument {
    private final String name;
    private final byte[] utf8;
    private final JsonValue root;

    private JsonDocument(String name, byte[] utf8, JsonValue root) {
        this.name = name;
        this.utf8 = utf8;
        this.root = root;
    }

    /**
     * Reads a document as {@link JsonReader#read} does.
     *
     * @param name file name for messages
     * @param utf8 the whole document; do not change
     */
    public static JsonDocument read(String name, byte[] utf8) throws InputException {
        return new JsonDocument(name, utf8, JsonReader.read(name, utf8));
    }

    /** File name for messages. */
    public String name() {
        return name;
    }

    /** The value. */
    public JsonValue value() {
        return root;
    }

    /** A cursor at the value. */
    public JsonCursor cursor() {
        return new JsonCursor(this, root);
    }

    /**
     * The line of a value, from 1. Looked up by reading again, so that documents without mistakes pay nothing for it.
     *
     * @param path keys ({@link String}) and indices ({@link Integer}) from the root
     */
    OptionalInt line(List<Object> path) {
        String text = new String(utf8, StandardCharsets.UTF_8);
        char[] characters = (text.startsWith("\uFEFF") ? text.substring(1) : text).toCharArray();
        try (JsonParser parser = JsonReader.parser(characters, characters.length)) {
            parser.nextToken();
            for (Object step : path) {
                if (!(step instanceof String key ? member(parser, key) : item(parser, (Integer) step))) {
                    return OptionalInt.empty();
                }
            }
            return OptionalInt.of(parser.currentTokenLocation().getLineNr());
        } catch (IOException e) {
            throw new UncheckedIOException(e); // it was read before without a fault
        }
    }

    private static boolean member(JsonParser parser, String key) throws IOException {
        while (parser.nextToken() == JsonToken.FIELD_NAME) {
            boolean found = parser.currentName().equals(key);
            parser.nextToken();
            if (found) {
                return true;
            }
            parser.skipChildren();
        }
        return false;
    }

    private static boolean item(JsonParser parser, int index) throws IOException {
        for (int i = 0; parser.nextToken() != JsonToken.END_ARRAY; i++) {
            if (i == index) {
                return true;
            }
            parser.skipChildren();
        }
        return false;
    }
}
