package org.saddlebook.campaign.json.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.findings.Contributor;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.json.api.JsonArray;
import org.saddlebook.json.api.JsonCursor;
import org.saddlebook.json.api.JsonDocument;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonString;
import org.saddlebook.json.api.JsonValue;

/** Findings as JSON, version 1. */
final class FindingsJson {
    static final String SCHEMA = "saddlebook/findings/1";

    private static final List<String> SECTION_KEYS = List.of("id", "title", "outcome", "cautions", "cautionTexts");

    private FindingsJson() {}

    static JsonObject write(Findings findings) {
        Map<String, String> cautions = findings.cautions();
        List<JsonValue> sections = new ArrayList<>();
        for (Section section : findings.sections().values()) {
            sections.add(section(section, cautions));
        }
        JsonObject.Builder out = JsonObject.builder()
                .put("schema", SCHEMA)
                .put(
                        "software",
                        JsonObject.builder()
                                .put("bundles", bundles(findings))
                                .put("sections", new JsonArray(sections))
                                .build())
                .put(
                        "campaign",
                        JsonObject.builder()
                                .put("title", findings.campaignTitle())
                                .put("digest", findings.campaignDigest())
                                .build())
                .put("cautions", texts(cautions));
        for (Map.Entry<String, Section> section : findings.sections().entrySet()) {
            if (!section.getKey().equals(section.getValue().id())) {
                throw new IllegalArgumentException(
                        "section " + section.getValue().id() + " under " + section.getKey());
            }
            out.put(section.getKey(), NodeWriter.write(section.getValue().body()));
        }
        return out.build();
    }

    private static JsonArray bundles(Findings findings) {
        List<JsonValue> bundles = new ArrayList<>();
        for (Contributor contributor : findings.contributors()) {
            JsonObject.Builder bundle =
                    JsonObject.builder().put("name", contributor.name()).put("version", contributor.version());
            if (!contributor.sha256().isEmpty()) {
                bundle.put("sha256", contributor.sha256());
            }
            bundles.add(bundle.build());
        }
        return new JsonArray(bundles);
    }

    /** A section's own words; its body stands under its id. A caution worded otherwise elsewhere keeps its text here. */
    private static JsonObject section(Section section, Map<String, String> common) {
        JsonObject.Builder out = JsonObject.builder()
                .put("id", section.id())
                .put("title", section.title())
                .put("outcome", Words.of(section.outcome()));
        Map<String, String> differing = new LinkedHashMap<>();
        for (Map.Entry<String, String> caution : section.cautions().entrySet()) {
            if (!caution.getValue().equals(common.get(caution.getKey()))) {
                differing.put(caution.getKey(), caution.getValue());
            }
        }
        if (!section.cautions().isEmpty()) {
            out.put(
                    "cautions",
                    JsonArray.ofStrings(List.copyOf(section.cautions().keySet())));
        }
        if (!differing.isEmpty()) {
            out.put("cautionTexts", texts(differing));
        }
        return out.build();
    }

    private static JsonObject texts(Map<String, String> texts) {
        Map<String, JsonValue> members = new LinkedHashMap<>();
        for (Map.Entry<String, String> text : texts.entrySet()) {
            members.put(text.getKey(), new JsonString(text.getValue()));
        }
        return new JsonObject(members);
    }

    static Findings read(JsonDocument document) throws InputException {
        JsonCursor root = document.cursor();
        SchemaVersion.require(root, "findings", SCHEMA);
        JsonCursor software = root.member("software");
        software.onlyKeys(List.of("bundles", "sections"));
        JsonCursor campaign = root.member("campaign");
        campaign.onlyKeys(List.of("title", "digest"));
        Map<String, String> cautions = readTexts(root.member("cautions"));
        Map<String, Section> sections = new LinkedHashMap<>();
        List<String> known = new ArrayList<>(List.of("schema", "software", "campaign", "cautions"));
        for (JsonCursor entry : software.member("sections").items()) {
            Section section = readSection(entry, root, cautions);
            if (sections.put(section.id(), section) != null) {
                throw entry.member("id").wrongValue("each section once");
            }
            known.add(section.id());
        }
        root.onlyKeys(known);
        return new Findings(
                campaign.member("title").text(),
                campaign.member("digest").text(),
                readBundles(software.member("bundles")),
                sections);
    }

    private static List<Contributor> readBundles(JsonCursor at) throws InputException {
        List<Contributor> contributors = new ArrayList<>();
        for (JsonCursor bundle : at.items()) {
            bundle.onlyKeys(List.of("name", "version", "sha256"));
            Optional<JsonCursor> sha256 = bundle.optional("sha256");
            contributors.add(new Contributor(
                    bundle.member("name").text(),
                    bundle.member("version").text(),
                    sha256.isPresent() ? sha256.get().text() : ""));
        }
        return contributors;
    }

    private static Section readSection(JsonCursor entry, JsonCursor root, Map<String, String> common)
            throws InputException {
        entry.onlyKeys(SECTION_KEYS);
        Optional<JsonCursor> own = entry.optional("cautionTexts");
        Map<String, String> differing = own.isPresent() ? readTexts(own.get()) : Map.of();
        Map<String, String> cautions = new LinkedHashMap<>();
        for (String id : NodeReader.texts(entry, "cautions")) {
            String text = differing.getOrDefault(id, common.get(id));
            if (text == null) {
                throw entry.member("cautions")
                        .problem(
                                "wrong-value",
                                "the caution \"" + id + "\"",
                                "a caution whose text stands under \"cautions\"",
                                "Take an unchanged copy of the file.");
            }
            cautions.put(id, text);
        }
        String id = entry.member("id").text();
        JsonCursor at = root.member(id);
        Node body = NodeReader.read(at);
        if (!(body instanceof Node.Group || body instanceof Node.Items)) {
            throw at.wrongType("the body of a section");
        }
        Section.Outcome outcome = Words.read(entry.member("outcome"), Section.Outcome.values());
        try {
            return new Section(id, entry.member("title").text(), outcome, body, cautions);
        } catch (IllegalArgumentException e) {
            throw entry.member("id").wrongValue("a section id");
        }
    }

    private static Map<String, String> readTexts(JsonCursor at) throws InputException {
        Map<String, String> texts = new LinkedHashMap<>();
        for (JsonCursor member : at.members()) {
            texts.put(member.key(), member.text());
        }
        return texts;
    }
}
