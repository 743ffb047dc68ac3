package org.saddlebook.register.internal;

import java.time.DateTimeException;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.json.api.CanonicalJson;
import org.saddlebook.json.api.JsonArray;
import org.saddlebook.json.api.JsonCursor;
import org.saddlebook.json.api.JsonDocument;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonValue;
import org.saddlebook.register.api.Digest;
import org.saddlebook.register.api.LogRecord;
import org.saddlebook.register.api.PartEntry;
import org.saddlebook.register.api.RecordKind;
import org.saddlebook.register.api.RegisterDamagedException;
import org.saddlebook.register.api.RegisterException;

/** Records of the log as canonical JSON and back. */
public final class RecordJson {
    private static final List<String> KEYS =
            List.of("schema", "number", "kind", "time", "actor", "title", "meaning", "reason", "target", "parts");

    private RecordJson() {}

    /** The record as a tree. */
    public static JsonObject tree(LogRecord record) {
        List<JsonValue> parts = new ArrayList<>();
        for (PartEntry part : record.parts()) {
            parts.add(JsonObject.builder()
                    .put("name", part.name())
                    .put("type", part.type())
                    .put("size", (double) part.size())
                    .put("sha256", part.sha256().hex())
                    .build());
        }
        JsonObject.Builder object = JsonObject.builder()
                .put("schema", LogRecord.SCHEMA)
                .put("number", (double) record.number())
                .put("kind", record.kind().key())
                .put("time", record.time().toString())
                .put("actor", record.actor())
                .put("title", record.title())
                .put("meaning", record.meaning())
                .put("reason", record.reason());
        if (record.target().isPresent()) {
            object.put("target", (double) record.target().getAsLong());
        }
        return object.put("parts", new JsonArray(parts)).build();
    }

    /** The bytes that are hashed: RFC 8785. */
    public static byte[] canonical(LogRecord record) {
        return CanonicalJson.bytes(tree(record));
    }

    /**
     * Reads a record.
     *
     * @param number under which it is stored, for messages
     */
    public static LogRecord read(long number, byte[] bytes) throws RegisterException {
        JsonCursor root;
        try {
            root = JsonDocument.read("record " + number, bytes).cursor();
            String schema = root.member("schema").text();
            if (!schema.equals(LogRecord.SCHEMA)) {
                throw new RegisterException("Record " + number + " has the schema \"" + schema
                        + "\", which this version does not read; expected \"" + LogRecord.SCHEMA
                        + "\". Use the version that wrote it, or a newer one.");
            }
            root.onlyKeys(KEYS);
            return record(root);
        } catch (InputException | DateTimeException | IllegalArgumentException e) {
            throw new RegisterDamagedException(
                    "Record " + number + " is not a record of a register: " + reason(e) + ".", e);
        }
    }

    private static String reason(Exception e) {
        if (e instanceof InputException input) {
            return "found " + input.problems().get(0).found() + ", expected "
                    + input.problems().get(0).expected();
        }
        return e.getMessage();
    }

    private static LogRecord record(JsonCursor root) throws InputException {
        List<PartEntry> parts = new ArrayList<>();
        for (JsonCursor part : root.member("parts").items()) {
            parts.add(new PartEntry(
                    part.member("name").text(),
                    part.member("type").text(),
                    part.member("size").wholeNumber(),
                    new Digest(part.member("sha256").text())));
        }
        Optional<JsonCursor> target = root.optional("target");
        return new LogRecord(
                root.member("number").wholeNumber(),
                RecordKind.of(root.member("kind").text()),
                Instant.parse(root.member("time").text()),
                root.member("actor").text(),
                root.member("title").text(),
                root.member("meaning").text(),
                root.member("reason").text(),
                target.isPresent() ? OptionalLong.of(target.get().wholeNumber()) : OptionalLong.empty(),
                parts);
    }
}
