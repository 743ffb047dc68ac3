package org.saddlebook.register.console.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.json.api.JsonArray;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonValue;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.LogRecord;
import org.saddlebook.register.api.PartEntry;

/** Entries as JSON for scripts; documented in the README of this bundle. */
final class EntryJson {
    private EntryJson() {}

    static JsonArray list(List<Entry> entries) {
        List<JsonValue> items = new ArrayList<>();
        for (Entry entry : entries) {
            items.add(entry(entry));
        }
        return new JsonArray(items);
    }

    static JsonObject entry(Entry entry) {
        List<JsonValue> about = new ArrayList<>();
        for (LogRecord later : entry.about()) {
            about.add(record(later).build());
        }
        List<JsonValue> parts = new ArrayList<>();
        for (PartEntry part : entry.record().parts()) {
            parts.add(JsonObject.builder()
                    .put("name", part.name())
                    .put("type", part.type())
                    .put("size", (double) part.size())
                    .put("sha256", part.sha256().hex())
                    .build());
        }
        return record(entry.record())
                .put("status", Text.status(entry))
                .put("leaf", entry.receipt().leaf().hex())
                .put("root", entry.receipt().head().root().hex())
                .put("parts", new JsonArray(parts))
                .put("about", new JsonArray(about))
                .build();
    }

    private static JsonObject.Builder record(LogRecord record) {
        JsonObject.Builder object = JsonObject.builder()
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
        return object;
    }
}
