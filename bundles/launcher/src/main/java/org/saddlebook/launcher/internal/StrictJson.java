package org.saddlebook.launcher.internal;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.core.json.JsonReadFeature;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;

/** Walks through a JSON file of the installation, comments allowed and duplicate keys refused, with places in messages. */
final class StrictJson implements AutoCloseable {
    /** Does something with the member the reader stands at; leaves the parser on the member's last token. */
    interface Member {
        void read(String key) throws IOException, Refused;
    }

    private static final JsonFactory FACTORY = JsonFactory.builder()
            .enable(JsonReadFeature.ALLOW_JAVA_COMMENTS)
            .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
            .build();

    private final String file;
    private final JsonParser parser;

    private StrictJson(String file, byte[] bytes) throws IOException {
        this.file = file;
        this.parser = FACTORY.createParser(bytes);
    }

    /** Reads the one object that a file holds. */
    static void readObject(String file, byte[] bytes, Reading reading) throws Refused {
        try (StrictJson json = new StrictJson(file, bytes)) {
            json.parser.nextToken();
            reading.read(json);
            if (json.parser.nextToken() != null) {
                throw json.unexpected("one object and nothing after it", "Remove what follows the closing brace.");
            }
        } catch (JsonProcessingException e) {
            long line = e.getLocation() == null ? 1 : e.getLocation().getLineNr();
            throw Refused.at(
                    file + ", line " + line,
                    e.getOriginalMessage(),
                    "JSON with every key once",
                    "Mend the file or restore it from the installation archive.");
        } catch (IOException e) {
            throw new Refused(file + ": cannot be read: " + e.getMessage());
        }
    }

    /** What is done with a file. */
    interface Reading {
        void read(StrictJson json) throws IOException, Refused;
    }

    /** Reads an object, member by member. */
    void members(String what, Member member) throws IOException, Refused {
        if (parser.currentToken() != JsonToken.START_OBJECT) {
            throw unexpected("an object for " + what, "Write it in braces.");
        }
        while (parser.nextToken() == JsonToken.FIELD_NAME) {
            String key = parser.currentName();
            parser.nextToken();
            member.read(key);
        }
    }

    /** Reads an array; {@code item} is called at the first token of each. */
    void items(String what, Reading item) throws IOException, Refused {
        if (parser.currentToken() != JsonToken.START_ARRAY) {
            throw unexpected("a list for " + what, "Write it in square brackets.");
        }
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            item.read(this);
        }
    }

    /** Reads a list of texts. */
    List<String> texts(String what) throws IOException, Refused {
        List<String> all = new ArrayList<>();
        items(what, json -> all.add(json.text("an entry of " + what)));
        return all;
    }

    /** Reads a text. */
    String text(String what) throws IOException, Refused {
        if (parser.currentToken() != JsonToken.VALUE_STRING) {
            throw unexpected("a text in quotes for " + what, "Write it in double quotes.");
        }
        return parser.getText();
    }

    /** Steps over the value the reader stands at. */
    void skip() throws IOException {
        parser.skipChildren();
    }

    /** Whether the reader stands at a text. */
    boolean atText() {
        return parser.currentToken() == JsonToken.VALUE_STRING;
    }

    /** Whether the value the reader stands at is an empty object or list; steps over it. */
    boolean skipEmpty() throws IOException {
        JsonToken start = parser.currentToken();
        if (start != JsonToken.START_OBJECT && start != JsonToken.START_ARRAY) {
            return false;
        }
        JsonToken next = parser.nextToken();
        return next == JsonToken.END_OBJECT || next == JsonToken.END_ARRAY;
    }

    /** A refusal at the present line. */
    Refused refused(String found, String expected, String remedy) {
        return Refused.at(file + ", line " + parser.currentTokenLocation().getLineNr(), found, expected, remedy);
    }

    private Refused unexpected(String expected, String remedy) throws IOException {
        JsonToken token = parser.currentToken();
        return refused(token == null ? "the end of the file" : "\"" + parser.getText() + "\"", expected, remedy);
    }

    @Override
    public void close() throws IOException {
        parser.close();
    }
}
