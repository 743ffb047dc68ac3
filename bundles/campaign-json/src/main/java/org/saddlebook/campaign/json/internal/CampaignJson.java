package org.saddlebook.campaign.json.internal;

import java.time.DateTimeException;
import java.time.Instant;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.HistoryEntry;
import org.saddlebook.api.campaign.SourcePart;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.json.api.JsonArray;
import org.saddlebook.json.api.JsonCursor;
import org.saddlebook.json.api.JsonDocument;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonValue;
import org.saddlebook.json.api.Sha256;

/** Campaigns as JSON, version 1. */
final class CampaignJson {
    static final String SCHEMA = "saddlebook/campaign/1";

    private static final List<String> KEYS =
            List.of("schema", "title", "notes", "sources", "rateTable", "choices", "settings", "history");
    private static final List<String> SOURCE_KEYS = List.of("path", "sha256", "size", "reader");
    private static final List<String> HISTORY_KEYS = List.of("who", "when", "what", "old", "new", "reason");

    private static final int PARTS = 6;

    private CampaignJson() {}

    /** The document without its history: what its digest is taken of. */
    static JsonObject.Builder writeWithoutHistory(Campaign campaign) {
        JsonObject.Builder out = JsonObject.builder().put("schema", SCHEMA).put("title", campaign.title());
        if (!campaign.notes().isEmpty()) {
            out.put("notes", campaign.notes());
        }
        if (!campaign.sources().isEmpty()) {
            List<JsonValue> sources = new ArrayList<>();
            for (SourcePart source : campaign.sources()) {
                sources.add(source(source));
            }
            out.put("sources", new JsonArray(sources));
        }
        if (campaign.rateTable().isPresent()) {
            out.put("rateTable", RateTableJson.write(campaign.rateTable().get()));
        }
        JsonObject choices = ChoicesJson.write(campaign.choices());
        if (!choices.members().isEmpty()) {
            out.put("choices", choices);
        }
        if (!campaign.settings().isEmpty()) {
            Map<String, JsonValue> settings = new LinkedHashMap<>();
            for (Map.Entry<String, Node> setting : campaign.settings().entrySet()) {
                settings.put(setting.getKey(), NodeWriter.write(setting.getValue()));
            }
            out.put("settings", new JsonObject(settings));
        }
        return out;
    }

    static JsonObject write(Campaign campaign) {
        JsonObject.Builder out = writeWithoutHistory(campaign);
        if (!campaign.history().isEmpty()) {
            List<JsonValue> history = new ArrayList<>();
            for (HistoryEntry entry : campaign.history()) {
                history.add(entry(entry));
            }
            out.put("history", new JsonArray(history));
        }
        return out.build();
    }

    private static JsonObject source(SourcePart source) {
        JsonObject.Builder out = JsonObject.builder()
                .put("path", source.path())
                .put("sha256", source.sha256())
                .put("size", source.size());
        if (!source.reader().isEmpty()) {
            out.put("reader", source.reader());
        }
        return out.build();
    }

    private static JsonObject entry(HistoryEntry entry) {
        JsonObject.Builder out = JsonObject.builder()
                .put("who", entry.who())
                .put("when", entry.when().toString())
                .put("what", entry.what());
        putUnlessEmpty(out, "old", entry.oldValue());
        putUnlessEmpty(out, "new", entry.newValue());
        putUnlessEmpty(out, "reason", entry.reason());
        return out.build();
    }

    private static void putUnlessEmpty(JsonObject.Builder out, String key, String text) {
        if (!text.isEmpty()) {
            out.put(key, text);
        }
    }

    static Campaign read(JsonDocument document) throws InputException {
        JsonCursor root = document.cursor();
        SchemaVersion.require(root, "campaign", SCHEMA);
        List<Problem> problems = new ArrayList<>();
        Campaign campaign = Campaign.titled("");
        // Each part on its own, so that one message names the mistakes of all of them.
        for (int part = 0; part < PARTS; part++) {
            try {
                campaign = readPart(part, campaign, root);
            } catch (InputException e) {
                problems.addAll(e.problems());
            }
        }
        if (!problems.isEmpty()) {
            throw new InputException(problems);
        }
        return campaign;
    }

    private static Campaign readPart(int part, Campaign before, JsonCursor root) throws InputException {
        return switch (part) {
            case 0 -> readKeys(before, root);
            case 1 -> readTexts(before, root);
            case 2 -> readSources(before, root);
            case 3 -> readTable(before, root);
            case 4 -> readSettings(before, root);
            default -> readHistory(before, root);
        };
    }

    private static Campaign readKeys(Campaign before, JsonCursor root) throws InputException {
        root.onlyKeys(KEYS);
        return before;
    }

    private static Campaign readTexts(Campaign before, JsonCursor root) throws InputException {
        return before.withTitle(root.member("title").text()).withNotes(text(root, "notes"));
    }

    private static Campaign readSources(Campaign before, JsonCursor root) throws InputException {
        Optional<JsonCursor> sources = root.optional("sources");
        List<SourcePart> parts = new ArrayList<>();
        if (sources.isPresent()) {
            for (JsonCursor source : sources.get().items()) {
                parts.add(readSource(source));
            }
        }
        return before.withSources(parts);
    }

    private static SourcePart readSource(JsonCursor at) throws InputException {
        at.onlyKeys(SOURCE_KEYS);
        String path = at.member("path").text();
        JsonCursor sha256 = at.member("sha256");
        if (!Sha256.isHash(sha256.text())) {
            throw sha256.wrongValue("a SHA-256 of 64 lower-case hexadecimal digits");
        }
        try {
            return new SourcePart(path, sha256.text(), at.member("size").wholeNumber(), text(at, "reader"));
        } catch (IllegalArgumentException e) {
            throw at.member("path")
                    .problem(
                            "path-outside",
                            at.member("path").quoted(),
                            "a relative path inside the campaign's folder, with forward slashes and without \"..\"",
                            "Put the file into the campaign's folder and give its path from there.");
        }
    }

    private static Campaign readTable(Campaign before, JsonCursor root) throws InputException {
        Optional<JsonCursor> table = root.optional("rateTable");
        Campaign campaign = table.isPresent() ? before.withRateTable(RateTableJson.read(table.get())) : before;
        Optional<JsonCursor> choices = root.optional("choices");
        if (choices.isEmpty()) {
            return campaign;
        }
        Choices read = ChoicesJson.read(choices.get());
        if (read.molecularity().isPresent()
                && campaign.rateTable().isPresent()
                && read.molecularity().getAsDouble()
                        != campaign.rateTable().get().order()) {
            JsonCursor at = choices.get().member("molecularity");
            throw at.problem(
                    "order-against-unit",
                    "molecularity " + at.quoted(),
                    "the order of the rate constants, whose unit is "
                            + campaign.rateTable().get().rateUnit().code(),
                    "Correct the molecularity or the unit.");
        }
        return campaign.withChoices(read);
    }

    private static Campaign readSettings(Campaign before, JsonCursor root) throws InputException {
        Campaign campaign = before;
        Optional<JsonCursor> settings = root.optional("settings");
        if (settings.isPresent()) {
            for (JsonCursor setting : settings.get().members()) {
                campaign = campaign.withSetting(setting.key(), NodeReader.read(setting));
            }
        }
        return campaign;
    }

    private static Campaign readHistory(Campaign before, JsonCursor root) throws InputException {
        Campaign campaign = before;
        Optional<JsonCursor> history = root.optional("history");
        if (history.isPresent()) {
            for (JsonCursor entry : history.get().items()) {
                entry.onlyKeys(HISTORY_KEYS);
                campaign = campaign.withHistory(new HistoryEntry(
                        entry.member("who").text(),
                        instant(entry.member("when")),
                        entry.member("what").text(),
                        text(entry, "old"),
                        text(entry, "new"),
                        text(entry, "reason")));
            }
        }
        return campaign;
    }

    private static Instant instant(JsonCursor at) throws InputException {
        try {
            return InstantText.parse(at.text());
        } catch (DateTimeException e) {
            throw at.wrongValue("a time in UTC, for example \"2026-03-02T09:30:00Z\"");
        }
    }

    private static String text(JsonCursor at, String key) throws InputException {
        Optional<JsonCursor> member = at.optional(key);
        return member.isPresent() ? member.get().text() : "";
    }
}
